package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The generator and what stands between it and the driven input.
 *
 * @param resistance Ω
 * @param dc V
 * @param amplitude peak, V
 * @param frequency Hz
 * @param attenuator divider behind the resistance
 * @param couplingCapacitance behind that, F
 * @param biasResistance from the driven input to {@code biasTo}, Ω
 * @param biasTo ground or the mid-rail
 */
public record Source(
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue resistance,
    @Measure(unit = Unit.VOLT) @Otherwise("0") Quantity dc,
    @Measure(unit = Unit.VOLT, range = Range.NOT_NEGATIVE) @Otherwise("0") Quantity amplitude,
    @Measure(unit = Unit.HERTZ, range = Range.POSITIVE) @Otherwise("1000") Quantity frequency,
    Optional<Attenuator> attenuator,
    @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> couplingCapacitance,
    @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<PartValue> biasResistance,
    @Otherwise("ground") ReturnNode biasTo) {
  /** A divider: series part, then the shunt part to ground. */
  public record Attenuator(
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) PartValue series,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue shunt) {}
}
