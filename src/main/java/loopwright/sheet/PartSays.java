package loopwright.sheet;

import loopwright.design.PartValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** The values of parts in print. */
final class PartSays {
  private PartSays() {}

  /** What is printed on it, for example {@code 4.7 kΩ}. */
  static String value(PartValue value, Unit unit) {
    return EngineeringFormat.format(value.value().value(), unit);
  }

  /** The sign for the minus input as a person writes it. */
  static String node(String name) {
    return name.equals("in-") ? "in\u2212" : name;
  }
}
