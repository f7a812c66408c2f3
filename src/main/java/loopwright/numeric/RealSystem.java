package loopwright.numeric;

/**
 * A real linear system A x = b of a fixed pattern: factored often, solved often. Not thread-safe.
 */
public interface RealSystem {
  /**
   * Factors A.
   *
   * @param values of A by slot; not modified
   * @return false when A is singular to working precision or holds a value that is not finite; then
   *     nothing may be solved
   */
  boolean factor(double[] values);

  /**
   * Solves A x = b.
   *
   * @param rightHandSide b on entry, x on return
   */
  void solve(double[] rightHandSide);

  /**
   * Solves Aᵀ x = b.
   *
   * @param rightHandSide b on entry, x on return
   */
  void solveTransposed(double[] rightHandSide);

  /** Sign of the determinant of the matrix that was factored last: −1 or 1. */
  int determinantSign();
}
