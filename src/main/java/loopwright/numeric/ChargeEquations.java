package loopwright.numeric;

/**
 * Implicit equations in time, d/dt q(x) + f(x, t) = 0, of one sparsity pattern. A row whose q is
 * zero everywhere is an algebraic condition.
 *
 * <p>The arrays are shared on purpose: an integrator reads them in its hot loop.
 */
public interface ChargeEquations {
  /** Linear systems of the pattern of ∂f/∂x and ∂q/∂x. */
  SystemFamily systems();

  /** The point x at which the equations are evaluated; to be changed by an integrator only. */
  double[] unknowns();

  /** Evaluates f, q and their derivatives at the unknowns and a time. */
  void evaluate(double time);

  /** f of the last evaluation, by row. */
  double[] f();

  /** q of the last evaluation, by row. */
  double[] q();

  /** ∂f/∂x of the last evaluation, by slot. */
  double[] g();

  /** ∂q/∂x of the last evaluation, by slot. */
  double[] c();

  /**
   * Whether the last evaluation took something elsewhere than at the unknowns, to keep a Newton
   * step within what the equations can bear; then f and q do not count yet.
   */
  boolean limited();

  /**
   * How exact an unknown has to be however little it moves; infinite for one that follows from the
   * others and is not to be watched.
   */
  double tolerance(int unknown);
}
