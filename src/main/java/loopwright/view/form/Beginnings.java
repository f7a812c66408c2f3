package loopwright.view.form;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.ResourceBundle;
import loopwright.design.DesignException;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.design.PartValue;
import loopwright.design.Schema;
import loopwright.design.Shape;
import loopwright.quantity.Quantity;

/**
 * Makes a variant or block that a person has just chosen: values of the same name stay, the others
 * begin with something that works, parts with the first that fits.
 */
final class Beginnings {
  private final ResourceBundle values = ResourceBundle.getBundle("loopwright.view.form.beginnings");
  private final PartRole parts;

  Beginnings(PartRole parts) {
    this.parts = parts;
  }

  /**
   * A new record.
   *
   * @param type which
   * @param before what stood at its place, if anything
   * @param path the place
   * @throws DesignException when no part fits
   */
  Object begin(Class<?> type, Optional<Object> before, String path) {
    Map<String, Object> components = new LinkedHashMap<>();
    for (Field field : Schema.of(type).fields()) {
      Optional<Object> kept = before.flatMap(old -> kept(old, field));
      if (kept.isPresent()) {
        components.put(field.name(), kept.get());
      } else if (field.isNeeded()) {
        components.put(field.name(), first(type, field, path + "." + field.name()));
      }
    }
    return Schema.of(type).build(components);
  }

  private static Optional<Object> kept(Object old, Field field) {
    Schema schema = Schema.of(old.getClass());
    return schema
        .field(field.name())
        .filter(same -> same.type() == field.type() && same.optional() == field.optional())
        .map(same -> schema.value(old, same.name()))
        .filter(value -> isWithin(field, value));
  }

  /** What could stand there need not fit here: an emitter resistor of 0 Ω is a wire elsewhere. */
  private static boolean isWithin(Field field, Object value) {
    if (value instanceof PartValue part) {
      return field.range().contains(part.value().value());
    }
    return !(value instanceof Quantity quantity) || field.range().contains(quantity.value());
  }

  private Object first(Class<?> owner, Field field, String path) {
    return switch (field.shape()) {
      case TEXT -> firstPart(path);
      case FAMILY -> begin(field.variants().get(0), Optional.empty(), path);
      default ->
          FieldText.parse(
              field, values.getString(Labels.typeName(owner) + "." + field.name()), path);
    };
  }

  private String firstPart(String path) {
    List<String> candidates = parts.candidates(path);
    if (candidates.isEmpty()) {
      throw new DesignException(path, "found no part that fits, in the design or on the shelf");
    }
    return candidates.get(0);
  }

  /** Whether a field is one that the values of the properties file are for. */
  static boolean needsValue(Field field) {
    return field.isNeeded()
        && (field.shape() == Shape.QUANTITY || field.shape() == Shape.PART_VALUE);
  }
}
