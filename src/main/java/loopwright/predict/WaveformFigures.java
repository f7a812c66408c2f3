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
            NoFormula.ROAD),
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
            NoFormula.ROAD),
        new Figure(
            "crossoverError",
            "Crossover error",
            VOLT,
            "Half the peak-to-peak of the static waveform less its mean and fundamental: the residual"
                + " that a distortion meter's monitor output shows.",
            "over the waveform",
            "deadZone/(1 + A/NG): the dead zone divided by 1 + loop gain",
            CostClass.WAVEFORM,
            solution -> FigureValue.of(solution.waveform().residual()),
            NoFormula.ROAD),
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
            NoFormula.ROAD));
  }
}
