package loopwright.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.Eigenvalues;
import loopwright.numeric.RealSystem;
import loopwright.numeric.SparsityPattern;

/**
 * Natural frequencies of a circuit: the finite s with det(G + sC) = 0.
 *
 * <p>With a shift s₀, (G + s₀C)⁻¹ C x = x/(s₀ − s). Only the columns where C has entries count: the
 * rest of the matrix is zero, so that unknowns that no capacitance reaches are eliminated exactly
 * and the eigenvalue routine sees a smaller matrix with the same eigenvalues. A real positive shift
 * keeps slow poles, which crowd near zero, from drowning the fast ones.
 */
public final class NaturalFrequencies {
  /** Beyond this a natural frequency counts as infinite, rad/s. */
  public static final double INFINITE = 1e13;

  /** Beyond this an eigenvalue that cannot be refined is rounding of an infinite one, rad/s. */
  private static final double NEAR_INFINITE = 1e12;

  /** A root grows when its real part is above this share of its magnitude. */
  private static final double GROWS = 1e-9;

  private static final double SHIFT = 1.0e8;

  /** The root of the rounding of an eigenvalue, as a share of the shift's size. */
  private static final double SPLIT = 1e-7;

  /** And such a pair is all but real. */
  private static final double SPLIT_SHARE = 1e-3;

  private static final int REFINEMENTS = 14;

  /** First rounds keep the shift, until the vector has turned to the root's own. */
  private static final int ROUNDS_TO_TURN = 3;

  private final SparsityPattern pattern;
  private final RealSystem shifted;
  private final ComplexSystem complex;
  private final int[] columns;
  private final int[] place;
  private final double[] values;

  /** A complex root: growth in 1/s, angular frequency in rad/s. */
  public record Pole(double re, double im) {
    /** Magnitude, rad/s. */
    public double magnitude() {
      return Math.hypot(re, im);
    }

    /** Whether it grows. */
    public boolean grows() {
      return re > GROWS * magnitude();
    }
  }

  /** For networks of one pattern; the capacitive unknowns are those that C reaches at the state. */
  public NaturalFrequencies(SmallSignalCircuit network) {
    this.pattern = network.pattern();
    this.shifted = network.systems().real();
    this.complex = network.systems().complex();
    this.values = new double[pattern.slots()];
    this.place = new int[pattern.size()];
    Arrays.fill(place, -1);
    int count = 0;
    for (int slot = 0; slot < pattern.slots(); slot++) {
      if (network.c()[slot] != 0 && place[pattern.column(slot)] < 0) {
        place[pattern.column(slot)] = count++;
      }
    }
    this.columns = new int[count];
    for (int column = 0; column < place.length; column++) {
      if (place[column] >= 0) {
        columns[place[column]] = column;
      }
    }
  }

  /**
   * All finite natural frequencies of a network, one of each conjugate pair, im ≥ 0.
   *
   * @throws ArithmeticException when the network is singular at the shift or the eigenvalue
   *     iteration does not converge
   */
  public List<Pole> of(SmallSignalCircuit network) {
    double[] eigenvalues = Eigenvalues.of(reduced(network), columns.length);
    List<Pole> poles = new ArrayList<>();
    for (int i = 0; i < columns.length; i++) {
      double re = eigenvalues[2 * i];
      double im = eigenvalues[2 * i + 1];
      double square = re * re + im * im;
      if (square < 1 / (INFINITE * INFINITE)) {
        continue;
      }
      Pole pole = new Pole(SHIFT - re / square, im / square);
      if (isSplitByRounding(pole)) {
        keep(network, new Pole(pole.re(), 0), poles);
      } else if (pole.im() >= 0 && pole.magnitude() <= INFINITE) {
        keep(network, pole, poles);
      }
    }
    return poles;
  }

  /**
   * Whether a pair is a double real root that rounding has pushed off the axis: two rails with
   * equal decoupling have one.
   */
  private static boolean isSplitByRounding(Pole pole) {
    double off = Math.abs(pole.im());
    return off > 0
        && off < SPLIT * (pole.magnitude() + SHIFT)
        && off < SPLIT_SHARE * Math.abs(pole.re());
  }

