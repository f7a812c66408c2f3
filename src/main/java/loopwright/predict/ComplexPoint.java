package loopwright.predict;

/**
 * A complex value at a frequency.
 *
 * @param frequency Hz
 * @param re real part
 * @param im imaginary part
 */
public record ComplexPoint(double frequency, double re, double im) {
  /** Magnitude. */
  public double magnitude() {
    return Math.hypot(re, im);
  }

  /** Angle in degrees, −180 to 180. */
  public double degrees() {
    return Math.toDegrees(Math.atan2(im, re));
  }
}
