package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.hipparchus.complex.Complex;
import org.hipparchus.complex.ComplexField;
import org.hipparchus.linear.Array2DRowFieldMatrix;
import org.hipparchus.linear.ArrayFieldVector;
import org.hipparchus.linear.FieldLUDecomposition;
import org.hipparchus.linear.FieldMatrix;
import org.hipparchus.linear.FieldVector;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What every complex system must do, against Hipparchus' LU over a field. */
abstract class ComplexSystemChecks {
  /** A new system of the implementation that is checked. */
  abstract ComplexSystem system(SparsityPattern pattern);

  private static final double RE = 3e7;
  private static final double IM = 4e8;

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 5, 12, 40})
  void solutionsAreThoseOfAnIndependentLibrary(int size) {
    Random random = new Random(size);
    for (int i = 0; i < 10; i++) {
      RandomMatrices.Sparse sparse = RandomMatrices.regular(size, random);
      FieldMatrix<Complex> matrix = matrix(sparse, RE, IM);
      double[] b = RandomMatrices.vector(2 * size, random);
      ComplexSystem system = system(sparse.pattern());
      assertThat(system.factor(sparse.g(), sparse.c(), RE, IM)).isTrue();

      double[] x = b.clone();
      system.solve(x);
      assertClose(x, new FieldLUDecomposition<>(matrix).getSolver().solve(vector(b)));
      double[] transposed = b.clone();
      system.solveTransposed(transposed);
      assertClose(
          transposed, new FieldLUDecomposition<>(matrix.transpose()).getSolver().solve(vector(b)));

      Complex determinant = new FieldLUDecomposition<>(matrix).getDeterminant();
      assertThat(system.logDeterminant())
          .isCloseTo(Math.log(determinant.norm()), within(1e-9 * size));
      double turn = system.determinantArgument() - determinant.getArgument();
      assertThat(Math.IEEEremainder(turn, 2 * Math.PI)).isCloseTo(0, within(1e-9));
    }
  }

  /** One row excited and three unknowns read: what a whole solution gives there. */
  @ParameterizedTest
  @ValueSource(ints = {3, 12, 40})
  void aSolutionForSomeUnknownsIsThatForAll(int size) {
    Random random = new Random(size);
    RandomMatrices.Sparse sparse = RandomMatrices.regular(size, random);
    ComplexSystem system = system(sparse.pattern());
    assertThat(system.factor(sparse.g(), sparse.c(), RE, IM)).isTrue();
    double[] some = RandomMatrices.vector(2 * size, random);
    for (int row = 0; row < size; row++) {
      int[] wanted = {random.nextInt(size), -1, random.nextInt(size), row};
      double[] all = new double[2 * size];
      all[2 * row] = 1;
      system.solve(all);
      system.solveOne(row, wanted, some);
      for (int unknown : wanted) {
        if (unknown >= 0) {
          assertThat(some[2 * unknown]).isEqualTo(all[2 * unknown]);
          assertThat(some[2 * unknown + 1]).isEqualTo(all[2 * unknown + 1]);
        }
      }
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e-17, 1, 1e17})
  void singularityIsJudgedWithoutRegardToScale(double scale) {
    ComplexSystem system = system(RealSystemChecks.full(2));
    double[] g = {scale, 0, 0, scale};
    double[] c = {0, scale, -scale, 0};
    // (1, s; −s, 1) has the determinant 1 + s², which vanishes at s = j.
    assertThat(system.factor(g, c, 0, 1)).isFalse();
    assertThat(system.factor(g, c, 0, 1.5)).isTrue();
  }

  @Test
  void valuesThatAreNotFiniteAreRefused() {
    ComplexSystem system = system(RealSystemChecks.full(1));
    assertThat(system.factor(new double[] {Double.NaN}, new double[] {0}, 0, 1)).isFalse();
  }

  private static FieldMatrix<Complex> matrix(RandomMatrices.Sparse sparse, double re, double im) {
    int size = sparse.pattern().size();
    double[][] g = sparse.dense(sparse.g());
    double[][] c = sparse.dense(sparse.c());
    FieldMatrix<Complex> matrix =
        new Array2DRowFieldMatrix<>(ComplexField.getInstance(), size, size);
    for (int row = 0; row < size; row++) {
      for (int column = 0; column < size; column++) {
        matrix.setEntry(
            row, column, new Complex(g[row][column] + re * c[row][column], im * c[row][column]));
      }
    }
    return matrix;
  }

  private static FieldVector<Complex> vector(double[] interleaved) {
    Complex[] entries = new Complex[interleaved.length / 2];
    for (int i = 0; i < entries.length; i++) {
      entries[i] = new Complex(interleaved[2 * i], interleaved[2 * i + 1]);
    }
    return new ArrayFieldVector<>(entries);
  }

  private static void assertClose(double[] actual, FieldVector<Complex> expected) {
    double largest = 0;
    for (Complex entry : expected.toArray()) {
      largest = Math.max(largest, entry.norm());
    }
    for (int i = 0; i < expected.getDimension(); i++) {
      assertThat(actual[2 * i]).isCloseTo(expected.getEntry(i).getReal(), within(1e-9 * largest));
      assertThat(actual[2 * i + 1])
          .isCloseTo(expected.getEntry(i).getImaginary(), within(1e-9 * largest));
    }
  }
}
