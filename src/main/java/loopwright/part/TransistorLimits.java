package loopwright.part;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What a transistor stands. */
public record TransistorLimits(
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> collectorEmitterVoltage,
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> emitterBaseVoltage,
    @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Optional<Quantity> collectorCurrent,
    @Measure(unit = Unit.WATT, range = Range.POSITIVE) Optional<Quantity> power,
    @Measure(unit = Unit.KELVIN_PER_WATT, range = Range.NOT_NEGATIVE)
        Optional<Quantity> thermalResistance,
    @Measure(unit = Unit.CELSIUS) Optional<Quantity> junctionTemperature) {}
