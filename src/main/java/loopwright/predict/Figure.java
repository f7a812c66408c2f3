package loopwright.predict;

import loopwright.quantity.Unit;

/**
 * A figure of the trade: one entry of the catalogue.
 *
 * @param key its name in files and on the command line
 * @param label what a person reads
 * @param unit its unit
 * @param definition how it is defined, in a sentence
 * @param level where it is taken: at rest, high and low, over the swing
 * @param handFormula the hand formula in words and symbols, or empty
 * @param cost what it costs to solve
 */
public record Figure(
    String key,
    String label,
    Unit unit,
    String definition,
    String level,
    String handFormula,
    CostClass cost) {}
