package loopwright.sizing;

import java.util.OptionalDouble;
import loopwright.circuit.Physics;

/**
 * What speaks against a divider, each term 1 where a careful builder would begin to mind; the sum
 * is its score, and the least is best.
 *
 * @param error gain error over 1 %
 * @param band half the tolerance band of the gain over 3 % of it
 * @param current what the divider takes at the peak output over a tenth of what the output can give
 * @param offset output offset that the bias currents make in divider and source over 1 % of the
 *     peak output
 * @param noise what the divider adds to the input noise over a tenth of it
 * @param phase what the phase margin lacks of 60° over 5°
 * @param parts a tenth for each part beyond two
 */
record DividerScore(
    double error,
    double band,
    double current,
    double offset,
    double noise,
    double phase,
    double parts) {
  private static final double ERROR = 0.01;
  private static final double BAND = 0.03;
  private static final double CURRENT = 0.1;
  private static final double OFFSET = 0.01;
  private static final double NOISE = 0.1;
  private static final double DEGREES = 5;
  private static final double PART = 0.1;

  /** Margin with which a closed loop hardly rises or rings; common practice, no source. */
  private static final double CALM = 60;

  private static final double THERMAL = 4 * Physics.BOLTZMANN * Physics.NOMINAL_TEMPERATURE;
  private static final double SHOT = 2 * Physics.ELEMENTARY_CHARGE;

  /** The sum of all terms. */
  double sum() {
    return error + band + current + offset + noise + phase + parts;
  }

  /**
   * The same with what was solved.
   *
   * @param gainError a fraction
   * @param halfBand half the band, a fraction
   * @param margin degrees; empty where the loop gain never passes 1
   */
  DividerScore with(double gainError, double halfBand, OptionalDouble margin) {
    return new DividerScore(
        error(gainError),
        halfBand / BAND,
        current,
        offset,
        noise,
        lack(margin.orElse(Double.POSITIVE_INFINITY)),
        parts);
  }

  /**
   * By hand: gain by {@link LoopFacts}; current peak/(R_upper + R_lower); offset I_B2 R_upper less
   * I_B1 R₊ times the noise gain; 4kT R and 2q I_B R² of R = R_upper ∥ R_lower; the margin less
   * arctan of the loop's unity frequency over the pole with the input capacitance.
   *
   * @param wanted gain, generator to output
   * @param halfBand half the tolerance band of the gain, a fraction
   */
  static DividerScore byHand(
      AmplifierFacts facts, DividerCandidate divider, double wanted, double halfBand) {
    double upper = divider.upper().value();
    double noiseGain = facts.loop().noiseGain(upper, divider.lowerOhms());
    double error = facts.loop().gain(upper, divider.lowerOhms()) / wanted - 1;
    double parallel = upper / noiseGain;
    double offset =
        (facts.biasAtMinus() * upper - facts.biasAtPlus() * (facts.blocked() ? 1 : noiseGain))
            / (1 + (facts.blocked() ? 1 : noiseGain) / facts.loop().openLoop());
    double added = THERMAL * parallel + SHOT * facts.biasAtMinus() * parallel * parallel;
    double margin =
        facts.margin()
            - AmplifierFacts.phase(
                facts.gainBandwidth() / noiseGain, parallel, facts.inputCapacitance());
    return new DividerScore(
        error(error),
        halfBand / BAND,
        current(facts, divider) / facts.available() / CURRENT,
        Math.abs(offset) / facts.peak() / OFFSET,
        (Math.sqrt(1 + added / (facts.noise() * facts.noise())) - 1) / NOISE,
        lack(margin),
        PART * Math.max(0, divider.partCount() - 2));
  }

  /** The term of a gain error, a fraction. */
  static double error(double gainError) {
    return Math.abs(gainError) / ERROR;
  }

  /** What a divider takes at the peak output, A. */
  static double current(AmplifierFacts facts, DividerCandidate divider) {
    double foot = facts.loop().inverting() ? 0 : divider.lowerOhms();
    double resistance = divider.upper().value() + foot;
    return resistance == 0 ? 0 : facts.peak() / resistance;
  }

  /** The offset that its term stands for, V. */
  double offsetVolts(AmplifierFacts facts) {
    return offset * OFFSET * facts.peak();
  }

  private static double lack(double margin) {
    return Math.max(0, CALM - margin) / DEGREES;
  }
}
