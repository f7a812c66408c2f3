package loopwright.sizing;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupGains;

/**
 * The amplifier with a divider of no preferred values around it, of about 10 kΩ, for the ideal gain
 * that is wanted: what it shows there, it shows with any divider that comes into question. The
 * design's own divider may be a wire, or one that the amplifier oscillates with.
 */
final class FirstDivider {
  private static final double TOTAL = 10e3;
  private static final double ABOVE_SOURCE = 10;

  private FirstDivider() {}

  /**
   * Its figures.
   *
   * @param wanted gain, generator to output, signed as the hookup's
   */
  static HookupFigures around(Design design, DividerPaths paths, double wanted) {
    HookupGains gains = new HookupGains(design.hookup(paths.hookup()).orElseThrow());
    double ratio = Math.abs(wanted) / gains.inputRatio();
    List<Change> changes;
    if (paths.inverting()) {
      double input = Math.max(TOTAL / (1 + ratio), ABOVE_SOURCE * gains.sourceResistance());
      changes = paths.changes(ratio * (input + gains.sourceResistance()), OptionalDouble.of(input));
    } else if (ratio <= 1 || DividerScreen.isFollower(ratio)) {
      changes = paths.changes(0, OptionalDouble.empty());
    } else {
      changes = paths.changes(TOTAL * (1 - 1 / ratio), OptionalDouble.of(TOTAL / ratio));
    }
    return HookupFigures.of(Change.applyAll(design, changes), paths.hookup());
  }
}
