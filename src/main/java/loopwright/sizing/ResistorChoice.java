package loopwright.sizing;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * A resistance made of one or two parts in stock.
 *
 * @param value Ω
 * @param parts the values of the parts, Ω
 * @param series whether two parts stand in series, else side by side
 */
record ResistorChoice(double value, List<Double> parts, boolean series) {
  private static final int DIGITS = 6;

  /** Keeps its own copy. */
  ResistorChoice {
    parts = List.copyOf(parts);
  }

  static ResistorChoice single(double value) {
    return new ResistorChoice(value, List.of(value), true);
  }

  static ResistorChoice inSeries(double one, double other) {
    return new ResistorChoice(rounded(one + other), List.of(one, other), true);
  }

  static ResistorChoice sideBySide(double one, double other) {
    return new ResistorChoice(rounded(one * other / (one + other)), List.of(one, other), false);
  }

  /** To six digits, far finer than any part is, so that a person can read and type it. */
  private static double rounded(double value) {
    return new BigDecimal(value).round(new MathContext(DIGITS)).doubleValue();
  }

  /** How it is made, in words. */
  String says() {
    String values =
        parts.stream()
            .map(part -> EngineeringFormat.format(part, Unit.OHM))
            .collect(Collectors.joining(" and "));
    return parts.size() == 1 ? values : values + (series ? " in series" : " in parallel");
  }
}
