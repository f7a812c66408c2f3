package loopwright.solve;

import loopwright.assembly.AssembledHookup;

/** The small-signal circuit of a hookup: its response and its loop gain. */
public final class LinearNetwork extends SmallSignalCircuit {
  private final AssembledHookup hookup;

  /** A network of a hookup's circuit; {@link #linearise} fills it. */
  public LinearNetwork(AssembledHookup hookup) {
    super(hookup.circuit());
    this.hookup = hookup;
  }

  /** The hookup. */
  public AssembledHookup hookup() {
    return hookup;
  }

  /**
   * Output over generator.
   *
   * @param frequency Hz
   * @return real and imaginary part; NaN where the network is singular
   */
  public double[] response(double frequency) {
    return response(frequency, hookup.generator().branch(), hookup.out());
  }

  /**
   * Loop gain in the lead of the inverting input.
   *
   * @param frequency Hz
   * @return real and imaginary part; NaN where the network is singular
   */
  public double[] loopGain(double frequency) {
    return loopGain(frequency, hookup.feedbackLead());
  }
}
