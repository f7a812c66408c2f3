package loopwright.predict;

import java.util.Arrays;
import loopwright.circuit.CircuitState;
import loopwright.quantity.Unit;
import loopwright.solve.GeneratorSignal;
import loopwright.solve.Transient;
import loopwright.task.Progress;

/**
 * A step of the generator and what the output makes of it, every step of the solver kept. Where it
 * ends is known beforehand: from the static circuit, blocking capacitors holding their voltage.
 */
final class StepRun {
  /** More than this many steps no answer is worth waiting for. */
  private static final int MOST_STEPS = 20_000;

  /** First look at the output, s. */
  private static final double FIRST_LOOK = 1e-9;

  /** Longer than this no step takes, s. */
  private static final double LONGEST = 10;

  private static final double LOOK_AGAIN = 1.5;

  /** It has settled when it has stayed within its band for this many times the time that took. */
  private static final double PATIENCE = 3;

  private final int out;
  private final double start;
  private final double end;
  private final Transient run;
  private final Progress progress;
  private double[] times = new double[256];
  private double[] volts = new double[256];
  private int count;

  /**
   * @param from solved state where the generator stands before the step
   * @param to generator voltage after the step, V
   * @param end where the output should come to, V
   */
  StepRun(
      CircuitState from,
      int out,
      double to,
      double end,
      Transient.Accuracy accuracy,
      Progress progress) {
    this.out = out;
    this.start = from.voltage(out);
    this.end = end;
    this.run = new Transient(from, GeneratorSignal.constant(to), accuracy);
    this.progress = progress;
  }

  private void look() {
    if (run.time() > LONGEST) {
      throw new UnsolvedException(
          "the output has not come to "
              + Text.volts(end)
              + " after "
              + Text.of(LONGEST, Unit.SECOND));
    }
    run.advance(Math.max(FIRST_LOOK, run.time() * LOOK_AGAIN), this::keep, progress);
  }

  private void keep(double time, CircuitState state) {
    if (count == times.length) {
      times = Arrays.copyOf(times, 2 * count);
      volts = Arrays.copyOf(volts, 2 * count);
    }
    times[count] = time;
    volts[count++] = state.voltage(out);
    if (count > MOST_STEPS) {
      throw new UnsolvedException(
          "the output has not come to " + Text.volts(end) + " after " + MOST_STEPS + " time steps");
    }
  }

  /**
   * Mean slope between 10 % and 90 % of the way, V/s: from the last passage of 10 % before the
   * first of 90 %, since the step itself may come through capacitances before the amplifier moves.
   */
  double slope() {
    int late = firstBeyond(0.9);
    int early = late;
    while (early > 1 && beyond(early - 1, 0.1)) {
      early--;
    }
    return 0.8 * Math.abs(end - start) / (passage(late, 0.9) - passage(early, 0.1));
  }

  private int firstBeyond(double share) {
    int k = 1;
    while (true) {
      for (; k < count; k++) {
        if (beyond(k, share)) {
          return k;
        }
      }
      look();
    }
  }

  private boolean beyond(int point, double share) {
    return (volts[point] - start) / (end - start) >= share;
  }

  /** When a share of the way was passed, between the point before and a point, s. */
  private double passage(int point, double share) {
    double level = start + share * (end - start);
    double rise = volts[point] - volts[point - 1];
    double part = rise == 0 ? 1 : (level - volts[point - 1]) / rise;
    return times[point - 1] + Math.max(0, Math.min(1, part)) * (times[point] - times[point - 1]);
  }

  /** When the output has come within a share of the step about its end to stay, s. */
  double settling(double band) {
    while (true) {
      double last = lastOutside(band);
      if (count > 1 && last < run.time() / PATIENCE) {
        return last;
      }
      look();
    }
  }

  /** How far the output goes beyond its end, as a share of the step; call after settling. */
  double overshoot() {
    double most = 0;
    for (int k = 0; k < count; k++) {
      most = Math.max(most, (volts[k] - end) / (end - start));
    }
    return most;
  }

  private double lastOutside(double band) {
    double width = band * Math.abs(end - start);
    for (int k = count - 1; k > 0; k--) {
      double away = Math.abs(volts[k] - end);
      if (away > width) {
        if (k == count - 1) {
          return times[k];
        }
        double part = (away - width) / (away - Math.abs(volts[k + 1] - end));
        return times[k] + part * (times[k + 1] - times[k]);
      }
    }
    return 0;
  }

  /** Times of the steps, s. */
  double[] times() {
    return Arrays.copyOf(times, count);
  }

  /** The output at those times, V. */
  double[] volts() {
    return Arrays.copyOf(volts, count);
  }

  /** The output before the step, V. */
  double start() {
    return start;
  }

  /** Where the output should come to, V. */
  double end() {
    return end;
  }
}
