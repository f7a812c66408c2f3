package loopwright.session;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import loopwright.file.UserFolder;

/** What a person should find again at the next start: recent files, the look, the window's size. */
public final class Preferences {
  private static final int MOST_RECENT = 10;
  private static final String RECENT = "recent.";
  private static final String LOOK = "look";
  private static final String WIDTH = "window.width";
  private static final String HEIGHT = "window.height";

  private final UserFolder folder;
  private final Properties kept;
  private final List<Path> recent = new ArrayList<>();

  /** The size of the window in pixels. */
  public record Size(int width, int height) {}

  /**
   * @param folder where they are kept
   */
  public Preferences(UserFolder folder) {
    this.folder = folder;
    this.kept = folder.preferences();
    for (int i = 0; i < MOST_RECENT; i++) {
      path(kept.getProperty(RECENT + i)).ifPresent(recent::add);
    }
  }

  private static Optional<Path> path(String text) {
    try {
      return Optional.ofNullable(text).map(Path::of);
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
  }

  /** Files opened or saved lately, the newest first; some may be gone by now. */
  public List<Path> recent() {
    return List.copyOf(recent);
  }

  /** Puts a file at the head of the recent ones. */
  public void opened(Path file) {
    Path whole = file.toAbsolutePath().normalize();
    if (!recent.isEmpty() && recent.get(0).equals(whole)) {
      return;
    }
    recent.remove(whole);
    recent.add(0, whole);
    while (recent.size() > MOST_RECENT) {
      recent.remove(MOST_RECENT);
    }
    for (int i = 0; i < recent.size(); i++) {
      kept.setProperty(RECENT + i, recent.get(i).toString());
    }
    keep();
  }

  /** Name of the look that was chosen last; empty when none was. */
  public Optional<String> look() {
    return Optional.ofNullable(kept.getProperty(LOOK));
  }

  /** Keeps the look that is chosen. */
  public void choose(String look) {
    kept.setProperty(LOOK, look);
    keep();
  }

  /** Size of the window when it was closed last. */
  public Optional<Size> size() {
    try {
      return Optional.of(
          new Size(
              Integer.parseInt(kept.getProperty(WIDTH, "")),
              Integer.parseInt(kept.getProperty(HEIGHT, ""))));
    } catch (NumberFormatException e) {
      return Optional.empty();
    }
  }

  /** Keeps the size of the window. */
  public void closed(Size size) {
    kept.setProperty(WIDTH, Integer.toString(size.width()));
    kept.setProperty(HEIGHT, Integer.toString(size.height()));
    keep();
  }

  /** A preference that cannot be kept is no reason to stop. */
  private void keep() {
    folder.keep(kept);
  }
}
