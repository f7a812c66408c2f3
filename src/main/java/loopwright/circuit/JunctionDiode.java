package loopwright.circuit;

import java.util.List;

/** A diode between its internal nodes; its series resistance is a resistor of its own. */
public final class JunctionDiode implements Element {
  private final String role;
  private final int anode;
  private final int cathode;
  private DiodeEquations equations;
  private final int memory;
  private final TwoTerminalSlots slots;

  JunctionDiode(
      String role,
      int anode,
      int cathode,
      DiodeEquations equations,
      int memory,
      CircuitBuilder builder) {
    this.role = role;
    this.anode = anode;
    this.cathode = cathode;
    this.equations = equations;
    this.memory = memory;
    this.slots = new TwoTerminalSlots(builder, anode, cathode);
  }

  @Override
  public String name() {
    return role;
  }

  /** Forward voltage across the junction, V. */
  public double voltage(CircuitState state) {
    return state.voltage(anode) - state.voltage(cathode);
  }

  /** Current from anode to cathode, A. */
  public double current(CircuitState state) {
    equations.evaluate(voltage(state));
    return equations.current();
  }

  @Override
  public void addNoise(CircuitState state, List<NoiseSource> sources) {
    NoiseSource.addShot(
        role, NoiseSource.Cause.DIODE_SHOT, anode, cathode, current(state), sources);
  }

  @Override
  public void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    double through = Stamps.at(adjoint, anode) - Stamps.at(adjoint, cathode);
    sums.add(
        role,
        Parameter.JUNCTION_VOLTAGE,
        -through * equations.currentByForwardVoltage(voltage(state)));
  }

  @Override
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    double voltage = voltage(state);
    double conductance = form.conductance(anode, cathode, anode, cathode);
    double capacitance = form.capacitance(anode, cathode, anode, cathode);
    double byVoltage =
        -equations.conductanceSlope(voltage) * conductance
            - equations.capacitanceSlope(voltage) * capacitance;
    Stamps.add(byUnknown, anode, byVoltage);
    Stamps.add(byUnknown, cathode, -byVoltage);
    sums.add(
        role,
        Parameter.JUNCTION_VOLTAGE,
        -equations.conductanceByForwardVoltage(voltage) * conductance
            - equations.capacitanceByForwardVoltage(voltage) * capacitance);
  }

  /** Brings its junction to another temperature, K. */
  void heat(double kelvin) {
    equations = equations.at(kelvin);
  }

  @Override
  public void stamp(CircuitState state) {
    double actual = voltage(state);
    double limited =
        JunctionLimit.limit(
            actual, state.memory(memory), equations.emissionVoltage(), equations.criticalVoltage());
    state.setMemory(memory, limited);
    equations.evaluate(limited);
    double more = actual - limited;
    if (more != 0) {
      state.setLimited();
    }
    double conductance = equations.conductance();
    double current = equations.current() + conductance * more;
    double charge = equations.charge() + equations.chargeByVoltage() * more;
    double conducted =
        conductance * (Math.abs(state.voltage(anode)) + Math.abs(state.voltage(cathode)));
    Stamps stamps = state.stamps();
    stamps.current(anode, current, conducted);
    stamps.current(cathode, -current, conducted);
    stamps.charge(anode, charge);
    stamps.charge(cathode, -charge);
    slots.conductance(stamps, conductance);
    slots.capacitance(stamps, equations.chargeByVoltage());
  }
}
