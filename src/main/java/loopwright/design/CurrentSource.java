package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What pulls a current from a node toward its rail: the pair's tail, or the gain stage's load. */
public sealed interface CurrentSource
    permits CurrentSource.Resistor,
        CurrentSource.Ideal,
        CurrentSource.Mirror,
        CurrentSource.DiodeBiased,
        CurrentSource.TwoTransistor {
  /** A resistor to the rail. */
  @Kind("resistor")
  record Resistor(@Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue resistance)
      implements CurrentSource {}

  /**
   * A current that nothing disturbs; no such part exists, but it shows what a better source would
   * do.
   */
  @Kind("ideal")
  record Ideal(@Measure(unit = Unit.AMPERE) Quantity current) implements CurrentSource {}

  /** A mirror whose input current is set by a resistor. */
  @Kind("mirror")
  record Mirror(
      String transistor,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue setResistance,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue emitterResistance,
      Optional<FeedFrom> feedFrom)
      implements CurrentSource {}

  /** A transistor whose base stands a chain of diodes away from the rail. */
  @Kind("diodeBiased")
  record DiodeBiased(
      String transistor,
      String diode,
      @Otherwise("2") int count,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue feedResistance,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue emitterResistance,
      Optional<FeedFrom> feedFrom)
      implements CurrentSource {}

  /**
   * Two transistors, one of which holds a base-emitter voltage across the other's sense resistor.
   */
  @Kind("twoTransistor")
  record TwoTransistor(
      String transistor,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue feedResistance,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue senseResistance,
      Optional<FeedFrom> feedFrom)
      implements CurrentSource {}
}
