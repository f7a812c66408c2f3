package loopwright.predict;

import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Values in the sentences of this package. */
final class Text {
  private Text() {}

  static String volts(double value) {
    return EngineeringFormat.format(value, Unit.VOLT);
  }

  static String hertz(double value) {
    return EngineeringFormat.format(value, Unit.HERTZ);
  }

  static String ratio(double value) {
    return EngineeringFormat.format(value, Unit.ONE);
  }

  static String of(double value, Unit unit) {
    return EngineeringFormat.format(value, unit);
  }
}
