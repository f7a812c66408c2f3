package loopwright.solve;

import loopwright.circuit.Lead;

/** Arithmetic of the double injection, without the infinities that its two ratios may have. */
final class LoopGain {
  private LoopGain() {}

  /**
   * T = (T_v T_i − 1)/(T_v + T_i + 2), numerator and denominator of either ratio kept apart.
   *
   * @param lead where it was injected
   * @param series solution with one volt in series with the lead, interleaved
   * @param shunt solution with one ampere into the amplifier's side, interleaved
   * @return real and imaginary part of T
   */
  static double[] combine(Lead lead, double[] series, double[] shunt) {
    double nvRe = -real(series, lead.from());
    double nvIm = -imaginary(series, lead.from());
    double dvRe = real(series, lead.to());
    double dvIm = imaginary(series, lead.to());
    double niRe = -real(shunt, lead.branch());
    double niIm = -imaginary(shunt, lead.branch());
    double diRe = 1 - niRe;
    double diIm = -niIm;
    double topRe = nvRe * niRe - nvIm * niIm - (dvRe * diRe - dvIm * diIm);
    double topIm = nvRe * niIm + nvIm * niRe - (dvRe * diIm + dvIm * diRe);
    double bottomRe =
        nvRe * diRe - nvIm * diIm + niRe * dvRe - niIm * dvIm + 2 * (dvRe * diRe - dvIm * diIm);
    double bottomIm =
        nvRe * diIm + nvIm * diRe + niRe * dvIm + niIm * dvRe + 2 * (dvRe * diIm + dvIm * diRe);
    double square = bottomRe * bottomRe + bottomIm * bottomIm;
    return new double[] {
      (topRe * bottomRe + topIm * bottomIm) / square, (topIm * bottomRe - topRe * bottomIm) / square
    };
  }

  private static double real(double[] vector, int index) {
    return index < 0 ? 0 : vector[2 * index];
  }

  private static double imaginary(double[] vector, int index) {
    return index < 0 ? 0 : vector[2 * index + 1];
  }
}
