package loopwright.solve;

import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;

/**
 * A walk of the static circuit as the generator moves, blocking capacitors holding their voltage at
 * rest. Every state is reached continuously from the one before; at a fold the walk ends.
 */
public final class GeneratorWalk {
  private static final double LARGEST_ERROR = 0.05;

  private final AssembledHookup hookup;
  private final Continuation continuation;

  /**
   * A walk from a solved state with blocking capacitors held; the state itself stays as it is.
   *
   * @param scale typical size of the generator's movement, V
   */
  public GeneratorWalk(AssembledHookup hookup, CircuitState start, double scale) {
    this.hookup = hookup;
    this.continuation =
        new Continuation(
            new StaticSolver(hookup.circuit()),
            start.copy(),
            Drive.generator(hookup.generator()),
            scale,
            LARGEST_ERROR);
  }

  /** The state where the walk stands; it moves with the walk. */
  public CircuitState state() {
    return continuation.state();
  }

  /** Generator voltage where the walk stands, V. */
  public double generator() {
    return continuation.drive();
  }

  /** Output voltage where the walk stands, V. */
  public double output() {
    return state().voltage(hookup.out());
  }

  /** Incremental gain ∂out/∂generator where the walk stands. */
  public double gain() {
    return continuation.tangent()[hookup.out()];
  }

  /** Takes one step toward a generator voltage; false when the branch ends here. */
  public boolean step(double target) {
    return continuation.step(target);
  }

  /** Walks to a generator voltage; false when the branch ends before. */
  public boolean advance(double target) {
    return continuation.advance(target);
  }
}
