package loopwright.bench;

import java.util.OptionalDouble;
import loopwright.design.Reading;
import loopwright.predict.FigureValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** The verdict on one reading, in words. */
final class VerdictWords {
  /** One of two uncertainties dominates when it is so many times the other. */
  private static final double DOMINATES = 3;

  private VerdictWords() {}

  static String of(
      Reading reading,
      MeasuredValue measured,
      FigureValue predicted,
      OptionalDouble expanded,
      OptionalDouble en) {
    if (predicted.number().isEmpty()) {
      return "Not judged: " + predicted.says() + ".";
    }
    if (expanded.isEmpty()) {
      return "Not judged: how far the tolerances let it spread is not known.";
    }
    Unit unit = ReadingUnit.of(reading);
    double difference = measured.value() - predicted.number().getAsDouble();
    String by =
        EngineeringFormat.format(Math.abs(difference), unit)
            + (difference < 0 ? " below" : " above")
            + " the prediction";
    if (en.isEmpty()) {
      return "Not judged: it is " + by + ", and nothing says how far either is to be believed.";
    }
    String verdict =
        Math.abs(en.getAsDouble()) <= 1
            ? "Agrees: " + by + ", within what "
            : "Does not agree: " + by + ", beyond what ";
    return verdict + what(measured, expanded.getAsDouble()) + " allow" + ".";
  }

  private static String what(MeasuredValue measured, double expanded) {
    double own = measured.uncertainty().expanded();
    String instrument = measured.says();
    if (own > DOMINATES * expanded) {
      return "the reading (" + instrument + ") and, far less, the tolerances";
    }
    return expanded > DOMINATES * own
        ? "the tolerances and, far less, the reading (" + instrument + ")"
        : "tolerances and reading (" + instrument + ")";
  }
}
