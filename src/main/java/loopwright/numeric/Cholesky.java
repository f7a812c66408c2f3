package loopwright.numeric;

/** Factor L of a symmetric positive definite matrix L Lᵀ, for covariances. */
public final class Cholesky {
  private final double[][] lower;

  /**
   * Factors.
   *
   * @param matrix symmetric; only its lower half is read; not modified
   * @throws ArithmeticException when it is not positive definite to working precision
   */
  public Cholesky(double[][] matrix) {
    int size = matrix.length;
    lower = new double[size][size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j <= i; j++) {
        double sum = matrix[i][j];
        for (int k = 0; k < j; k++) {
          sum -= lower[i][k] * lower[j][k];
        }
        if (i == j && !(sum > 1e-14 * matrix[i][i])) {
          throw new ArithmeticException("the matrix is not positive definite at row " + i);
        }
        lower[i][j] = i == j ? Math.sqrt(sum) : sum / lower[j][j];
      }
    }
  }

  /** The vector L⁻¹ b; its squared length is bᵀ (L Lᵀ)⁻¹ b. */
  public double[] whiten(double[] vector) {
    double[] result = vector.clone();
    for (int i = 0; i < result.length; i++) {
      for (int k = 0; k < i; k++) {
        result[i] -= lower[i][k] * result[k];
      }
      result[i] /= lower[i][i];
    }
    return result;
  }

  /** bᵀ (L Lᵀ)⁻¹ b. */
  public double quadraticForm(double[] vector) {
    double sum = 0;
    for (double value : whiten(vector)) {
      sum += value * value;
    }
    return sum;
  }

  /** The solution of L Lᵀ x = b. */
  public double[] solve(double[] vector) {
    double[] x = whiten(vector);
    for (int i = x.length - 1; i >= 0; i--) {
      for (int k = i + 1; k < x.length; k++) {
        x[i] -= lower[k][i] * x[k];
      }
      x[i] /= lower[i][i];
    }
    return x;
  }

  /** Natural logarithm of the determinant of L Lᵀ. */
  public double logDeterminant() {
    double sum = 0;
    for (int i = 0; i < lower.length; i++) {
      sum += 2 * Math.log(lower[i][i]);
    }
    return sum;
  }
}
