package loopwright.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Drawer.Stock;
import loopwright.design.Field;
import loopwright.design.PartValue;
import loopwright.design.Schema;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * Derives from the schema of a record how it is read and written: the one description of the format
 * is the records themselves.
 */
final class Bindings {
  private static final Binding<Quantity> FRACTION =
      new QuantityBinding(UnitRule.always(Unit.ONE), Range.FRACTION);

  private final NeighbourUnits neighbours;

  /**
   * @param quantities what a reading or a limit may be of
   */
  Bindings(BenchQuantities quantities) {
    this.neighbours = new NeighbourUnits(quantities);
  }

  /** How a record is read and written. */
  <R> BlockBinding<R> block(Class<R> type) {
    return block(type, Optional.empty());
  }

  private <R> BlockBinding<R> block(Class<R> type, Optional<String> kind) {
    Schema schema = Schema.of(type);
    List<MemberBinding> members =
        schema.fields().stream().map(field -> member(schema, field, single(type, field))).toList();
    return new BlockBinding<>(schema, members, kind);
  }

  /** A field takes and gives values of its own type, which its description cannot show. */
  @SuppressWarnings("unchecked")
  private static MemberBinding member(Schema schema, Field field, Binding<?> single) {
    Binding<?> whole = field.optional() ? new OptionalBinding<>(single) : single;
    return new MemberBinding(schema, field, (Binding<Object>) whole);
  }

  /** How a sealed family is read and written. */
  <T> FamilyBinding<T> family(Class<T> type) {
    Map<String, FamilyBinding.Variant<? extends T>> variants = new LinkedHashMap<>();
    for (Class<?> permitted : type.getPermittedSubclasses()) {
      for (String word : Field.kinds(permitted)) {
        variants.put(word, variant(permitted.asSubclass(type), word));
      }
    }
    return new FamilyBinding<>(variants);
  }

  private <V> FamilyBinding.Variant<V> variant(Class<V> type, String word) {
    boolean held = Schema.of(type).field(BlockBinding.KIND).isPresent();
    return new FamilyBinding.Variant<>(
        type, block(type, held ? Optional.empty() : Optional.of(word)));
  }

  /** How the value of a field is read and written, without the optional around it. */
  private Binding<?> single(Class<?> owner, Field field) {
    return switch (field.shape()) {
      case QUANTITY -> neighbours.value(owner, field).orElseGet(() -> measured(field));
      case PART_VALUE -> part(field);
      case TEXT -> neighbours.text(owner, field).orElse(PlainBindings.TEXT);
      case COUNT -> PlainBindings.COUNT;
      case FLAG -> PlainBindings.SWITCH;
      case CHOICE -> new WordBinding(field);
      case BLOCK -> block(field.type());
      case FAMILY -> family(field.type());
      case ALTERNATIVES ->
          field.type() == Stock.class
              ? new StockBinding(new ListBinding<>(measured(field)))
              : new BetaSpreadBinding(FRACTION);
      case LIST -> new ListBinding<>(single(owner, field.element().orElseThrow()));
      case MAP -> new MapBinding<>(single(owner, field.element().orElseThrow()));
    };
  }

  private static QuantityBinding measured(Field field) {
    Unit unit = field.unit().orElseThrow(() -> new IllegalStateException(field + " has no unit"));
    return new QuantityBinding(UnitRule.always(unit), field.range());
  }

  /** A part value's members in full carry the unit of the field that it stands in. */
  private static PartValueBinding part(Field field) {
    Binding<Quantity> value = measured(field);
    Schema schema = Schema.of(PartValue.class);
    List<MemberBinding> members =
        schema.fields().stream()
            .map(own -> member(schema, own, own.name().equals("tolerance") ? FRACTION : value))
            .toList();
    return new PartValueBinding(value, new BlockBinding<>(schema, members, Optional.empty()));
  }
}
