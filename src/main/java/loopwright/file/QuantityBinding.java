package loopwright.file;

import java.util.List;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** A value with a unit: a number, or a text as a person would write it. */
record QuantityBinding(UnitRule rule, Range range) implements Binding<Quantity> {
  /** Longer than any value; what is longer is shortened in messages. */
  private static final int LONGEST = 40;

  @Override
  public Quantity read(Json json, Spot spot) {
    List<Unit> units = rule.units(spot);
    String expected = units.size() == 1 ? units.get(0).expectation() : rule.expected();
    String written = written(json, spot, expected);
    try {
      if (json instanceof Json.Number) {
        Quantity quantity = Quantity.literal(written);
        quantity.requireWithin(range, units.isEmpty() ? Unit.ONE : units.get(0));
        return quantity;
      }
      return units.isEmpty() ? Quantity.parseAny(written).quantity() : parse(written, units);
    } catch (QuantityException e) {
      throw spot.misfit(e.getMessage());
    }
  }

  private static String written(Json json, Spot spot, String expected) {
    if (json instanceof Json.Number number && number.literal().length() <= LONGEST) {
      return number.literal();
    }
    if (json instanceof Json.Text text
        && text.value().length() <= LONGEST
        && text.value().chars().noneMatch(Character::isISOControl)) {
      return text.value();
    }
    throw spot.misfit(json, expected);
  }

  private Quantity parse(String written, List<Unit> units) {
    QuantityException last = null;
    for (Unit unit : units) {
      try {
        return Quantity.parse(written, unit, range);
      } catch (QuantityException e) {
        last = e;
      }
    }
    throw units.size() == 1
        ? last
        : new QuantityException(
            "found " + JsonText.quoted(written) + ", expected " + rule.expected());
  }

  @Override
  public Json write(Quantity value) {
    return value.bare() && JsonText.isNumber(value.spelling())
        ? Json.number(value.spelling())
        : Json.text(value.spelling());
  }

  @Override
  public String expected() {
    return rule.expected();
  }
}
