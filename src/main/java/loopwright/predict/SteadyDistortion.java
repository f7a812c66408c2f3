package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.assembly.DeviceModels;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.solve.GeneratorSignal;
import loopwright.solve.Transient;
import loopwright.task.Progress;

/**
 * Distortion at the hookup's frequency and amplitude in a steady state, every capacitance in place:
 * the generator's sine runs until two periods are alike.
 *
 * @param hookup name
 * @param frequency Hz
 * @param amplitude of the generator, peak, V
 * @param thd root of the sum of squares of harmonics 2 to 50 over the fundamental; empty where
 *     there is no steady state
 * @param staticThd the same without capacitances, or why there is none
 * @param harmonics peak values, V, index 0 the mean; empty without a steady state
 * @param output one period of the output from the sine's zero upward, V; empty likewise
 * @param residual the same less its mean and fundamental, V
 * @param periods how many were run
 * @param change largest difference between the last two periods, as a share of the fundamental
 * @param says why there is none, or empty
 */
public record SteadyDistortion(
    String hookup,
    double frequency,
    double amplitude,
    OptionalDouble thd,
    FigureValue staticThd,
    List<Double> harmonics,
    List<Double> output,
    List<Double> residual,
    int periods,
    OptionalDouble change,
    String says) {
  /** Two periods are alike when they differ by less than this share of the fundamental. */
  public static final double ALIKE = 1e-5;

  private static final int POINTS = 1024;
  private static final int MOST_PERIODS = 40;

  /** Keeps its own copies. */
  public SteadyDistortion {
    harmonics = List.copyOf(harmonics);
    output = List.copyOf(output);
    residual = List.copyOf(residual);
  }

  /**
   * Runs a hookup.
   *
   * @param design a valid design, every part it names among its own
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  public static SteadyDistortion of(Design design, Hookup hookup, Progress progress) {
    HookupSolution solution = new HookupSolution(design, hookup, new DeviceModels(design));
    FigureValue still = Catalogue.find("thd").orElseThrow().solve(solution);
    Run run = new Run(solution, progress);
    Outcome<Harmonics> harmonics = Outcome.of(run::untilSteady);
    if (!harmonics.isPresent()) {
      return run.result(still, null, harmonics.reason());
    }
    return run.result(still, harmonics.value(), "");
  }

  /** The periods of one hookup. */
  private static final class Run {
    private final HookupSolution solution;
    private final Progress progress;
    private final double frequency;
    private final double amplitude;
    private final double[] period = new double[POINTS];
    private int periods;
    private double change = Double.NaN;

    Run(HookupSolution solution, Progress progress) {
      this.solution = solution;
      this.progress = progress;
      this.frequency = solution.hookup().source().frequency().value();
      this.amplitude = solution.hookup().source().amplitude().value();
    }

    Harmonics untilSteady() {
      if (amplitude == 0) {
        throw new UnsolvedException("the source has no amplitude");
      }
      String grows = solution.swing().says();
      if (!grows.isEmpty()) {
        // Long steps would damp what grows, and show a steady state that there is not.
        throw new UnsolvedException("no steady state: something " + grows);
      }
      CircuitState rest = solution.levels().rest();
      int out = solution.assembled().out();
      Transient run =
          new Transient(
              rest,
              GeneratorSignal.sine(rest.generator(), amplitude, frequency),
              Transient.Accuracy.FINE);
      double[] before = new double[POINTS];
      while (periods < MOST_PERIODS) {
        System.arraycopy(period, 0, before, 0, POINTS);
        for (int k = 0; k < POINTS; k++) {
          run.advance((periods + (double) k / POINTS) / frequency, (t, state) -> {}, quiet());
          period[k] = run.state().voltage(out);
        }
        periods++;
        progress.report((double) periods / MOST_PERIODS, "period " + periods);
        Harmonics harmonics = new Harmonics(period);
        if (periods > 1) {
          change = difference(before, period) / harmonics.peak(1);
          if (change < ALIKE) {
            return harmonics;
          }
        }
      }
      throw new UnsolvedException(
          "no steady state after "
              + periods
              + " periods: the last two differ by "
              + Text.ratio(change)
              + " of the fundamental");
    }

    /** Passes on only the question whether the result is still wanted. */
    private Progress quiet() {
      return new Progress() {
        @Override
        public void report(double share, String says) {
          // The periods are what is reported.
        }

        @Override
        public boolean cancelled() {
          return progress.cancelled();
        }
      };
    }

    private static double difference(double[] one, double[] other) {
      double most = 0;
      for (int k = 0; k < one.length; k++) {
        most = Math.max(most, Math.abs(one[k] - other[k]));
      }
      return most;
    }

    SteadyDistortion result(FigureValue still, Harmonics harmonics, String says) {
      List<Double> peaks = new ArrayList<>();
      for (int n = 0; harmonics != null && n <= Harmonics.HIGHEST; n++) {
        peaks.add(harmonics.peak(n));
      }
      return new SteadyDistortion(
          solution.hookup().name(),
          frequency,
          amplitude,
          harmonics == null ? OptionalDouble.empty() : OptionalDouble.of(harmonics.distortion()),
          still,
          peaks,
          harmonics == null ? List.of() : boxed(period),
          harmonics == null ? List.of() : boxed(harmonics.residual()),
          periods,
          Double.isNaN(change) ? OptionalDouble.empty() : OptionalDouble.of(change),
          says);
    }

    private static List<Double> boxed(double[] values) {
      List<Double> list = new ArrayList<>(values.length);
      for (double value : values) {
        list.add(value);
      }
      return list;
    }
  }
}
