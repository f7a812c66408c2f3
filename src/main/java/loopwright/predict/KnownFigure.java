package loopwright.predict;

import java.util.List;
import loopwright.design.Reading;

/**
 * A figure that a hand formula needs: the measured value where there is one, the latest in this
 * hookup, else the latest in any; else the solved value. So each formula tests one step.
 *
 * @param value in the figure's unit
 * @param isMeasured whether it comes from a reading
 * @param says which it is, in words
 */
record KnownFigure(double value, boolean isMeasured, String says) {
  /**
   * Looks a figure up.
   *
   * @throws UnsolvedException when it is neither measured nor solved
   */
  static KnownFigure of(HookupSolution solution, String key) {
    Figure figure = Catalogue.find(key).orElseThrow();
    List<Reading> readings =
        solution.design().bench().readings().stream()
            .filter(reading -> reading.quantity().equals(key))
            .toList();
    String here = solution.hookup().name();
    Reading latest = null;
    for (Reading reading : readings) {
      boolean isHere = reading.hookup().filter(here::equals).isPresent();
      boolean latestIsHere = latest != null && latest.hookup().filter(here::equals).isPresent();
      if (isHere || !latestIsHere) {
        latest = reading;
      }
    }
    if (latest != null) {
      double value = latest.value().value();
      return new KnownFigure(
          value, true, "measured " + figure.label() + " " + Text.of(value, figure.unit()));
    }
    FigureValue solved = figure.solve(solution);
    if (solved.number().isEmpty()) {
      throw new UnsolvedException(figure.label() + ": " + solved.says());
    }
    double value = solved.number().getAsDouble();
    return new KnownFigure(
        value, false, "solved " + figure.label() + " " + Text.of(value, figure.unit()));
  }
}
