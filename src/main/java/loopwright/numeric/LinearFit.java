package loopwright.numeric;

/**
 * Values that are a sum of known functions with unknown weights, by least squares through QR.
 *
 * @param weights of the functions
 * @param covariance of the weights, for residuals of equal variance that is estimated from them
 * @param residuals values less the sum
 * @param deviation standard deviation of the residuals: root of their squares over the degrees of
 *     freedom
 */
public record LinearFit(
    double[] weights, double[][] covariance, double[] residuals, double deviation) {
  /**
   * Fits.
   *
   * @param functions a row for each value, a column for each function; not modified
   * @param values more of them than functions; not modified
   * @throws ArithmeticException when the functions cannot be told apart at these places
   */
  public static LinearFit of(double[][] functions, double[] values) {
    int count = functions[0].length;
    if (values.length <= count) {
      throw new ArithmeticException(values.length + " values do not tell " + count + " weights");
    }
    HouseholderQr factors = new HouseholderQr(functions);
    double largest = 0;
    double smallest = Double.POSITIVE_INFINITY;
    for (int i = 0; i < count; i++) {
      largest = Math.max(largest, Math.abs(factors.r(i, i)));
      smallest = Math.min(smallest, Math.abs(factors.r(i, i)));
    }
    if (!(smallest > 1e-10 * largest)) {
      throw new ArithmeticException("the functions cannot be told apart at these places");
    }
    double[] weights = factors.solve(values);
    double[] residuals = values.clone();
    double sum = 0;
    for (int i = 0; i < residuals.length; i++) {
      for (int j = 0; j < count; j++) {
        residuals[i] -= functions[i][j] * weights[j];
      }
      sum += residuals[i] * residuals[i];
    }
    double variance = sum / (values.length - count);
    double[][] covariance = factors.inverseOfSquare();
    for (double[] row : covariance) {
      for (int j = 0; j < count; j++) {
        row[j] *= variance;
      }
    }
    return new LinearFit(weights, covariance, residuals, Math.sqrt(variance));
  }
}
