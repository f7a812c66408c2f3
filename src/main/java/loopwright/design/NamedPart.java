package loopwright.design;

import loopwright.quantity.Unit;

/**
 * A resistor or capacitor of a design, named by its path. One path may stand for two equal parts,
 * as the emitter resistors of a pair do.
 *
 * @param path for example {@code hookups.gain.feedback.upper}
 * @param value what it is
 * @param unit Ω or F
 */
public record NamedPart(String path, PartValue value, Unit unit) {}
