package loopwright.view.form;

import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** Rows and values at rest, as wide as there is room. */
final class Column extends JPanel implements Scrollable {
  Column() {
    super(new MigLayout("insets 0 0 0 4, fillx, wrap 1", "[grow,fill]"));
    Theme.style(this, "plain");
  }

  @Override
  public Dimension getPreferredScrollableViewportSize() {
    return getPreferredSize();
  }

  @Override
  public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
    return 16;
  }

  @Override
  public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
    return visible.height;
  }

  @Override
  public boolean getScrollableTracksViewportWidth() {
    return true;
  }

  @Override
  public boolean getScrollableTracksViewportHeight() {
    return false;
  }
}
