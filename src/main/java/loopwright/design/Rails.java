package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The supply.
 *
 * @param positive V
 * @param negative V; 0 for a single supply
 * @param resistance between each ideal source and its rail, Ω
 * @param inductance in series with it, H
 * @param decoupling from each rail to ground
 * @param midRail a divided rail
 */
public record Rails(
    @Measure(unit = Unit.VOLT) Quantity positive,
    @Measure(unit = Unit.VOLT) Quantity negative,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue resistance,
    @Measure(unit = Unit.HENRY, range = Range.NOT_NEGATIVE) @Otherwise("0") Quantity inductance,
    Optional<Decoupling> decoupling,
    Optional<MidRail> midRail) {
  /** A capacitor from each rail node to ground, with its series resistance. */
  public record Decoupling(
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) PartValue capacitance,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue resistance) {}

  /** A divider between the rails, with a capacitor to ground. */
  public record MidRail(
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue upper,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue lower,
      @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue capacitance) {}
}
