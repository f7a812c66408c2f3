package loopwright.laws;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.LongFunction;
import java.util.stream.LongStream;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;

/**
 * Solves many designs at rest and judges each outcome by what {@link CurrentSum} finds at its
 * nodes, which shares no code with the solver.
 */
final class OperatingPointCampaign {
  /**
   * By how much two ways of rounding may exceed what the criterion allows; more than between
   * ordinary designs, since an ideal source can drive a node to millions of volts.
   */
  private static final double ROUNDED_TWICE = 3;

  /** What became of a design. */
  enum Outcome {
    /** Reached continuously from all sources at zero, and the currents balance. */
    SOLVED,
    /** Reached with a jump or by settling, said so, and the currents balance. */
    SOLVED_WITH_A_REMARK,
    /** Said not to be solved, with a reason. */
    UNRESOLVED,
    /** Said to be solved, but currents at some node do not balance: must not be. */
    UNBALANCED,
    /** A voltage or current is no number: must not be. */
    NOT_A_NUMBER,
    /** An exception: must not be. */
    EXCEPTION
  }

  /** A design that was not solved, and why. */
  record Case(long seed, Outcome outcome, String says) {}

  /** Counts of every outcome, and the cases that were not solved. */
  record Table(Map<Outcome, Integer> counts, List<Case> unsolved, int designs) {
    int count(Outcome outcome) {
      return counts.getOrDefault(outcome, 0);
    }

    /** Share of the designs that were solved. */
    double solved() {
      return (count(Outcome.SOLVED) + count(Outcome.SOLVED_WITH_A_REMARK)) / (double) designs;
    }

    /** Designs for which the program gave a wrong answer or none. */
    int broken() {
      return count(Outcome.UNBALANCED) + count(Outcome.NOT_A_NUMBER) + count(Outcome.EXCEPTION);
    }
  }

  private OperatingPointCampaign() {}

  /** Solves the designs of some seeds, on all cores. */
  static Table run(LongFunction<Design> generator, long first, int designs) {
    List<Case> cases =
        LongStream.range(first, first + designs)
            .parallel()
            .mapToObj(seed -> judge(generator, seed))
            .toList();
    Map<Outcome, Integer> counts = new TreeMap<>();
    List<Case> unsolved = new ArrayList<>();
    for (Case each : cases) {
      counts.merge(each.outcome(), 1, Integer::sum);
      if (each.outcome().compareTo(Outcome.SOLVED_WITH_A_REMARK) > 0) {
        unsolved.add(each);
      }
    }
    return new Table(counts, unsolved, designs);
  }

  private static Case judge(LongFunction<Design> generator, long seed) {
    Design design = generator.apply(seed);
    try {
      AssembledHookup hookup = Assembler.assemble(design, design.hookups().get(0));
      OperatingPoint point = OperatingPointSolver.solve(hookup.circuit());
      if (point instanceof OperatingPoint.NotFound none) {
        return new Case(seed, Outcome.UNRESOLVED, none.reason());
      }
      OperatingPoint.Found found = (OperatingPoint.Found) point;
      return balance(seed, design, hookup, found);
    } catch (RuntimeException broken) {
      return new Case(seed, Outcome.EXCEPTION, broken.toString());
    }
  }

  private static Case balance(
      long seed, Design design, AssembledHookup hookup, OperatingPoint.Found found) {
    CircuitState state = found.state();
    for (double unknown : state.unknowns()) {
      if (!Double.isFinite(unknown)) {
        return new Case(seed, Outcome.NOT_A_NUMBER, "an unknown is " + unknown);
      }
    }
    Wiring wiring = Wiring.of(design);
    for (Map.Entry<String, CurrentSum.Node> entry :
        new CurrentSum(hookup, state, wiring).nodes().entrySet()) {
      CurrentSum.Node node = entry.getValue();
      if (!wiring.fed().contains(entry.getKey())
          && !(Math.abs(node.leaving()) <= ROUNDED_TWICE * node.allowed())) {
        String says = node.leaving() + " A at " + entry.getKey() + ", allowed " + node.allowed();
        return new Case(seed, Outcome.UNBALANCED, says);
      }
    }
    return found.remark().isEmpty()
        ? new Case(seed, Outcome.SOLVED, "")
        : new Case(seed, Outcome.SOLVED_WITH_A_REMARK, found.remark());
  }
}
