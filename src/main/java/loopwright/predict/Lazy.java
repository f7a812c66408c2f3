package loopwright.predict;

import java.util.function.Supplier;

/** A value that is solved when first asked for, and then kept; a failure is kept as well. */
final class Lazy<T> {
  private final Supplier<T> computation;
  private Outcome<T> outcome;

  Lazy(Supplier<T> computation) {
    this.computation = computation;
  }

  /** Whether it was asked for and has a value. */
  boolean isSolved() {
    return outcome != null && outcome.isPresent();
  }

  Outcome<T> outcome() {
    if (outcome == null) {
      outcome = Outcome.of(computation);
    }
    return outcome;
  }

  /**
   * The value.
   *
   * @throws UnsolvedException with the reason, where there is none
   */
  T get() {
    return outcome().get();
  }
}
