package loopwright.design;

import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The long-tailed pair.
 *
 * @param transistor name of the part record of both transistors
 * @param tail current source from the common emitters
 * @param load what stands in the collectors
 * @param emitterResistance degeneration of each transistor, Ω
 * @param baseResistance stopper at each base, Ω
 * @param baseEmitterMismatch extra V_BE that Q1 needs over Q2 at the same current, V
 */
public record InputPair(
    String transistor,
    CurrentSource tail,
    PairLoad load,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
        PartValue emitterResistance,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue baseResistance,
    @Measure(unit = Unit.VOLT) @Otherwise("0") Quantity baseEmitterMismatch) {}
