package loopwright.numeric;

/**
 * A complex number.
 *
 * @param re real part
 * @param im imaginary part
 */
public record Complex(double re, double im) {
  /** 1. */
  public static final Complex ONE = new Complex(1, 0);

  /** j. */
  public static final Complex I = new Complex(0, 1);

  /** Element of an interleaved vector; index −1 is zero. */
  public static Complex at(double[] vector, int index) {
    return index < 0 ? new Complex(0, 0) : new Complex(vector[2 * index], vector[2 * index + 1]);
  }

  /** Adds this to an element of an interleaved vector; index −1 is dropped. */
  public void addTo(double[] vector, int index) {
    if (index >= 0) {
      vector[2 * index] += re;
      vector[2 * index + 1] += im;
    }
  }

  /** Sum. */
  public Complex plus(Complex other) {
    return new Complex(re + other.re, im + other.im);
  }

  /** Difference. */
  public Complex minus(Complex other) {
    return new Complex(re - other.re, im - other.im);
  }

  /** Product. */
  public Complex times(Complex other) {
    return new Complex(re * other.re - im * other.im, re * other.im + im * other.re);
  }

  /** Product with a real number. */
  public Complex times(double factor) {
    return new Complex(re * factor, im * factor);
  }

  /** Quotient. */
  public Complex over(Complex other) {
    double square = other.re * other.re + other.im * other.im;
    return new Complex(
        (re * other.re + im * other.im) / square, (im * other.re - re * other.im) / square);
  }

  /** Magnitude. */
  public double magnitude() {
    return Math.hypot(re, im);
  }
}
