package loopwright.design;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * Reaches every place of a design by the path that the file gives it: field names joined by dots,
 * entries of maps by their key, elements of lists by their name where they have one and else by
 * their index from 0 ({@code hookups.follower.load.isolation}, {@code limits.0.minimum}, {@code
 * devices.pair.q1.part}).
 */
public final class DesignPath {
  private DesignPath() {}

  /**
   * What stands at a path, optionals unwrapped.
   *
   * @throws DesignException when the design has no such place, or nothing stands there
   */
  public static Object get(Design design, String path) {
    return find(design, path)
        .orElseThrow(() -> new DesignException(path, "found nothing, expected a value"));
  }

  /**
   * What stands at a path, optionals unwrapped; empty where something optional is absent.
   *
   * @throws DesignException when the design can have no such place
   */
  public static Optional<Object> find(Design design, String path) {
    return Optional.ofNullable(locate(design, path).value());
  }

  /**
   * What is known of the field at a path; it may be absent from the design as yet.
   *
   * @throws DesignException when the design can have no such place
   */
  public static Field field(Design design, String path) {
    return locate(design, path).field();
  }

  /**
   * A copy of the design with another value at a path. Null, or an empty optional, takes an
   * optional value, a list element or a map entry away; a new name, or the index one past the end,
   * adds an element. An absent block on the way is created when nothing else in it is needed.
   *
   * @param value of the field's own type; a part value is not merged with what stood there
   * @throws DesignException when there is no such place, the value is of another type or outside
   *     the field's range, or a block on the way would be incomplete
   */
  public static Design set(Design design, String path, Object value) {
    Object plain = value instanceof Optional<?> optional ? optional.orElse(null) : value;
    return (Design) inBlock(Schema.of(Design.class), design, path, plain, "");
  }

  /**
   * A copy of the design with other values at many paths, far quicker than one after the other. An
   * absent block on the way is created where the values complete it.
   *
   * @param values by path, of each field's own type; list elements and map entries on the way exist
   * @throws DesignException when a path has no such place, a value does not fit it, or a block
   *     would be incomplete
   */
  public static Design setAll(Design design, Map<String, ?> values) {
    return values.isEmpty()
        ? design
        : (Design) manyInBlock(Schema.of(Design.class), design, values, "");
  }

  /** Every resistor and capacitor of the design in the order of the file; wires are left out. */
  public static List<NamedPart> parts(Design design) {
    List<NamedPart> parts = new ArrayList<>();
    DesignWalk.over(
        design,
        (path, field, value) -> {
          if (value instanceof PartValue part
              && (part.value().value() != 0 || part.effective() != 0)) {
            parts.add(new NamedPart(path, part, field.unit().orElseThrow()));
          }
        });
    return parts;
  }

  /** The paths of everything that stands in the design, blocks before what is in them. */
  public static List<String> all(Design design) {
    List<String> paths = new ArrayList<>();
    DesignWalk.over(design, (path, field, value) -> paths.add(path));
    return paths;
  }

  /** A place of a design; the value is null where it is absent. */
  private record Place(Field field, Object value) {}

  private static Place locate(Design design, String path) {
    Schema schema = Schema.of(Design.class);
    Object block = design;
    String rest = path;
    while (true) {
      String name = head(rest);
      Field field = field(schema, name, before(path, rest));
      Object value = block == null ? null : unwrapped(schema.value(block, name));
      rest = tail(rest, name);
      while (!rest.isEmpty() && field.element().isPresent()) {
        String key = key(field, value, rest, before(path, rest));
        value = entry(field, value, key);
        field = field.element().get();
        rest = tail(rest, key);
      }
      if (rest.isEmpty()) {
        return new Place(field, value);
      }
      schema = inside(field, value, before(path, rest));
      block = value;
    }
  }

  private static Object inBlock(Schema schema, Object block, String path, Object value, String at) {
    String name = head(path);
    Field field = field(schema, name, at);
    Object current = block == null ? null : unwrapped(schema.value(block, name));
    String here = join(at, name);
    Object changed = changed(field, current, tail(path, name), value, here);
    Object component = field.optional() ? Optional.ofNullable(changed) : changed;
    if (block != null) {
      if (component == null) {
        component = field.isNeeded() ? missing(here, field) : field.absent();
      }
      return schema.with(block, name, component);
    }
    for (Field needed : schema.needed()) {
      if (!needed.name().equals(name)) {
        missing(join(at, needed.name()), needed);
      }
    }
    return schema.build(Map.of(name, component));
  }

