package loopwright.session;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.file.FileException;
import loopwright.file.Recovery;

/**
 * Keeps the unsaved work of a session where the next run finds it, and forgets it once it is saved.
 */
public final class KeptWork {
  private final Session session;
  private final Recovery recovery;
  private Optional<Design> last = Optional.empty();

  /**
   * @param session whose work is kept
   * @param recovery where it is kept
   */
  public KeptWork(Session session, Recovery recovery) {
    this.session = session;
    this.recovery = recovery;
  }

  /**
   * Keeps the present design if it is unsaved and not yet kept; forgets what was kept if it is
   * saved.
   *
   * @return why it cannot be kept; empty when all is well
   */
  public Optional<String> keep() {
    Snapshot now = session.snapshot();
    boolean toKeep = now.unsaved() && now.undoable().isPresent();
    if (!toKeep) {
      if (last.isPresent()) {
        forget();
      }
      return Optional.empty();
    }
    if (last.filter(now.design()::equals).isPresent()) {
      return Optional.empty();
    }
    last = Optional.of(now.design());
    return recovery.keep(now.design(), now.path());
  }

  /** Forgets what was kept: the session ends in good order. */
  public void forget() {
    recovery.forget();
    last = Optional.empty();
  }

  /** What earlier runs left, the newest first. */
  public List<Recovery.Left> left() {
    return recovery.left();
  }

  /** Takes up what an earlier run left: unsaved, as an edit of the file that it came from. */
  public void restore(Recovery.Left left) {
    Optional<Path> file = left.of().filter(Files::isRegularFile);
    boolean opened = false;
    if (file.isPresent()) {
      try {
        session.open(file.get());
        opened = true;
      } catch (FileException | DesignException e) {
        // The file is no help any more; the work itself is whole.
      }
    }
    if (!opened) {
      session.begin(left.design());
    }
    session.edit(Edit.of("Restore unsaved work", left.design()));
    recovery.forget(left);
    keep();
  }

  /** Gives up what an earlier run left. */
  public void discard(Recovery.Left left) {
    recovery.forget(left);
  }
}
