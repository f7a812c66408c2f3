package loopwright.file;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import loopwright.design.Curve;
import loopwright.design.Field;
import loopwright.design.Instrument;
import loopwright.design.Limit;
import loopwright.design.Reading;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The values whose unit another member of their block decides: a reading's by its quantity, a
 * limit's by its figure or node, an instrument's by its kind, a curve's by its column. The members
 * that decide take known words only.
 */
final class NeighbourUnits {
  private final BenchQuantities quantities;

  NeighbourUnits(BenchQuantities quantities) {
    this.quantities = quantities;
  }

  /** How a text is read that may not be any text. */
  Optional<Binding<String>> text(Class<?> owner, Field field) {
    return switch (path(owner, field)) {
      case "Reading.quantity" -> Optional.of(new KeyBinding(quantities.readings()));
      case "Limit.figure" -> Optional.of(new KeyBinding(quantities.figures()));
      case "Column.unit" -> Optional.of(new UnitSymbolBinding());
      default -> Optional.empty();
    };
  }

  /** How a value is read whose unit a neighbour decides. */
  Optional<QuantityBinding> value(Class<?> owner, Field field) {
    return Optional.ofNullable(
        switch (path(owner, field)) {
          case "Reading.value" -> reading(Range.ANY);
          case "Reading.uncertainty" -> reading(Range.NOT_NEGATIVE);
          case "Limit.minimum", "Limit.maximum" -> limit(Range.ANY);
          case "Limit.guard" -> limit(Range.NOT_NEGATIVE);
          case "Instrument.range", "Instrument.resolution" ->
              new QuantityBinding(
                  new ByNeighbour("a value of what the instrument reads", this::instrument),
                  Range.POSITIVE);
          case "Column.values" ->
              new QuantityBinding(
                  new ByNeighbour(
                      "a value in the column's unit",
                      block -> block.text("unit").flatMap(Unit::fromSymbol).stream().toList()),
                  Range.ANY);
          default -> null;
        });
  }

  private static String path(Class<?> owner, Field field) {
    boolean known =
        List.of(Reading.class, Limit.class, Instrument.class, Curve.Column.class).contains(owner);
    return known ? owner.getSimpleName() + "." + field.name() : "";
  }

  private QuantityBinding reading(Range range) {
    return new QuantityBinding(
        new ByNeighbour(
            "a value of the quantity that was read",
            block -> block.text("quantity").flatMap(quantities::ofReading).stream().toList()),
        range);
  }

  private QuantityBinding limit(Range range) {
    return new QuantityBinding(
        new ByNeighbour("a value of the figure or node that is limited", this::limited), range);
  }

  private List<Unit> limited(Json.Block block) {
    if (block.get("figure").isEmpty() && block.get("node").isPresent()) {
      return List.of(Unit.VOLT);
    }
    return block.text("figure").flatMap(quantities::ofFigure).stream().toList();
  }

  private List<Unit> instrument(Json.Block block) {
    return switch (block.text("kind").orElse("")) {
      case "voltmeter", "oscilloscope", "generator" -> List.of(Unit.VOLT);
      case "ohmmeter" -> List.of(Unit.OHM);
      case "ammeter" -> List.of(Unit.AMPERE);
      case "counter" -> List.of(Unit.HERTZ);
      case "componentTester" -> List.of(Unit.ONE, Unit.OHM, Unit.FARAD, Unit.VOLT);
      default -> List.of();
    };
  }

  private record ByNeighbour(String expected, Function<Json.Block, List<Unit>> deciding)
      implements UnitRule {
    @Override
    public List<Unit> units(Spot spot) {
      return spot.around().map(deciding).orElse(List.of());
    }
  }
}
