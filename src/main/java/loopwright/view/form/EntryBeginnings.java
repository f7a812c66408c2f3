package loopwright.view.form;

import java.util.LinkedHashMap;
import java.util.Map;
import loopwright.design.Design;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.design.Schema;
import loopwright.design.Shape;
import loopwright.quantity.Unit;

/**
 * What a new entry of a list or map begins with: only what it needs, with values that can stand.
 */
final class EntryBeginnings {
  private final Design design;
  private final String name;

  /**
   * @param name of the new entry, where it has one
   */
  EntryBeginnings(Design design, String name) {
    this.design = design;
    this.name = name;
  }

  /** A new block for a field. */
  Object begin(Field field, String path) {
    Class<?> type = field.shape() == Shape.FAMILY ? field.variants().get(0) : field.type();
    return build(type, path);
  }

  private Object build(Class<?> type, String path) {
    Schema schema = Schema.of(type);
    Map<String, Object> values = new LinkedHashMap<>();
    for (Field field : schema.fields()) {
      if (field.isNeeded()) {
        values.put(field.name(), first(field, path + "." + field.name()));
      }
    }
    return schema.build(values);
  }

  private Object first(Field field, String path) {
    return switch (field.shape()) {
      case BLOCK, FAMILY -> begin(field, path);
      case QUANTITY, PART_VALUE -> FieldText.parse(field, value(field), path);
      case COUNT -> 1;
      case FLAG -> false;
      case CHOICE -> field.choice(field.choices().get(0)).orElseThrow();
      case TEXT -> text(field.name());
      default -> field.absent();
    };
  }

  private String value(Field field) {
    return switch (field.unit().orElse(Unit.ONE)) {
      case OHM -> "10k";
      case FARAD -> "100p";
      case AMPERE -> "1m";
      case VOLT -> "1";
      case HERTZ -> "1k";
      case CELSIUS -> "25";
      default -> "1";
    };
  }

  private String text(String field) {
    return switch (field) {
      case "name" -> name;
      case "hookup" -> design.hookups().get(0).name();
      case "node", "from" -> "out";
      case "to" -> "ground";
      case "quantity" -> "gain";
      default -> "new";
    };
  }
}
