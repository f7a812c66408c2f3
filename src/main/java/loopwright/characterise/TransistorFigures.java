package loopwright.characterise;

import loopwright.circuit.Physics;
import loopwright.circuit.TransistorEquations;
import loopwright.part.TransistorParameters;

/**
 * Small-signal and static figures of a transistor from its parameters, in the words of a datasheet.
 * Voltages and currents are given in the device's own polarity. Every method throws {@link
 * FitException} where the parameters cannot reach the bias.
 */
public final class TransistorFigures {
  /** Collector current over base current where a datasheet calls a transistor saturated. */
  public static final double SATURATED_GAIN = 10;

  private final TransistorParameters parameters;
  private final double kelvin;

  /**
   * @param parameters at 25 °C
   * @param kelvin junction temperature at which the figures are wanted, K
   */
  public TransistorFigures(TransistorParameters parameters, double kelvin) {
    this.parameters = parameters;
    this.kelvin = kelvin;
  }

  /** Figures at 25 °C. */
  public TransistorFigures(TransistorParameters parameters) {
    this(parameters, Physics.NOMINAL_TEMPERATURE);
  }

  /**
   * Direct-current gain I_C/I_B.
   *
   * @param collectorCurrent A
   * @param collectorEmitterVoltage V
   */
  public double beta(double collectorCurrent, double collectorEmitterVoltage) {
    TransistorEquations equations = active(collectorCurrent, collectorEmitterVoltage).equations();
    return equations.collectorCurrent() / equations.baseCurrent();
  }

  /**
   * Base-emitter voltage between the terminals in the active region, V.
   *
   * @param collectorCurrent A
   * @param collectorEmitterVoltage V
   */
  public double baseEmitterVoltage(double collectorCurrent, double collectorEmitterVoltage) {
    return active(collectorCurrent, collectorEmitterVoltage).terminalBaseEmitter();
  }

  /**
   * Base-emitter voltage between the terminals in saturation with I_B = I_C/10, V.
   *
   * @param collectorCurrent A
   */
  public double saturatedBaseEmitterVoltage(double collectorCurrent) {
    TransistorBias bias = new TransistorBias(parameters, kelvin);
    bias.saturated(collectorCurrent, collectorCurrent / SATURATED_GAIN);
    return bias.terminalBaseEmitter();
  }

  /**
   * Transition frequency, Hz: 1/(2π f_T) = dQ/dI_C at constant collector-emitter voltage, Q being
   * all charge on the base (Gummel, "On the definition of the cutoff frequency f_T", Proceedings of
   * the IEEE 57, 1969, 2159; from memory). Without ohmic resistances this is transitTime +
   * (C_BE,depletion + C_BC)/g_m.
   *
   * @param collectorCurrent A
   * @param collectorEmitterVoltage V
   */
  public double transitionFrequency(double collectorCurrent, double collectorEmitterVoltage) {
    return 1 / (2 * Math.PI * baseDelay(collectorCurrent, collectorEmitterVoltage));
  }

  /** dQ/dI_C at constant collector-emitter voltage, s; arguments as above. */
  double baseDelay(double collectorCurrent, double collectorEmitterVoltage) {
    TransistorEquations at = active(collectorCurrent, collectorEmitterVoltage).equations();
    double collectorPart = parameters.collectorResistance() + parameters.emitterResistance();
    double emitterPart = parameters.emitterResistance();
    // dV_CE = 0 ties the two junction voltages together: slopes of V_CE by v_BE and by v_BC.
    double byBaseEmitter =
        1 + at.collectorByBaseEmitter() * collectorPart + at.baseByBaseEmitter() * emitterPart;
    double byBaseCollector =
        -1 + at.collectorByBaseCollector() * collectorPart + at.baseByBaseCollector() * emitterPart;
    double follow = -byBaseEmitter / byBaseCollector;
    double charge =
        at.baseEmitterChargeByBaseEmitter()
            + follow
                * (at.baseEmitterChargeByBaseCollector() + at.baseCollectorChargeByBaseCollector());
    return charge / (at.collectorByBaseEmitter() + follow * at.collectorByBaseCollector());
  }

  /**
   * Collector-base capacitance with the emitter open, F.
   *
   * @param reverseVoltage V
   */
  public double outputCapacitance(double reverseVoltage) {
    TransistorEquations equations = new TransistorEquations(parameters, kelvin);
    equations.evaluate(0, -reverseVoltage);
    return equations.baseCollectorChargeByBaseCollector();
  }

  /**
   * Emitter-base capacitance with the collector open, F.
   *
   * @param reverseVoltage V
   */
  public double inputCapacitance(double reverseVoltage) {
    TransistorEquations equations = new TransistorEquations(parameters, kelvin);
    equations.evaluate(-reverseVoltage, 0);
    return equations.baseEmitterChargeByBaseEmitter();
  }

  /**
   * Output conductance h_oe = dI_C/dV_CE at constant base current, S.
   *
   * @param collectorCurrent A
   * @param collectorEmitterVoltage V
   */
  public double outputConductance(double collectorCurrent, double collectorEmitterVoltage) {
    return 1 / outputResistance(collectorCurrent, collectorEmitterVoltage);
  }

  private double outputResistance(double collectorCurrent, double collectorEmitterVoltage) {
    TransistorEquations at = active(collectorCurrent, collectorEmitterVoltage).equations();
    double follow = -at.baseByBaseCollector() / at.baseByBaseEmitter();
    double collector = at.collectorByBaseCollector() + follow * at.collectorByBaseEmitter();
    return (follow - 1) / collector
        + parameters.collectorResistance()
        + parameters.emitterResistance();
  }

  private TransistorBias active(double collectorCurrent, double collectorEmitterVoltage) {
    TransistorBias bias = new TransistorBias(parameters, kelvin);
    bias.active(collectorCurrent, collectorEmitterVoltage);
    return bias;
  }
}
