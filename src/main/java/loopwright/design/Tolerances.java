package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** How the parts spread; what is absent does not. */
public record Tolerances(
    @Measure(unit = Unit.ONE, range = Range.FRACTION) Optional<Quantity> resistor,
    @Measure(unit = Unit.ONE, range = Range.FRACTION) Optional<Quantity> capacitor,
    @Measure(unit = Unit.VOLT, range = Range.NOT_NEGATIVE) Optional<Quantity> baseEmitterVoltage,
    Optional<BetaSpread> beta,
    @Measure(unit = Unit.ONE, range = Range.FRACTION) Optional<Quantity> rails,
    Optional<AmbientRange> ambient) {
  /** How current gain spreads. */
  public sealed interface BetaSpread permits BetaSpread.FromDatasheet, BetaSpread.ByFraction {
    /**
     * From the datasheet's minimum to its maximum at the nearest current; written {@code
     * "datasheet"}.
     */
    record FromDatasheet() implements BetaSpread {}

    /** By a fraction either way; written as a plain value. */
    record ByFraction(@Measure(unit = Unit.ONE, range = Range.FRACTION) Quantity fraction)
        implements BetaSpread {}
  }

  /** The range of ambient temperature. */
  public record AmbientRange(
      @Measure(unit = Unit.CELSIUS) Quantity minimum,
      @Measure(unit = Unit.CELSIUS) Quantity maximum) {}
}
