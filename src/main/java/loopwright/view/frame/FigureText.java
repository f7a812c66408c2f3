package loopwright.view.frame;

import java.util.Optional;
import loopwright.design.Reading;
import loopwright.predict.Figure;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.quantity.EngineeringFormat;

/** How figures read: at most four digits in the table, everything else on hover. */
final class FigureText {
  /** Distortion alone of all ratios is spoken of in per cent. */
  private static final String IN_PER_CENT = "thd";

  /** Where formula and solution part by more than this, relatively, it is worth a look. */
  private static final double PARTING = 0.1;

  private FigureText() {}

  /** The value to at most four digits, with its unit. */
  static String shortly(Figure figure, double value) {
    return figure.key().equals(IN_PER_CENT)
        ? EngineeringFormat.percent(value)
        : EngineeringFormat.format(value, figure.unit());
  }

  /** The value with every digit that means something to a program. */
  static String fully(Figure figure, double value) {
    return EngineeringFormat.full(value, figure.unit());
  }

  /** By how much the formula is away from the solution, relatively, where that is worth a look. */
  static Optional<Double> parting(FigureResult result) {
    if (result.formula().number().isEmpty() || result.solved().number().isEmpty()) {
      return Optional.empty();
    }
    return difference(
            result.formula().number().getAsDouble(), result.solved().number().getAsDouble())
        .filter(share -> Math.abs(share) > PARTING);
  }

  /** What the name of a figure says on hover. */
  static String aboutFigure(Figure figure) {
    return hover(figure.definition(), "Taken " + figure.level() + ".");
  }

  /** What a formula's cell says on hover. */
  static String aboutFormula(FigureResult result) {
    Figure figure = result.figure();
    return hover(
        figure.handFormula().isEmpty() ? "" : "By hand: " + figure.handFormula(),
        about(figure, result.formula()),
        parting(result).map(share -> "It is " + away(share) + " the solution.").orElse(""));
  }

  /** What a solution's cell says on hover. */
  static String aboutSolution(FigureResult result) {
    return hover(
        result.figure().definition(),
        "Taken " + result.figure().level() + ".",
        about(result.figure(), result.solved()));
  }

  /** What a measured cell says on hover. */
  static String aboutReading(FigureResult result, Optional<Reading> reading) {
    if (reading.isEmpty()) {
      return "Type what you measured, such as 9.8 or 12 mV";
    }
    double measured = reading.get().value().value();
    Optional<Double> share =
        result.solved().number().isPresent()
            ? difference(measured, result.solved().number().getAsDouble())
            : Optional.empty();
    return hover(
        "Measured " + fully(result.figure(), measured) + ".",
        share.map(by -> "It is " + away(by) + " the solution.").orElse(""),
        reading.get().instrument().map(name -> "With " + name + ".").orElse(""),
        reading.get().note().orElse(""));
  }

  private static String about(Figure figure, FigureValue value) {
    String number = value.number().isPresent() ? fully(figure, value.number().getAsDouble()) : "";
    if (number.isEmpty() || value.says().isEmpty()) {
      return number + value.says();
    }
    return number + "; " + value.says();
  }

  private static Optional<Double> difference(double value, double reference) {
    return reference == 0
        ? Optional.empty()
        : Optional.of((value - reference) / Math.abs(reference));
  }

  private static String away(double share) {
    return EngineeringFormat.format(Math.abs(share) * 100, loopwright.quantity.Unit.ONE, 2)
        + " % "
        + (share < 0 ? "below" : "above");
  }

  /** Lines of text as the look and feel shows them in a tool tip, wrapped. */
  private static String hover(String... lines) {
    StringBuilder html = new StringBuilder("<html><body style='width: 260px'>");
    for (String line : lines) {
      if (!line.isBlank()) {
        html.append("<p>")
            .append(line.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;"))
            .append("</p>");
      }
    }
    return html.append("</body></html>").toString();
  }
}
