package loopwright.design;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Visits everything that stands in a design, in the order of the file. */
final class DesignWalk {
  /** Sees one thing: its path, what is known of its field, and its value without optional. */
  interface Visitor {
    void see(String path, Field field, Object value);
  }

  private final Visitor visitor;

  private DesignWalk(Visitor visitor) {
    this.visitor = visitor;
  }

  /** A block is seen before what is in it; what is absent is not seen. */
  static void over(Design design, Visitor visitor) {
    new DesignWalk(visitor).fields(Schema.of(Design.class), design, "");
  }

  private void fields(Schema schema, Object block, String prefix) {
    for (Field field : schema.fields()) {
      Object value = schema.value(block, field.name());
      if (value instanceof Optional<?> optional) {
        value = optional.orElse(null);
      }
      if (value != null) {
        value(field, value, prefix + field.name());
      }
    }
  }

  private void value(Field field, Object value, String path) {
    visitor.see(path, field, value);
    switch (field.shape()) {
      case BLOCK, FAMILY, PART_VALUE ->
          fields(Schema.inside(field, value.getClass()), value, path + ".");
      case LIST, MAP -> elements(field, value, path);
      default -> {}
    }
  }

  private void elements(Field field, Object container, String path) {
    List<String> keys = DesignPath.keys(field, container);
    Field element = field.element().orElseThrow();
    for (int i = 0; i < keys.size(); i++) {
      Object value =
          container instanceof Map<?, ?> map ? map.get(keys.get(i)) : ((List<?>) container).get(i);
      value(element, value, path + "." + keys.get(i));
    }
  }
}
