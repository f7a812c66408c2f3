package loopwright.predict;

import loopwright.design.Feedback;
import loopwright.design.Load;
import loopwright.design.PartValue;

/** The resistance that the output drives, by hand. */
final class OutputLoad {
  private OutputLoad() {}

  /** Load behind its isolation, in parallel with the feedback network, Ω; infinite for none. */
  static double resistance(HookupSolution solution) {
    Load load = solution.hookup().load();
    double behind =
        load.resistance().map(PartValue::effective).orElse(Double.POSITIVE_INFINITY)
            + load.isolation().effective();
    return Resistances.parallel(behind, feedback(solution));
  }

  private static double feedback(HookupSolution solution) {
    HookupGains gains = solution.gains();
    if (solution.hookup().feedback() instanceof Feedback.Open) {
      return Double.POSITIVE_INFINITY;
    }
    return solution.hookup().feedback() instanceof Feedback.Inverting
        ? gains.upper()
        : gains.upper() + gains.lower();
  }
}
