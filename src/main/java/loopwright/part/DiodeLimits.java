package loopwright.part;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What a diode stands. */
public record DiodeLimits(
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> reverseVoltage,
    @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Optional<Quantity> current,
    @Measure(unit = Unit.WATT, range = Range.POSITIVE) Optional<Quantity> power,
    @Measure(unit = Unit.KELVIN_PER_WATT, range = Range.NOT_NEGATIVE)
        Optional<Quantity> thermalResistance) {}