  /**
   * Adds a root; one that seems to grow, or all but does, is refined first and dropped if it is
   * none.
   */
  private void keep(SmallSignalCircuit network, Pole pole, List<Pole> poles) {
    if (pole.re() < -1e-6 * pole.magnitude()) {
      poles.add(pole);
      return;
    }
    Pole refined = refine(network, pole);
    if (refined != null) {
      poles.add(refined);
    } else if (pole.magnitude() < NEAR_INFINITE) {
      poles.add(pole);
    }
  }

  private double[] reduced(SmallSignalCircuit network) {
    double[] g = network.g();
    double[] c = network.c();
    for (int slot = 0; slot < values.length; slot++) {
      values[slot] = g[slot] + SHIFT * c[slot];
    }
    if (!shifted.factor(values)) {
      throw new ArithmeticException("the small-signal circuit is singular");
    }
    int size = columns.length;
    double[][] rightHandSides = new double[size][pattern.size()];
    for (int slot = 0; slot < values.length; slot++) {
      int at = place[pattern.column(slot)];
      if (at >= 0) {
        rightHandSides[at][pattern.row(slot)] += c[slot];
      }
    }
    double[] matrix = new double[size * size];
    for (int column = 0; column < size; column++) {
      shifted.solve(rightHandSides[column]);
      for (int row = 0; row < size; row++) {
        matrix[row * size + column] = rightHandSides[column][columns[row]];
      }
    }
    return matrix;
  }

  /**
   * Inverse iteration with a moving shift: (G + sC) y = C x, s ← s − x_k/y_k.
   *
   * @return the root nearby, or null when there is none within a tenth of its magnitude
   */
  Pole refine(SmallSignalCircuit network, Pole start) {
    int n = pattern.size();
    double re = start.re();
    double im = start.im();
    double[] x = new double[2 * n];
    double[] y = new double[2 * n];
    Arrays.fill(x, 1);
    for (int i = 0; i < REFINEMENTS; i++) {
      multiply(network.c(), x, y);
      if (!complex.factor(network.g(), network.c(), re, im)) {
        return new Pole(re, Math.abs(im));
      }
      complex.solve(y);
      int k = largest(y);
      double yRe = y[2 * k];
      double yIm = y[2 * k + 1];
      double square = yRe * yRe + yIm * yIm;
      if (!(square > 0)) {
        return null;
      }
      double stepRe = (x[2 * k] * yRe + x[2 * k + 1] * yIm) / square;
      double stepIm = (x[2 * k + 1] * yRe - x[2 * k] * yIm) / square;
      if (i >= ROUNDS_TO_TURN) {
        re -= stepRe;
        im -= stepIm;
      }
      for (int j = 0; j < n; j++) {
        double a = y[2 * j];
        double b = y[2 * j + 1];
        x[2 * j] = (a * yRe + b * yIm) / square;
        x[2 * j + 1] = (b * yRe - a * yIm) / square;
      }
      if (i > ROUNDS_TO_TURN && Math.hypot(stepRe, stepIm) < 1e-12 * Math.hypot(re, im)) {
        break;
      }
    }
    double moved = Math.hypot(re - start.re(), im - start.im());
    return moved <= 0.1 * start.magnitude() + 1e-3 ? new Pole(re, Math.abs(im)) : null;
  }

  private void multiply(double[] c, double[] x, double[] y) {
    Arrays.fill(y, 0);
    for (int slot = 0; slot < c.length; slot++) {
      int row = pattern.row(slot);
      int column = pattern.column(slot);
      y[2 * row] += c[slot] * x[2 * column];
      y[2 * row + 1] += c[slot] * x[2 * column + 1];
    }
  }

  private static int largest(double[] vector) {
    int largest = 0;
    double most = -1;
    for (int i = 0; i < vector.length / 2; i++) {
      double size = Math.hypot(vector[2 * i], vector[2 * i + 1]);
      if (size > most) {
        most = size;
        largest = i;
      }
    }
    return largest;
  }
}
