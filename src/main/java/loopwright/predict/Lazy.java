package loopwright.predict;

import java.util.Optional;
import java.util.function.Supplier;

/** A value that is solved when first asked for, and then kept; a failure is kept as well. */
final class Lazy<T> {
  private final Supplier<T> computation;
  private Outcome<T> outcome;

  Lazy(Supplier<T> computation) {
    this.computation = computation;
  }

  /** The value where it was asked for already and has one. */
  Optional<T> ifSolved() {
    return outcome == null ? Optional.empty() : Optional.ofNullable(outcome.value());
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
