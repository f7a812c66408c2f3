package loopwright.predict;

/** The Fourier series of one period, sampled at equal distances from the sine's zero upward. */
final class Harmonics {
  /** The highest harmonic that counts. */
  static final int HIGHEST = 50;

  private final double[] cosine = new double[HIGHEST + 1];
  private final double[] sine = new double[HIGHEST + 1];
  private final double[] error;

  /**
   * @param period the samples, V; not modified
   */
  Harmonics(double[] period) {
    int points = period.length;
    for (int n = 0; n <= HIGHEST; n++) {
      double a = 0;
      double b = 0;
      for (int k = 0; k < points; k++) {
        double angle = 2 * Math.PI * ((long) n * k % points) / points;
        a += period[k] * Math.cos(angle);
        b += period[k] * Math.sin(angle);
      }
      double weight = n == 0 ? 1.0 / points : 2.0 / points;
      cosine[n] = weight * a;
      sine[n] = weight * b;
    }
    this.error = new double[points];
    for (int k = 0; k < points; k++) {
      double angle = 2 * Math.PI * k / points;
      error[k] = period[k] - cosine[0] - cosine[1] * Math.cos(angle) - sine[1] * Math.sin(angle);
    }
  }

  /** Mean, V. */
  double mean() {
    return cosine[0];
  }

  /** Peak value of the fundamental's part in step with the sine, V, signed. */
  double inPhase() {
    return sine[1];
  }

  /** Peak value of a harmonic, V; index 0 the mean. */
  double peak(int n) {
    return n == 0 ? cosine[0] : Math.hypot(cosine[n], sine[n]);
  }

  /** Root of the sum of squares of harmonics 2 to 50 over the fundamental. */
  double distortion() {
    double sum = 0;
    for (int n = 2; n <= HIGHEST; n++) {
      sum += cosine[n] * cosine[n] + sine[n] * sine[n];
    }
    return Math.sqrt(sum) / peak(1);
  }

  /** The period less its mean and fundamental, V; not to be changed. */
  double[] residual() {
    return error;
  }
}
