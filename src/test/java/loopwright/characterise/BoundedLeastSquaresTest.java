package loopwright.characterise;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class BoundedLeastSquaresTest {
  /**
   * NIST Statistical Reference Datasets, nonlinear regression, Misra1a: y = b1 (1 − exp(−b2 x)).
   */
  private static final double[][] MISRA_1A = {
    {10.07, 77.6}, {14.73, 114.9}, {17.94, 141.1}, {23.93, 190.8}, {29.61, 239.9},
    {35.18, 289.0}, {40.02, 332.8}, {44.82, 378.4}, {50.76, 434.8}, {55.05, 477.3},
    {61.01, 536.8}, {66.4, 593.1}, {75.47, 689.1}, {81.78, 760.0}
  };

  private static final double[] UNBOUNDED_LOW = {-1e9, -1e9};
  private static final double[] UNBOUNDED_HIGH = {1e9, 1e9};

  @Test
  void findsTheCertifiedParametersOfMisra1aFromBothStarts() {
    BoundedLeastSquares squares =
        new BoundedLeastSquares(BoundedLeastSquaresTest::misra1a, UNBOUNDED_LOW, UNBOUNDED_HIGH);

    for (double[] start : new double[][] {{2, 0.2}, {1, 1}}) {
      double[] found = squares.solve(start);

      // Certified: 2.3894212918E+02, 5.5015643181E-04, residual sum of squares 1.2455138894E-01.
      assertThat(250 * found[0]).isCloseTo(238.94212918, within(1e-6));
      assertThat(5e-4 * found[1]).isCloseTo(5.5015643181e-4, within(3e-12));
      assertThat(2 * squares.cost(found)).isCloseTo(0.12455138894, within(1e-11));
    }
  }

  @Test
  void staysInsideItsBoundsAndSolvesTheRest() {
    // (x − 3)² + (x + y − 4)² with x ≤ 2 is least at x = 2, y = 2 (elementary).
    BoundedLeastSquares squares =
        new BoundedLeastSquares(
            at -> new double[] {at[0] - 3, at[0] + at[1] - 4},
            new double[] {0, 0},
            new double[] {2, 10});

    double[] found = squares.solve(new double[] {0.5, 0.5});

    assertThat(found[0]).isEqualTo(2);
    assertThat(found[1]).isCloseTo(2, within(1e-9));
  }

  @Test
  void stepsBackFromPointsThatAreOutOfReach() {
    BoundedLeastSquares squares =
        new BoundedLeastSquares(
            at -> new double[] {at[0] > 2.5 ? Double.NaN : Math.exp(at[0]) - Math.exp(2)},
            new double[] {-10},
            new double[] {10});

    assertThat(squares.solve(new double[] {-1})[0]).isCloseTo(2, within(1e-12));
  }

  private static double[] misra1a(double[] at) {
    double[] residuals = new double[MISRA_1A.length];
    for (int k = 0; k < residuals.length; k++) {
      residuals[k] = 250 * at[0] * (1 - Math.exp(-5e-4 * at[1] * MISRA_1A[k][1])) - MISRA_1A[k][0];
    }
    return residuals;
  }
}
