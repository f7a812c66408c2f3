package loopwright.circuit;

import java.util.List;

/** An inductor with its series resistance; its current i is an unknown: v − (R + sL) i = 0. */
public final class Inductor implements Element {
  private final String name;
  private final int from;
  private final int to;
  private final int branch;
  private final double resistance;
  private final double inductance;
  private final double kelvin;
  private final int fromBranch;
  private final int toBranch;
  private final int branchFrom;
  private final int branchTo;
  private final int branchBranch;

  /**
   * @param resistance in series, Ω
   * @param inductance H
   * @param kelvin temperature, K
   */
  Inductor(
      String name,
      int from,
      int to,
      int branch,
      double resistance,
      double inductance,
      double kelvin,
      CircuitBuilder builder) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.branch = branch;
    this.resistance = resistance;
    this.inductance = inductance;
    this.kelvin = kelvin;
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

  /** The noise voltage of the resistance stands in series, in the equation of the branch. */
  @Override
  public void addNoise(CircuitState state, List<NoiseSource> sources) {
    NoiseSource.addThermal(name, -1, branch, resistance, kelvin, sources);
  }

  @Override
  public void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    sums.add(name, Parameter.RESISTANCE, adjoint[branch] * resistance * state.voltage(branch));
  }

  @Override
  public void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    sums.add(name, Parameter.RESISTANCE, resistance * form.conductance(branch, -1, branch, -1));
  }

  @Override
  public void stamp(CircuitState state) {
    Stamps stamps = state.stamps();
    double current = state.voltage(branch);
    double high = state.voltage(from);
    double low = state.voltage(to);
    stamps.current(from, current, 0);
    stamps.current(to, -current, 0);
    stamps.conductance(fromBranch, 1);
    stamps.conductance(toBranch, -1);
    stamps.current(branch, high - low - resistance * current, Math.abs(high) + Math.abs(low));
    stamps.conductance(branchFrom, 1);
    stamps.conductance(branchTo, -1);
    stamps.conductance(branchBranch, -resistance);
    stamps.charge(branch, -inductance * current);
    stamps.capacitance(branchBranch, -inductance);
  }
}
