package loopwright.sizing;

import loopwright.circuit.Physics;

/**
 * What speaks against a divider, each term 1 where a careful builder would begin to mind; the sum
 * is its score, and the least is best.
 *
 * @param error gain error over 1 %
 * @param band half the tolerance band of the gain over 3 % of it
 * @param current what the divider takes at the peak output over a tenth of what the output can give
 * @param offset output offset that the bias current makes in the divider over 1 % of the peak
 *     output
 * @param noise what the divider adds to the input noise over a tenth of it
 * @param phase phase that its pole with the input capacitance takes from the margin over 5°
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
  private static final double ROOM = 4 * Physics.BOLTZMANN * Physics.NOMINAL_TEMPERATURE;

  /** The sum of all terms. */
  double sum() {
    return error + band + current + offset + noise + phase + parts;
  }

  /** The same with another gain error, a fraction, and band, half of it as a fraction. */
  DividerScore with(double gainError, double halfBand) {
    return new DividerScore(
        Math.abs(gainError) / ERROR, halfBand / BAND, current, offset, noise, phase, parts);
  }

  /**
   * By hand: gain κ n/(1 + n/A); current peak/(R_upper + R_lower); offset I_B (R_upper ∥ R_lower)
   * times the noise gain; thermal noise of R_upper ∥ R_lower; phase arctan of the loop's unity
   * frequency over the pole.
   *
   * @param wanted gain, generator to output
   * @param halfBand half the tolerance band of the gain, a fraction
   */
  static DividerScore byHand(
      AmplifierFacts facts, DividerCandidate divider, double wanted, double halfBand) {
    double upper = divider.upper().value();
    double lower = divider.lowerOhms() + (facts.inverting() ? facts.sourceResistance() : 0);
    double noiseGain = 1 + upper / lower;
    double ideal = facts.inverting() ? -facts.ratio() * upper / lower : facts.ratio() * noiseGain;
    double error = ideal / (1 + noiseGain / facts.gain()) / wanted - 1;
    double peak =
        Math.abs(wanted) * (facts.amplitude() > 0 ? facts.amplitude() : 1 / Math.abs(wanted));
    double foot = facts.inverting() ? 0 : lower;
    double taken = upper + foot == 0 ? 0 : peak / (upper + foot);
    double parallel = upper == 0 ? 0 : upper / noiseGain;
    double added =
        facts.noise() == 0
            ? 0
            : Math.sqrt(1 + ROOM * parallel / (facts.noise() * facts.noise())) - 1;
    double pole = 1 / (2 * Math.PI * parallel * facts.inputCapacitance());
    double unity = facts.gainBandwidth() / noiseGain;
    return new DividerScore(
            0,
            0,
            taken / facts.available() / CURRENT,
            facts.biasCurrent() * parallel * noiseGain / peak / OFFSET,
            added / NOISE,
            Math.toDegrees(Math.atan(unity / pole)) / DEGREES,
            PART * Math.max(0, divider.partCount() - 2))
        .with(error, halfBand);
  }
}
