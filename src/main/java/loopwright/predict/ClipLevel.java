package loopwright.predict;

import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.circuit.Transistor;
import loopwright.solve.GeneratorWalk;

/**
 * Where the output stops following: outward from a level, where the incremental gain first leaves
 * ±1 dB of its value there, or the output jumps.
 *
 * @param output V
 * @param says how it ends and which device's transconductance changed most
 */
record ClipLevel(double output, String says) {
  private static final double ONE_DECIBEL = Math.pow(10, 1.0 / 20);
  private static final int STEPS_PER_SPAN = 200;

  /** A device below this at both ends takes no part, S. */
  private static final double LEAST_TRANSCONDUCTANCE = 1e-6;

  /**
   * Walks outward.
   *
   * @param start solved level, blocking capacitors held
   * @param direction of the output: 1 upward, −1 downward
   */
  static ClipLevel outward(
      AssembledHookup hookup, HookupGains gains, CircuitState start, int direction) {
    double span =
        hookup.design().rails().positive().value() - hookup.design().rails().negative().value();
    GeneratorWalk walk = new GeneratorWalk(hookup, start, span / STEPS_PER_SPAN);
    double gain = walk.gain();
    if (!(Math.abs(gain) > 0)) {
      throw new UnsolvedException("the output does not follow the generator at this level");
    }
    int sense = direction * (gain > 0 ? 1 : -1);
    double limit =
        start.generator() + sense * (4 * span / Math.abs(gain) + 4 * span / gains.inputRatio());
    double stride = span / STEPS_PER_SPAN / Math.abs(gain);
    CircuitState before = start.copy();
    while (walk.generator() != limit) {
      before.copyFrom(walk.state());
      double next = walk.generator() + sense * stride;
      double target = sense * (limit - next) > 0 ? next : limit;
      boolean arrived = walk.advance(target);
      if (!arrived && !leaves(walk.gain(), gain)) {
        return new ClipLevel(
            walk.output(),
            "jumps at "
                + Text.volts(walk.output())
                + "; "
                + mostChanged(hookup, start, walk.state()));
      }
      if (!arrived || leaves(walk.gain(), gain)) {
        GeneratorWalk edge = bisect(hookup, before, walk.generator(), gain);
        return new ClipLevel(edge.output(), mostChanged(hookup, start, edge.state()));
      }
    }
    throw new UnsolvedException("the gain stays within 1 dB as far as the generator can drive");
  }

  private static boolean leaves(double gain, double reference) {
    double ratio = gain / reference;
    return !(ratio > 1 / ONE_DECIBEL && ratio < ONE_DECIBEL);
  }

  private static GeneratorWalk bisect(
      AssembledHookup hookup, CircuitState inside, double outside, double gain) {
    double far = outside;
    GeneratorWalk near = new GeneratorWalk(hookup, inside, Math.abs(far - inside.generator()));
    double tolerance = 1e-12 * Math.max(1e-3, Math.abs(far));
    while (Math.abs(far - near.generator()) > tolerance) {
      double middle = (near.generator() + far) / 2;
      GeneratorWalk walk =
          new GeneratorWalk(hookup, near.state(), Math.abs(far - near.generator()));
      if (walk.advance(middle) && !leaves(walk.gain(), gain)) {
        near = walk;
      } else {
        far = middle;
      }
    }
    return near;
  }

  private static String mostChanged(AssembledHookup hookup, CircuitState from, CircuitState to) {
    String device = "";
    double most = 0;
    for (Element element : hookup.circuit().elements()) {
      if (element instanceof Transistor transistor) {
        double before = transistor.transconductance(from);
        double after = transistor.transconductance(to);
        double change = Math.abs(Math.log(Math.abs(after / before)));
        if (Math.max(before, after) > LEAST_TRANSCONDUCTANCE && change > most) {
          most = change;
          device = transistor.name();
        }
      }
    }
    return device.isEmpty()
        ? "the amplifier's stated limit"
        : device + " changes its transconductance most";
  }
}
