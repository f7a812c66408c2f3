package loopwright.view.frame;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Hookup;
import loopwright.design.Problem;
import loopwright.file.FileException;
import loopwright.file.Recovery;
import loopwright.session.Edit;
import loopwright.session.KeptWork;
import loopwright.session.Session;
import loopwright.session.Snapshot;
import loopwright.view.form.HookupEdits;

/** What a person can have the window do with the design as a whole. */
final class Commands {
  private final Session session;
  private final Dialogs dialogs;
  private final Runnable commitTyping;

  /**
   * @param session the open design
   * @param dialogs asks in between
   * @param commitTyping makes a value that is being typed count
   */
  Commands(Session session, Dialogs dialogs, Runnable commitTyping) {
    this.session = session;
    this.dialogs = dialogs;
    this.commitTyping = commitTyping;
  }

  /** Asks for a design and opens it. */
  void open() {
    commitTyping.run();
    if (mayLeave()) {
      dialogs.fileToOpen(session.snapshot().path()).ifPresent(this::open);
    }
  }

  /** Opens a file if the present design may be left. */
  void openFile(Path file) {
    commitTyping.run();
    if (mayLeave()) {
      open(file);
    }
  }

  private void open(Path file) {
    attempt("Cannot open the design", () -> session.open(file));
  }

  /** Begins with a design that is in no file yet, if the present one may be left. */
  void begin(Design design) {
    commitTyping.run();
    if (mayLeave()) {
      session.begin(design);
    }
  }

  /**
   * Takes a design of the program's own making, if the present one may be left; to undo it brings
   * the present one back, which is then in no file.
   */
  void take(Design design) {
    commitTyping.run();
    if (mayLeave()) {
      session.begin(session.snapshot().design());
      session.edit(Edit.of("First design", design));
    }
  }

  /** Offers the work that earlier runs left, one after the other until one is taken up. */
  void offer(KeptWork work) {
    for (Recovery.Left left : work.left()) {
      switch (dialogs.left(left)) {
        case RESTORE -> {
          work.restore(left);
          return;
        }
        case DISCARD -> work.discard(left);
        case LATER -> {
          return;
        }
      }
    }
  }

  /** Saves where the design came from, or asks where. Whether it was saved. */
  boolean save() {
    commitTyping.run();
    Optional<Path> path = session.snapshot().path();
    if (path.isPresent() && session.changedOnDisk() && !dialogs.mayOverwrite(path.get())) {
      return saveAs();
    }
    return path.isPresent() ? save(path.get()) : saveAs();
  }

  /** Asks where to save. Whether it was saved. */
  boolean saveAs() {
    commitTyping.run();
    Snapshot now = session.snapshot();
    return dialogs.fileToSave(now.path(), now.design().name()).filter(this::save).isPresent();
  }

  private boolean save(Path file) {
    return attempt("Cannot save the design", () -> session.save(file));
  }

  /** Takes the last edit back. */
  void undo() {
    commitTyping.run();
    session.undo();
  }

  /** Makes the edit again that was taken back last. */
  void redo() {
    commitTyping.run();
    session.redo();
  }

  /** Whether the present design may be left: it is saved, or its edits are not wanted. */
  boolean mayLeave() {
    Snapshot now = session.snapshot();
    boolean nothingDone = now.path().isEmpty() && now.undoable().isEmpty();
    if (!now.unsaved() || nothingDone) {
      return true;
    }
    return switch (dialogs.unsaved(now.design().name())) {
      case SAVE -> save();
      case DISCARD -> true;
      case CANCEL -> false;
    };
  }

  /** Copies the chosen hookup; the copy is chosen then. */
  void copyHookup() {
    commitTyping.run();
    Snapshot now = session.snapshot();
    session.edit(HookupEdits.copy(now.design(), now.hookup()));
    List<Hookup> hookups = session.snapshot().design().hookups();
    session.choose(hookups.get(hookups.size() - 1).name());
  }

  /** Removes the chosen hookup, if it is not the only one. */
  void removeHookup() {
    commitTyping.run();
    Snapshot now = session.snapshot();
    attempt(
        "Cannot remove the hookup",
        () -> session.edit(HookupEdits.remove(now.design(), now.hookup())));
  }

  /** Shows the part records of the design. */
  void parts() {
    dialogs.parts(session.snapshot().design());
  }

  /** Says what the program is. */
  void about() {
    dialogs.about();
  }

  private boolean attempt(String what, Runnable work) {
    try {
      work.run();
      return true;
    } catch (DesignException e) {
      dialogs.complain(
          what, e.problems().stream().map(Problem::message).collect(Collectors.joining("\n")));
    } catch (FileException e) {
      dialogs.complain(what, e.getMessage());
    }
    return false;
  }
}
