package loopwright.design;

import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What stands in the collectors of the pair. */
public sealed interface PairLoad permits PairLoad.Resistors, PairLoad.Mirror {
  /** A resistor from the rail to each collector; {@code other} may be a wire. */
  @Kind("resistors")
  record Resistors(
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue output,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue other)
      implements PairLoad {}

  /** A current mirror that turns the pair's other current to the output collector. */
  @Kind("mirror")
  record Mirror(
      String transistor,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue emitterResistance)
      implements PairLoad {}
}
