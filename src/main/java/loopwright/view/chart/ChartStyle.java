package loopwright.view.chart;

import java.awt.BasicStroke;
import java.awt.font.FontRenderContext;
import java.util.List;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.Axis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleInsets;

/** Dresses charts in the theme. */
final class ChartStyle {
  private static final double BETWEEN_STRIPS = 10;

  private ChartStyle() {}

  /** An axis: no line of its own, quiet labels. */
  static void axis(Axis axis, PlotTheme theme) {
    axis.setAxisLineVisible(false);
    axis.setTickMarksVisible(false);
    axis.setTickLabelFont(theme.small());
    axis.setTickLabelPaint(theme.quiet());
    axis.setLabelFont(theme.small());
    axis.setLabelPaint(theme.quiet());
    axis.setTickLabelInsets(new RectangleInsets(3, 2, 2, 5));
    axis.setLabelInsets(new RectangleInsets(0, 0, 0, 0));
  }

  /** A plot: a thin frame, gridlines at the ticks, fainter ones between. */
  static void plot(XYPlot plot, PlotTheme theme) {
    plot.setBackgroundPaint(theme.background());
    plot.setOutlinePaint(theme.rule());
    BasicStroke thin = new BasicStroke(1f);
    plot.setDomainGridlinePaint(theme.rule());
    plot.setDomainGridlineStroke(thin);
    plot.setRangeGridlinePaint(theme.rule());
    plot.setRangeGridlineStroke(thin);
    plot.setDomainMinorGridlinesVisible(true);
    plot.setDomainMinorGridlinePaint(theme.faint());
    plot.setDomainMinorGridlineStroke(thin);
    plot.setDomainZeroBaselineVisible(false);
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
  }

  /**
   * Strips above one another along one axis.
   *
   * @param weights share of the height of each
   */
  static JFreeChart stack(
      ValueAxis shared, List<XYPlot> strips, List<Integer> weights, PlotTheme theme) {
    axis(shared, theme);
    CombinedDomainXYPlot combined = new CombinedDomainXYPlot(shared);
    combined.setGap(BETWEEN_STRIPS);
    combined.setBackgroundPaint(null);
    for (int i = 0; i < strips.size(); i++) {
      combined.add(strips.get(i), weights.get(i));
    }
    return chart(combined, theme);
  }

  /** Room for the half of the last label that stands beyond the end of its axis. */
  private static double halfALabel(PlotTheme theme) {
    FontRenderContext context = new FontRenderContext(null, true, true);
    return theme.small().getStringBounds("100 MHz", context).getWidth() / 2;
  }

  /** A chart without title or legend: words and labels stand elsewhere. */
  static JFreeChart chart(Plot plot, PlotTheme theme) {
    JFreeChart chart = new JFreeChart(null, theme.font(), plot, false);
    chart.setBackgroundPaint(theme.background());
    chart.setPadding(RectangleInsets.ZERO_INSETS);
    plot.setInsets(new RectangleInsets(8, 2, 2, halfALabel(theme)));
    return chart;
  }
}
