package loopwright.file;

import java.util.Optional;
import loopwright.design.DesignException;

/**
 * How one type of value is read from JSON and written as JSON.
 *
 * @param <T> the type
 */
interface Binding<T> {
  /**
   * Reads a value.
   *
   * @throws DesignException when it is no such value
   */
  T read(Json json, Spot spot);

  /** Writes a value as the program would. */
  Json write(T value);

  /** Writes a value that differs from what stood there, keeping what can be kept of that. */
  default Json rewrite(T value, Before<T> before) {
    return write(value);
  }

  /** What is wanted, with its article, for messages. */
  String expected();

  /** Whether values of this type are addressed by a name of their own. */
  default boolean isNamed() {
    return false;
  }

  /** Writes a value: what is unchanged keeps its author's text. */
  default Json write(T value, Optional<Before<T>> before) {
    if (before.isEmpty()) {
      return write(value);
    }
    return before.get().value().equals(value) ? before.get().json() : rewrite(value, before.get());
  }
}
