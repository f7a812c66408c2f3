package loopwright.predict;

import loopwright.circuit.CircuitState;
import loopwright.quantity.Unit;
import loopwright.solve.GeneratorSignal;
import loopwright.solve.TimeRecord;
import loopwright.solve.Transient;
import loopwright.task.Progress;

/** How long the output takes to come back after the generator drove it into clipping. */
final class Overload {
  private static final int MOST_STEPS = 20_000;
  private static final int RECORDED = 3000;

  /** Longer than this no recovery takes, s. */
  private static final double LONGEST = 10;

  private static final double PATIENCE = 3;
  private static final double LOOK_AGAIN = 1.5;

  private final int out;
  private final double rest;
  private final double start;
  private double furthest;
  private double band;
  private double lastOutside;
  private int steps;
  private final TimeRecord record;

  /**
   * An overload and the recovery from it.
   *
   * @param rest output at rest, V
   * @param width how long the overload lasts, s
   * @param recovery from the generator's return until the output stays near rest, s
   * @param times of the record, the overload beginning at 0, s
   * @param volts the output at those times, V
   */
  record Run(double rest, double width, double recovery, double[] times, double[] volts) {}

  private Overload(int out, double rest, double start) {
    this.out = out;
    this.rest = rest;
    this.start = start;
    this.lastOutside = start;
    this.record = new TimeRecord(RECORDED, out);
  }

  /**
   * Runs the overload and the recovery.
   *
   * @param rest solved, where the generator starts and returns to
   * @param generator voltage of the overload, V
   * @param width how long it lasts, s
   * @param band how near the output must come to rest, as a share of how far it went
   */
  static Run run(
      CircuitState rest, int out, double generator, double width, double band, Progress progress) {
    if (!(width > 0 && width < LONGEST)) {
      throw new UnsolvedException("the output does not move fast enough to be overloaded in time");
    }
    GeneratorSignal pulse = GeneratorSignal.pulse(rest.generator(), generator, 0, 0, width, 0);
    Transient run = new Transient(rest, pulse, Transient.Accuracy.USUAL);
    Overload overload = new Overload(out, rest.voltage(out), width);
    overload.band = band;
    run.advance(width, overload::point, progress);
    double ahead = width / 100;
    while (true) {
      run.advance(width + ahead, overload::point, progress);
      if (PATIENCE * (overload.lastOutside - width) < ahead) {
        return new Run(
            overload.rest,
            width,
            overload.lastOutside - width,
            overload.record.times(),
            overload.record.volts(0));
      }
      if (ahead > LONGEST) {
        throw new UnsolvedException(
            "the output has not recovered after " + Text.of(ahead, Unit.SECOND));
      }
      ahead *= LOOK_AGAIN;
    }
  }

  private void point(double time, CircuitState state) {
    record.point(time, state);
    if (++steps > MOST_STEPS) {
      throw new UnsolvedException(
          "the output has not recovered after " + MOST_STEPS + " time steps");
    }
    double away = Math.abs(state.voltage(out) - rest);
    if (time <= start) {
      furthest = Math.max(furthest, away);
    } else if (away > band * furthest) {
      lastOutside = time;
    }
  }
}
