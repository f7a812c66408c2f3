package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Stamps;
import loopwright.numeric.RealSystem;

/**
 * Newton's method on the static equations f(x) = 0 of a circuit, with junction voltages limited.
 *
 * <p>Converged: the last step below 1e-9 V at every node, and the current balance of every node
 * within 1e-9 of the sum of the magnitudes of the currents that meet there, or within 1e-15 A plus
 * 1e-15 of the sum of conductance × |voltage|, whichever is larger.
 *
 * <p>It owns its work arrays and serves one thread.
 */
public final class StaticSolver {
  private static final double STEP = 1e-9;
  private static final double BALANCE = 1e-9;
  private static final double LEAST_CURRENT = 1e-15;
  private static final double CONDUCTED = 1e-15;

  /** Spacings of a double that a step may be long and yet be rounding. */
  private static final double ROUNDED = 4;

  /** Below this a step that does not converge is rounding, V. */
  private static final double NEAR = 1e-6;

  /** A step longer than this is shortened: it comes from a matrix that is all but singular, V. */
  private static final double LONGEST_STEP = 1e4;

  private final Circuit circuit;
  private final RealSystem system;
  private final double[] step;
  private final double[] byDrive;
  private double lastStep;
  private long iterations;

  /** A solver for one circuit. */
  public StaticSolver(Circuit circuit) {
    this.circuit = circuit;
    this.system = circuit.systems().real();
    this.step = new double[circuit.unknowns()];
    this.byDrive = new double[circuit.unknowns()];
  }

  /** The circuit. */
  public Circuit circuit() {
    return circuit;
  }

  /** How many Newton steps were taken so far. */
  public long iterations() {
    return iterations;
  }

  /**
   * Solves from the state's unknowns.
   *
   * @param state start on entry, solution and stamps there on return
   * @param most iterations at the most
   * @return whether it converged; if not, the unknowns are where it stopped
   */
  public boolean solve(CircuitState state, int most) {
    lastStep = Double.POSITIVE_INFINITY;
    for (int i = 0; i < most; i++) {
      state.evaluate();
      if (lastStep < STEP && !state.limited() && isBalanced(state)) {
        return true;
      }
      if (!factor(state)) {
        return false;
      }
      iterations++;
      double[] f = state.stamps().f;
      for (int row = 0; row < step.length; row++) {
        step[row] = -f[row];
      }
      system.solve(step);
      lastStep = move(state.unknowns());
      if (!Double.isFinite(lastStep)) {
        return false;
      }
    }
    state.evaluate();
    return lastStep < STEP && !state.limited() && isBalanced(state);
  }

  /**
   * Whether the last solve ended within rounding of a solution, though no step was short enough: a
   * gain of many millions stands behind some node.
   */
  boolean wavers() {
    return lastStep < NEAR;
  }

  /**
   * Solves for unknowns and drive together, in the plane through the start that a direction is
   * normal to (Keller 1977: pseudo-arclength continuation). Where a gain of many millions stands
   * behind a node, its voltage is known better than the drive's, and only this is well posed.
   *
   * @param state start on entry, solution and stamps there on return
   * @param drive what moves with the unknowns
   * @param direction unknowns' part of the normal; not modified
   * @param driveDirection the drive's part of the normal
   * @param most iterations at the most
   * @return whether it converged; if not, the unknowns are where it stopped
   */
  boolean solveInPlane(
      CircuitState state, Drive drive, double[] direction, double driveDirection, int most) {
    double[] unknowns = state.unknowns();
    double distance = 0;
    lastStep = Double.POSITIVE_INFINITY;
    for (int i = 0; i <= most; i++) {
      state.evaluate();
      if (lastStep < STEP && !state.limited() && isBalanced(state)) {
        return true;
      }
      if (i == most || !factor(state)) {
        return false;
      }
      iterations++;
      double[] f = state.stamps().f;
      Arrays.fill(byDrive, 0);
      for (int row = 0; row < step.length; row++) {
        step[row] = -f[row];
      }
      drive.excite(state, byDrive);
      system.solve(step);
      system.solve(byDrive);
      double along = along(direction, byDrive);
      double moved = -(distance + along(direction, step)) / (driveDirection + along);
      for (int k = 0; k < step.length; k++) {
        step[k] += moved * byDrive[k];
      }
      lastStep = move(unknowns);
      if (!(lastStep < LONGEST_STEP)) {
        return false;
      }
      drive.set(state, drive.get(state) + moved);
      distance += along(direction, step) + driveDirection * moved;
    }
    return false;
  }

