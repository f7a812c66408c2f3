package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.Test;

/** Against Hipparchus. */
class CholeskyTest {
  private static final int SIZE = 8;

  private static double[][] covariance(Random random) {
    RealMatrix factor = new Array2DRowRealMatrix(SIZE, SIZE);
    for (int i = 0; i < SIZE; i++) {
      for (int j = 0; j < SIZE; j++) {
        factor.setEntry(i, j, random.nextGaussian());
      }
    }
    return factor.multiplyTransposed(factor).getData();
  }

  @Test
  void solvesAndWeighsAsHipparchusDoes() {
    Random random = new Random(3);
    double[][] matrix = covariance(random);
    double[] vector = random.doubles(SIZE, -1, 1).toArray();
    Cholesky cholesky = new Cholesky(matrix);
    CholeskyDecomposition other =
        new CholeskyDecomposition(new Array2DRowRealMatrix(matrix), 1e-8, 1e-12);
    double[] expected = other.getSolver().solve(new ArrayRealVector(vector)).toArray();

    double form = 0;
    for (int i = 0; i < SIZE; i++) {
      form += vector[i] * expected[i];
      assertThat(cholesky.solve(vector)[i]).isEqualTo(expected[i], within(1e-7));
    }
    assertThat(cholesky.quadraticForm(vector)).isEqualTo(form, within(1e-7 * form));
    assertThat(cholesky.logDeterminant()).isEqualTo(Math.log(other.getDeterminant()), within(1e-9));
  }

  @Test
  void refusesAMatrixThatIsNoCovariance() {
    assertThatThrownBy(() -> new Cholesky(new double[][] {{1, 1}, {1, 1}}))
        .isInstanceOf(ArithmeticException.class)
        .hasMessageContaining("row 1");
  }
}
