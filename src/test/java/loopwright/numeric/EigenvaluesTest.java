package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.hipparchus.complex.Complex;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.EigenDecompositionNonSymmetric;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Eigenvalues against Hipparchus, an independent library. */
class EigenvaluesTest {
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 8, 25})
  void eigenvaluesAreThoseOfAnIndependentLibrary(int size) {
    Random random = new Random(size);
    for (int i = 0; i < 20; i++) {
      double[] matrix = random.doubles((long) size * size, -1, 1).toArray();
      List<Complex> expected =
          new ArrayList<>(
              List.of(
                  new EigenDecompositionNonSymmetric(new Array2DRowRealMatrix(square(matrix, size)))
                      .getEigenvalues()));
      for (Complex value : complex(Eigenvalues.of(matrix, size))) {
        Complex nearest =
            expected.stream()
                .min(Comparator.comparingDouble(other -> other.subtract(value).norm()))
                .orElseThrow();
        assertThat(nearest.subtract(value).norm()).isLessThan(1e-9);
        expected.remove(nearest);
      }
      assertThat(expected).isEmpty();
    }
  }

  @Test
  void theMatrixIsLeftAsItWas() {
    double[] matrix = {0, 1, -1, 0};
    Eigenvalues.of(matrix, 2);
    assertThat(matrix).containsExactly(0, 1, -1, 0);
  }

  @Test
  void noRowsHaveNoEigenvalues() {
    assertThat(Eigenvalues.of(new double[0], 0)).isEmpty();
  }

  @Test
  void entriesThatAreNotFiniteAreRefused() {
    assertThatThrownBy(() -> Eigenvalues.of(new double[] {Double.NaN}, 1))
        .isInstanceOf(ArithmeticException.class);
  }

  private static double[][] square(double[] flat, int size) {
    double[][] rows = new double[size][size];
    for (int i = 0; i < flat.length; i++) {
      rows[i / size][i % size] = flat[i];
    }
    return rows;
  }

  private static List<Complex> complex(double[] interleaved) {
    List<Complex> values = new ArrayList<>();
    for (int i = 0; i < interleaved.length; i += 2) {
      values.add(new Complex(interleaved[i], interleaved[i + 1]));
    }
    return values;
  }
}
