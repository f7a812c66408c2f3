package loopwright.circuit;

/**
 * Re yᵀ(G + sC)x, entry by entry: how a small change of the matrix changes a network's response is
 * the same form of the change. Vectors are interleaved; ground, index −1, is zero in both.
 */
public final class BilinearForm {
  private final double[] y;
  private final double[] x;
  private final double re;
  private final double im;

  /**
   * The form of a solution and an adjoint solution.
   *
   * @param y by row; not copied
   * @param x by column; not copied
   * @param re real part of s, 1/s
   * @param im imaginary part of s, rad/s
   */
  public BilinearForm(double[] y, double[] x, double re, double im) {
    this.y = y;
    this.x = x;
    this.re = re;
    this.im = im;
  }

  /** What 1 S gives that carries, by a voltage between two columns, a current between two rows. */
  double conductance(int rowFrom, int rowTo, int columnFrom, int columnTo) {
    double yRe = difference(y, rowFrom, rowTo, 0);
    double yIm = difference(y, rowFrom, rowTo, 1);
    double xRe = difference(x, columnFrom, columnTo, 0);
    double xIm = difference(x, columnFrom, columnTo, 1);
    return yRe * xRe - yIm * xIm;
  }

  /** What 1 F gives between such columns and rows. */
  double capacitance(int rowFrom, int rowTo, int columnFrom, int columnTo) {
    double yRe = difference(y, rowFrom, rowTo, 0);
    double yIm = difference(y, rowFrom, rowTo, 1);
    double xRe = difference(x, columnFrom, columnTo, 0);
    double xIm = difference(x, columnFrom, columnTo, 1);
    return re * (yRe * xRe - yIm * xIm) - im * (yRe * xIm + yIm * xRe);
  }

  private static double difference(double[] vector, int from, int to, int part) {
    return (from < 0 ? 0 : vector[2 * from + part]) - (to < 0 ? 0 : vector[2 * to + part]);
  }
}
