package loopwright.view.study;

import javax.swing.JButton;
import loopwright.part.Shelf;
import loopwright.session.Snapshot;
import loopwright.view.form.WholePanel;

/** Every field of the design, also those that no form beside the plots has room for. */
public final class WholeStudy extends Study {
  private final WholePanel panel;
  private final JButton none = new JButton();

  /**
   * @param desk the window's session
   * @param shelf parts to choose from beside those of the design
   */
  public WholeStudy(Desk desk, Shelf shelf) {
    super("Whole design");
    panel = new WholePanel(desk.now(), shelf, desk.edit());
    add(panel, "span 1 3, grow, push");
  }

  @Override
  public void show(Snapshot snapshot) {
    panel.show(snapshot);
  }

  @Override
  public JButton defaultButton() {
    return none;
  }
}
