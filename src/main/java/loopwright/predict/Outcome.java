package loopwright.predict;

import java.util.function.Supplier;

/**
 * A value, or the reason why there is none.
 *
 * @param value null where there is none
 * @param reason empty where there is a value
 */
record Outcome<T>(T value, String reason) {
  /** Runs a computation; what it cannot solve becomes the reason. */
  static <T> Outcome<T> of(Supplier<T> computation) {
    try {
      return new Outcome<>(computation.get(), "");
    } catch (UnsolvedException | ArithmeticException | IllegalStateException e) {
      return new Outcome<>(null, e.getMessage());
    }
  }

  /**
   * The value.
   *
   * @throws UnsolvedException with the reason, where there is none
   */
  T get() {
    if (value == null) {
      throw new UnsolvedException(reason);
    }
    return value;
  }

  boolean isPresent() {
    return value != null;
  }
}
