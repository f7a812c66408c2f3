package loopwright.numeric;

import org.ejml.data.Complex_F64;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;

/** Eigenvalues of a real square matrix (EJML: Hessenberg form and shifted QR). */
public final class Eigenvalues {
  private Eigenvalues() {}

  /**
   * All eigenvalues.
   *
   * @param matrix square, row by row; not modified
   * @param size number of rows
   * @return interleaved: eigenvalue i at 2i (real) and 2i + 1 (imaginary)
   * @throws ArithmeticException when the iteration does not converge or an entry is not finite
   */
  public static double[] of(double[] matrix, int size) {
    if (size == 0) {
      return new double[0];
    }
    for (double value : matrix) {
      if (!Double.isFinite(value)) {
        throw new ArithmeticException("the matrix of natural frequencies is not finite");
      }
    }
    DMatrixRMaj copy = new DMatrixRMaj(size, size, true, matrix.clone());
    EigenDecomposition_F64<DMatrixRMaj> decomposition =
        DecompositionFactory_DDRM.eig(size, false, false);
    if (!decomposition.decompose(copy)) {
      throw new ArithmeticException("the eigenvalue iteration did not converge");
    }
    double[] values = new double[2 * size];
    for (int i = 0; i < size; i++) {
      Complex_F64 value = decomposition.getEigenvalue(i);
      values[2 * i] = value.real;
      values[2 * i + 1] = value.imaginary;
    }
    return values;
  }
}
