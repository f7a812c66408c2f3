package loopwright.view.frame;

import java.awt.BorderLayout;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JSplitPane;

/**
 * The five parts of the screen: the signal path above, below it the form, the plots, and the
 * figures over the findings. A person moves the edges between them; at first they suit the window's
 * size.
 */
final class Panes extends JPanel {
  private static final int GAP = 8;

  private final JSplitPane all;
  private final JSplitPane lower;
  private final JSplitPane centre;
  private final JSplitPane right;
  private final JComponent path;
  private boolean placed;

  Panes(
      JComponent path, JComponent form, JComponent plots, JComponent figures, JComponent findings) {
    super(new BorderLayout());
    this.path = path;
    right = split(JSplitPane.VERTICAL_SPLIT, figures, findings, 0.6);
    centre = split(JSplitPane.HORIZONTAL_SPLIT, plots, right, 1);
    lower = split(JSplitPane.HORIZONTAL_SPLIT, form, centre, 0);
    all = split(JSplitPane.VERTICAL_SPLIT, path, lower, 0);
    setBorder(BorderFactory.createEmptyBorder(0, GAP, 0, GAP));
    add(all);
  }

  private static JSplitPane split(
      int direction, JComponent first, JComponent second, double weight) {
    JSplitPane split = new JSplitPane(direction, true, first, second);
    split.setBorder(null);
    split.setResizeWeight(weight);
    split.setDividerSize(GAP);
    return split;
  }

  /** Places the edges once, when the size is first known. */
  @Override
  public void doLayout() {
    super.doLayout();
    if (!placed && getWidth() > 0 && getHeight() > 0) {
      placed = true;
      place(getWidth() - 2 * GAP, getHeight());
    }
  }

  private void place(int width, int height) {
    int pathHeight = Math.min(path.getPreferredSize().height, height / 3);
    int formWidth = Math.max(258, Math.min(300, width / 5));
    int rightWidth = Math.max(372, Math.min(430, width * 3 / 10));
    all.setDividerLocation(pathHeight);
    lower.setDividerLocation(formWidth);
    centre.setDividerLocation(width - formWidth - rightWidth - 2 * GAP);
    right.setDividerLocation((height - pathHeight - GAP) * 6 / 10);
  }
}
