package loopwright.circuit;

/**
 * A wire whose current is an unknown and in which a voltage can be inserted: v(from) − v(to) − e =
 * 0. It stays in the circuit always, so that measurements in the lead change a right-hand side and
 * never the matrix.
 */
public final class Lead implements Element {
  private final String name;
  private final int from;
  private final int to;
  private final int branch;
  private final int fromBranch;
  private final int toBranch;
  private final int branchFrom;
  private final int branchTo;

  Lead(String name, int from, int to, int branch, CircuitBuilder builder) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.branch = branch;
    this.fromBranch = builder.slot(from, branch);
    this.toBranch = builder.slot(to, branch);
    this.branchFrom = builder.slot(branch, from);
    this.branchTo = builder.slot(branch, to);
  }

  @Override
  public String name() {
    return name;
  }

  /** Index of the node on the network's side. */
  public int from() {
    return from;
  }

  /** Index of the node on the amplifier's side. */
  public int to() {
    return to;
  }

  /** Row of its equation, and index of its current, which flows from {@code from} to {@code to}. */
  public int branch() {
    return branch;
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double current = state.voltage(branch);
    stamps.current(from, current, 0);
    stamps.current(to, -current, 0);
    stamps.conductance(fromBranch, 1);
    stamps.conductance(toBranch, -1);
    double high = state.voltage(from);
    double low = state.voltage(to);
    stamps.current(branch, high - low, Math.abs(high) + Math.abs(low));
    stamps.conductance(branchFrom, 1);
    stamps.conductance(branchTo, -1);
  }
}
