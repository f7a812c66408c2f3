package loopwright.design;

import java.util.Optional;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** Reads the value of a single field from a text as a person would write it. */
public final class FieldText {
  private FieldText() {}

  /**
   * The value that a text stands for.
   *
   * @param field what is expected
   * @param text what was written
   * @param path where, for the message
   * @return of the field's own type, not wrapped in an optional
   * @throws DesignException when the text does not fit the field, or the field is no single value
   */
  public static Object parse(Field field, String text, String path) {
    try {
      return switch (field.shape()) {
        case QUANTITY -> quantity(field, text);
        case PART_VALUE -> PartValue.of(quantity(field, text));
        case TEXT -> text;
        case COUNT -> count(text);
        case FLAG -> flag(text);
        case CHOICE -> field.choice(text).orElseThrow(() -> wrong(field, text));
        case ALTERNATIVES -> alternative(field, text);
        default -> throw wrong(field, text);
      };
    } catch (QuantityException e) {
      throw new DesignException(path, e.getMessage());
    }
  }

  private static Quantity quantity(Field field, String text) {
    Optional<Unit> unit = field.unit();
    if (unit.isPresent()) {
      return Quantity.parse(text, unit.get(), field.range());
    }
    Quantity quantity = Quantity.parseAny(text).quantity();
    quantity.requireWithin(field.range(), Unit.ONE);
    return quantity;
  }

  private static Object count(String text) {
    try {
      return Integer.valueOf(text.strip());
    } catch (NumberFormatException e) {
      throw new QuantityException("found \"" + text + "\", expected a whole number");
    }
  }

  private static Object flag(String text) {
    return switch (text.strip()) {
      case "true" -> true;
      case "false" -> false;
      default -> throw new QuantityException("found \"" + text + "\", expected true or false");
    };
  }

  private static Object alternative(Field field, String text) {
    if (field.type() == Drawer.Stock.class) {
      if (PreferredValues.named(text).isEmpty()) {
        throw wrong(field, text);
      }
      return new Drawer.Stock.Series(text);
    }
    return text.equals("datasheet")
        ? new Tolerances.BetaSpread.FromDatasheet()
        : new Tolerances.BetaSpread.ByFraction(Quantity.parse(text, Unit.ONE, Range.FRACTION));
  }

  private static QuantityException wrong(Field field, String text) {
    return new QuantityException("found \"" + text + "\", expected " + field.expectation());
  }
}
