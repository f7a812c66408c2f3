package loopwright.design;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loopwright.quantity.Quantity;

/** Collects what is wrong; the same thing said twice stands once. */
final class Problems {
  private final Set<Problem> problems = new LinkedHashSet<>();

  /**
   * @param path where
   * @param found what is there
   * @param expected what should be
   */
  void add(String path, String found, String expected) {
    problems.add(new Problem(path, "found " + found + ", expected " + expected));
  }

  void add(Problem problem) {
    problems.add(problem);
  }

  /** Bounds that are given in the wrong order. */
  void checkOrder(String path, Optional<Quantity> minimum, Optional<Quantity> maximum) {
    if (minimum.isPresent()
        && maximum.isPresent()
        && minimum.get().value() > maximum.get().value()) {
      add(
          path + ".maximum",
          maximum.get().spelling() + " below the minimum of " + minimum.get().spelling(),
          "a maximum not below the minimum");
    }
  }

  /** Names by which paths address things: not empty, without dots, none twice. */
  void checkNames(String list, Collection<String> names) {
    Set<String> known = new HashSet<>();
    for (String name : names) {
      String path = list + "." + name;
      if (name.isBlank()) {
        add(list, "an empty name", "a name");
      } else if (name.contains(".")) {
        add(path, "a dot in the name \"" + name + "\"", "a name without dots");
      } else if (!known.add(name)) {
        add(path, "the name \"" + name + "\" twice", "every name once");
      }
    }
  }

  List<Problem> all() {
    return new ArrayList<>(problems);
  }
}
