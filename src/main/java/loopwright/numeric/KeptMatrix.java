package loopwright.numeric;

import java.util.Arrays;

/**
 * A matrix that was factored with pivots that another matrix had chosen, kept to see what its
 * solutions leave over: real, or complex and then with interleaved vectors.
 */
final class KeptMatrix {
  /**
   * A solution whose residual is larger, as a share of ‖A‖∞‖x‖∞ + ‖b‖∞, is improved. Magnitudes of
   * complex numbers are taken as |re| + |im|.
   */
  private static final double LARGEST_RESIDUAL = 1e-14;

  private final SparsityPattern pattern;
  private final double[] re;
  private final double[] im;
  private final double[] given;
  private final double[] rest;
  private final double[] sums;

  /**
   * A matrix yet to be kept.
   *
   * @param parts 1 when it is real, 2 when it is complex
   */
  KeptMatrix(SparsityPattern pattern, int parts) {
    this.pattern = pattern;
    this.re = new double[pattern.slots()];
    this.im = new double[(parts - 1) * pattern.slots()];
    this.given = new double[parts * pattern.size()];
    this.rest = new double[parts * pattern.size()];
    this.sums = new double[pattern.size()];
  }

  /** Keeps a real matrix. */
  void keep(double[] matrix) {
    System.arraycopy(matrix, 0, re, 0, re.length);
  }

  /** Keeps G + sC. */
  void keep(double[] g, double[] c, double real, double imaginary) {
    for (int slot = 0; slot < g.length; slot++) {
      re[slot] = g[slot] + real * c[slot];
      im[slot] = imaginary * c[slot];
    }
  }

  /** Keeps the right-hand side that is about to be solved for. */
  void keepRightHandSide(double[] b) {
    System.arraycopy(b, 0, given, 0, given.length);
  }

  /** Real parts by slot. */
  double[] re() {
    return re;
  }

  /** Imaginary parts by slot; empty when it is real. */
  double[] im() {
    return im;
  }

  /** The right-hand side that was kept. */
  double[] rightHandSide() {
    return given;
  }

  /** What the solution that was looked at last leaves over, b − Ax. */
  double[] rest() {
    return rest;
  }

  /** Whether a solution leaves over more than rounding; sets {@link #rest}. */
  boolean leavesTooMuch(double[] x, boolean transposed) {
    System.arraycopy(given, 0, rest, 0, rest.length);
    Arrays.fill(sums, 0);
    boolean real = im.length == 0;
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = transposed ? pattern.column(slot) : pattern.row(slot);
      int column = transposed ? pattern.row(slot) : pattern.column(slot);
      if (real) {
        rest[row] -= re[slot] * x[column];
        sums[row] += Math.abs(re[slot]);
      } else {
        double ar = re[slot];
        double ai = im[slot];
        double xr = x[2 * column];
        double xi = x[2 * column + 1];
        rest[2 * row] -= ar * xr - ai * xi;
        rest[2 * row + 1] -= ar * xi + ai * xr;
        sums[row] += Math.abs(ar) + Math.abs(ai);
      }
    }
    double allowed = largest(sums, true) * largest(x, real) + largest(given, real);
    return !(largest(rest, real) <= LARGEST_RESIDUAL * allowed);
  }

  private static double largest(double[] vector, boolean real) {
    double largest = 0;
    for (int i = 0; i < vector.length; i += real ? 1 : 2) {
      double magnitude = Math.abs(vector[i]) + (real ? 0 : Math.abs(vector[i + 1]));
      // Math.max lets a NaN through to the comparison, which must see it.
      largest = Math.max(largest, magnitude);
    }
    return largest;
  }
}
