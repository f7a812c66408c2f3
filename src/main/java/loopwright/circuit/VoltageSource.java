package loopwright.circuit;

/**
 * An ideal source from ground to a node. Its current i, into the node, is an unknown: v − E = 0.
 */
public final class VoltageSource implements Element {
  private final String name;
  private final int node;
  private final int branch;
  private final double voltage;
  private final boolean generator;
  private final int nodeBranch;
  private final int branchNode;

  VoltageSource(
      String name,
      int node,
      int branch,
      double voltage,
      boolean generator,
      CircuitBuilder builder) {
    this.name = name;
    this.node = node;
    this.branch = branch;
    this.voltage = voltage;
    this.generator = generator;
    this.nodeBranch = builder.slot(node, branch);
    this.branchNode = builder.slot(branch, node);
  }

  @Override
  public String name() {
    return name;
  }

  /** Row of its equation: an excitation of 1 there is one volt more of this source. */
  public int branch() {
    return branch;
  }

  /** Source voltage before the source scale at a state, V. */
  public double nominal(CircuitState state) {
    return generator ? state.generator() : voltage;
  }

  /** Current into its node at a state, A. */
  public double current(CircuitState state) {
    return state.voltage(branch);
  }

  /** Only a supply's voltage is a parameter; the generator's is a level. */
  @Override
  public void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    if (!generator) {
      sums.add(name, Parameter.SUPPLY, adjoint[branch] * voltage);
    }
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double source = state.sourceScale() * nominal(state);
    stamps.current(node, -current(state), 0);
    stamps.conductance(nodeBranch, -1);
    stamps.current(branch, state.voltage(node) - source, Math.abs(source));
    stamps.conductance(branchNode, 1);
  }

  @Override
  public void exciteSources(CircuitState state, double[] rightHandSide) {
    rightHandSide[branch] += nominal(state);
  }
}
