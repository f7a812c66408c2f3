package loopwright.view.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Objects;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.Tick;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.Marker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.xy.XYDataset;

/** What tests ask of axes and charts. */
final class Drawn {
  private Drawn() {}

  /** Labels of the ticks that an axis would have at this length, empty ones left out. */
  static List<String> labels(ValueAxis axis, RectangleEdge edge, int length) {
    List<String> labels = new ArrayList<>();
    for (Tick tick : ticks(axis, edge, length)) {
      if (!tick.getText().isEmpty()) {
        labels.add(tick.getText());
      }
    }
    return labels;
  }

  /** The ticks that an axis would have at this length. */
  static List<Tick> ticks(ValueAxis axis, RectangleEdge edge, int length) {
    Graphics2D g2 = new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB).createGraphics();
    List<Tick> ticks = new ArrayList<>();
    for (Object tick :
        axis.refreshTicks(
            g2, new AxisState(), new Rectangle2D.Double(0, 0, length, length), edge)) {
      ticks.add((Tick) tick);
    }
    g2.dispose();
    return ticks;
  }

  /** The strips of a picture, from the top. */
  static List<XYPlot> strips(Picture picture) {
    JFreeChart chart = picture.chart().orElseThrow();
    return ((CombinedDomainXYPlot) chart.getPlot())
        .getSubplots().stream().map(XYPlot.class::cast).toList();
  }

  /** Places of a series. */
  static double[] x(XYPlot strip, int series) {
    XYDataset data = strip.getDataset();
    double[] x = new double[data.getItemCount(series)];
    for (int i = 0; i < x.length; i++) {
      x[i] = data.getXValue(series, i);
    }
    return x;
  }

  /** Values of a series. */
  static double[] y(XYPlot strip, int series) {
    XYDataset data = strip.getDataset();
    double[] y = new double[data.getItemCount(series)];
    for (int i = 0; i < y.length; i++) {
      y[i] = data.getYValue(series, i);
    }
    return y;
  }

  /** What stands beside curves and marks. */
  static List<String> words(XYPlot strip) {
    return layer(strip).stream().map(PlotLabel::text).toList();
  }

  /** The colour of those words. */
  static Color colour(XYPlot strip, String text) {
    return layer(strip).stream()
        .filter(label -> label.text().equals(text))
        .findFirst()
        .orElseThrow()
        .colour();
  }

  /** Marked places, or marked values: lines and shades. */
  static List<Marker> marks(Collection<?> markers) {
    return markers.stream().map(Marker.class::cast).toList();
  }

  private static List<PlotLabel> layer(XYPlot strip) {
    return strip.getAnnotations().stream()
        .map(annotation -> annotation instanceof LabelLayer layer ? layer.labels() : null)
        .filter(Objects::nonNull)
        .findFirst()
        .orElseThrow();
  }
}
