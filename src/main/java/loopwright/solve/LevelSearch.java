package loopwright.solve;

import java.util.Optional;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;

/**
 * Brings the output of a hookup to a level by its generator, starting from a circuit that differs
 * little in its values and stands near that level. It owns its work arrays and serves one thread.
 */
public final class LevelSearch {
  private static final int MOST_STEPS = 15;

  private final AssembledHookup hookup;
  private final CircuitState rest;
  private final StaticSolver solver;
  private final int signAtRest;

  /**
   * A search in one hookup.
   *
   * @param rest at rest, blocking capacitors held; evaluated again, its unknowns unchanged
   */
  public LevelSearch(AssembledHookup hookup, CircuitState rest) {
    this.hookup = hookup;
    this.rest = rest;
    this.solver = new StaticSolver(hookup.circuit());
    rest.evaluate();
    this.signAtRest = solver.factor(rest) ? solver.determinantSign() : 0;
  }

  /**
   * The state in which the output stands at a level.
   *
   * @param near a solved state of a like circuit, with its generator
   * @param volts the level, V
   * @return empty where Newton's method does not get there, or where a fold lies between rest and
   *     there: the determinant changes its sign at a fold and nowhere else
   */
  public Optional<CircuitState> near(CircuitState near, double volts) {
    CircuitState state = rest.copy();
    state.startFrom(near);
    state.setGenerator(near.generator());
    Drive generator = Drive.generator(hookup.generator());
    boolean found = solver.solveToVoltage(state, generator, hookup.out(), volts, MOST_STEPS);
    return found && solver.factor(state) && solver.determinantSign() == signAtRest
        ? Optional.of(state)
        : Optional.empty();
  }
}
