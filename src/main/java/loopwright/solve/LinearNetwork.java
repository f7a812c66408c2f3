package loopwright.solve;

import java.util.Arrays;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Lead;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.DenseComplexSystem;
import loopwright.numeric.SparsityPattern;

/**
 * The small-signal circuit (G + sC) x = b at one operating point, every capacitor in place. It owns
 * its work arrays and serves one thread.
 */
public final class LinearNetwork {
  private final AssembledHookup hookup;
  private final ComplexSystem system;
  private final double[] g;
  private final double[] c;
  private final double[] first;
  private final double[] second;

  /** A network of a hookup's circuit; {@link #linearise} fills it. */
  public LinearNetwork(AssembledHookup hookup) {
    SparsityPattern pattern = hookup.circuit().pattern();
    this.hookup = hookup;
    this.system = new DenseComplexSystem(pattern);
    this.g = new double[pattern.slots()];
    this.c = new double[pattern.slots()];
    this.first = new double[2 * pattern.size()];
    this.second = new double[2 * pattern.size()];
  }

  /**
   * Takes the network at a solved state. Blocking capacitors become capacitors, whatever they held.
   *
   * @param state solved; evaluated again, its unknowns unchanged
   */
  public void linearise(CircuitState state) {
    CircuitState open = state.copy();
    open.openBlockingCapacitors();
    open.evaluate();
    System.arraycopy(open.stamps().g, 0, g, 0, g.length);
    System.arraycopy(open.stamps().c, 0, c, 0, c.length);
  }

  /** The hookup. */
  public AssembledHookup hookup() {
    return hookup;
  }

  /** Pattern of G and C. */
  public SparsityPattern pattern() {
    return hookup.circuit().pattern();
  }

  /** G by slot; not to be changed. */
  public double[] g() {
    return g;
  }

  /** C by slot; not to be changed. */
  public double[] c() {
    return c;
  }

  /**
   * Output over generator.
   *
   * @param frequency Hz
   * @return real and imaginary part; NaN where the network is singular
   */
  public double[] response(double frequency) {
    if (!system.factor(g, c, 0, 2 * Math.PI * frequency)) {
      return new double[] {Double.NaN, Double.NaN};
    }
    Arrays.fill(first, 0);
    first[2 * hookup.generator().branch()] = 1;
    system.solve(first);
    int out = hookup.out();
    return new double[] {first[2 * out], first[2 * out + 1]};
  }

  /**
   * Loop gain by double injection in the lead of the inverting input (Middlebrook, International
   * Journal of Electronics 38, 1975, 485–512): T_v = −v(network side)/v(amplifier side) with a
   * series voltage; T_i = i into the network/i into the amplifier with a current into the
   * amplifier's side; T = (T_v T_i − 1)/(T_v + T_i + 2).
   *
   * @param frequency Hz
   * @return real and imaginary part; NaN where the network is singular
   */
  public double[] loopGain(double frequency) {
    if (!system.factor(g, c, 0, 2 * Math.PI * frequency)) {
      return new double[] {Double.NaN, Double.NaN};
    }
    Lead lead = hookup.feedbackLead();
    Arrays.fill(first, 0);
    first[2 * lead.branch()] = 1;
    system.solve(first);
    Arrays.fill(second, 0);
    second[2 * lead.to()] = 1;
    system.solve(second);
    return LoopGain.combine(lead, first, second);
  }
}
