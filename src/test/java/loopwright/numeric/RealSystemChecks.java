package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What every real system must do, against Hipparchus, an independent library. */
abstract class RealSystemChecks {
  /** A new system of the implementation that is checked. */
  abstract RealSystem system(SparsityPattern pattern);

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 5, 12, 40})
  void solutionsAreThoseOfAnIndependentLibrary(int size) {
    Random random = new Random(size);
    for (int i = 0; i < 20; i++) {
      RandomMatrices.Sparse sparse = RandomMatrices.regular(size, random);
      RealMatrix matrix = new Array2DRowRealMatrix(sparse.dense(sparse.g()));
      double[] b = RandomMatrices.vector(size, random);
      RealSystem system = system(sparse.pattern());
      assertThat(system.factor(sparse.g())).isTrue();

      double[] x = b.clone();
      system.solve(x);
      assertClose(x, new LUDecomposition(matrix, 0).getSolver().solve(new ArrayRealVector(b)));
      double[] transposed = b.clone();
      system.solveTransposed(transposed);
      assertClose(
          transposed,
          new LUDecomposition(matrix.transpose(), 0).getSolver().solve(new ArrayRealVector(b)));
      assertThat((double) system.determinantSign())
          .isEqualTo(Math.signum(new LUDecomposition(matrix, 0).getDeterminant()));
    }
  }

  /** A matrix without an inverse is refused, however large or small its entries are. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-17, 1, 1e17})
  void singularityIsJudgedWithoutRegardToScale(double scale) {
    SparsityPattern pattern = full(3);
    RealSystem system = system(pattern);
    double[] singular = {1, 2, 3, 2, 4, 6, 1, 1, 1};
    double[] regular = {1, 2, 3, 2, 5, 6, 1, 1, 1};
    assertThat(system.factor(scaled(singular, scale))).isFalse();
    assertThat(system.factor(scaled(regular, scale))).isTrue();
    double[] x = scaled(new double[] {6, 13, 3}, scale);
    system.solve(x);
    assertThat(x).containsExactly(new double[] {1, 1, 1}, within(1e-12));
  }

  @Test
  void valuesThatAreNotFiniteAreRefused() {
    RealSystem system = system(full(2));
    assertThat(system.factor(new double[] {1, 0, 0, Double.NaN})).isFalse();
    assertThat(system.factor(new double[] {1, 0, Double.POSITIVE_INFINITY, 1})).isFalse();
  }

  @Test
  void anEmptyColumnIsSingular() {
    assertThat(system(full(2)).factor(new double[] {1, 0, 3, 0})).isFalse();
  }

  static SparsityPattern full(int size) {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    for (int row = 0; row < size; row++) {
      for (int column = 0; column < size; column++) {
        builder.slot(row, column);
      }
    }
    return builder.build(size);
  }

  private static double[] scaled(double[] values, double scale) {
    return Arrays.stream(values).map(value -> scale * value).toArray();
  }

  private static void assertClose(double[] actual, RealVector expected) {
    double tolerance = 1e-9 * expected.getLInfNorm();
    assertThat(actual).containsExactly(expected.toArray(), within(tolerance));
  }
}
