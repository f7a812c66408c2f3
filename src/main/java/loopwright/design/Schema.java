package loopwright.design;

import java.lang.reflect.Constructor;
import java.lang.reflect.Method;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The fields of one block of the design file, taken from the components and annotations of the
 * record that holds it. This is the one place that knows them: readers, writers, forms, paths and
 * the documentation of the format all ask here.
 */
public final class Schema {
  private static final ClassValue<Schema> SCHEMAS =
      new ClassValue<>() {
        @Override
        protected Schema computeValue(Class<?> type) {
          return new Schema(type);
        }
      };

  /** The runtime looks the permitted records of a family up anew at every question. */
  private static final ClassValue<List<Class<?>>> VARIANTS =
      new ClassValue<>() {
        @Override
        protected List<Class<?>> computeValue(Class<?> type) {
          return type.isSealed() ? List.of(type.getPermittedSubclasses()) : List.of();
        }
      };

  private final Class<?> type;
  private final List<Field> fields;
  private final Map<String, Method> accessors;
  private final Constructor<?> constructor;

  private Schema(Class<?> type) {
    if (!type.isRecord()) {
      throw new IllegalArgumentException(type.getName() + " is no record");
    }
    RecordComponent[] components = type.getRecordComponents();
    this.type = type;
    this.fields = Arrays.stream(components).map(Schema::field).toList();
    this.accessors =
        Arrays.stream(components)
            .collect(
                Collectors.toUnmodifiableMap(
                    RecordComponent::getName, RecordComponent::getAccessor));
    this.constructor = canonicalConstructor(type, components);
  }

  private Schema(Schema schema, List<Field> fields) {
    this.type = schema.type;
    this.fields = fields;
    this.accessors = schema.accessors;
    this.constructor = schema.constructor;
  }

  private static Constructor<?> canonicalConstructor(Class<?> type, RecordComponent[] components) {
    try {
      return type.getDeclaredConstructor(
          Arrays.stream(components).map(RecordComponent::getType).toArray(Class<?>[]::new));
    } catch (NoSuchMethodException e) {
      throw new IllegalStateException(type.getName() + " has no canonical constructor", e);
    }
  }

  /**
   * The schema of a record type.
   *
   * @throws IllegalArgumentException when it is no record
   */
  public static Schema of(Class<?> type) {
    return SCHEMAS.get(type);
  }

  /**
   * The schema of what stands in a field: of a part value with the unit of its field, of a block or
   * the given variant of a family.
   *
   * @param variant the record type of the value, the field's own type where there is no choice
   */
  static Schema inside(Field field, Class<?> variant) {
    Schema schema = of(variant);
    return field.shape() == Shape.PART_VALUE
        ? new Schema(schema, schema.fields.stream().map(part -> measured(part, field)).toList())
        : schema;
  }

  /**
   * The records of a sealed family in the order of its permits clause, which each family writes out
   * because the compiler promises no order otherwise; none for other types.
   */
  static List<Class<?>> variants(Class<?> type) {
    return VARIANTS.get(type);
  }

  /** The record type that this describes. */
  public Class<?> type() {
    return type;
  }

  /** The fields in the order of the record's components, without the {@code kind} of a family. */
  public List<Field> fields() {
    return fields;
  }

  /** The field of that name, if there is one. */
  public Optional<Field> field(String name) {
    return fields.stream().filter(field -> field.name().equals(name)).findFirst();
  }

  /**
   * What a record's component holds, optionals included.
   *
   * @param block a record of this type
   * @param name name of a field
   */
  public Object value(Object block, String name) {
    Method accessor = accessors.get(name);
    if (accessor == null) {
      throw new IllegalArgumentException(type.getName() + " has no field " + name);
    }
    try {
      return accessor.invoke(block);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException("cannot read " + name + " of " + type.getName(), e);
    }
  }

  /**
   * A new record.
   *
   * @param values by field name, as the components hold them, optionals included; what is missing
   *     is {@link Field#absent()}
   * @throws IllegalStateException when a needed field is missing
   */
  public Object build(Map<String, ?> values) {
    Object[] arguments =
        fields.stream()
            .map(
                field ->
                    values.containsKey(field.name()) ? values.get(field.name()) : field.absent())
            .toArray();
    try {
      return constructor.newInstance(arguments);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException("cannot build " + type.getName(), e);
    }
  }

  /** A copy of a record with one component changed. */
  Object with(Object block, String name, Object value) {
    Map<String, Object> values = new LinkedHashMap<>();
    for (Field field : fields) {
      values.put(field.name(), field.name().equals(name) ? value : value(block, field.name()));
    }
    return build(values);
  }

  /** The fields without which no record can be built. */
  public List<Field> needed() {
    return fields.stream().filter(Field::isNeeded).toList();
  }

  /**
   * A record in which every field is absent or has its default.
   *
   * @throws IllegalStateException when a field is needed
   */
  public Object defaults() {
    return build(Map.of());
  }

  private static Field measured(Field part, Field owner) {
    boolean fraction = part.name().equals("tolerance");
    return new Field(
        part.name(),
        part.shape(),
        part.type(),
        part.optional(),
        fraction ? Optional.of(Unit.ONE) : owner.unit(),
        fraction ? Range.FRACTION : owner.range(),
        part.otherwise(),
        part.element());
  }

  private static Field field(RecordComponent component) {
    Optional<Measure> measure = Optional.ofNullable(component.getAnnotation(Measure.class));
    Optional<Otherwise> otherwise = Optional.ofNullable(component.getAnnotation(Otherwise.class));
    Type type = component.getGenericType();
    boolean optional = component.getType() == Optional.class;
    Field inner = field(component.getName(), optional ? argument(type, 0) : type, measure);
    return new Field(
        inner.name(),
        inner.shape(),
        inner.type(),
        optional,
        inner.unit(),
        inner.range(),
        otherwise.map(Otherwise::value),
        inner.element());
  }

  private static Field field(String name, Type type, Optional<Measure> measure) {
    Optional<Field> element = Optional.empty();
    Class<?> raw;
    Shape shape;
    if (type instanceof ParameterizedType generic) {
      raw = (Class<?>) generic.getRawType();
      shape = raw == List.class ? Shape.LIST : Shape.MAP;
      int last = generic.getActualTypeArguments().length - 1;
      element = Optional.of(field(name, argument(type, last), measure));
    } else {
      raw = (Class<?>) type;
      shape = shape(raw);
    }
    return new Field(
        name,
        shape,
        raw,
        false,
        measure.map(Measure::unit),
        measure.map(Measure::range).orElse(Range.ANY),
        Optional.empty(),
        element);
  }

  private static Shape shape(Class<?> type) {
    if (type == Quantity.class) {
      return Shape.QUANTITY;
    } else if (type == PartValue.class) {
      return Shape.PART_VALUE;
    } else if (type == String.class) {
      return Shape.TEXT;
    } else if (type == int.class) {
      return Shape.COUNT;
    } else if (type == boolean.class) {
      return Shape.FLAG;
    } else if (type.isEnum()) {
      return Shape.CHOICE;
    } else if (type.isSealed()) {
      boolean told = variants(type).stream().noneMatch(variant -> Field.kinds(variant).isEmpty());
      return told ? Shape.FAMILY : Shape.ALTERNATIVES;
    } else if (type.isRecord()) {
      return Shape.BLOCK;
    }
    throw new IllegalArgumentException("a design cannot hold a " + type.getName());
  }

  private static Type argument(Type type, int index) {
    return ((ParameterizedType) type).getActualTypeArguments()[index];
  }
}
