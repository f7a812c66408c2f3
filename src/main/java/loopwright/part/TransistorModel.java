package loopwright.part;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * Parameters of the transistor equations at 25 °C as a record states them. What is absent comes
 * from the datasheet, or else from {@link TransistorParameters#DEFAULTS}.
 */
public record TransistorModel(
    @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Optional<Quantity> saturationCurrent,
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> forwardBeta,
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> reverseBeta,
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE_OR_INFINITE) Optional<Quantity> earlyVoltage,
    @Measure(unit = Unit.AMPERE, range = Range.POSITIVE_OR_INFINITE) Optional<Quantity> kneeCurrent,
    @Measure(unit = Unit.AMPERE, range = Range.NOT_NEGATIVE)
        Optional<Quantity> recombinationCurrent,
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> recombinationIdeality,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) Optional<Quantity> baseResistance,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) Optional<Quantity> emitterResistance,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) Optional<Quantity> collectorResistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE)
        Optional<Quantity> baseEmitterCapacitance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE)
        Optional<Quantity> baseCollectorCapacitance,
    @Measure(unit = Unit.SECOND, range = Range.NOT_NEGATIVE) Optional<Quantity> transitTime,
    @Measure(unit = Unit.SECOND, range = Range.NOT_NEGATIVE) Optional<Quantity> reverseTransitTime,
    @Measure(unit = Unit.HERTZ, range = Range.NOT_NEGATIVE) Optional<Quantity> flickerCorner) {}
