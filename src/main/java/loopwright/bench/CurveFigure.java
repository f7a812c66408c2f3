package loopwright.bench;

import java.util.OptionalDouble;
import loopwright.quantity.Unit;

/**
 * What a curve measures.
 *
 * @param key quantity of a reading, or a name of its own where no reading is of it
 * @param value in the unit
 * @param unit of the value
 * @param standard standard uncertainty from the samples alone: noise, and how finely they stand
 * @param frequency Hz, where it depends on one
 * @param amplitude peak at the generator, V, where it is known and matters
 * @param says how it was found
 */
public record CurveFigure(
    String key,
    double value,
    Unit unit,
    double standard,
    OptionalDouble frequency,
    OptionalDouble amplitude,
    String says) {
  static CurveFigure of(String key, double value, Unit unit, double standard, String says) {
    return new CurveFigure(
        key, value, unit, standard, OptionalDouble.empty(), OptionalDouble.empty(), says);
  }

  CurveFigure at(double itsFrequency, OptionalDouble itsAmplitude) {
    return new CurveFigure(
        key, value, unit, standard, OptionalDouble.of(itsFrequency), itsAmplitude, says);
  }

  /** Whether it can stand among the readings. */
  public boolean isReading() {
    return ReadingUnit.quantities().contains(key);
  }
}
