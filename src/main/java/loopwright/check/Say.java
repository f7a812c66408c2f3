package loopwright.check;

import loopwright.design.Change;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Numbers and changes as findings write them. */
final class Say {
  private Say() {}

  static String volts(double value) {
    return EngineeringFormat.format(value, Unit.VOLT, 3);
  }

  static String amperes(double value) {
    return EngineeringFormat.format(value, Unit.AMPERE, 3);
  }

  static String ohms(double value) {
    return EngineeringFormat.format(value, Unit.OHM, 3);
  }

  static String watts(double value) {
    return EngineeringFormat.format(value, Unit.WATT, 3);
  }

  static String celsius(double value) {
    return EngineeringFormat.format(value, Unit.CELSIUS, 3);
  }

  static String percent(double fraction) {
    return EngineeringFormat.format(100 * fraction, Unit.ONE, 2) + " %";
  }

  static Change change(String path, double value, Unit unit) {
    return new Change(path, EngineeringFormat.spelling(value, unit));
  }
}
