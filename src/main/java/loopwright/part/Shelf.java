package loopwright.part;

import java.util.List;
import java.util.Optional;

/** Part records by name: those that ship with the program, and the user's own. */
public interface Shelf {
  /** The record of that name, if the shelf has one. */
  Optional<PartRecord> find(String name);

  /** All names, in the order in which a person would look for them. */
  List<String> names();

  /** A shelf with nothing on it. */
  static Shelf empty() {
    return new Shelf() {
      @Override
      public Optional<PartRecord> find(String name) {
        return Optional.empty();
      }

      @Override
      public List<String> names() {
        return List.of();
      }
    };
  }
}
