package loopwright.sizing;

import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.quantity.Quantity;

/**
 * What the two resistors of a divider alone can make of its gain: both at the wrong ends of their
 * tolerances.
 *
 * @param low lowest gain without its sign over the nominal one
 * @param high highest
 */
record WorstCase(double low, double high) {
  /**
   * By hand, with the open-loop gain as it is.
   *
   * @param changed the design with the divider in it
   * @param tolerance of a resistor that states none of its own, a fraction
   */
  static WorstCase of(
      Design changed,
      DividerPaths paths,
      DividerCandidate divider,
      LoopFacts loop,
      double tolerance) {
    if (divider.lower().isEmpty()) {
      return new WorstCase(1, 1);
    }
    double upper = divider.upper().value();
    double lower = divider.lowerOhms();
    double byUpper = own(changed, paths.upper(), tolerance);
    double byLower = own(changed, paths.lower(), tolerance);
    double nominal = loop.gain(upper, lower);
    return new WorstCase(
        loop.gain(upper * (1 - byUpper), lower * (1 + byLower)) / nominal,
        loop.gain(upper * (1 + byUpper), lower * (1 - byLower)) / nominal);
  }

  private static double own(Design design, String path, double otherwise) {
    return DesignPath.find(design, path)
        .map(PartValue.class::cast)
        .flatMap(PartValue::tolerance)
        .map(Quantity::value)
        .orElse(otherwise);
  }
}
