package loopwright.predict;

import java.util.Optional;
import loopwright.solve.LinearNetwork;

/**
 * Where the loop gain passes 1.
 *
 * @param frequency highest frequency where |T| = 1, Hz
 * @param phaseMargin 180° + arg T there, arg continuous from low frequency, degrees
 */
record UnityCrossing(double frequency, double phaseMargin) {
  private static final int MOST_STEPS = 20;
  private static final double EXACT = 1e-11;

  /** Further than this, in the frequency's logarithm, is another crossing. */
  private static final double FAR = 0.7;

  /** More than this, in degrees, may be another crossing. */
  private static final double TURNED = 45;

  /**
   * The crossing of a network that differs little from one whose crossing is known, by secants on
   * log |T| against log frequency.
   *
   * @return empty where there is none near
   */
  static Optional<UnityCrossing> near(LinearNetwork network, UnityCrossing before) {
    double x = 0;
    double[] value = network.loopGain(before.frequency());
    double y = logMagnitude(value);
    double slope = -1;
    for (int i = 0; i < MOST_STEPS && Math.abs(y) > EXACT; i++) {
      double next = x - y / slope;
      if (!(Math.abs(next) < FAR)) {
        return Optional.empty();
      }
      value = network.loopGain(before.frequency() * Math.exp(next));
      double nextY = logMagnitude(value);
      slope = (nextY - y) / (next - x);
      x = next;
      y = nextY;
    }
    double margin = 180 + Math.toDegrees(Math.atan2(value[1], value[0]));
    margin += 360 * Math.rint((before.phaseMargin() - margin) / 360);
    return Math.abs(y) <= EXACT && Math.abs(margin - before.phaseMargin()) < TURNED
        ? Optional.of(new UnityCrossing(before.frequency() * Math.exp(x), margin))
        : Optional.empty();
  }

  private static double logMagnitude(double[] value) {
    return Math.log(Math.hypot(value[0], value[1]));
  }
}
