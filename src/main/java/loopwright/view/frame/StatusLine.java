package loopwright.view.frame;

import java.time.Duration;
import javax.swing.JLabel;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;

/** Says which edit the figures belong to. */
final class StatusLine extends JLabel {
  StatusLine() {
    setName("status");
    Theme.style(this, "quiet");
  }

  /** Shows where the work stands. */
  void show(Snapshot snapshot) {
    String says = says(snapshot);
    Theme.style(this, snapshot.unsolved().isPresent() ? "failing" : "quiet");
    setText(says);
    setToolTipText(says);
  }

  /** Where the work stands, in a sentence. */
  static String says(Snapshot snapshot) {
    if (snapshot.unsolved().isPresent()) {
      return "Not solved: " + snapshot.unsolved().get();
    }
    if (snapshot.solving()) {
      return "Solving…";
    }
    return snapshot
        .newest()
        .map(
            solved -> "Solved in " + milliseconds(solved.took()) + "; every figure is of this edit")
        .orElse("");
  }

  private static String milliseconds(Duration took) {
    return took.toMillis() < 1000
        ? took.toMillis() + " ms"
        : String.format(java.util.Locale.ROOT, "%.1f s", took.toMillis() / 1000.0);
  }
}
