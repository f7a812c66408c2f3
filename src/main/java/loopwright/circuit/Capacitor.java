package loopwright.circuit;

/** A capacitor that is open in every static state. */
public final class Capacitor implements Element {
  private final String name;
  private final int from;
  private final int to;
  private final double capacitance;
  private final TwoTerminalSlots slots;

  Capacitor(String name, int from, int to, double capacitance, CircuitBuilder builder) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.capacitance = capacitance;
    this.slots = new TwoTerminalSlots(builder, from, to);
  }

  @Override
  public String name() {
    return name;
  }

  /** Capacitance, F. */
  public double capacitance() {
    return capacitance;
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
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    sums.add(name, Parameter.CAPACITANCE, -capacitance * form.capacitance(from, to, from, to));
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double charge = capacitance * (state.voltage(from) - state.voltage(to));
    stamps.charge(from, charge);
    stamps.charge(to, -charge);
    slots.capacitance(stamps, capacitance);
  }
}
