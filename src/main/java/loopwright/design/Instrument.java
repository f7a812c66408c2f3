package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * An instrument and its accuracy as its manual states it.
 *
 * @param kind what it is
 * @param percentOfReading fraction of the reading
 * @param percentOfRange fraction of the range
 * @param range full scale, in the unit of what it reads
 * @param digits counts of the last digit
 * @param resolution value of one count, in the unit of what it reads
 * @param divisions vertical divisions of an oscilloscope
 * @param voltsPerDivision its setting, V
 * @param inputResistance what it lays across the node, Ω
 * @param inputCapacitance what it lays across the node, F
 * @param displayLoad load that a generator's display is meant for, Ω: 50 or infinite
 */
public record Instrument(
    InstrumentKind kind,
    @Measure(unit = Unit.ONE, range = Range.NOT_NEGATIVE) Optional<Quantity> percentOfReading,
    @Measure(unit = Unit.ONE, range = Range.NOT_NEGATIVE) Optional<Quantity> percentOfRange,
    Optional<Quantity> range,
    @Measure(unit = Unit.ONE, range = Range.NOT_NEGATIVE) Optional<Quantity> digits,
    Optional<Quantity> resolution,
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> divisions,
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> voltsPerDivision,
    @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<Quantity> inputResistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) Optional<Quantity> inputCapacitance,
    @Measure(unit = Unit.OHM, range = Range.POSITIVE_OR_INFINITE) Optional<Quantity> displayLoad) {}
