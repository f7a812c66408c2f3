package loopwright.design;

import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * Where the amplifier stands.
 *
 * @param ambient °C
 * @param strayCapacitance from every node to ground, F
 * @param selfHeating whether junctions are solved at their own temperature
 * @param biasCoupling share of the output devices' mean junction rise that the bias device sees
 */
public record Surroundings(
    @Measure(unit = Unit.CELSIUS) @Otherwise("25") Quantity ambient,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) @Otherwise("0")
        Quantity strayCapacitance,
    @Otherwise("false") boolean selfHeating,
    @Measure(unit = Unit.ONE, range = Range.FRACTION) @Otherwise("0") Quantity biasCoupling) {}
