package loopwright.circuit;

import loopwright.part.TransistorParameters;

/**
 * Bipolar transistor in the transport form (Gummel and Poon, Bell System Technical Journal 49,
 * 1970, 827–852), written for npn, at one junction temperature:
 *
 * <pre>
 * q_1 = 1/(1 − v_BC/V_A);  q_2 = (I_S/I_K)(e_F − 1);  q_b = (q_1/2)(1 + √(1 + 4 q_2))
 * I_C = I_S (e_F − e_R)/q_b − (I_S/β_R)(e_R − 1) − g v_BC
 * I_B = (I_S/β_F)(e_F − 1) + I_rec (exp(v_BE/(n_rec V_T)) − 1) + (I_S/β_R)(e_R − 1) + g v_BE + g v_BC
 * </pre>
 *
 * with e_F = exp(v_BE/V_T), e_R = exp(v_BC/V_T) and a shunt g across each junction. The voltages
 * are those across the internal junctions, behind the ohmic resistances.
 *
 * <p>One object serves one device in one run: {@link #evaluate} leaves its results in the fields
 * that the accessors read, so that a hot loop allocates nothing.
 */
public final class TransistorEquations {
  /** Shunt conductance across each junction that keeps the equations regular, S. */
  public static final double SHUNT = 1e-13;

  private final TransistorParameters parameters;
  final double thermalVoltage;
  final double saturationCurrent;
  final double forwardBeta;
  final double reverseBeta;
  final double inverseEarlyVoltage;
  final double inverseKneeCurrent;
  final double recombinationCurrent;
  final double recombinationVoltage;
  final double baseEmitterCapacitance;
  final double baseCollectorCapacitance;
  final double transitTime;
  final double reverseTransitTime;
  final double shunt;
  private final double criticalVoltage;

  private double collectorCurrent;
  private double baseCurrent;
  private double collectorByBaseEmitter;
  private double collectorByBaseCollector;
  private double baseByBaseEmitter;
  private double baseByBaseCollector;
  private double baseCharge;

  private double baseEmitterCharge;
  private double baseEmitterChargeByBaseEmitter;
  private double baseEmitterChargeByBaseCollector;
  private double baseCollectorCharge;
  private double baseCollectorChargeByBaseCollector;

  /**
   * Equations with the shunt that belongs to their definition.
   *
   * @param parameters at 298.15 K
   * @param kelvin junction temperature, K
   */
  public TransistorEquations(TransistorParameters parameters, double kelvin) {
    this(parameters, kelvin, SHUNT);
  }

  /**
   * Equations with a shunt of one's own; published vectors are stated without one.
   *
   * @param parameters at 298.15 K
   * @param kelvin junction temperature, K
   * @param shunt conductance across each junction, S
   */
  public TransistorEquations(TransistorParameters parameters, double kelvin, double shunt) {
    this.parameters = parameters;
    double beta = Physics.betaFactor(kelvin);
    double growth = Physics.saturationCurrentFactor(kelvin);
    this.thermalVoltage = Physics.thermalVoltage(kelvin);
    this.saturationCurrent = parameters.saturationCurrent() * growth;
    this.forwardBeta = parameters.forwardBeta() * beta;
    this.reverseBeta = parameters.reverseBeta() * beta;
    this.inverseEarlyVoltage = 1 / parameters.earlyVoltage();
    this.inverseKneeCurrent = 1 / parameters.kneeCurrent();
    this.recombinationCurrent =
        parameters.recombinationCurrent()
            * Math.pow(growth, 1 / parameters.recombinationIdeality());
    this.recombinationVoltage = parameters.recombinationIdeality() * thermalVoltage;
    this.baseEmitterCapacitance = parameters.baseEmitterCapacitance();
    this.baseCollectorCapacitance = parameters.baseCollectorCapacitance();
    this.transitTime = parameters.transitTime();
    this.reverseTransitTime = parameters.reverseTransitTime();
    this.shunt = shunt;
    this.criticalVoltage =
        thermalVoltage * Math.log(thermalVoltage / (Math.sqrt(2) * saturationCurrent));
  }

  /** The same transistor at another junction temperature, K. */
  TransistorEquations at(double kelvin) {
    return new TransistorEquations(parameters, kelvin, shunt);
  }

