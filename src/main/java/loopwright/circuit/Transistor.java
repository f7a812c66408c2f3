package loopwright.circuit;

import java.util.List;
import loopwright.part.Polarity;

/**
 * A bipolar transistor between its internal nodes; ohmic resistances are resistors of their own.
 * For pnp every voltage and current is mirrored.
 */
public final class Transistor implements Element {
  /** Change of ln I_S by a volt more of V_BE at equal current at 25 °C, 1/V. */
  private static final double SATURATION_BY_VOLT =
      -1 / Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);

  private final String role;
  private final int sign;
  private final int collector;
  private final int base;
  private final int emitter;
  private TransistorEquations equations;
  private final int memory;
  private final double flickerCorner;
  private final int[] slots = new int[9];

  Transistor(
      String role,
      Polarity polarity,
      int collector,
      int base,
      int emitter,
      TransistorEquations equations,
      int memory,
      double flickerCorner,
      CircuitBuilder builder) {
    this.role = role;
    this.sign = polarity.sign();
    this.collector = collector;
    this.base = base;
    this.emitter = emitter;
    this.equations = equations;
    this.memory = memory;
    this.flickerCorner = flickerCorner;
    int[] nodes = {collector, base, emitter};
    for (int row = 0; row < 3; row++) {
      for (int column = 0; column < 3; column++) {
        slots[3 * row + column] = builder.slot(nodes[row], nodes[column]);
      }
    }
  }

  @Override
  public String name() {
    return role;
  }

  /** The equations, as the last evaluation of any state left them. */
  public TransistorEquations equations() {
    return equations;
  }

  /** Voltage across the internal base-emitter junction in the device's own polarity, V. */
  public double baseEmitter(CircuitState state) {
    return sign * (state.voltage(base) - state.voltage(emitter));
  }

  /** Voltage across the internal base-collector junction in the device's own polarity, V. */
  public double baseCollector(CircuitState state) {
    return sign * (state.voltage(base) - state.voltage(collector));
  }

  /** Collector current in the device's own polarity, A. */
  public double collectorCurrent(CircuitState state) {
    equations.evaluate(baseEmitter(state), baseCollector(state));
    return equations.collectorCurrent();
  }

  /** Base current in the device's own polarity, A. */
  public double baseCurrent(CircuitState state) {
    equations.evaluate(baseEmitter(state), baseCollector(state));
    return equations.baseCurrent();
  }

  /** ∂I_C/∂v_BE at the state, S. */
  public double transconductance(CircuitState state) {
    equations.evaluate(baseEmitter(state), baseCollector(state));
    return equations.collectorByBaseEmitter();
  }

  /** Whether its flicker corner is known. */
  public boolean knowsFlicker() {
    return flickerCorner > 0;
  }

  /** Shot noise of both currents, and the base current's flicker where a corner is known. */
  @Override
  public void addNoise(CircuitState state, List<NoiseSource> sources) {
    equations.evaluate(baseEmitter(state), baseCollector(state));
    NoiseSource.addShot(
        role,
        NoiseSource.Cause.COLLECTOR_SHOT,
        collector,
        emitter,
        equations.collectorCurrent(),
        sources);
    NoiseSource.addShot(
        role, NoiseSource.Cause.BASE_SHOT, base, emitter, equations.baseCurrent(), sources);
    NoiseSource.addFlicker(role, base, emitter, equations.baseCurrent(), flickerCorner, sources);
  }

  @Override
  public void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    double toCollector = Stamps.at(adjoint, collector) - Stamps.at(adjoint, emitter);
    double toBase = Stamps.at(adjoint, base) - Stamps.at(adjoint, emitter);
    TransistorVariation variation = new TransistorVariation(equations);
    double vbe = baseEmitter(state);
    double vbc = baseCollector(state);
    variation.vary(vbe, vbc, 0, 0, SATURATION_BY_VOLT, 0);
    sums.add(
        role,
        Parameter.JUNCTION_VOLTAGE,
        -sign * (toCollector * variation.collectorCurrent + toBase * variation.baseCurrent));
    variation.vary(vbe, vbc, 0, 0, 0, 1);
    sums.add(
        role,
        Parameter.CURRENT_GAIN,
        -sign * (toCollector * variation.collectorCurrent + toBase * variation.baseCurrent));
  }

  @Override
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    TransistorVariation variation = new TransistorVariation(equations);
    double vbe = baseEmitter(state);
    double vbc = baseCollector(state);
    variation.vary(vbe, vbc, 1, 0, 0, 0);
    double byForward = -sign * change(form, variation);
    Stamps.add(byUnknown, base, byForward);
    Stamps.add(byUnknown, emitter, -byForward);
    variation.vary(vbe, vbc, 0, 1, 0, 0);
    double byReverse = -sign * change(form, variation);
    Stamps.add(byUnknown, base, byReverse);
    Stamps.add(byUnknown, collector, -byReverse);
    variation.vary(vbe, vbc, 0, 0, SATURATION_BY_VOLT, 0);
    sums.add(role, Parameter.JUNCTION_VOLTAGE, -change(form, variation));
    variation.vary(vbe, vbc, 0, 0, 0, 1);
    sums.add(role, Parameter.CURRENT_GAIN, -change(form, variation));
  }

  /** Change of the form when small-signal values change as a variation says. */
  private double change(BilinearForm form, TransistorVariation by) {
    return by.collectorByBaseEmitter * form.conductance(collector, emitter, base, emitter)
        + by.collectorByBaseCollector * form.conductance(collector, emitter, base, collector)
        + by.baseByBaseEmitter * form.conductance(base, emitter, base, emitter)
        + by.baseByBaseCollector * form.conductance(base, emitter, base, collector)
        + by.baseEmitterChargeByBaseEmitter * form.capacitance(base, emitter, base, emitter)
        + by.baseEmitterChargeByBaseCollector * form.capacitance(base, emitter, base, collector)
        + by.baseCollectorChargeByBaseCollector
            * form.capacitance(base, collector, base, collector);
  }

  /** Brings its junction to another temperature, K. */
  void heat(double kelvin) {
    equations = equations.at(kelvin);
  }

  @Override
  public void stamp(CircuitState state) {
    double actualForward = baseEmitter(state);
    double actualReverse = baseCollector(state);
    double forward = limit(state, memory, actualForward);
    double reverse = limit(state, memory + 1, actualReverse);
    equations.evaluate(forward, reverse);

    double moreForward = actualForward - forward;
    double moreReverse = actualReverse - reverse;
    if (moreForward != 0 || moreReverse != 0) {
      state.setLimited();
    }
    double cf = equations.collectorByBaseEmitter();
    double cr = equations.collectorByBaseCollector();
    double bf = equations.baseByBaseEmitter();
    double br = equations.baseByBaseCollector();
    double ic = equations.collectorCurrent() + cf * moreForward + cr * moreReverse;
    double ib = equations.baseCurrent() + bf * moreForward + br * moreReverse;

    Stamps stamps = state.stamps();
    double vc = Math.abs(state.voltage(collector));
    double vb = Math.abs(state.voltage(base));
    double ve = Math.abs(state.voltage(emitter));
    double conductedCollector = Math.abs(cf + cr) * vb + Math.abs(cf) * ve + Math.abs(cr) * vc;
    double conductedBase = Math.abs(bf + br) * vb + Math.abs(bf) * ve + Math.abs(br) * vc;
    stamps.current(collector, sign * ic, conductedCollector);
    stamps.current(base, sign * ib, conductedBase);
    stamps.current(emitter, -sign * (ic + ib), conductedCollector + conductedBase);

    stamps.conductance(slots[0], -cr);
    stamps.conductance(slots[1], cf + cr);
    stamps.conductance(slots[2], -cf);
    stamps.conductance(slots[3], -br);
    stamps.conductance(slots[4], bf + br);
    stamps.conductance(slots[5], -bf);
    stamps.conductance(slots[6], cr + br);
    stamps.conductance(slots[7], -(cf + cr + bf + br));
    stamps.conductance(slots[8], cf + bf);
    stampCharges(stamps, moreForward, moreReverse);
  }

  private void stampCharges(Stamps stamps, double moreForward, double moreReverse) {
    double ef = equations.baseEmitterChargeByBaseEmitter();
    double er = equations.baseEmitterChargeByBaseCollector();
    double rr = equations.baseCollectorChargeByBaseCollector();
    double chargeEmitter = equations.baseEmitterCharge() + ef * moreForward + er * moreReverse;
    double chargeCollector = equations.baseCollectorCharge() + rr * moreReverse;
    stamps.charge(base, sign * (chargeEmitter + chargeCollector));
    stamps.charge(emitter, -sign * chargeEmitter);
    stamps.charge(collector, -sign * chargeCollector);
    stamps.capacitance(slots[0], rr);
    stamps.capacitance(slots[1], -rr);
    stamps.capacitance(slots[3], -(er + rr));
    stamps.capacitance(slots[4], ef + er + rr);
    stamps.capacitance(slots[5], -ef);
    stamps.capacitance(slots[6], er);
    stamps.capacitance(slots[7], -(ef + er));
    stamps.capacitance(slots[8], ef);
  }

  private double limit(CircuitState state, int at, double proposed) {
    double limited =
        JunctionLimit.limit(
            proposed, state.memory(at), equations.thermalVoltage(), equations.criticalVoltage());
    state.setMemory(at, limited);
    return limited;
  }
}
