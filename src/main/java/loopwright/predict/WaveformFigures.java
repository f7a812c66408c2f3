package loopwright.predict;

import static loopwright.quantity.Unit.ONE;
import static loopwright.quantity.Unit.VOLT;

import java.util.List;

/** What the crossover does to the waveform. */
final class WaveformFigures {
  private WaveformFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "deadZone",
            "Dead zone",
            VOLT,
            "Half the range of v(gainOut) − v(out) over the static waveform: what the loop must make"
                + " up. Two probes and a difference show the same on the bench.",
            "over the waveform",
            "V_BE at the load current for joined bases, twice with drivers; about 0 when biased",
            CostClass.WAVEFORM,
            solution -> FigureValue.of(solution.waveform().deadZone()),
            DeadZoneFormulas::deadZone),
        new Figure(
            "deadZoneAtInput",
            "Dead zone at the input",
            VOLT,
            "Dead zone over open-loop gain.",
            "over the waveform",
            "deadZone/A",
            CostClass.WAVEFORM,
            solution ->
                FigureValue.of(
                    solution.waveform().deadZone()
                        / Catalogue.find("openLoopGain")
                            .orElseThrow()
                            .solve(solution)
                            .number()
                            .orElseThrow(
                                () -> new UnsolvedException("the open-loop gain is missing"))),
            DeadZoneFormulas::atInput),
        new Figure(
            "crossoverError",
            "Crossover error",
            VOLT,
            "Half the peak-to-peak of the static waveform less its mean and fundamental: the residual"
                + " that a distortion meter's monitor output shows.",
            "over the waveform",
            "deadZone/(1 + A/NG): the dead zone divided by 1 + loop gain",
            CostClass.WAVEFORM,
            solution -> {
              Outcome<String> lines = Outcome.of(() -> lines(solution));
              return FigureValue.of(
                  solution.waveform().residual(),
                  lines.isPresent() ? lines.value() : lines.reason());
            },
            DeadZoneFormulas::crossoverError),
        new Figure(
            "thd",
            "Total harmonic distortion",
            ONE,
            "Root of the sum of squares of harmonics 2 to 50 over the fundamental of the static"
                + " waveform.",
            "over the waveform",
            "series of a dead zone within the loop",
            CostClass.WAVEFORM,
            solution -> {
              double ratio = solution.waveform().distortion();
              return FigureValue.of(
                  ratio,
                  "referred to the total output (IEC 60268-3) "
                      + Text.ratio(ratio / Math.sqrt(1 + ratio * ratio)));
            },
            DeadZoneFormulas::distortion));
  }

  /**
   * Lines of the crossover's budget: loop gain by double injection, and what curvature alone
   * leaves.
   */
  private static String lines(HookupSolution solution) {
    if (solution.assembled().isOpen()) {
      return "";
    }
    double noiseGain = solution.gains().noiseGain().orElseThrow();
    double high = GainFigures.mean(solution.midbandHigh());
    double low = GainFigures.mean(solution.midbandLow());
    double gain = 2 / (1 / high + 1 / low);
    double curvature =
        solution.levels().peak()
            / 4
            * Math.abs(1 / high - 1 / low)
            * noiseGain
            / (1 + noiseGain / gain);
    return "loop gain "
        + Text.ratio(solution.midbandHigh().loopGain())
        + " at the high and "
        + Text.ratio(solution.midbandLow().loopGain())
        + " at the low level; curvature of the gain alone "
        + Text.volts(curvature);
  }
}