  /**
   * Solves for unknowns and drive together so that a node comes to a given voltage.
   *
   * @param state start on entry, solution and stamps there on return
   * @param drive what moves with the unknowns
   * @param node index of the node
   * @param volts its voltage, V
   * @param most iterations at the most
   * @return whether it converged; if not, the unknowns are where it stopped
   */
  boolean solveToVoltage(CircuitState state, Drive drive, int node, double volts, int most) {
    double[] unknowns = state.unknowns();
    lastStep = Double.POSITIVE_INFINITY;
    for (int i = 0; i <= most; i++) {
      state.evaluate();
      boolean there = Math.abs(unknowns[node] - volts) < STEP;
      if (lastStep < STEP && there && !state.limited() && isBalanced(state)) {
        return true;
      }
      if (i == most || !factor(state)) {
        return false;
      }
      iterations++;
      double[] f = state.stamps().f;
      Arrays.fill(byDrive, 0);
      for (int row = 0; row < step.length; row++) {
        step[row] = -f[row];
      }
      drive.excite(state, byDrive);
      system.solve(step);
      system.solve(byDrive);
      double moved = (volts - unknowns[node] - step[node]) / byDrive[node];
      for (int k = 0; k < step.length; k++) {
        step[k] += moved * byDrive[k];
      }
      lastStep = move(unknowns);
      if (!(lastStep < LONGEST_STEP)) {
        return false;
      }
      drive.set(state, drive.get(state) + moved);
    }
    return false;
  }

  /** Scalar product over the nodes. */
  double along(double[] direction, double[] vector) {
    double sum = 0;
    for (int node = 0; node < circuit.nodes(); node++) {
      sum += direction[node] * vector[node];
    }
    return sum;
  }

  /** Factors G of the state's last evaluation; false when it is singular. */
  public boolean factor(CircuitState state) {
    return system.factor(state.stamps().g);
  }

  /** Solves with the last factors. */
  public void backSolve(double[] rightHandSide) {
    system.solve(rightHandSide);
  }

  /** Solves with the last factors, transposed. */
  public void backSolveTransposed(double[] rightHandSide) {
    system.solveTransposed(rightHandSide);
  }

  /** Sign of the determinant of the last factors. */
  public int determinantSign() {
    return system.determinantSign();
  }

  /** Name of the node whose balance is worst, for a failure's reason. */
  public String worstNode(CircuitState state) {
    Stamps stamps = state.stamps();
    int worst = 0;
    double most = -1;
    for (int node = 0; node < circuit.nodes(); node++) {
      double relative = Math.abs(stamps.f[node]) / allowed(stamps, node);
      if (relative > most || Double.isNaN(relative)) {
        most = relative;
        worst = node;
      }
    }
    return circuit.nodeName(worst);
  }

  private double move(double[] unknowns) {
    double largest = 0;
    double counted = 0;
    for (int node = 0; node < circuit.nodes(); node++) {
      double size = Math.abs(step[node]);
      largest = Math.max(largest, size);
      // What a double cannot tell from the voltage itself is no step: a current that nothing takes
      // up can drive a node to millions of volts.
      double noise = ROUNDED * Math.ulp(unknowns[node]);
      counted = Math.max(counted, noise > STEP ? size * (STEP / noise) : size);
    }
    if (Double.isNaN(largest) || Arrays.stream(step).anyMatch(Double::isNaN)) {
      return Double.NaN;
    }
    double scale = largest > LONGEST_STEP ? LONGEST_STEP / largest : 1;
    for (int i = 0; i < unknowns.length; i++) {
      unknowns[i] += scale * step[i];
    }
    return counted;
  }

  private boolean isBalanced(CircuitState state) {
    Stamps stamps = state.stamps();
    for (int row = 0; row < stamps.f.length; row++) {
      if (!(Math.abs(stamps.f[row]) <= allowed(stamps, row))) {
        return false;
      }
    }
    return true;
  }

  private static double allowed(Stamps stamps, int row) {
    return Math.max(
        BALANCE * stamps.currentScale[row],
        LEAST_CURRENT + CONDUCTED * stamps.conductanceScale[row]);
  }
}
