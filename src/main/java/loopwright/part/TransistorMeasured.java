package loopwright.part;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What a tester showed of the part in hand; it wins over model and datasheet. */
public record TransistorMeasured(
    Optional<Beta> beta, Optional<BaseEmitterVoltage> baseEmitterVoltage) {
  /** Current gain at a collector current. */
  public record Beta(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.ONE, range = Range.POSITIVE) Quantity value) {}

  /** Base-emitter voltage at a collector current and a temperature. */
  public record BaseEmitterVoltage(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Quantity value,
      @Measure(unit = Unit.CELSIUS) @Otherwise("25") Quantity temperature) {}
}
