package loopwright.view.study;

import java.util.OptionalDouble;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;

/** Numbers as studies show and read them. */
final class Numbers {
  private static final String NONE = "—";

  private Numbers() {}

  static String text(OptionalDouble value, Unit unit) {
    return value.isPresent() ? EngineeringFormat.format(value.getAsDouble(), unit) : NONE;
  }

  static String text(double value, Unit unit) {
    return EngineeringFormat.format(value, unit);
  }

  /**
   * A finite number as a person types it.
   *
   * @throws QuantityException when the text is none, in a sentence that names the field
   */
  static double read(String field, String text, Unit unit) {
    try {
      double value = Quantity.parse(text.strip(), unit).value();
      if (Double.isFinite(value)) {
        return value;
      }
    } catch (QuantityException e) {
      throw new QuantityException(field + ": " + e.getMessage());
    }
    throw new QuantityException(field + ": found \"" + text + "\", expected a finite number");
  }
}
