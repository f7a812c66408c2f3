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
 * @param solver how it is solved
 * @param formula how the hand formula is worked out
 */
public record Figure(
    String key,
    String label,
    Unit unit,
    String definition,
    String level,
    String handFormula,
    CostClass cost,
    Road solver,
    Road formula) {
  /** A road to a figure's value. */
  @FunctionalInterface
  interface Road {
    /** The value, or an {@link UnsolvedException} with the reason. */
    FigureValue of(HookupSolution solution);
  }

  /** The solved value, or why there is none. */
  FigureValue solve(HookupSolution solution) {
    return follow(solver, solution);
  }

  /** The hand formula's value, or why there is none. */
  FigureValue estimate(HookupSolution solution) {
    return follow(formula, solution);
  }

  private static FigureValue follow(Road road, HookupSolution solution) {
    Outcome<FigureValue> outcome = Outcome.of(() -> road.of(solution));
    return outcome.isPresent() ? outcome.value() : FigureValue.none(outcome.reason());
  }
}
