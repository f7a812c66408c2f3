package loopwright.view.study;

import javax.swing.JButton;
import javax.swing.JPanel;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** What one of the dialogs holds. */
public abstract class Study extends JPanel {
  private final String title;

  /**
   * @param title of the dialog
   */
  Study(String title) {
    super(new MigLayout("insets 12, fill, wrap 1", "[0:0,grow,fill]", "[][][grow,fill]"));
    this.title = title;
    Theme.style(this, "plain");
    setName("study." + title.toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
  }

  /** Title of the dialog. */
  public final String title() {
    return title;
  }

  /** Shows another moment: the chosen hookup may be another one. */
  public abstract void show(Snapshot snapshot);

  /** The button that Enter presses. */
  public abstract JButton defaultButton();
}