  /**
   * Currents and their derivatives at a pair of junction voltages.
   *
   * @param baseEmitter v_BE, V
   * @param baseCollector v_BC, V
   */
  public void evaluate(double baseEmitter, double baseCollector) {
    double forward = Math.exp(baseEmitter / thermalVoltage);
    double reverse = Math.exp(baseCollector / thermalVoltage);
    double forwardSlope = saturationCurrent * forward / thermalVoltage;
    double reverseSlope = saturationCurrent * reverse / thermalVoltage;
    double forwardCurrent = saturationCurrent * (forward - 1);
    double reverseCurrent = saturationCurrent * (reverse - 1);

    double early = 1 / (1 - baseCollector * inverseEarlyVoltage);
    double root = Math.sqrt(1 + 4 * forwardCurrent * inverseKneeCurrent);
    baseCharge = 0.5 * early * (1 + root);
    double chargeByBaseEmitter = early * forwardSlope * inverseKneeCurrent / root;
    double chargeByBaseCollector = baseCharge * early * inverseEarlyVoltage;

    double transport = (forwardCurrent - reverseCurrent) / baseCharge;
    double transportByBaseEmitter = (forwardSlope - transport * chargeByBaseEmitter) / baseCharge;
    double transportByBaseCollector =
        (-reverseSlope - transport * chargeByBaseCollector) / baseCharge;

    double recombination = Math.exp(baseEmitter / recombinationVoltage);

    collectorCurrent = transport - reverseCurrent / reverseBeta - shunt * baseCollector;
    collectorByBaseEmitter = transportByBaseEmitter;
    collectorByBaseCollector = transportByBaseCollector - reverseSlope / reverseBeta - shunt;
    baseCurrent =
        forwardCurrent / forwardBeta
            + recombinationCurrent * (recombination - 1)
            + reverseCurrent / reverseBeta
            + shunt * (baseEmitter + baseCollector);
    baseByBaseEmitter =
        forwardSlope / forwardBeta
            + recombinationCurrent * recombination / recombinationVoltage
            + shunt;
    baseByBaseCollector = reverseSlope / reverseBeta + shunt;

    double stored = forwardCurrent / baseCharge;
    baseEmitterCharge =
        transitTime * stored + baseEmitterCapacitance * DepletionCapacitance.charge(baseEmitter);
    baseEmitterChargeByBaseEmitter =
        transitTime * (forwardSlope - stored * chargeByBaseEmitter) / baseCharge
            + baseEmitterCapacitance * DepletionCapacitance.factor(baseEmitter);
    baseEmitterChargeByBaseCollector = -transitTime * stored * chargeByBaseCollector / baseCharge;
    baseCollectorCharge =
        reverseTransitTime * reverseCurrent
            + baseCollectorCapacitance * DepletionCapacitance.charge(baseCollector);
    baseCollectorChargeByBaseCollector =
        reverseTransitTime * reverseSlope
            + baseCollectorCapacitance * DepletionCapacitance.factor(baseCollector);
  }

  /** Current into the collector, A. */
  public double collectorCurrent() {
    return collectorCurrent;
  }

  /** Current into the base, A. */
  public double baseCurrent() {
    return baseCurrent;
  }

  /** ∂I_C/∂v_BE at constant v_BC, S. */
  public double collectorByBaseEmitter() {
    return collectorByBaseEmitter;
  }

  /** ∂I_C/∂v_BC at constant v_BE, S. */
  public double collectorByBaseCollector() {
    return collectorByBaseCollector;
  }

  /** ∂I_B/∂v_BE at constant v_BC, S. */
  public double baseByBaseEmitter() {
    return baseByBaseEmitter;
  }

  /** ∂I_B/∂v_BC at constant v_BE, S. */
  public double baseByBaseCollector() {
    return baseByBaseCollector;
  }

  /** Normalised base charge q_b. */
  public double baseCharge() {
    return baseCharge;
  }

  /** Charge between internal base and emitter, C: diffusion and depletion. */
  public double baseEmitterCharge() {
    return baseEmitterCharge;
  }

  /** Its derivative by v_BE, F. */
  public double baseEmitterChargeByBaseEmitter() {
    return baseEmitterChargeByBaseEmitter;
  }

  /** Its derivative by v_BC through q_b, F. */
  public double baseEmitterChargeByBaseCollector() {
    return baseEmitterChargeByBaseCollector;
  }

  /** Charge between internal base and collector, C. */
  public double baseCollectorCharge() {
    return baseCollectorCharge;
  }

  /** Its derivative by v_BC, F. */
  public double baseCollectorChargeByBaseCollector() {
    return baseCollectorChargeByBaseCollector;
  }

  /** Thermal voltage at the junction temperature, V. */
  public double thermalVoltage() {
    return thermalVoltage;
  }

  /** I_S at the junction temperature, A. */
  public double saturationCurrent() {
    return saturationCurrent;
  }

  /** Junction voltage at which the exponential bends most, V; see {@link JunctionLimit}. */
  public double criticalVoltage() {
    return criticalVoltage;
  }
}
