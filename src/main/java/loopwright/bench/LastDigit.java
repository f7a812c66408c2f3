package loopwright.bench;

import loopwright.quantity.Quantity;

/** The step of a value's last digit, as its author wrote it. */
final class LastDigit {
  private LastDigit() {}

  /** One unit of the last digit written, in the value's unit; a whole number is known to one. */
  static double of(Quantity quantity) {
    String text = quantity.spelling().replace(',', '.');
    StringBuilder digits = new StringBuilder();
    for (char letter : text.toCharArray()) {
      if (Character.isDigit(letter) || letter == '.') {
        digits.append(letter);
      } else if (!digits.isEmpty()) {
        break;
      }
    }
    int dot = digits.indexOf(".");
    int places = dot < 0 ? 0 : digits.length() - dot - 1;
    double number = digits.isEmpty() ? 0 : Double.parseDouble(digits.toString());
    double scale = number == 0 ? 1 : Math.abs(quantity.value()) / number;
    return scale * Math.pow(10, -places);
  }
}
