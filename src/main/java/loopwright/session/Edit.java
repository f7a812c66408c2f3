package loopwright.session;

import java.util.Objects;
import java.util.Optional;
import loopwright.design.Design;

/**
 * A change that a person made.
 *
 * @param what what was done, in words that fit behind 'Undo'
 * @param after the design that it leads to
 * @param gesture a name that all edits of one movement share, such as stepping a value by its arrow
 *     keys; they are undone together
 */
public record Edit(String what, Design after, Optional<String> gesture) {
  /** Checks that there is something to undo by name. */
  public Edit {
    if (what.isBlank()) {
      throw new IllegalArgumentException("an edit says what was done");
    }
    Objects.requireNonNull(after);
  }

  /** An edit that is undone by itself. */
  public static Edit of(String what, Design after) {
    return new Edit(what, after, Optional.empty());
  }
}
