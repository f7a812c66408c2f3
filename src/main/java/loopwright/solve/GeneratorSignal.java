package loopwright.solve;

/**
 * What the generator does in time. Between two corners it is smooth; at a corner its slope, or it
 * itself, may change at once.
 */
public sealed interface GeneratorSignal permits BreakpointSignal, SineSignal {
  /** Voltage just before a time, V. */
  double before(double time);

  /** Voltage just after a time, V. */
  double after(double time);

  /** The first corner later than a time, s; infinite when there is none. */
  double nextCorner(double time);

  /** Longest step that still follows its curve, s; infinite where it is straight. */
  double longestStep();

  /** A voltage that stays. */
  static GeneratorSignal constant(double volts) {
    return recorded(new double[] {0}, new double[] {volts});
  }

  /** A jump from one voltage to another at a time. */
  static GeneratorSignal step(double from, double to, double at) {
    return recorded(new double[] {at, at}, new double[] {from, to});
  }

  /** A straight way from one voltage to another, held before and after. */
  static GeneratorSignal ramp(double from, double to, double start, double end) {
    return recorded(new double[] {start, end}, new double[] {from, to});
  }

  /**
   * A pulse: from low to high, and back.
   *
   * @param low V
   * @param high V
   * @param start when it begins to rise, s
   * @param rise s; 0 for a jump
   * @param width from the end of the rise to the begin of the fall, s
   * @param fall s; 0 for a jump
   */
  static GeneratorSignal pulse(
      double low, double high, double start, double rise, double width, double fall) {
    double top = start + rise;
    double end = top + width;
    return recorded(
        new double[] {start, top, end, end + fall}, new double[] {low, high, high, low});
  }

  /**
   * A sine that begins at time 0, at the mean and upward; the mean before.
   *
   * @param mean V
   * @param amplitude peak, V
   * @param frequency Hz
   */
  static GeneratorSignal sine(double mean, double amplitude, double frequency) {
    return new SineSignal(mean, amplitude, frequency);
  }

  /**
   * A recorded waveform, straight between its points and held outside them; two points of one time
   * are a jump.
   *
   * @param times s, never falling
   * @param volts as many
   * @throws IllegalArgumentException when the times fall or the lengths differ
   */
  static GeneratorSignal recorded(double[] times, double[] volts) {
    return new BreakpointSignal(times, volts);
  }
}
