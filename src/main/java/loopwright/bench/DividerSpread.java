package loopwright.bench;

import loopwright.design.Design;
import loopwright.quantity.Quantity;

/** How far the tolerance of two resistors lets the ideal gain of a divider spread. */
final class DividerSpread {
  private DividerSpread() {}

  /**
   * Expanded relative uncertainty of 1 + upper/lower, both uniform within the general tolerance of
   * resistors.
   *
   * @param noiseGain 1 + upper/lower
   */
  static double relative(Design design, double noiseGain) {
    double tolerance = design.tolerances().resistor().map(Quantity::value).orElse(0.0);
    double share = (noiseGain - 1) / noiseGain;
    return 2 * share * tolerance * Math.sqrt(2.0 / 3);
  }
}
