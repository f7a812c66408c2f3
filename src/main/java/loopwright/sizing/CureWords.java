package loopwright.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** What a cure gives and costs, in words. */
final class CureWords {
  /** A change of less than this share is not worth a word. */
  private static final double LITTLE = 0.03;

  private CureWords() {}

  static String of(
      String kind,
      OptionalDouble worst,
      OptionalDouble corner,
      Map<String, FigureValue> before,
      Map<String, FigureValue> after) {
    String gives =
        worst.isPresent()
            ? "phase margin at least "
                + degrees(worst.getAsDouble())
                + " over the swing, "
                + degrees(corner.orElse(worst.getAsDouble()))
                + " at the tolerance corners"
            : "stable at every level; the loop gain never passes 1";
    List<String> costs = new ArrayList<>();
    after.forEach((key, value) -> cost(key, before.get(key), value, costs));
    return Character.toUpperCase(kind.charAt(0))
        + kind.substring(1)
        + ": "
        + gives
        + (costs.isEmpty() ? "; costs nothing else here." : "; " + String.join("; ", costs) + ".");
  }

  private static void cost(String key, FigureValue before, FigureValue after, List<String> costs) {
    if (before == null || before.number().isEmpty() || after.number().isEmpty()) {
      return;
    }
    double old = before.number().getAsDouble();
    double now = after.number().getAsDouble();
    if (Math.abs(now - old) <= LITTLE * Math.abs(old)) {
      return;
    }
    Figure figure = Catalogue.find(key).orElseThrow();
    costs.add(
        figure.label().toLowerCase(java.util.Locale.ROOT)
            + " "
            + EngineeringFormat.format(now, figure.unit())
            + " instead of "
            + EngineeringFormat.format(old, figure.unit()));
  }

  private static String degrees(double value) {
    return EngineeringFormat.format(value, Unit.DEGREE, 3);
  }
}
