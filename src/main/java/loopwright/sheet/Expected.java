package loopwright.sheet;

import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.predict.FigureValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.spread.Band;

/**
 * What a meter or scope should show, and within what.
 *
 * @param value nominal, or why there is none
 * @param low end of the 95 % band; empty without a band
 * @param high end of the 95 % band; empty without a band
 * @param unit of all three
 * @param percent whether they are shares that are read in per cent
 */
public record Expected(
    FigureValue value, OptionalDouble low, OptionalDouble high, Unit unit, boolean percent) {
  private static final String NOTHING = "\u2014";

  /** A value within its band, where it has one. */
  static Expected of(FigureValue value, Optional<Band> band, Unit unit) {
    boolean known = value.number().isPresent() && band.isPresent() && band.get().samples() > 1;
    return new Expected(
        value,
        known ? band.get().low() : OptionalDouble.empty(),
        known ? band.get().high() : OptionalDouble.empty(),
        unit,
        false);
  }

  /** The same, read in per cent. */
  Expected inPercent() {
    return new Expected(value, low, high, unit, true);
  }

  /** The value as text; a dash where there is none. */
  String says() {
    return text(value.number());
  }

  /** The lower end as text; a dash where there is none. */
  String lowSays() {
    return text(low);
  }

  /** The upper end as text; a dash where there is none. */
  String highSays() {
    return text(high);
  }

  private String text(OptionalDouble number) {
    if (number.isEmpty()) {
      return NOTHING;
    }
    return percent
        ? EngineeringFormat.percent(number.getAsDouble())
        : EngineeringFormat.format(number.getAsDouble(), unit);
  }
}
