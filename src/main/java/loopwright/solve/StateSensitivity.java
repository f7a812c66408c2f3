package loopwright.solve;

import java.util.Arrays;
import java.util.Optional;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.circuit.ElementSensitivities;

/**
 * How any function of a solved static state changes with the parts, all of them by one solution of
 * the transposed system (Director and Rohrer, IEEE Transactions on Circuit Theory 16, 1969,
 * 318–323).
 *
 * <p>With f(x, p) = 0 and Gᵀλ = ∂φ/∂x the change is dφ/dp = −λᵀ∂f/∂p. Where the generator holds the
 * output at a level, its voltage is one more unknown and the level one more equation; where
 * blocking capacitors are held, the voltage that they have at rest changes too.
 */
public final class StateSensitivity {
  /** How the level changes that the output is held at. */
  @FunctionalInterface
  public interface Level {
    /**
     * Adds the level's derivatives.
     *
     * @param weight factor on them
     * @param sums added to
     */
    void add(double weight, ElementSensitivities sums);
  }

  private final CircuitState state;
  private final StaticSolver solver;
  private final Optional<StateSensitivity> rest;
  private final Optional<Level> level;
  private final double[] byGenerator;
  private final int out;

  private StateSensitivity(
      AssembledHookup hookup,
      CircuitState solved,
      Optional<StateSensitivity> rest,
      Optional<Level> level) {
    this.state = solved.copy();
    this.rest = rest;
    this.level = level;
    this.out = hookup.out();
    this.solver = new StaticSolver(hookup.circuit());
    if (rest.isEmpty()) {
      state.openBlockingCapacitors();
    }
    state.evaluate();
    if (!solver.factor(state)) {
      throw new ArithmeticException("the circuit is singular at this state");
    }
    this.byGenerator = new double[hookup.circuit().unknowns()];
    byGenerator[hookup.generator().branch()] = 1;
    solver.backSolve(byGenerator);
  }

  /**
   * The state at rest, generator at its rest voltage.
   *
   * @param solved not modified
   * @throws ArithmeticException when the circuit is singular there
   */
  public static StateSensitivity atRest(AssembledHookup hookup, CircuitState solved) {
    return new StateSensitivity(hookup, solved, Optional.empty(), Optional.empty());
  }

  /**
   * A state with blocking capacitors held and the generator at a given voltage.
   *
   * @param rest of the same circuit
   * @throws ArithmeticException when the circuit is singular there
   */
  public static StateSensitivity atGenerator(
      AssembledHookup hookup, CircuitState solved, StateSensitivity rest) {
    return new StateSensitivity(hookup, solved, Optional.of(rest), Optional.empty());
  }

  /**
   * A state with blocking capacitors held and the generator where it brings the output to a level.
   *
   * @param rest of the same circuit
   * @throws ArithmeticException when the circuit is singular there
   */
  public static StateSensitivity atLevel(
      AssembledHookup hookup, CircuitState solved, StateSensitivity rest, Level level) {
    return new StateSensitivity(hookup, solved, Optional.of(rest), Optional.of(level));
  }

  /**
   * Adds the derivatives of a function of the state.
   *
   * @param byUnknown the function's own derivative by each unknown; not modified
   * @param sums added to
   */
  public void add(double[] byUnknown, ElementSensitivities sums) {
    double[] adjoint = byUnknown.clone();
    if (level.isPresent()) {
      double share = product(byUnknown, byGenerator) / byGenerator[out];
      adjoint[out] -= share;
      level.get().add(share, sums);
    }
    solver.backSolveTransposed(adjoint);
    double[] byHeld = new double[adjoint.length];
    for (Element element : state.circuit().elements()) {
      element.addStaticSensitivity(state, adjoint, sums);
      if (element instanceof BlockingCapacitor capacitor) {
        add(byHeld, capacitor.from(), adjoint[capacitor.branch()]);
        add(byHeld, capacitor.to(), -adjoint[capacitor.branch()]);
      }
    }
    if (rest.isPresent() && Arrays.stream(byHeld).anyMatch(value -> value != 0)) {
      rest.get().add(byHeld, sums);
    }
  }

  /**
   * Adds the derivatives of an unknown.
   *
   * @param unknown its index; ground, −1, has none
   * @param weight factor on them
   * @param sums added to
   */
  public void add(int unknown, double weight, ElementSensitivities sums) {
    double[] byUnknown = new double[state.circuit().unknowns()];
    add(byUnknown, unknown, weight);
    add(byUnknown, sums);
  }

  private static void add(double[] vector, int index, double value) {
    if (index >= 0) {
      vector[index] += value;
    }
  }

  private static double product(double[] one, double[] other) {
    double sum = 0;
    for (int i = 0; i < one.length; i++) {
      sum += one[i] * other[i];
    }
    return sum;
  }
}
