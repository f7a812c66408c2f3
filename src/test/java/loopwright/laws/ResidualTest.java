package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.PriorityQueue;
import java.util.Random;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.design.Rails;
import loopwright.design.RandomDesigns;
import loopwright.file.DesignText;
import loopwright.numeric.SystemFamily;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;

/**
 * What the elimination leaves over is rounding: ‖Ax − b‖∞ ≤ 1e-13 (‖A‖∞‖x‖∞ + ‖b‖∞) for every
 * solution, real and complex, plain and transposed, with pivots that another state or frequency of
 * the circuit had chosen. And a small residual means a small error, judged by arithmetic of 32
 * digits: at most 1e-13 times the condition number.
 */
class ResidualTest {
  private static final double RESIDUAL = 1e-13;
  private static final double ERROR = 1e-13;
  private static final int DESIGNS = 2000;
  private static final int AT_REST = 100;
  private static final int WORST = 25;
  private static final int REGULAR = 25;

  /** What was solved of one or many circuits. */
  private static final class Tally {
    private final PriorityQueue<LinearProblem> worst =
        new PriorityQueue<>(Comparator.comparingDouble(LinearProblem::leastCondition));
    private final List<LinearProblem> regular = new ArrayList<>();
    private int solutions;
    private double largest;
    private String where = "";
    private int analyses;
    private int refinements;
    private int denseFallbacks;

    void check(LinearProblem problem) {
      double residual = problem.residual();
      if (!(residual <= largest)) {
        largest = residual;
        where = problem.what();
      }
      solutions++;
    }

    /** Keeps it for the sample if it is badly conditioned, or when its turn has come. */
    void sample(LinearProblem problem, int turn) {
      check(problem);
      if (solutions % turn == 0) {
        regular.add(problem);
      }
      worst.add(problem);
      if (worst.size() > WORST) {
        worst.remove();
      }
    }

    void count(SystemFamily systems) {
      analyses += systems.analyses();
      refinements += systems.refinements();
      denseFallbacks += systems.denseFallbacks();
    }

    void conclude(TestReporter reporter) {
      assertThat(largest).as(where).isPositive().isLessThanOrEqualTo(RESIDUAL);
      assertThat(denseFallbacks).isZero();
      reporter.publishEntry(
          String.format(
              "%d solutions, largest residual %.2g; %d analyses, %d refinements, %d dense",
              solutions, largest, analyses, refinements, denseFallbacks));
    }
  }

  @Test
  void ofRandomDesignsAtRandomStates(TestReporter reporter) {
    Tally tally = new Tally();
    int each = DESIGNS * 2 * 3 * 4 / REGULAR;
    for (long seed = 1; seed <= DESIGNS; seed++) {
      Design design = RandomDesigns.of(seed);
      AssembledHookup hookup = Solved.assembled(design);
      SolvedSystems systems =
          new SolvedSystems(
              design.name(), hookup.circuit(), seed, problem -> tally.sample(problem, each));
      Random random = new Random(seed);
      systems.solveAt(randomState(hookup, random), 2);
      systems.solveAt(randomState(hookup, random), 2);
      tally.count(hookup.circuit().systems());
    }
    tally.conclude(reporter);
    assertThat(tally.refinements).as("some pivots are bad enough to tell").isPositive();

    assertThat(tally.regular).hasSize(REGULAR);
    assertThat(tally.worst).hasSize(WORST);
    Stream.concat(tally.worst.stream(), tally.regular.stream())
        .forEach(
            problem -> {
              LinearProblem.Judgement judgement = problem.judge();
              assertThat(judgement.condition())
                  .as(problem.what())
                  .isGreaterThanOrEqualTo(problem.leastCondition() / 2);
              assertThat(judgement.error())
                  .as(problem.what())
                  .isLessThanOrEqualTo(ERROR * judgement.condition());
            });
  }

  @Test
  void ofRandomDesignsAtRest(TestReporter reporter) {
    Tally tally = new Tally();
    RandomDesigns.of(AT_REST)
        .forEach(design -> solveAtRest(design, design.hookups().get(0), tally));
    tally.conclude(reporter);
  }

  @Test
  void ofTheExamplesAndTheReferenceDesignsAtRest(TestReporter reporter) throws IOException {
    Tally tally = new Tally();
    Stream<Design> examples =
        Stream.of(
                "everything-fitted",
                "hydrophone-follower",
                "measured-amplifier",
                "nine-volt-preamplifier",
                "seismometer-coil")
            .map(DesignText::example);
    Stream.concat(examples, referenceDesigns())
        .forEach(design -> design.hookups().forEach(hookup -> solveAtRest(design, hookup, tally)));
    tally.conclude(reporter);
  }

  private static Stream<Design> referenceDesigns() throws IOException {
    try (InputStream file =
        ResidualTest.class.getResourceAsStream("/loopwright/reference-designs.json")) {
      List<Design> designs = new ArrayList<>();
      for (JsonNode each : new ObjectMapper().readTree(file).get("cases")) {
        designs.add(DesignText.read(each.get("design").toString()));
      }
      return designs.stream();
    }
  }

  private static void solveAtRest(Design design, Hookup named, Tally tally) {
    AssembledHookup hookup = Assembler.assemble(design, named);
    CircuitState state = Solved.atRest(hookup);
    String name = design.name() + ", " + named.name();
    SolvedSystems systems = new SolvedSystems(name, hookup.circuit(), 1, tally::check);
    systems.solveAt(state, 6);
    state.holdBlockingCapacitors();
    state.evaluate();
    systems.solveAt(state, 2);
    tally.count(hookup.circuit().systems());
  }

  /** Every node somewhere between the rails, junctions limited as in Newton's first steps. */
  private static CircuitState randomState(AssembledHookup hookup, Random random) {
    Rails rails = hookup.design().rails();
    CircuitState state = hookup.circuit().newState();
    double[] unknowns = state.unknowns();
    for (int node = 0; node < hookup.circuit().nodes(); node++) {
      double share = random.nextDouble();
      unknowns[node] =
          rails.negative().value() + share * (rails.positive().value() - rails.negative().value());
    }
    state.evaluate();
    state.evaluate();
    return state;
  }
}
