package loopwright.view.chart;

import java.awt.BasicStroke;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import java.awt.event.MouseEvent;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;
import javax.swing.ToolTipManager;
import javax.swing.event.MouseInputAdapter;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.entity.ChartEntity;

/**
 * Draws a chart at whatever size it has. Mouse and arrow keys read it off, a drag shows a part of
 * it, Esc goes back; its menu copies and saves it.
 */
final class ChartCanvas extends JComponent {
  /** How much of the ground lies over what is out of date. */
  private static final float FADING = 0.65f;

  /** Shorter drags, in pixels, are clicks of an unsteady hand. */
  private static final int LEAST_DRAG = 8;

  /** Drags less high are meant to choose places only. */
  private static final int LEAST_HEIGHT = 24;

  private final transient ChartView view = new ChartView();
  private transient ChartRenderingInfo drawn = new ChartRenderingInfo();
  private transient Optional<Reading> reading = Optional.empty();
  private transient Optional<Rectangle2D> drag = Optional.empty();
  private String title = "";
  private boolean faded;

  ChartCanvas() {
    setFocusable(true);
    ToolTipManager.sharedInstance().registerComponent(this);
    Hand hand = new Hand();
    addMouseListener(hand);
    addMouseMotionListener(hand);
    addFocusListener(
        new FocusListener() {
          @Override
          public void focusGained(FocusEvent event) {
            repaint();
          }

          @Override
          public void focusLost(FocusEvent event) {
            read(Optional.empty());
          }
        });
    new ChartMenu(this).install();
  }

  /**
   * @param shownChart what to draw; empty for nothing
   * @param isFaded whether it stands for an earlier design
   */
  void show(Optional<JFreeChart> shownChart, boolean isFaded) {
    view.show(shownChart);
    faded = isFaded;
    drawn = new ChartRenderingInfo();
    reading = Optional.empty();
    repaint();
  }

  /** The title that stands over it, for what is saved. */
  void titled(String says) {
    title = says;
  }

  /** What is drawn. */
  Optional<JFreeChart> chart() {
    return view.chart();
  }

  /** What it is saved as; empty where there is nothing. */
  Optional<ChartExport> export() {
    return view.chart()
        .map(
            chart ->
                new ChartExport(
                    chart,
                    title,
                    PlotTheme.current(),
                    Math.max(getWidth(), 640),
                    Math.max(getHeight(), 420)));
  }

  /** The title that stands over it. */
  String title() {
    return title;
  }

  boolean isZoomed() {
    return view.isZoomed();
  }

  /** Goes back to what was shown before the latest zoom. */
  void back() {
    view.back();
    repaint();
  }

  /** Shows the whole plot. */
  void whole() {
    view.whole();
    repaint();
  }

  /** Shows half of the places about the one that is read. */
  void closer() {
    List<DrawnStrip> strips = strips();
    if (DrawnStrip.isDrawn(strips)) {
      double place = reading.orElseGet(() -> Reading.middle(strips)).place();
      boolean isLogarithmic = strips.get(0).domain() instanceof LogAxis;
      chart().flatMap(Zoom::of).map(all -> all.about(place, isLogarithmic)).ifPresent(view::zoom);
      repaint();
    }
  }

  /** Moves the crosshair so many pixels. */
  void step(int pixels) {
    List<DrawnStrip> strips = strips();
    if (DrawnStrip.isDrawn(strips)) {
      read(
          Optional.of(
              reading.isPresent() ? reading.get().moved(strips, pixels) : Reading.middle(strips)));
    }
  }

  /** Goes to another curve of a plane. */
  void otherCurve(int direction) {
    List<DrawnStrip> strips = strips();
    if (DrawnStrip.isDrawn(strips)) {
      Reading from = reading.orElseGet(() -> Reading.middle(strips));
      read(Optional.of(from.otherCurve(strips, direction)));
    }
  }

  /** What is read, strip by strip; empty where nothing is. */
  List<String> readout() {
    return reading.isEmpty()
        ? List.of()
        : strips().stream().flatMap(strip -> reading.get().says(strip).stream()).toList();
  }

  private void read(Optional<Reading> next) {
    reading = next;
    if (next.isPresent()) {
      // A screen reader speaks the newest values as the description of the plot.
      getAccessibleContext().setAccessibleDescription(String.join("; ", readout()));
    }
    repaint();
  }

