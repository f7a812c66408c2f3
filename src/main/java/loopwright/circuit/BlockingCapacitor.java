package loopwright.circuit;

/**
 * A capacitor large enough to count as a short at the signal's frequency. Its current i is an
 * unknown of its own, so that the matrix keeps its pattern whether the capacitor is open (i = 0),
 * held at a voltage (v − V = 0), or a capacitance (i − s C v = 0).
 */
public final class BlockingCapacitor implements Element {
  private final String name;
  private final int index;
  private final int from;
  private final int to;
  private final int branch;
  private final double capacitance;
  private final int fromBranch;
  private final int toBranch;
  private final int branchFrom;
  private final int branchTo;
  private final int branchBranch;

  BlockingCapacitor(
      String name,
      int index,
      int from,
      int to,
      int branch,
      double capacitance,
      CircuitBuilder builder) {
    this.name = name;
    this.index = index;
    this.from = from;
    this.to = to;
    this.branch = branch;
    this.capacitance = capacitance;
    this.fromBranch = builder.slot(from, branch);
    this.toBranch = builder.slot(to, branch);
    this.branchFrom = builder.slot(branch, from);
    this.branchTo = builder.slot(branch, to);
    this.branchBranch = builder.slot(branch, branch);
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

  /** Row of its equation, and index of its current. */
  public int branch() {
    return branch;
  }

  int index() {
    return index;
  }

  double voltage(CircuitState state) {
    return state.voltage(from) - state.voltage(to);
  }

  @Override
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    if (!state.holds(index)) {
      sums.add(name, Parameter.CAPACITANCE, capacitance * form.capacitance(branch, -1, from, to));
    }
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double current = state.voltage(branch);
    stamps.current(from, current, 0);
    stamps.current(to, -current, 0);
    stamps.conductance(fromBranch, 1);
    stamps.conductance(toBranch, -1);
    if (state.holds(index)) {
      double voltage = voltage(state);
      stamps.current(branch, voltage - state.held(index), Math.abs(voltage));
      stamps.conductance(branchFrom, 1);
      stamps.conductance(branchTo, -1);
    } else {
      stamps.current(branch, current, 0);
      stamps.conductance(branchBranch, 1);
      stamps.charge(branch, -capacitance * voltage(state));
      stamps.capacitance(branchFrom, -capacitance);
      stamps.capacitance(branchTo, capacitance);
    }
  }
}
