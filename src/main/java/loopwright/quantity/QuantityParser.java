package loopwright.quantity;

/** Reads values as people write them. */
final class QuantityParser {
  private QuantityParser() {}

  static double parse(String text, Unit unit) {
    try {
      return Double.parseDouble(text.trim());
    } catch (NumberFormatException e) {
      throw new QuantityException("found \"" + text + "\", expected a value in " + unit.symbol());
    }
  }
}
