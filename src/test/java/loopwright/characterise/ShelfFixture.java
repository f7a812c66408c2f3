package loopwright.characterise;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * The shelf that ships with the program, read by the shapes of the records alone, so that these
 * tests stand below the packages that read files.
 */
final class ShelfFixture {
  private ShelfFixture() {}

  /** All records of the shelf, by name. */
  static Map<String, PartRecord> records() {
    Map<String, PartRecord> records = new LinkedHashMap<>();
    parts()
        .properties()
        .forEach(entry -> records.put(entry.getKey(), record(entry.getKey(), entry.getValue())));
    return records;
  }

  /** The transistor of that name. */
  static TransistorRecord transistor(String name) {
    return (TransistorRecord) records().get(name);
  }

  /** The block {@code parts} of the shelf's file. */
  static JsonNode parts() {
    try (InputStream shelf =
        ShelfFixture.class.getResourceAsStream("/loopwright/shelf/shelf.json")) {
      JsonNode document = new ObjectMapper().readTree(shelf);
      if (document.get("loopwright").intValue() != 1) {
        throw new IllegalStateException("not version 1");
      }
      return document.get("parts");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static PartRecord record(String name, JsonNode node) {
    boolean diode = node.get("kind").textValue().equals("diode");
    return (PartRecord)
        value(name, node, diode ? DiodeRecord.class : TransistorRecord.class, null, null);
  }

  private static Object value(
      String place, JsonNode node, Type type, Measure measure, Otherwise otherwise) {
    if (type instanceof ParameterizedType generic) {
      Type inside = generic.getActualTypeArguments()[0];
      if (generic.getRawType() == Optional.class) {
        return node == null
            ? Optional.empty()
            : Optional.of(value(place, node, inside, measure, null));
      }
      List<Object> list = new ArrayList<>();
      if (node != null) {
        node.forEach(item -> list.add(value(place, item, inside, measure, null)));
      }
      return list;
    }
    Class<?> raw = (Class<?>) type;
    if (raw == boolean.class) {
      return node == null ? Boolean.parseBoolean(otherwise.value()) : node.booleanValue();
    }
    if (node == null) {
      throw new IllegalStateException(place + ": missing");
    }
    if (raw == Quantity.class) {
      return quantity(node, measure.unit());
    }
    if (raw == String.class) {
      return node.textValue();
    }
    if (raw.isEnum()) {
      String wanted = node.textValue().toUpperCase(Locale.ROOT);
      for (Object constant : raw.getEnumConstants()) {
        if (constant.toString().equals(wanted)) {
          return constant;
        }
      }
      throw new IllegalStateException(place + ": " + node);
    }
    return record(place, node, raw);
  }

  private static Object record(String place, JsonNode node, Class<?> raw) {
    RecordComponent[] components = raw.getRecordComponents();
    Set<String> unknown = new TreeSet<>();
    node.fieldNames().forEachRemaining(unknown::add);
    if (raw == DiodeRecord.class) {
      unknown.remove("kind");
    }
    Class<?>[] types = new Class<?>[components.length];
    Object[] values = new Object[components.length];
    for (int i = 0; i < components.length; i++) {
      String name = components[i].getName();
      types[i] = components[i].getType();
      values[i] =
          value(
              place + "." + name,
              node.get(name),
              components[i].getGenericType(),
              components[i].getAnnotation(Measure.class),
              components[i].getAnnotation(Otherwise.class));
      unknown.remove(name);
    }
    if (!unknown.isEmpty()) {
      throw new IllegalStateException(place + ": unknown " + unknown);
    }
    try {
      return raw.getDeclaredConstructor(types).newInstance(values);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(place, e);
    }
  }

  private static Quantity quantity(JsonNode node, Unit unit) {
    return node.isNumber()
        ? Quantity.literal(node.asText())
        : Quantity.parse(node.textValue(), unit);
  }
}
