package loopwright.view.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.LineMetrics;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.data.xy.XYDataset;

/** All labels of one strip, laid out together each time it is drawn, at whatever size. */
final class LabelLayer extends AbstractXYAnnotation {
  private static final double PADDING = 2;

  /** Points nearer together than this are one obstacle. */
  private static final double CLOSE = 3;

  private final transient List<PlotLabel> labels;
  private final Font font;
  private final Color background;

  LabelLayer(List<PlotLabel> labels, Font font, Color background) {
    this.labels = List.copyOf(labels);
    this.font = font;
    this.background = background;
  }

  /** What it says, in the order of importance. */
  List<PlotLabel> labels() {
    return labels;
  }

  @Override
  public void draw(
      Graphics2D g2,
      XYPlot plot,
      Rectangle2D dataArea,
      ValueAxis domain,
      ValueAxis range,
      int rendererIndex,
      PlotRenderingInfo info) {
    Pixels pixels = new Pixels(plot, dataArea, domain, range);
    LabelPlacer placer = new LabelPlacer(inset(dataArea), pixels.curves(), pixels.marks());
    g2.setFont(font);
    LineMetrics metrics = font.getLineMetrics("0", g2.getFontRenderContext());
    double height = metrics.getAscent() + metrics.getDescent();
    for (PlotLabel label : labels) {
      double width = font.getStringBounds(label.text(), g2.getFontRenderContext()).getWidth();
      List<Point2D> anchors = label.anchors().stream().map(pixels::of).toList();
      Optional<Rectangle2D> place =
          placer.place(anchors, width + 2 * PADDING, height, label.optional());
      place.ifPresent(
          box -> {
            // A plate under the words, so that gridlines do not run through them.
            g2.setColor(PlotTheme.thin(background, 0.6f));
            g2.fill(box);
            g2.setColor(label.colour());
            g2.drawString(
                label.text(),
                (float) (box.getX() + PADDING),
                (float) (box.getY() + metrics.getAscent()));
          });
    }
  }

  private static Rectangle2D inset(Rectangle2D area) {
    return new Rectangle2D.Double(
        area.getX() + 2, area.getY() + 2, area.getWidth() - 4, area.getHeight() - 4);
  }

  /** From a plot's units to pixels. */
  private record Pixels(XYPlot plot, Rectangle2D area, ValueAxis domain, ValueAxis range) {
    Point2D of(Point2D point) {
      return new Point2D.Double(
          domain.valueToJava2D(point.getX(), area, plot.getDomainAxisEdge()),
          range.valueToJava2D(point.getY(), area, plot.getRangeAxisEdge()));
    }

    /** The lines of marked values and places. */
    List<Line2D> marks() {
      List<Line2D> lines = new ArrayList<>();
      for (double y : marked(plot.getRangeMarkers(Layer.BACKGROUND))) {
        double at = range.valueToJava2D(y, area, plot.getRangeAxisEdge());
        lines.add(new Line2D.Double(area.getMinX(), at, area.getMaxX(), at));
      }
      for (double x : marked(plot.getDomainMarkers(Layer.BACKGROUND))) {
        double at = domain.valueToJava2D(x, area, plot.getDomainAxisEdge());
        lines.add(new Line2D.Double(at, area.getMinY(), at, area.getMaxY()));
      }
      return lines;
    }

    List<Line2D> curves() {
      List<Line2D> lines = new ArrayList<>();
      for (int d = 0; d < plot.getDatasetCount(); d++) {
        XYDataset dataset = plot.getDataset(d);
        for (int series = 0; series < dataset.getSeriesCount(); series++) {
          addCurve(dataset, series, lines);
        }
      }
      return lines;
    }

    private static double[] marked(Collection<?> markers) {
      if (markers == null) {
        return new double[0];
      }
      return markers.stream()
          .filter(ValueMarker.class::isInstance)
          .mapToDouble(marker -> ((ValueMarker) marker).getValue())
          .toArray();
    }

    private void addCurve(XYDataset dataset, int series, List<Line2D> lines) {
      Point2D from = null;
      for (int item = 0; item < dataset.getItemCount(series); item++) {
        Point2D to =
            of(
                new Point2D.Double(
                    dataset.getXValue(series, item), dataset.getYValue(series, item)));
        if (Double.isNaN(to.getY())) {
          from = null;
        } else if (from == null) {
          from = to;
        } else if (from.distance(to) >= CLOSE) {
          lines.add(new Line2D.Double(from, to));
          from = to;
        }
      }
    }
  }
}
