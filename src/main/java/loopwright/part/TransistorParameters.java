package loopwright.part;

/**
 * A complete set of parameters of the transistor equations at 298.15 K, in SI units.
 *
 * @param saturationCurrent I_S, A
 * @param forwardBeta β_F
 * @param reverseBeta β_R
 * @param earlyVoltage V_A, V; infinite for none
 * @param kneeCurrent I_K, A; infinite for none
 * @param recombinationCurrent I_rec, A
 * @param recombinationIdeality n_rec
 * @param baseResistance r_B, Ω
 * @param emitterResistance r_E, Ω
 * @param collectorResistance r_C, Ω
 * @param baseEmitterCapacitance zero-bias depletion capacitance, F
 * @param baseCollectorCapacitance zero-bias depletion capacitance, F
 * @param transitTime forward, s
 * @param reverseTransitTime reverse, s
 * @param flickerCorner Hz; 0 when not known
 */
public record TransistorParameters(
    double saturationCurrent,
    double forwardBeta,
    double reverseBeta,
    double earlyVoltage,
    double kneeCurrent,
    double recombinationCurrent,
    double recombinationIdeality,
    double baseResistance,
    double emitterResistance,
    double collectorResistance,
    double baseEmitterCapacitance,
    double baseCollectorCapacitance,
    double transitTime,
    double reverseTransitTime,
    double flickerCorner) {
  /**
   * What holds where a record says nothing; saturation current and forward beta have no default.
   */
  public static final TransistorParameters DEFAULTS =
      new TransistorParameters(
          Double.NaN,
          Double.NaN,
          3,
          Double.POSITIVE_INFINITY,
          Double.POSITIVE_INFINITY,
          0,
          2,
          0,
          0,
          0,
          0,
          0,
          0,
          0,
          0);

  /** These parameters with another saturation current, A. */
  public TransistorParameters withSaturationCurrent(double value) {
    return new TransistorParameters(
        value,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another forward beta. */
  public TransistorParameters withForwardBeta(double value) {
    return new TransistorParameters(
        saturationCurrent,
        value,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another Early voltage, V. */
  public TransistorParameters withEarlyVoltage(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        value,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another knee current, A. */
  public TransistorParameters withKneeCurrent(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        value,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another recombination current, A. */
  public TransistorParameters withRecombinationCurrent(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        value,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another zero-bias base-emitter capacitance, F. */
  public TransistorParameters withBaseEmitterCapacitance(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        value,
        baseCollectorCapacitance,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another zero-bias base-collector capacitance, F. */
  public TransistorParameters withBaseCollectorCapacitance(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        value,
        transitTime,
        reverseTransitTime,
        flickerCorner);
  }

  /** These parameters with another forward transit time, s. */
  public TransistorParameters withTransitTime(double value) {
    return new TransistorParameters(
        saturationCurrent,
        forwardBeta,
        reverseBeta,
        earlyVoltage,
        kneeCurrent,
        recombinationCurrent,
        recombinationIdeality,
        baseResistance,
        emitterResistance,
        collectorResistance,
        baseEmitterCapacitance,
        baseCollectorCapacitance,
        value,
        reverseTransitTime,
        flickerCorner);
  }
}
