package loopwright.numeric;

import java.util.Arrays;

/**
 * A complex linear system (G + sC) x = b of a fixed pattern with real G and C: factored often,
 * solved often. Complex vectors are interleaved: element i at 2i (real) and 2i + 1 (imaginary). Not
 * thread-safe.
 */
public interface ComplexSystem {
  /**
   * Factors G + sC.
   *
   * @param g values of G by slot; not modified
   * @param c values of C by slot; not modified
   * @param re real part of s
   * @param im imaginary part of s
   * @return false when the matrix is singular to working precision or holds a value that is not
   *     finite; then nothing may be solved
   */
  boolean factor(double[] g, double[] c, double re, double im);

  /**
   * Solves (G + sC) x = b.
   *
   * @param rightHandSide b on entry, x on return; interleaved
   */
  void solve(double[] rightHandSide);

  /**
   * Solves (G + sC) x = b with b = 1 in one row and 0 in all others, only as far as some of the
   * unknowns need.
   *
   * @param row the row
   * @param wanted the unknowns; a negative one, ground, needs nothing
   * @param solution x on return, interleaved; what is not wanted may be anything
   */
  default void solveOne(int row, int[] wanted, double[] solution) {
    Arrays.fill(solution, 0);
    solution[2 * row] = 1;
    solve(solution);
  }

  /**
   * Solves (G + sC)ᵀ x = b, transposed without conjugation.
   *
   * @param rightHandSide b on entry, x on return; interleaved
   */
  void solveTransposed(double[] rightHandSide);

  /** Natural logarithm of the determinant's magnitude. */
  double logDeterminant();

  /** Argument of the determinant in rad, known up to a multiple of 2π. */
  double determinantArgument();
}
