package loopwright.solve;

import loopwright.circuit.CircuitState;
import loopwright.numeric.TrBdf2;
import loopwright.task.Progress;

/**
 * A circuit in time, every charge in place and every device in full, from any solved state on. The
 * generator's corners are hit exactly; the steps between follow from the error that is allowed.
 *
 * <p>A balance that is not stable is left only when something disturbs it, and steps that are long
 * against the time in which a disturbance grows damp it instead: ask the natural frequencies before
 * trusting a run that stays quiet.
 *
 * <p>It keeps only the present point: what is to be remembered is for a {@link Sink} to say, such
 * as {@link TimeRecord}. It owns its work arrays and serves one thread.
 */
public final class Transient {
  /** First step after a start or a jump, s; steps grow fast from there. */
  private static final double FIRST_STEP = 1e-12;

  /** What counts as no time at all, s. */
  private static final double INSTANT = 1e-15;

  private static final int STEPS_BETWEEN_REPORTS = 256;
  private static final long MOST_STEPS = 20_000_000;

  /**
   * What a step may be off.
   *
   * @param relative share of how far an unknown has moved since the start
   * @param volts and so much more, for a node, V
   * @param amperes and so much more, for the current of an inductor, A
   */
  public record Accuracy(double relative, double volts, double amperes) {
    /** For waveforms to look at and figures of three digits. */
    public static final Accuracy USUAL = new Accuracy(1e-4, 1e-6, 1e-9);

    /** For what is small beside the waveform, such as its harmonics. */
    public static final Accuracy FINE = new Accuracy(1e-6, 1e-8, 1e-11);
  }

  /** Who looks at every step. */
  @FunctionalInterface
  public interface Sink {
    /**
     * A step was taken.
     *
     * @param time s
     * @param state the circuit there; it moves on, and is neither to be kept nor changed
     */
    void point(double time, CircuitState state);
  }

  private final CircuitState state;
  private final GeneratorSignal signal;
  private final CircuitEquations equations;
  private final TrBdf2 integrator;
  private boolean started;

  /**
   * A run from time 0.
   *
   * @param start a solved state, which stays as it is; blocking capacitors begin with the voltage
   *     that they have there
   * @param signal what the generator does; a difference to where it stands at the start is a jump
   *     at time 0
   */
  public Transient(CircuitState start, GeneratorSignal signal, Accuracy accuracy) {
    this.state = start.copy();
    this.signal = signal;
    state.openBlockingCapacitors();
    state.setMoving(true);
    this.equations = new CircuitEquations(state, signal, accuracy);
    this.integrator = new TrBdf2(equations, accuracy.relative());
  }

  /** Present time, s. */
  public double time() {
    return integrator.time();
  }

  /** The circuit at the present time; it moves on with the run. */
  public CircuitState state() {
    return state;
  }

  /** Steps taken so far. */
  public long steps() {
    return integrator.accepted();
  }

  /**
   * Runs on.
   *
   * @param until time to stop at exactly, s
   * @param sink told of the point at time 0, of every step, and of both sides of a jump
   * @param progress told of the share of this call's way, and asked whether it is still wanted
   * @throws ArithmeticException when some step finds no solution; the message says when
   * @throws loopwright.task.CancelledException when nobody wants it any more
   */
  public void advance(double until, Sink sink, Progress progress) {
    double from = time();
    if (!started) {
      begin(sink);
    }
    for (long steps = 0; time() < until; steps++) {
      if (steps % STEPS_BETWEEN_REPORTS == 0) {
        progress.check();
        progress.report((time() - from) / (until - from), "in time");
      }
      if (integrator.accepted() >= MOST_STEPS) {
        throw new ArithmeticException(
            "the circuit takes more than " + MOST_STEPS + " steps to " + time() + " s");
      }
      double corner = signal.nextCorner(time());
      integrator.step(Math.min(until, corner), signal.longestStep());
      sink.point(time(), state);
      if (time() == corner && signal.after(corner) != signal.before(corner)) {
        jump(sink);
      }
    }
  }

  private void begin(Sink sink) {
    started = true;
    boolean jumps = state.generator() != signal.after(0);
    integrator.start(0, FIRST_STEP);
    sink.point(0, state);
    if (jumps) {
      jump(sink);
    }
  }

  private void jump(Sink sink) {
    equations.setAfterJump(true);
    integrator.jump(INSTANT, FIRST_STEP);
    equations.setAfterJump(false);
    sink.point(time(), state);
  }
}
