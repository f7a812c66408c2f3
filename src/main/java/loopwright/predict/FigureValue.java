package loopwright.predict;

import java.util.OptionalDouble;

/**
 * The value of a figure, or the reason why there is none.
 *
 * @param number the value in the figure's unit; finite where present
 * @param says the reason where there is no number; a remark, or empty, where there is one
 */
public record FigureValue(OptionalDouble number, String says) {
  /** Checks that a missing number has a reason and that a present one is finite. */
  public FigureValue {
    if (number.isEmpty() && says.isBlank()) {
      throw new IllegalArgumentException("a figure without a number needs a reason");
    }
    if (number.isPresent() && !Double.isFinite(number.getAsDouble())) {
      throw new IllegalArgumentException("a figure is finite or has a reason");
    }
  }

  /** A number without a remark; a number that is not finite becomes a reason. */
  public static FigureValue of(double number) {
    return of(number, "");
  }

  /** A number with a remark; a number that is not finite becomes a reason. */
  public static FigureValue of(double number, String remark) {
    if (Double.isNaN(number)) {
      return none("undefined here" + (remark.isBlank() ? "" : ": " + remark));
    }
    if (Double.isInfinite(number)) {
      return none("without limit" + (remark.isBlank() ? "" : ": " + remark));
    }
    return new FigureValue(OptionalDouble.of(number), remark);
  }

  /** No number, and why. */
  public static FigureValue none(String reason) {
    return new FigureValue(OptionalDouble.empty(), reason);
  }
}
