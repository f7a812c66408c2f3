package loopwright.design;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.quantity.Kind;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * What is known of a field of the design, for whoever reads, writes, shows or edits it.
 *
 * @param name its name in the file; for an element of a list or map, the word that stands for it
 * @param shape what it holds
 * @param type the class of what it holds, inside any optional; primitive for counts and flags
 * @param optional whether the record component is an {@link Optional}
 * @param unit the unit of its values; empty where it depends on other fields or makes no sense
 * @param range the values that make sense
 * @param otherwise its default in the file's own spelling
 * @param element what a list or map holds
 */
public record Field(
    String name,
    Shape shape,
    Class<?> type,
    boolean optional,
    Optional<Unit> unit,
    Range range,
    Optional<String> otherwise,
    Optional<Field> element) {

  /** Whether a design is incomplete without it. */
  public boolean isNeeded() {
    return !optional && otherwise.isEmpty() && element.isEmpty();
  }

  /**
   * What the record component holds when the field is not written: an empty optional, list or map,
   * or the default.
   *
   * @throws IllegalStateException when the field is needed
   */
  public Object absent() {
    if (optional) {
      return Optional.empty();
    }
    return switch (shape) {
      case LIST -> List.of();
      case MAP -> Map.of();
      default -> defaultValue();
    };
  }

  private Object defaultValue() {
    String text = otherwise.orElseThrow(() -> new IllegalStateException(name + " has no default"));
    return switch (shape) {
      case QUANTITY -> defaultQuantity(text);
      case PART_VALUE -> PartValue.of(defaultQuantity(text));
      case TEXT -> text;
      case COUNT -> Integer.valueOf(text);
      case FLAG -> Boolean.valueOf(text);
      case CHOICE ->
          choice(text)
              .orElseThrow(() -> new IllegalStateException(name + " has no choice " + text));
      case BLOCK -> Schema.of(type).defaults();
      default -> throw new IllegalStateException(name + " cannot have a default");
    };
  }

  private Quantity defaultQuantity(String text) {
    return Character.isDigit(text.charAt(text.length() - 1))
        ? Quantity.literal(text)
        : Quantity.parse(text, unit.orElse(Unit.ONE), range);
  }

  /** The words of a choice, in the order of its enum; empty for other shapes. */
  public List<String> choices() {
    return type.isEnum()
        ? Arrays.stream(type.getEnumConstants()).map(constant -> word((Enum<?>) constant)).toList()
        : List.of();
  }

  /** The member of a choice that a word stands for. */
  public Optional<Object> choice(String word) {
    return type.isEnum()
        ? Arrays.stream(type.getEnumConstants())
            .filter(constant -> word((Enum<?>) constant).equals(word))
            .map(Object.class::cast)
            .findFirst()
        : Optional.empty();
  }

  /** The records of a family or of alternatives, in the order of the permits clause. */
  public List<Class<?>> variants() {
    return Schema.variants(type);
  }

  /** The words that the field {@code kind} may hold for a record of a family; empty for others. */
  public static List<String> kinds(Class<?> variant) {
    Kind kind = variant.getAnnotation(Kind.class);
    return kind == null ? List.of() : List.of(kind.value());
  }

  /** The word that stands in a file for a member of a choice: {@code MID_RAIL} is midRail. */
  public static String word(Enum<?> constant) {
    StringBuilder word = new StringBuilder();
    boolean capital = false;
    for (char letter : constant.name().toCharArray()) {
      if (letter == '_') {
        capital = true;
      } else {
        word.append(capital ? letter : Character.toLowerCase(letter));
        capital = false;
      }
    }
    return word.toString();
  }

  /** What is expected in this field, for messages: {@code a resistance in Ω, such as 4k7}. */
  public String expectation() {
    return switch (shape) {
      case QUANTITY, PART_VALUE ->
          unit.map(Unit::expectation).orElse("a value, such as 4.7k or -6.1 mV");
      case TEXT -> "a text";
      case COUNT -> "a whole number";
      case FLAG -> "true or false";
      case CHOICE -> "one of " + String.join(", ", choices());
      case FAMILY ->
          "a block whose kind is one of "
              + String.join(
                  ", ", variants().stream().flatMap(variant -> kinds(variant).stream()).toList());
      case BLOCK ->
          "a block of "
              + String.join(", ", Schema.of(type).fields().stream().map(Field::name).toList());
      case ALTERNATIVES ->
          type == Tolerances.BetaSpread.class
              ? "datasheet, or a fraction such as 30%"
              : "a list of values, or a series such as E24";
      case LIST -> "a list";
      case MAP -> "a block of named entries";
    };
  }
}