  private List<DrawnStrip> strips() {
    return chart().map(chart -> DrawnStrip.of(chart, drawn)).orElse(List.of());
  }

  @Override
  protected void paintComponent(Graphics g) {
    if (chart().isEmpty() || getWidth() <= 0 || getHeight() <= 0) {
      return;
    }
    Graphics2D g2 = (Graphics2D) g.create();
    try {
      Rectangle2D area = new Rectangle2D.Double(0, 0, getWidth(), getHeight());
      drawn.clear();
      chart().get().draw(g2, area, null, drawn);
      if (faded) {
        g2.setColor(PlotTheme.thin(getBackground(), FADING));
        g2.fill(area);
      }
      List<DrawnStrip> strips = strips();
      PlotTheme theme = PlotTheme.current();
      if (reading.isPresent() && !strips.isEmpty()) {
        new Crosshair(theme).draw(g2, strips, reading.get());
      }
      drag.ifPresent(
          box -> {
            g2.setColor(PlotTheme.thin(theme.accent(), 0.15f));
            g2.fill(box);
            g2.setColor(theme.accent());
            g2.draw(box);
          });
      if (isFocusOwner()) {
        g2.setColor(theme.accent());
        g2.setStroke(new BasicStroke(1f));
        g2.drawRect(0, 0, getWidth() - 1, getHeight() - 1);
      }
    } finally {
      g2.dispose();
    }
  }

  /** Shows what a drag spans: places, and values where it is high enough to mean them. */
  void zoomTo(Point2D from, Point2D to) {
    List<DrawnStrip> strips = strips();
    Optional<Zoom> present = chart().flatMap(Zoom::of);
    if (!DrawnStrip.isDrawn(strips)
        || present.isEmpty()
        || Math.abs(from.getX() - to.getX()) < LEAST_DRAG) {
      return;
    }
    Zoom zoom = present.get();
    DrawnStrip first = strips.get(0);
    double left = first.placeAt(inside(first.area(), Math.min(from.getX(), to.getX())));
    double right = first.placeAt(inside(first.area(), Math.max(from.getX(), to.getX())));
    if (left < right) {
      zoom = zoom.withPlaces(new Span(left, right));
    }
    for (int i = 0; i < strips.size(); i++) {
      Rectangle2D area = strips.get(i).area();
      if (from.getY() >= area.getMinY()
          && from.getY() <= area.getMaxY()
          && Math.abs(from.getY() - to.getY()) >= LEAST_HEIGHT) {
        double end = Math.max(area.getMinY(), Math.min(area.getMaxY(), to.getY()));
        double one = strips.get(i).valueAt(from.getY());
        double other = strips.get(i).valueAt(end);
        zoom = zoom.withValues(i, new Span(Math.min(one, other), Math.max(one, other)));
      }
    }
    view.zoom(zoom);
    repaint();
  }

  private static double inside(Rectangle2D area, double x) {
    return Math.max(area.getMinX(), Math.min(area.getMaxX(), x));
  }

  /** What the mouse does. */
  private final class Hand extends MouseInputAdapter {
    private Point2D from = new Point2D.Double();

    @Override
    public void mousePressed(MouseEvent event) {
      requestFocusInWindow();
      from = event.getPoint();
    }

    @Override
    public void mouseMoved(MouseEvent event) {
      List<DrawnStrip> strips = strips();
      if (DrawnStrip.isDrawn(strips)) {
        boolean isInside =
            strips.stream().anyMatch(strip -> strip.area().contains(event.getPoint()));
        read(isInside ? Optional.of(Reading.at(strips, event.getPoint())) : Optional.empty());
      }
    }

    @Override
    public void mouseDragged(MouseEvent event) {
      if (!strips().isEmpty()) {
        Rectangle2D box = new Rectangle2D.Double();
        box.setFrameFromDiagonal(from, event.getPoint());
        drag = Optional.of(box);
        repaint();
      }
    }

    @Override
    public void mouseReleased(MouseEvent event) {
      if (drag.isPresent()) {
        drag = Optional.empty();
        zoomTo(from, event.getPoint());
        repaint();
      }
    }

    @Override
    public void mouseExited(MouseEvent event) {
      read(Optional.empty());
    }
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    // Where there is a crosshair it says the same without covering the curve.
    if (drawn.getEntityCollection() == null || reading.isPresent()) {
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
