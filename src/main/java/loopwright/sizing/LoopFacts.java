package loopwright.sizing;

import loopwright.design.Feedback;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupGains;
import loopwright.predict.Level;

/**
 * What decides the closed-loop gain besides the divider: κ n s/(1 + n/A), inverting κ (n − 1) s/(1
 * + n/A) (Black 1934), with n the noise gain.
 *
 * @param openLoop A; infinite where it is not known
 * @param ratio driven-input ratio κ
 * @param share s, what loading of the source, common mode and dead zone leave of such a gain
 * @param sourceResistance that the driven terminal sees, Ω
 * @param inverting whether the source drives the inverting input
 */
record LoopFacts(
    double openLoop, double ratio, double share, double sourceResistance, boolean inverting) {
  /** A waveform that falls this far behind the linear gain is clipped: no divider mends that. */
  private static final double CLIPPED = 0.1;

  /** Those of a solved hookup with feedback. */
  static LoopFacts of(HookupFigures figures) {
    HookupGains gains = figures.gains();
    double openLoop = solved(figures, "openLoopGain", Double.POSITIVE_INFINITY);
    LoopFacts plain =
        new LoopFacts(
            openLoop,
            gains.inputRatio(),
            1,
            gains.sourceResistance(),
            figures.hookup().feedback() instanceof Feedback.Inverting);
    double foot = gains.lower() - (plain.inverting() ? gains.sourceResistance() : 0);
    double ideal = plain.gain(gains.upper(), foot);
    double linear =
        (figures.midbandGain(Level.HIGH).number().orElse(Double.NaN)
                + figures.midbandGain(Level.LOW).number().orElse(Double.NaN))
            / 2
            / ideal;
    double waveform = solved(figures, "closedLoopGain", Double.NaN) / ideal;
    boolean clipped = !(Math.abs(waveform / linear - 1) < CLIPPED);
    double share = clipped ? linear : waveform;
    return share > 0 && Double.isFinite(share)
        ? new LoopFacts(openLoop, plain.ratio, share, plain.sourceResistance, plain.inverting)
        : plain;
  }

  private static double solved(HookupFigures figures, String key, double otherwise) {
    return figures.solved(Catalogue.find(key).orElseThrow()).number().orElse(otherwise);
  }

  /** Noise gain n of a divider; the source's resistance stands in series where it inverts. */
  double noiseGain(double upper, double lower) {
    return 1 + upper / (inverting ? lower + sourceResistance : lower);
  }

  /** Gain from generator to output with a divider, signed. */
  double gain(double upper, double lower) {
    double n = noiseGain(upper, lower);
    return ratio * share * (inverting ? 1 - n : n) / (1 + n / openLoop);
  }

  /**
   * The ratio of upper to lower resistor, the source's resistance included where it inverts, that
   * makes a gain; not above zero where that takes more than the open-loop gain.
   *
   * @param wanted gain, signed as the hookup's
   */
  double dividerRatio(double wanted) {
    double w = Math.abs(wanted) / (ratio * share);
    double left = 1 - w / openLoop;
    if (left <= 0) {
      return Double.NEGATIVE_INFINITY;
    }
    return inverting ? w * (1 + 1 / openLoop) / left : w / left - 1;
  }

  /** The largest gain that feedback can leave, without its sign. */
  double mostGain() {
    return openLoop * ratio * share;
  }
}
