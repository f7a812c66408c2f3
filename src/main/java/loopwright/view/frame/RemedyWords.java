package loopwright.view.frame;

import java.util.Locale;
import java.util.stream.Collectors;
import loopwright.check.Finding;

/** What the button of a remedy says, and what undoing it is called. */
final class RemedyWords {
  private RemedyWords() {}

  /** In short: the last word of each path and its value. */
  static String button(Finding finding) {
    return "Set "
        + finding.changes().stream()
            .map(change -> last(change.path()) + " " + change.value())
            .collect(Collectors.joining(", "));
  }

  /** In full: every path and its value. */
  static String changes(Finding finding) {
    return finding.changes().stream()
        .map(change -> change.path() + " = " + change.value())
        .collect(Collectors.joining(", "));
  }

  /** The last word of a path, set apart from the one before where that says more. */
  private static String last(String path) {
    String spaced = path.substring(path.lastIndexOf('.') + 1);
    return spaced.replaceAll("([a-z])([A-Z])", "$1 $2").toLowerCase(Locale.ROOT);
  }
}
