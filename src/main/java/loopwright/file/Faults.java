package loopwright.file;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import loopwright.design.DesignException;
import loopwright.design.Problem;

/** Collects what is wrong with the parts of a value, so that a person is told of all of it. */
final class Faults {
  private final Set<Problem> problems = new LinkedHashSet<>();

  /** Reads a part; empty, and remembered, when it does not fit. */
  <T> Optional<T> collect(Supplier<T> part) {
    try {
      return Optional.of(part.get());
    } catch (DesignException e) {
      add(e);
      return Optional.empty();
    }
  }

  void add(DesignException fault) {
    problems.addAll(fault.problems());
  }

  /**
   * @throws DesignException when a part did not fit
   */
  void throwAny() {
    if (!problems.isEmpty()) {
      throw new DesignException(List.copyOf(problems));
    }
  }
}
