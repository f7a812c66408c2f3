package loopwright.part;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * Parameters of the diode equations at 25 °C as a record states them. What is absent comes from the
 * datasheet, or else from {@link DiodeParameters#DEFAULTS}.
 */
public record DiodeModel(
    @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Optional<Quantity> saturationCurrent,
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> ideality,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) Optional<Quantity> seriesResistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) Optional<Quantity> capacitance,
    @Measure(unit = Unit.SECOND, range = Range.NOT_NEGATIVE) Optional<Quantity> transitTime) {}
