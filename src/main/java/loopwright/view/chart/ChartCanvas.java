package loopwright.view.chart;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.MouseEvent;
import java.awt.geom.Rectangle2D;
import java.util.Optional;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;
import javax.swing.ToolTipManager;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.entity.ChartEntity;

/** Draws a chart at whatever size it has, with the values of its points as tool tips. */
final class ChartCanvas extends JComponent {
  /** How much of the ground lies over what is out of date. */
  private static final float FADING = 0.65f;

  private transient Optional<JFreeChart> chart = Optional.empty();
  private transient ChartRenderingInfo drawn = new ChartRenderingInfo();
  private boolean faded;

  ChartCanvas() {
    ToolTipManager.sharedInstance().registerComponent(this);
  }

  /**
   * @param shownChart what to draw; empty for nothing
   * @param isFaded whether it stands for an earlier design
   */
  void show(Optional<JFreeChart> shownChart, boolean isFaded) {
    chart = shownChart;
    faded = isFaded;
    drawn = new ChartRenderingInfo();
    repaint();
  }

  /** What is drawn. */
  Optional<JFreeChart> chart() {
    return chart;
  }

  @Override
  protected void paintComponent(Graphics g) {
    if (chart.isEmpty() || getWidth() <= 0 || getHeight() <= 0) {
      return;
    }
    Graphics2D g2 = (Graphics2D) g.create();
    try {
      Rectangle2D area = new Rectangle2D.Double(0, 0, getWidth(), getHeight());
      drawn.clear();
      chart.get().draw(g2, area, null, drawn);
      if (faded) {
        g2.setColor(PlotTheme.thin(getBackground(), FADING));
        g2.fill(area);
      }
    } finally {
      g2.dispose();
    }
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    if (drawn.getEntityCollection() == null) {
      return null;
    }
    ChartEntity entity = drawn.getEntityCollection().getEntity(event.getX(), event.getY());
    return entity == null ? null : entity.getToolTipText();
  }

  @Override
  public Dimension getPreferredSize() {
    return isPreferredSizeSet() ? super.getPreferredSize() : new Dimension(460, 260);
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext =
          new AccessibleJComponent() {
            @Override
            public AccessibleRole getAccessibleRole() {
              return AccessibleRole.CANVAS;
            }
          };
    }
    return accessibleContext;
  }
}
