package loopwright.predict;

import static loopwright.quantity.Unit.HERTZ;
import static loopwright.quantity.Unit.ONE;
import static loopwright.quantity.Unit.SECOND;
import static loopwright.quantity.Unit.VOLT;
import static loopwright.quantity.Unit.VOLT_PER_SECOND;

import java.util.List;

/** How far and how fast the output moves. */
final class SwingFigures {
  private SwingFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "clipHigh",
            "Highest output",
            VOLT,
            "Going up from the high level, where the incremental gain first leaves ±1 dB of its value"
                + " there, or the output jumps.",
            "beyond the high level",
            "rail less saturation and drops, or the limit of the current that is left",
            CostClass.WAVEFORM,
            solution -> clip(solution.clipHigh()),
            solution -> SwingFormulas.clip(solution, 1)),
        new Figure(
            "clipLow",
            "Lowest output",
            VOLT,
            "Going down from the low level, where the incremental gain first leaves ±1 dB of its value"
                + " there, or the output jumps.",
            "beyond the low level",
            "rail less saturation and drops, or the limit of the current that is left",
            CostClass.WAVEFORM,
            solution -> clip(solution.clipLow()),
            solution -> SwingFormulas.clip(solution, -1)),
        slew("slewRising", "Slew rate, rising", 1),
        slew("slewFalling", "Slew rate, falling", -1),
        new Figure(
            "fullPowerBandwidth",
            "Full-power bandwidth",
            HERTZ,
            "Highest frequency at which a sine of the hookup's peak output is nowhere steeper than"
                + " the slower slew rate.",
            "large step",
            "slew rate/(2π P), the slower one",
            CostClass.TIME,
            solution ->
                fullPower(
                    solution,
                    Math.min(solution.largeSignal().slew(1), solution.largeSignal().slew(-1))),
            SwingFigures::fullPowerByFormula),
        new Figure(
            "overshoot",
            "Overshoot",
            ONE,
            "How far the output goes beyond its end on a small step, a tenth of P upward from rest, as"
                + " a share of the step.",
            "small step from rest",
            "",
            CostClass.TIME,
            solution -> FigureValue.of(solution.largeSignal().overshoot()),
            NoFormula.ROAD),
        new Figure(
            "settlingTime",
            "Settling time",
            SECOND,
            "From a small step, a tenth of P upward from rest, until the output stays within 1 % of the"
                + " step about its end.",
            "small step from rest",
            "",
            CostClass.TIME,
            solution -> FigureValue.of(solution.largeSignal().settling(), "to 1 % of the step"),
            NoFormula.ROAD),
        recovery("recoveryHigh", "Recovery from clipping, above", 1),
        recovery("recoveryLow", "Recovery from clipping, below", -1));
  }

  private static Figure slew(String key, String label, int direction) {
    return new Figure(
        key,
        label,
        VOLT_PER_SECOND,
        "10 % to 90 % of a step over 0.8 of the range between lowest and highest output.",
        "large step",
        "current that the pair can give/(C_c + C_cb + strays) (Solomon 1974)",
        CostClass.TIME,
        solution -> FigureValue.of(solution.largeSignal().slew(direction)),
        solution -> SwingFormulas.slew(solution, direction));
  }

  private static Figure recovery(String key, String label, int direction) {
    return new Figure(
        key,
        label,
        SECOND,
        "After the generator went half as far again as brings the output to its limit, and stayed"
            + " there: from its return to rest until the output stays within 1 % of how far it was"
            + " away.",
        "from beyond clipping",
        "",
        CostClass.TIME,
        solution -> FigureValue.of(solution.largeSignal().recovery(direction)),
        NoFormula.ROAD);
  }

  private static FigureValue fullPower(HookupSolution solution, double slew) {
    double peak = Levels.nominalPeak(solution.assembled(), solution.gains());
    return FigureValue.of(slew / (2 * Math.PI * peak), "at a peak of " + Text.volts(peak));
  }

  private static FigureValue fullPowerByFormula(HookupSolution solution) {
    FigureValue rising = SwingFormulas.slew(solution, 1);
    FigureValue falling = SwingFormulas.slew(solution, -1);
    if (rising.number().isEmpty() || falling.number().isEmpty()) {
      return rising.number().isEmpty() ? rising : falling;
    }
    return fullPower(
        solution, Math.min(rising.number().getAsDouble(), falling.number().getAsDouble()));
  }

  private static FigureValue clip(ClipLevel level) {
    return FigureValue.of(level.output(), level.says());
  }
}
