package loopwright.circuit;

import loopwright.part.DiodeParameters;

/**
 * Junction diode at one temperature: I = I_S (exp(v/(n V_T)) − 1) + g v, with the depletion charge
 * and transitTime times the exponential's current as stored charge. The series resistance stands
 * outside. I_S follows the transistor's temperature law to the power 1/n.
 *
 * <p>{@link #evaluate} leaves its results in fields, as {@link TransistorEquations} does.
 */
public final class DiodeEquations {
  private final DiodeParameters parameters;
  private final double emissionVoltage;
  private final double nominalEmissionVoltage;
  private final double saturationCurrent;
  private final double capacitance;
  private final double transitTime;
  private final double shunt;
  private final double criticalVoltage;

  private double current;
  private double conductance;
  private double charge;
  private double chargeByVoltage;

  /**
   * Equations with the shunt that belongs to their definition.
   *
   * @param parameters at 298.15 K
   * @param kelvin junction temperature, K
   */
  public DiodeEquations(DiodeParameters parameters, double kelvin) {
    this(parameters, kelvin, TransistorEquations.SHUNT);
  }

  /**
   * Equations with a shunt of one's own.
   *
   * @param parameters at 298.15 K
   * @param kelvin junction temperature, K
   * @param shunt conductance across the junction, S
   */
  public DiodeEquations(DiodeParameters parameters, double kelvin, double shunt) {
    this.parameters = parameters;
    this.emissionVoltage = parameters.ideality() * Physics.thermalVoltage(kelvin);
    this.nominalEmissionVoltage =
        parameters.ideality() * Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);
    this.saturationCurrent =
        parameters.saturationCurrent()
            * Math.pow(Physics.saturationCurrentFactor(kelvin), 1 / parameters.ideality());
    this.capacitance = parameters.capacitance();
    this.transitTime = parameters.transitTime();
    this.shunt = shunt;
    this.criticalVoltage =
        emissionVoltage * Math.log(emissionVoltage / (Math.sqrt(2) * saturationCurrent));
  }

  /** The same diode at another junction temperature, K. */
  DiodeEquations at(double kelvin) {
    return new DiodeEquations(parameters, kelvin, shunt);
  }

  /**
   * Current, charge and derivatives.
   *
   * @param voltage across the junction, forward positive, V
   */
  public void evaluate(double voltage) {
    double growth = Math.exp(voltage / emissionVoltage);
    double slope = saturationCurrent * growth / emissionVoltage;
    double forward = saturationCurrent * (growth - 1);
    current = forward + shunt * voltage;
    conductance = slope + shunt;
    charge = transitTime * forward + capacitance * DepletionCapacitance.charge(voltage);
    chargeByVoltage = transitTime * slope + capacitance * DepletionCapacitance.factor(voltage);
  }

  /** ∂I/∂(forward voltage at equal current at 25 °C) at a junction voltage in V, S. */
  double currentByForwardVoltage(double voltage) {
    return -saturationCurrent * Math.expm1(voltage / emissionVoltage) / nominalEmissionVoltage;
  }

  /** Derivative of the exponential's own conductance by the junction voltage, S/V. */
  double conductanceSlope(double voltage) {
    return exponentialConductance(voltage) / emissionVoltage;
  }

  /** Derivative of the capacitance by the junction voltage, F/V. */
  double capacitanceSlope(double voltage) {
    return transitTime * conductanceSlope(voltage)
        + capacitance * DepletionCapacitance.slope(voltage);
  }

  /** ∂²I/∂v∂(forward voltage at equal current at 25 °C), S/V. */
  double conductanceByForwardVoltage(double voltage) {
    return -exponentialConductance(voltage) / nominalEmissionVoltage;
  }

  /** The same of the capacitance, F/V. */
  double capacitanceByForwardVoltage(double voltage) {
    return transitTime * conductanceByForwardVoltage(voltage);
  }

  private double exponentialConductance(double voltage) {
    return saturationCurrent * Math.exp(voltage / emissionVoltage) / emissionVoltage;
  }

  /** Current from anode to cathode, A. */
  public double current() {
    return current;
  }

  /** ∂I/∂v, S. */
  public double conductance() {
    return conductance;
  }

  /** Stored charge, C. */
  public double charge() {
    return charge;
  }

  /** Its derivative, F. */
  public double chargeByVoltage() {
    return chargeByVoltage;
  }

  /** n V_T at the junction temperature, V. */
  public double emissionVoltage() {
    return emissionVoltage;
  }

  /** Junction voltage at which the exponential bends most, V; see {@link JunctionLimit}. */
  public double criticalVoltage() {
    return criticalVoltage;
  }
}
