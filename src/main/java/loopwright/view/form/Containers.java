package loopwright.view.form;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.Schema;
import loopwright.design.Shape;

/** The lists and maps of blocks that stand in a block of the design, and their entries. */
final class Containers {
  private Containers() {}

  /**
   * A list or map of blocks.
   *
   * @param path where it stands
   * @param field what is known of it
   */
  record Container(String path, Field field) {}

  /** Whether a field holds several blocks. */
  static boolean isContainer(Field field) {
    return field
        .element()
        .filter(element -> element.shape() == Shape.BLOCK || element.shape() == Shape.FAMILY)
        .isPresent();
  }

  /** Those in a block, also in blocks within it, but not within entries. */
  static List<Container> in(Design design, String blockPath) {
    List<Container> found = new ArrayList<>();
    Object block = blockPath.isEmpty() ? design : DesignPath.get(design, blockPath);
    collect(found, block, blockPath);
    return found;
  }

  private static void collect(List<Container> found, Object block, String path) {
    Schema schema = Schema.of(block.getClass());
    for (Field field : schema.fields()) {
      String at = path.isEmpty() ? field.name() : path + "." + field.name();
      Object value = schema.value(block, field.name());
      Object plain = value instanceof Optional<?> optional ? optional.orElse(null) : value;
      if (isContainer(field)) {
        found.add(new Container(at, field));
      } else if (plain != null && (field.shape() == Shape.BLOCK || field.shape() == Shape.FAMILY)) {
        collect(found, plain, at);
      }
    }
  }

  /** Keys of the entries, in their order: names where they have one, else their numbers. */
  static List<String> keys(Design design, Container container) {
    Object value = DesignPath.find(design, container.path()).orElse(List.of());
    List<String> keys = new ArrayList<>();
    if (value instanceof Map<?, ?> map) {
      map.keySet().forEach(key -> keys.add((String) key));
    } else {
      List<?> list = (List<?>) value;
      for (int i = 0; i < list.size(); i++) {
        keys.add(name(list.get(i)).orElse(Integer.toString(i)));
      }
    }
    return keys;
  }

  /** The name that an entry carries itself. */
  static Optional<String> name(Object entry) {
    Schema schema = Schema.of(entry.getClass());
    return schema.field("name").map(field -> (String) schema.value(entry, "name"));
  }
}