  private static Object manyInBlock(Schema schema, Object block, Map<String, ?> values, String at) {
    Map<String, Map<String, Object>> byName = new LinkedHashMap<>();
    values.forEach((path, value) -> put(byName, head(path), path, value));
    Map<String, Object> components = new LinkedHashMap<>();
    if (block != null) {
      for (Field field : schema.fields()) {
        components.put(field.name(), schema.value(block, field.name()));
      }
    }
    byName.forEach(
        (name, inside) -> {
          Field field = field(schema, name, at);
          Object current = unwrapped(components.get(name));
          Object changed = manyChanged(field, current, inside, join(at, name));
          components.put(name, field.optional() ? Optional.of(changed) : changed);
        });
    for (Field needed : schema.needed()) {
      if (!components.containsKey(needed.name())) {
        missing(join(at, needed.name()), needed);
      }
    }
    return schema.build(components);
  }

  private static Object manyChanged(
      Field field, Object current, Map<String, Object> inside, String at) {
    if (inside.containsKey("")) {
      return FieldCheck.checked(field, inside.get(""), at);
    }
    if (current == null && field.element().isPresent()) {
      throw new DesignException(at, "found nothing, expected " + field.expectation());
    }
    if (field.element().isEmpty()) {
      return manyInBlock(inside(field, current, at), current, inside, at);
    }
    Map<String, Map<String, Object>> byKey = new LinkedHashMap<>();
    inside.forEach((path, value) -> put(byKey, key(field, current, path, at), path, value));
    Object copy =
        current instanceof Map<?, ?> map
            ? new LinkedHashMap<Object, Object>(map)
            : new ArrayList<Object>((List<?>) current);
    byKey.forEach(
        (key, deeper) -> {
          Object entry = entry(field, current, key);
          Object changed = manyChanged(field.element().get(), entry, deeper, join(at, key));
          replace(copy, key, keys(field, current).indexOf(key), changed);
        });
    return copy;
  }

  @SuppressWarnings("unchecked")
  private static void replace(Object container, String key, int index, Object element) {
    if (container instanceof Map<?, ?> map) {
      ((Map<Object, Object>) map).put(key, element);
    } else {
      ((List<Object>) container).set(index, element);
    }
  }

  private static void put(
      Map<String, Map<String, Object>> groups, String head, String path, Object value) {
    groups.computeIfAbsent(head, name -> new LinkedHashMap<>()).put(tail(path, head), value);
  }

  private static Object changed(Field field, Object current, String rest, Object value, String at) {
    if (rest.isEmpty()) {
      return value == null ? null : FieldCheck.checked(field, value, at);
    }
    if (value == null && current == null) {
      return null;
    }
    if (field.element().isPresent()) {
      return field.shape() == Shape.MAP
          ? inMap(field, (Map<?, ?>) current, rest, value, at)
          : inList(field, (List<?>) current, rest, value, at);
    }
    return inBlock(inside(field, current, at), current, rest, value, at);
  }

  private static Object inMap(
      Field field, Map<?, ?> current, String rest, Object value, String at) {
    String key = key(field, current, rest, at);
    Object entry = current.get(key);
    Object changed =
        changed(field.element().orElseThrow(), entry, tail(rest, key), value, join(at, key));
    Map<Object, Object> copy = new LinkedHashMap<>(current);
    if (changed == null) {
      copy.remove(key);
    } else {
      copy.put(key, changed);
    }
    return copy;
  }

  private static Object inList(Field field, List<?> current, String rest, Object value, String at) {
    String key = key(field, current, rest, at);
    int index = keys(field, current).indexOf(key);
    Object entry = index < 0 ? null : current.get(index);
    String deeper = tail(rest, key);
    if (entry == null && !deeper.isEmpty()) {
      throw new DesignException(join(at, key), "found nothing, expected " + among(field, current));
    }
    Object changed = changed(field.element().orElseThrow(), entry, deeper, value, join(at, key));
    List<Object> copy = new ArrayList<>(current);
    if (changed == null) {
      if (index >= 0) {
        copy.remove(index);
      }
    } else if (index < 0) {
      copy.add(changed);
    } else {
      copy.set(index, changed);
    }
    return copy;
  }

