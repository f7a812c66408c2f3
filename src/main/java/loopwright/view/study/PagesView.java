package loopwright.view.study;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.util.List;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import javax.swing.SwingConstants;

/** Pages of paper below one another, as wide as there is room. */
final class PagesView extends JPanel implements Scrollable {
  private static final int GAP = 12;
  private static final int STEP = 24;

  private transient List<BufferedImage> pages = List.of();

  PagesView() {
    setName("pages");
    setFocusable(true);
    getAccessibleContext().setAccessibleName("Pages of the sheet");
  }

  /** Shows other pages; none to show none. */
  void show(List<BufferedImage> others) {
    pages = List.copyOf(others);
    getAccessibleContext()
        .setAccessibleDescription(pages.isEmpty() ? "no sheet yet" : pages.size() + " pages");
    revalidate();
    repaint();
  }

  /** How many there are. */
  int count() {
    return pages.size();
  }

  @Override
  public Dimension getPreferredSize() {
    int height = GAP;
    for (BufferedImage page : pages) {
      height += height(page) + GAP;
    }
    return new Dimension(getWidth(), height);
  }

  private int height(BufferedImage page) {
    return Math.round((float) (getWidth() - 2 * GAP) * page.getHeight() / page.getWidth());
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    super.paintComponent(graphics);
    Graphics2D smooth = (Graphics2D) graphics.create();
    smooth.setRenderingHint(
        RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BICUBIC);
    smooth.setRenderingHint(RenderingHints.KEY_RENDERING, RenderingHints.VALUE_RENDER_QUALITY);
    int y = GAP;
    for (BufferedImage page : pages) {
      smooth.drawImage(page, GAP, y, getWidth() - 2 * GAP, height(page), null);
      y += height(page) + GAP;
    }
    smooth.dispose();
  }

  @Override
  public Dimension getPreferredScrollableViewportSize() {
    return getPreferredSize();
  }

  @Override
  public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
    return STEP;
  }

  @Override
  public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
    return orientation == SwingConstants.VERTICAL ? visible.height : visible.width;
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
