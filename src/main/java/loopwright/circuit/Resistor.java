package loopwright.circuit;

import java.util.List;

/** A resistor. */
public final class Resistor implements Element {
  private final String name;
  private final int from;
  private final int to;
  private final double conductance;
  private final double kelvin;
  private final TwoTerminalSlots slots;

  /**
   * @param resistance Ω
   * @param kelvin temperature, K; 0 for one that stands for no part and makes no noise
   */
  Resistor(
      String name, int from, int to, double resistance, double kelvin, CircuitBuilder builder) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.conductance = 1 / resistance;
    this.kelvin = kelvin;
    this.slots = new TwoTerminalSlots(builder, from, to);
  }

  @Override
  public String name() {
    return name;
  }

  /** Conductance, S. */
  public double conductance() {
    return conductance;
  }

  /** Index of its first node. */
  public int from() {
    return from;
  }

  /** Index of its second node. */
  public int to() {
    return to;
  }

  @Override
  public void addNoise(CircuitState state, List<NoiseSource> sources) {
    NoiseSource.addThermal(name, from, to, conductance, kelvin, sources);
  }

  @Override
  public void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    double current = conductance * (state.voltage(from) - state.voltage(to));
    sums.add(
        name, Parameter.RESISTANCE, current * (Stamps.at(adjoint, from) - Stamps.at(adjoint, to)));
  }

  @Override
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    sums.add(name, Parameter.RESISTANCE, conductance * form.conductance(from, to, from, to));
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double voltage = state.voltage(from) - state.voltage(to);
    double current = conductance * voltage;
    double conducted = conductance * (Math.abs(state.voltage(from)) + Math.abs(state.voltage(to)));
    stamps.current(from, current, conducted);
    stamps.current(to, -current, conducted);
    slots.conductance(stamps, conductance);
  }
}
