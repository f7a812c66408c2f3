package loopwright.circuit;

/** A resistor. */
public final class Resistor implements Element {
  private final String name;
  private final int from;
  private final int to;
  private final double conductance;
  private final TwoTerminalSlots slots;

  Resistor(String name, int from, int to, double resistance, CircuitBuilder builder) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.conductance = 1 / resistance;
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
