package loopwright.view.chart;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.ui.RectangleEdge;

/**
 * A strip of a chart and where it was drawn.
 *
 * @param plot the strip
 * @param domain the axis of its places, which strips may share
 * @param area inside its frame, in pixels; empty before it was drawn
 */
record DrawnStrip(StripPlot plot, ValueAxis domain, Rectangle2D area) {
  /** The strips of a chart from the top; none of a chart of bars. */
  static List<DrawnStrip> of(JFreeChart chart, ChartRenderingInfo info) {
    List<DrawnStrip> strips = new ArrayList<>();
    if (chart.getPlot() instanceof CombinedDomainXYPlot combined) {
      List<?> plots = combined.getSubplots();
      for (int i = 0; i < plots.size(); i++) {
        Rectangle2D area =
            i < info.getPlotInfo().getSubplotCount()
                ? info.getPlotInfo().getSubplotInfo(i).getDataArea()
                : new Rectangle2D.Double();
        if (plots.get(i) instanceof StripPlot plot) {
          strips.add(new DrawnStrip(plot, combined.getDomainAxis(), area));
        }
      }
    } else if (chart.getPlot() instanceof StripPlot plot) {
      strips.add(new DrawnStrip(plot, plot.getDomainAxis(), info.getPlotInfo().getDataArea()));
    }
    return strips;
  }

  /** The strips of a chart that need not have been drawn. */
  static List<StripPlot> plots(JFreeChart chart) {
    return of(chart, new ChartRenderingInfo()).stream().map(DrawnStrip::plot).toList();
  }

  double placeAt(double pixel) {
    return domain.java2DToValue(pixel, area, RectangleEdge.BOTTOM);
  }

  double pixelOf(double place) {
    return domain.valueToJava2D(place, area, RectangleEdge.BOTTOM);
  }

  double valueAt(double pixel) {
    return plot.getRangeAxis().java2DToValue(pixel, area, RectangleEdge.LEFT);
  }

  double pixelOfValue(double value) {
    return plot.getRangeAxis().valueToJava2D(value, area, RectangleEdge.LEFT);
  }

  /** Whether all of them have a place in pixels. */
  static boolean isDrawn(List<DrawnStrip> strips) {
    return !strips.isEmpty() && strips.stream().noneMatch(strip -> strip.area().isEmpty());
  }
}
