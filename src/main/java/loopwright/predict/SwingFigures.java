package loopwright.predict;

import static loopwright.quantity.Unit.VOLT;
import static loopwright.quantity.Unit.VOLT_PER_SECOND;

import java.util.List;

/** How far and how fast the output moves. */
final class SwingFigures {
  private static final String NOT_YET = "not solved by this version: it needs the time domain";

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
        slew("slewFalling", "Slew rate, falling", -1));
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
        solution -> FigureValue.none(NOT_YET),
        solution -> SwingFormulas.slew(solution, direction));
  }

  private static FigureValue clip(ClipLevel level) {
    return FigureValue.of(level.output(), level.says());
  }
}