  private static Object entry(Field field, Object container, String key) {
    if (container == null) {
      return null;
    }
    if (container instanceof Map<?, ?> map) {
      return map.get(key);
    }
    List<?> list = (List<?>) container;
    int index = keys(field, list).indexOf(key);
    return index < 0 ? null : list.get(index);
  }

  /** The names or indices by which the elements of a list or map are addressed. */
  static List<String> keys(Field field, Object container) {
    if (container instanceof Map<?, ?> map) {
      return map.keySet().stream().map(String.class::cast).toList();
    }
    List<?> list = (List<?>) container;
    return isNamed(field)
        ? list.stream().map(DesignPath::nameOf).toList()
        : IntStream.range(0, list.size()).mapToObj(Integer::toString).toList();
  }

  /** The key at the head of a path: the longest that stands there, for roles have dots in them. */
  private static String key(Field field, Object container, String rest, String at) {
    List<String> keys = container == null ? List.of() : keys(field, container);
    Optional<String> known =
        keys.stream()
            .filter(key -> rest.equals(key) || rest.startsWith(key + "."))
            .max(Comparator.comparingInt(String::length));
    if (known.isPresent()) {
      return known.get();
    }
    String fresh = head(rest);
    if (field.element().orElseThrow().type() == DeviceChoice.class && !fresh.equals(rest)) {
      fresh = fresh + "." + head(tail(rest, fresh));
    }
    boolean addable =
        field.shape() == Shape.MAP
            || (tail(rest, fresh).isEmpty()
                && (isNamed(field) || fresh.equals(Integer.toString(keys.size()))));
    if (!addable) {
      throw new DesignException(
          join(at, fresh), "found nothing, expected " + among(field, container));
    }
    return fresh;
  }

  private static String among(Field field, Object container) {
    Collection<String> keys = container == null ? List.of() : keys(field, container);
    return keys.isEmpty()
        ? "an entry that exists; there is none"
        : "one of " + String.join(", ", keys);
  }

  private static boolean isNamed(Field field) {
    Field element = field.element().orElseThrow();
    List<Class<?>> blocks =
        switch (element.shape()) {
          case BLOCK -> List.of(element.type());
          case FAMILY -> element.variants();
          default -> List.of();
        };
    return blocks.stream().anyMatch(block -> Schema.of(block).field("name").isPresent());
  }

  private static String nameOf(Object element) {
    return (String) Schema.of(element.getClass()).value(element, "name");
  }

  private static Schema inside(Field field, Object value, String at) {
    boolean hasFields =
        switch (field.shape()) {
          case BLOCK, PART_VALUE -> true;
          case FAMILY -> value != null;
          default -> false;
        };
    if (!hasFields) {
      String found = value == null ? "nothing" : "a value without fields";
      throw new DesignException(at, "found " + found + ", expected " + field.expectation());
    }
    return Schema.inside(field, value == null ? field.type() : value.getClass());
  }

  private static Field field(Schema schema, String name, String at) {
    return schema
        .field(name)
        .orElseThrow(
            () ->
                new DesignException(
                    join(at, name),
                    "found no such field, expected one of "
                        + String.join(", ", schema.fields().stream().map(Field::name).toList())));
  }

  private static Object missing(String path, Field field) {
    throw new DesignException(path, "found nothing, expected " + field.expectation());
  }

  private static Object unwrapped(Object value) {
    return value instanceof Optional<?> optional ? optional.orElse(null) : value;
  }

  private static String head(String path) {
    int dot = path.indexOf('.');
    return dot < 0 ? path : path.substring(0, dot);
  }

  private static String tail(String path, String head) {
    return path.length() == head.length() ? "" : path.substring(head.length() + 1);
  }

  private static String before(String path, String rest) {
    return rest.length() == path.length()
        ? ""
        : path.substring(0, path.length() - rest.length() - 1);
  }

  private static String join(String at, String name) {
    return at.isEmpty() ? name : at + "." + name;
  }
}
