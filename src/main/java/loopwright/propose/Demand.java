package loopwright.propose;

import java.util.OptionalDouble;
import loopwright.quantity.Unit;

/**
 * One demand of a specification beside what was predicted.
 *
 * @param name in words
 * @param wanted in the unit
 * @param predicted in the unit, by the solved circuit; empty where it has no value
 * @param unit of both
 * @param met whether the prediction meets it
 * @param says how far off it is and what would have to give, where it is not met; else empty or a
 *     remark
 */
public record Demand(
    String name, double wanted, OptionalDouble predicted, Unit unit, boolean met, String says) {}
