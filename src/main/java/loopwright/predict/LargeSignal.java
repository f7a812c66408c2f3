package loopwright.predict;

import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.solve.Transient.Accuracy;
import loopwright.task.Progress;

/**
 * The large and the small step of a hookup and its recovery from clipping, each run when it is
 * first asked for.
 */
final class LargeSignal {
  /** Share of the range between lowest and highest output that the large step covers. */
  private static final double RANGE = 0.8;

  /** The small step as a share of P. */
  private static final double SMALL = 0.1;

  /** How far beyond what clips the generator goes in the overload. */
  private static final double OVERLOAD = 1.5;

  /** How long the overload lasts, in settling times and in times of the large step. */
  private static final double LASTS = 10;

  /** Band within which the output has settled, as a share of the step. */
  static final double BAND = 0.01;

  private final HookupSolution solution;
  private final Progress progress;
  private final Lazy<CircuitState> low;
  private final Lazy<CircuitState> high;
  private final Lazy<StepRun> rising;
  private final Lazy<StepRun> falling;
  private final Lazy<StepRun> small;
  private final Lazy<Overload.Run> above;
  private final Lazy<Overload.Run> below;

  LargeSignal(HookupSolution solution, Progress progress) {
    this.solution = solution;
    this.progress = progress;
    this.low = new Lazy<>(() -> end(-1));
    this.high = new Lazy<>(() -> end(1));
    this.rising = new Lazy<>(() -> step(low.get(), high.get(), Accuracy.USUAL));
    this.falling = new Lazy<>(() -> step(high.get(), low.get(), Accuracy.USUAL));
    this.small = new Lazy<>(this::smallStep);
    this.above = new Lazy<>(() -> overload(1));
    this.below = new Lazy<>(() -> overload(-1));
  }

  /** The circuit where the large step ends: direction 1 upward, −1 downward. */
  private CircuitState end(int direction) {
    double top = solution.clipHigh().output();
    double bottom = solution.clipLow().output();
    double level = (top + bottom) / 2 + direction * RANGE / 2 * (top - bottom);
    return reach(level);
  }

  private CircuitState reach(double output) {
    CircuitState state =
        Levels.reach(solution.assembled(), solution.gains(), solution.levels().rest(), output);
    if (state == null) {
      throw new UnsolvedException("the generator cannot bring the output to " + Text.volts(output));
    }
    return state;
  }

  private StepRun step(CircuitState from, CircuitState to, Accuracy accuracy) {
    AssembledHookup hookup = solution.assembled();
    return new StepRun(
        from, hookup.out(), to.generator(), to.voltage(hookup.out()), accuracy, progress);
  }

  private StepRun smallStep() {
    CircuitState from = solution.linearRest();
    double rest = from.voltage(solution.assembled().out());
    return step(from, reach(rest + SMALL * solution.levels().peak()), Accuracy.USUAL);
  }

  /** Slope of the large step, V/s: direction 1 rising, −1 falling. */
  double slew(int direction) {
    return (direction > 0 ? rising : falling).get().slope();
  }

  /** The small step from rest, upward. */
  StepRun small() {
    return small.get();
  }

  /** The large step: direction 1 rising, −1 falling. */
  StepRun large(int direction) {
    return (direction > 0 ? rising : falling).get();
  }

  /** From the small step until the output stays within its band, s; nothing may grow at rest. */
  double settling() {
    if (solution.poles().stream().anyMatch(pole -> pole.grows())) {
      throw new UnsolvedException("something grows at rest");
    }
    return small().settling(BAND);
  }

  /** Overshoot of the small step, as a share of it. */
  double overshoot() {
    settling();
    return small().overshoot();
  }

  /**
   * From the end of an overload until the output is back at rest to stay, s: direction 1 for an
   * overload upward.
   */
  double recovery(int direction) {
    return overloaded(direction).recovery();
  }

  /** The overload itself: direction 1 upward, −1 downward. */
  Overload.Run overloaded(int direction) {
    return (direction > 0 ? above : below).get();
  }

  private Overload.Run overload(int direction) {
    CircuitState rest = solution.linearRest();
    CircuitState edge = (direction > 0 ? high : low).get();
    int out = solution.assembled().out();
    double beyond = OVERLOAD / RANGE * (edge.generator() - rest.generator());
    double width =
        LASTS * (settling() + Math.abs(edge.voltage(out) - rest.voltage(out)) / slew(direction));
    return Overload.run(rest, out, rest.generator() + beyond, width, BAND, progress);
  }
}
