package loopwright.circuit;

/**
 * How everything that {@link TransistorEquations} gives changes when junction voltages or
 * parameters change a little: each line of the equations differentiated once more, so that what
 * comes out are the exact second derivatives, to rounding.
 *
 * <p>{@link #vary} leaves its results in the fields, as the equations do.
 */
final class TransistorVariation {
  private final TransistorEquations e;

  double collectorCurrent;
  double baseCurrent;
  double collectorByBaseEmitter;
  double collectorByBaseCollector;
  double baseByBaseEmitter;
  double baseByBaseCollector;
  double baseEmitterChargeByBaseEmitter;
  double baseEmitterChargeByBaseCollector;
  double baseCollectorChargeByBaseCollector;

  TransistorVariation(TransistorEquations equations) {
    this.e = equations;
  }

  /**
   * Derivatives along a direction at a pair of junction voltages.
   *
   * @param baseEmitter v_BE, V
   * @param baseCollector v_BC, V
   * @param dForward change of v_BE, V
   * @param dReverse change of v_BC, V
   * @param dSaturation change of ln I_S
   * @param dGain change of ln β_F; I_rec changes against it
   */
  void vary(
      double baseEmitter,
      double baseCollector,
      double dForward,
      double dReverse,
      double dSaturation,
      double dGain) {
    double thermal = e.thermalVoltage;
    double forward = Math.exp(baseEmitter / thermal);
    double reverse = Math.exp(baseCollector / thermal);
    double forwardSlope = e.saturationCurrent * forward / thermal;
    double reverseSlope = e.saturationCurrent * reverse / thermal;
    double forwardCurrent = e.saturationCurrent * (forward - 1);
    double reverseCurrent = e.saturationCurrent * (reverse - 1);
    double dForwardSlope = forwardSlope * (dForward / thermal + dSaturation);
    double dReverseSlope = reverseSlope * (dReverse / thermal + dSaturation);
    double dForwardCurrent = forwardSlope * dForward + forwardCurrent * dSaturation;
    double dReverseCurrent = reverseSlope * dReverse + reverseCurrent * dSaturation;

    double early = 1 / (1 - baseCollector * e.inverseEarlyVoltage);
    double dEarly = early * early * e.inverseEarlyVoltage * dReverse;
    double root = Math.sqrt(1 + 4 * forwardCurrent * e.inverseKneeCurrent);
    double dRoot = 2 * e.inverseKneeCurrent * dForwardCurrent / root;
    double charge = 0.5 * early * (1 + root);
    double dCharge = 0.5 * (dEarly * (1 + root) + early * dRoot);
    double chargeByForward = early * forwardSlope * e.inverseKneeCurrent / root;
    double dChargeByForward =
        e.inverseKneeCurrent * (dEarly * forwardSlope + early * dForwardSlope) / root
            - chargeByForward * dRoot / root;
    double chargeByReverse = charge * early * e.inverseEarlyVoltage;
    double dChargeByReverse = e.inverseEarlyVoltage * (dCharge * early + charge * dEarly);

    double transport = (forwardCurrent - reverseCurrent) / charge;
    double dTransport = (dForwardCurrent - dReverseCurrent - transport * dCharge) / charge;
    double byForward = (forwardSlope - transport * chargeByForward) / charge;
    double byReverse = (-reverseSlope - transport * chargeByReverse) / charge;

    collectorCurrent = dTransport - dReverseCurrent / e.reverseBeta - e.shunt * dReverse;
    collectorByBaseEmitter =
        (dForwardSlope
                - dTransport * chargeByForward
                - transport * dChargeByForward
                - byForward * dCharge)
            / charge;
    collectorByBaseCollector =
        (-dReverseSlope
                    - dTransport * chargeByReverse
                    - transport * dChargeByReverse
                    - byReverse * dCharge)
                / charge
            - dReverseSlope / e.reverseBeta;

    double recombination = Math.exp(baseEmitter / e.recombinationVoltage);
    double recombinationSlope = e.recombinationCurrent * recombination / e.recombinationVoltage;
    baseCurrent =
        (dForwardCurrent - dGain * forwardCurrent) / e.forwardBeta
            + recombinationSlope * dForward
            - dGain * e.recombinationCurrent * (recombination - 1)
            + dReverseCurrent / e.reverseBeta
            + e.shunt * (dForward + dReverse);
    baseByBaseEmitter =
        (dForwardSlope - dGain * forwardSlope) / e.forwardBeta
            + recombinationSlope * (dForward / e.recombinationVoltage - dGain);
    baseByBaseCollector = dReverseSlope / e.reverseBeta;

    double stored = forwardCurrent / charge;
    double dStored = (dForwardCurrent - stored * dCharge) / charge;
    double storedByForward = (forwardSlope - stored * chargeByForward) / charge;
    double storedByReverse = stored * chargeByReverse / charge;
    baseEmitterChargeByBaseEmitter =
        e.transitTime
                * (dForwardSlope
                    - dStored * chargeByForward
                    - stored * dChargeByForward
                    - storedByForward * dCharge)
                / charge
            + e.baseEmitterCapacitance * DepletionCapacitance.slope(baseEmitter) * dForward;
    baseEmitterChargeByBaseCollector =
        -e.transitTime
            * (dStored * chargeByReverse + stored * dChargeByReverse - storedByReverse * dCharge)
            / charge;
    baseCollectorChargeByBaseCollector =
        e.reverseTransitTime * dReverseSlope
            + e.baseCollectorCapacitance * DepletionCapacitance.slope(baseCollector) * dReverse;
  }
}
