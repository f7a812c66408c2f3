package loopwright.bench;

import java.util.Optional;
import java.util.Set;
import loopwright.design.Reading;

/** From the way in which an alternating value was read to the way in which a figure is defined. */
final class Expression {
  /** Figures that are defined as a root mean square. */
  private static final Set<String> RMS = Set.of("outputNoise");

  /** Figures that are defined as a peak: half the range of a waveform. */
  private static final Set<String> PEAK =
      Set.of("crossoverError", "deadZone", "deadZoneAtInput", "nodeVoltage");

  private Expression() {}

  /** Factor from what was read to what the quantity means; 1 where it has only one meaning. */
  static double factor(String quantity, Optional<Reading.Expression> expression) {
    if (expression.isEmpty()) {
      return 1;
    }
    double toPeak =
        switch (expression.get()) {
          case PEAK -> 1;
          case PEAK_TO_PEAK -> 0.5;
          case RMS -> Math.sqrt(2);
        };
    if (PEAK.contains(quantity)) {
      return toPeak;
    }
    return RMS.contains(quantity) ? toPeak / Math.sqrt(2) : 1;
  }
}
