package loopwright.view.form;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.Schema;
import loopwright.design.Shape;

/**
 * One line of a form: a field of the design and what stands in it.
 *
 * @param path where in the design
 * @param owner the record that has the field
 * @param field what is known of it
 * @param value what stands there; empty where something optional is absent
 * @param depth 0 for the block's own fields, more for those of what is fitted in them
 */
record Row(String path, Class<?> owner, Field field, Optional<Object> value, int depth) {
  /** The rows for everything that stands in a block of the design, as far as a form shows it. */
  static List<Row> of(Design design, String blockPath) {
    List<Row> rows = new ArrayList<>();
    Field field = DesignPath.field(design, blockPath);
    Optional<Object> block = DesignPath.find(design, blockPath);
    if (field.shape() == Shape.FAMILY && field.variants().size() > 1 && !isAmplifier(blockPath)) {
      add(rows, new Row(blockPath, field.type(), field, block, 0));
    } else {
      block.ifPresent(value -> fields(rows, value, blockPath, 0));
    }
    return rows;
  }

  /** Of the two kinds of amplifier neither can be made of the other. */
  private static boolean isAmplifier(String path) {
    return path.equals("amplifier");
  }

  private static void fields(List<Row> rows, Object block, String path, int depth) {
    Schema schema = Schema.of(block.getClass());
    for (Field field : schema.fields()) {
      Object value = schema.value(block, field.name());
      Optional<Object> present =
          value instanceof Optional<?> optional
              ? optional.map(Object.class::cast)
              : Optional.of(value);
      Row row = new Row(path + "." + field.name(), block.getClass(), field, present, depth);
      if (row.isShown()) {
        add(rows, row);
      }
    }
  }

  /**
   * The rows for everything that stands in a block, but for the lists and maps of blocks in it,
   * which have entries of their own.
   */
  static List<Row> whole(Design design, String blockPath) {
    List<Row> rows = new ArrayList<>();
    Object block = blockPath.isEmpty() ? design : DesignPath.get(design, blockPath);
    everything(rows, design, block, blockPath, 0);
    return rows;
  }

  private static void everything(
      List<Row> rows, Design design, Object block, String path, int depth) {
    Schema schema = Schema.of(block.getClass());
    for (Field field : schema.fields()) {
      String at = path.isEmpty() ? field.name() : path + "." + field.name();
      boolean ownPlace = path.isEmpty() && field.shape() != Shape.TEXT;
      if (Containers.isContainer(field) || ownPlace) {
        continue;
      }
      Object value = schema.value(block, field.name());
      Optional<Object> present =
          value instanceof Optional<?> optional
              ? optional.map(Object.class::cast)
              : Optional.of(value);
      Row row = new Row(at, block.getClass(), field, present, depth);
      rows.add(row);
      switch (field.shape()) {
        case BLOCK, FAMILY ->
            present.ifPresent(inner -> everything(rows, design, inner, at, depth + 1));
        case PART_VALUE ->
            present.ifPresent(
                inner -> {
                  known(rows, design, inner, at + ".tolerance", depth + 1);
                  known(rows, design, inner, at + ".measured", depth + 1);
                });
        default -> {}
      }
    }
  }

  /** What is known of a part beyond its nominal value. */
  private static void known(List<Row> rows, Design design, Object part, String path, int depth) {
    Field field = DesignPath.field(design, path);
    rows.add(new Row(path, part.getClass(), field, DesignPath.find(design, path), depth));
  }

  private static void add(List<Row> rows, Row row) {
    rows.add(row);
    if (row.field().shape() == Shape.FAMILY || row.field().shape() == Shape.BLOCK) {
      row.value().ifPresent(inner -> fields(rows, inner, row.path(), row.depth() + 1));
    }
  }

  private boolean isShown() {
    return switch (field.shape()) {
      case MAP, ALTERNATIVES -> false;
      case LIST -> isListOfValues();
      default -> true;
    };
  }

  /** Whether it holds several plain values, such as the poles of an amplifier. */
  boolean isListOfValues() {
    return field.element().filter(element -> element.shape() == Shape.QUANTITY).isPresent();
  }

  /** Whether both rows are edited by the same kind of field at the same place. */
  boolean isSamePlace(Row other) {
    return path.equals(other.path)
        && owner == other.owner
        && depth == other.depth
        && field.equals(other.field);
  }
}
