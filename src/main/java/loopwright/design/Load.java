package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * What the amplifier drives.
 *
 * @param resistance Ω
 * @param capacitance F
 * @param isolation between {@code out} and {@code load}, Ω
 * @param couplingCapacitance behind it, F
 * @param snubber resistor and capacitor in series from {@code out} to ground
 */
public record Load(
    @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<PartValue> resistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) Optional<PartValue> capacitance,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue isolation,
    @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> couplingCapacitance,
    Optional<Snubber> snubber) {
  /** Resistor and capacitor in series. */
  public record Snubber(
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) PartValue resistance,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) PartValue capacitance) {}

  /** Whether the load stands at a node of its own behind the output. */
  public boolean isSeparate() {
    return isolation.effective() > 0 || couplingCapacitance.isPresent();
  }
}
