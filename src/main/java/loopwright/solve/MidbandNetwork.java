package loopwright.solve;

import java.util.Arrays;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Lead;
import loopwright.circuit.VoltageSource;

/**
 * The small-signal circuit at signal frequency at one operating point: blocking capacitors are
 * shorts, all others open. Real arithmetic.
 */
public final class MidbandNetwork {
  private final AssembledHookup hookup;
  private final StaticSolver solver;
  private final double[] byGenerator;
  private final double[] work;

  /**
   * The network at a solved state whose blocking capacitors are held.
   *
   * @param state solved; evaluated again, its unknowns unchanged
   * @throws ArithmeticException when the network is singular there
   */
  public MidbandNetwork(AssembledHookup hookup, CircuitState state) {
    this.hookup = hookup;
    this.solver = new StaticSolver(hookup.circuit());
    this.byGenerator = new double[hookup.circuit().unknowns()];
    this.work = new double[byGenerator.length];
    CircuitState held = state.copy();
    if (held.blocking() != CircuitState.Blocking.HELD) {
      held.holdBlockingCapacitors();
    }
    held.evaluate();
    if (!solver.factor(held)) {
      throw new ArithmeticException("the circuit at signal frequency is singular");
    }
    byGenerator[hookup.generator().branch()] = 1;
    solver.backSolve(byGenerator);
  }

  /** Output over generator. */
  public double gain() {
    return at(byGenerator, hookup.out());
  }

  /**
   * Gains from the two inputs to the output: out = A₊ v(in+) − A₋ v(in−), from two independent
   * excitations, the generator and a voltage in the lead of the inverting input. Where the source
   * drives the inverting input, or nothing comes back, both are out/(v(in+) − v(in−)) under the
   * generator.
   *
   * @return A₊ and A₋
   */
  public double[] twoInputGains() {
    Lead lead = hookup.feedbackLead();
    double out1 = at(byGenerator, hookup.out());
    double plus1 = at(byGenerator, hookup.inPlus());
    double minus1 = at(byGenerator, lead.to());
    if (hookup.isOpen() || hookup.isInverting()) {
      double gain = out1 / (plus1 - minus1);
      return new double[] {gain, gain};
    }
    solve(lead.branch());
    double out2 = at(work, hookup.out());
    double plus2 = at(work, hookup.inPlus());
    double minus2 = at(work, lead.to());
    double determinant = plus2 * minus1 - plus1 * minus2;
    double gainPlus = (out2 * minus1 - out1 * minus2) / determinant;
    double gainMinus = (out2 * plus1 - out1 * plus2) / determinant;
    return new double[] {gainPlus, gainMinus};
  }

  /** Loop gain at signal frequency, see {@link LinearNetwork#loopGain}. */
  public double loopGain() {
    Lead lead = hookup.feedbackLead();
    solve(lead.branch());
    double[] series = interleave(work);
    solve(lead.to());
    return LoopGain.combine(lead, series, interleave(work))[0];
  }

  /**
   * Resistance into the driven terminal with the source removed, Ω; infinite when it takes nothing.
   */
  public double inputResistance() {
    Lead lead = hookup.sourceLead();
    return at(byGenerator, lead.to()) / byGenerator[lead.branch()];
  }

  /**
   * Resistance at a node, Ω.
   *
   * @param node its index
   */
  public double resistanceAt(int node) {
    solve(node);
    return at(work, node);
  }

  /** Output change for one volt more of a supply behind its resistance. */
  public double outputBySupply(VoltageSource supply) {
    solve(supply.branch());
    return at(work, hookup.out());
  }

  private void solve(int row) {
    Arrays.fill(work, 0);
    if (row >= 0) {
      work[row] = 1;
    }
    solver.backSolve(work);
  }

  private static double at(double[] vector, int index) {
    return index < 0 ? 0 : vector[index];
  }

  private static double[] interleave(double[] real) {
    double[] complex = new double[2 * real.length];
    for (int i = 0; i < real.length; i++) {
      complex[2 * i] = real[i];
    }
    return complex;
  }
}
