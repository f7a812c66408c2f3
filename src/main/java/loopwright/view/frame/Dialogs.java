package loopwright.view.frame;

import java.nio.file.Path;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.file.Recovery;

/** What the window asks a person in between. */
public interface Dialogs {
  /** What to do with unsaved edits. */
  enum Answer {
    SAVE,
    DISCARD,
    CANCEL
  }

  /** Asks for a design file to open; empty when none is wanted. */
  Optional<Path> fileToOpen(Optional<Path> present);

  /**
   * Asks where to save, and whether a file that is there may be replaced; empty when nowhere.
   *
   * @param present where the design was saved before
   * @param name what the design is called
   */
  Optional<Path> fileToSave(Optional<Path> present, String name);

  /** Asks what to do with the unsaved edits of a design. */
  Answer unsaved(String name);

  /** What to do with work that an earlier run left. */
  enum Kept {
    RESTORE,
    DISCARD,
    LATER
  }

  /** Asks what to do with unsaved work that an earlier run left. */
  Kept left(Recovery.Left left);

  /** Whether a file that something else has changed may be overwritten. */
  boolean mayOverwrite(Path file);

  /**
   * Says what went wrong.
   *
   * @param what what could not be done
   * @param why a sentence
   */
  void complain(String what, String why);

  /** Says what the program is, and what it is not. */
  void about();

  /** Shows the part records of a design, printed figures beside what the models return. */
  void parts(Design design);
}
