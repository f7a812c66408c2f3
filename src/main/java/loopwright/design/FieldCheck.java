package loopwright.design;

import java.util.List;
import java.util.Map;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** Holds a value against the field that it shall stand in. */
final class FieldCheck {
  private FieldCheck() {}

  /**
   * The value, when it is of the field's type and range.
   *
   * @throws DesignException naming the place otherwise
   */
  static Object checked(Field field, Object value, String at) {
    if (!isOfType(field, value)) {
      throw new DesignException(
          at, "found a value of another type, expected " + field.expectation());
    }
    if (value instanceof Quantity quantity) {
      requireRange(field, quantity, at);
    } else if (value instanceof PartValue part) {
      requireRange(field, part.value(), at);
      part.measured().ifPresent(measured -> requireRange(field, measured, at + ".measured"));
      part.tolerance()
          .ifPresent(
              tolerance -> requireRange(Range.FRACTION, Unit.ONE, tolerance, at + ".tolerance"));
    }
    return value;
  }

  private static void requireRange(Field field, Quantity quantity, String at) {
    requireRange(field.range(), field.unit().orElse(Unit.ONE), quantity, at);
  }

  private static void requireRange(Range range, Unit unit, Quantity quantity, String at) {
    try {
      quantity.requireWithin(range, unit);
    } catch (QuantityException e) {
      throw new DesignException(at, e.getMessage());
    }
  }

  private static boolean isOfType(Field field, Object value) {
    return switch (field.shape()) {
      case COUNT -> value instanceof Integer;
      case FLAG -> value instanceof Boolean;
      case LIST ->
          value instanceof List<?> list
              && list.stream().allMatch(entry -> isOfType(field.element().orElseThrow(), entry));
      case MAP ->
          value instanceof Map<?, ?> map
              && map.keySet().stream().allMatch(String.class::isInstance)
              && map.values().stream()
                  .allMatch(entry -> isOfType(field.element().orElseThrow(), entry));
      default -> field.type().isInstance(value);
    };
  }
}
