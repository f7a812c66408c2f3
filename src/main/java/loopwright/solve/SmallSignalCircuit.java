package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Lead;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.SparsityPattern;
import loopwright.numeric.SystemFamily;

/**
 * The small-signal circuit (G + sC) x = b at one operating point, every capacitor in place. It owns
 * its work arrays and serves one thread.
 */
public class SmallSignalCircuit {
  private final Circuit circuit;
  private final ComplexSystem system;
  private final double[] g;
  private final double[] c;
  private final double[] first;
  private final double[] second;
  private final int[] wantedOne = new int[1];
  private final int[] wantedOfLead = new int[3];

  /** The small-signal form of a circuit; {@link #linearise} fills it. */
  public SmallSignalCircuit(Circuit circuit) {
    SparsityPattern pattern = circuit.pattern();
    this.circuit = circuit;
    this.system = circuit.systems().complex();
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
  public final void linearise(CircuitState state) {
    CircuitState open = state.copy();
    open.openBlockingCapacitors();
    open.evaluate();
    System.arraycopy(open.stamps().g, 0, g, 0, g.length);
    System.arraycopy(open.stamps().c, 0, c, 0, c.length);
  }

  /** Pattern of G and C. */
  public final SparsityPattern pattern() {
    return circuit.pattern();
  }

  /** The systems of this circuit's pattern. */
  final SystemFamily systems() {
    return circuit.systems();
  }

  /** Argument of det(G + sC) at the s that was solved last, rad, up to a multiple of 2π. */
  public final double determinantArgument() {
    return system.determinantArgument();
  }

  /** G by slot; not to be changed. */
  public final double[] g() {
    return g;
  }

  /** C by slot; not to be changed. */
  public final double[] c() {
    return c;
  }

  /**
   * What an excitation of 1 in a row gives in an unknown: for a node's row an ampere into it, for a
   * source's branch a volt more of it.
   *
   * @param frequency Hz
   * @param row the row excited
   * @param unknown the unknown read; −1, ground, reads zero
   * @return real and imaginary part; NaN where the network is singular
   */
  public final double[] response(double frequency, int row, int unknown) {
    return responseAt(0, 2 * Math.PI * frequency, row, unknown);
  }

  /**
   * The same anywhere on the plane of complex frequency.
   *
   * @param re growth, 1/s
   * @param im angular frequency, rad/s
   * @param row the row excited
   * @param unknown the unknown read; −1, ground, reads zero
   * @return real and imaginary part; NaN where the network is singular
   */
  public final double[] responseAt(double re, double im, int row, int unknown) {
    if (!system.factor(g, c, re, im)) {
      return new double[] {Double.NaN, Double.NaN};
    }
    wantedOne[0] = unknown;
    system.solveOne(row, wantedOne, first);
    return unknown < 0
        ? new double[] {0, 0}
        : new double[] {first[2 * unknown], first[2 * unknown + 1]};
  }

  /**
   * What an excitation of 1 in each row gives in one unknown, for all rows at once: one solution of
   * the transposed system, which is that of the adjoint network (Director and Rohrer, IEEE
   * Transactions on Circuit Theory 16, 1969, 318–323).
   *
   * @param frequency Hz
   * @param unknown the unknown read; not ground
   * @return interleaved by row; valid until the next solution, not to be changed
   * @throws ArithmeticException when the network is singular there
   */
  public final double[] transfersTo(double frequency, int unknown) {
    if (!system.factor(g, c, 0, 2 * Math.PI * frequency)) {
      throw new ArithmeticException("the small-signal circuit is singular at " + frequency + " Hz");
    }
    Arrays.fill(first, 0);
    first[2 * unknown] = 1;
    system.solveTransposed(first);
    return first;
  }

  /**
   * Loop gain by double injection in a lead (Middlebrook, International Journal of Electronics 38,
   * 1975, 485–512): T_v = −v(network side)/v(amplifier side) with a series voltage; T_i = i into
   * the network/i into the amplifier with a current into the amplifier's side; T = (T_v T_i −
   * 1)/(T_v + T_i + 2).
   *
   * @param frequency Hz
   * @return real and imaginary part; NaN where the network is singular
   */
  public final double[] loopGain(double frequency, Lead lead) {
    if (!system.factor(g, c, 0, 2 * Math.PI * frequency)) {
      return new double[] {Double.NaN, Double.NaN};
    }
    wantedOfLead[0] = lead.from();
    wantedOfLead[1] = lead.to();
    wantedOfLead[2] = lead.branch();
    system.solveOne(lead.branch(), wantedOfLead, first);
    system.solveOne(lead.to(), wantedOfLead, second);
    return LoopGain.combine(lead, first, second);
  }
}
