package loopwright.view.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.predict.OffsetShare;
import loopwright.quantity.Unit;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.CategoryAxis;
import org.jfree.chart.labels.CategoryItemLabelGenerator;
import org.jfree.chart.labels.CategoryToolTipGenerator;
import org.jfree.chart.labels.ItemLabelAnchor;
import org.jfree.chart.labels.ItemLabelPosition;
import org.jfree.chart.plot.CategoryPlot;
import org.jfree.chart.plot.PlotOrientation;
import org.jfree.chart.renderer.category.BarRenderer;
import org.jfree.chart.renderer.category.StandardBarPainter;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.category.CategoryDataset;
import org.jfree.data.category.DefaultCategoryDataset;

/** Horizontal bars of shares, each with its value at its end, and their sum as the last. */
final class OffsetBars {
  /** The last bar: what the others add up to. */
  static final String TOTAL = "output offset, solved";

  /** Share of the axis that is kept for the value at the end of a bar. */
  private static final double ROOM_FOR_VALUE = 0.48;

  private OffsetBars() {}

  /**
   * The chart.
   *
   * @param shares one bar each
   * @param total the last bar, V
   */
  static JFreeChart of(List<OffsetShare> shares, double total, PlotTheme theme) {
    DefaultCategoryDataset dataset = new DefaultCategoryDataset();
    for (int i = 0; i < shares.size(); i++) {
      dataset.addValue(shares.get(i).output(), "share", new Bar(i, shares.get(i).cause()));
    }
    dataset.addValue(total, "share", new Bar(shares.size(), TOTAL));
    Span span =
        Span.of(
                DoubleStream.concat(
                    shares.stream().mapToDouble(OffsetShare::output), DoubleStream.of(total)))
            .with(0);
    EngineeringAxis volts = new EngineeringAxis(Unit.VOLT, withRoom(span));
    ChartStyle.axis(volts, theme);
    CategoryPlot plot = new CategoryPlot(dataset, causes(theme), volts, bars(theme));
    plot.setOrientation(PlotOrientation.HORIZONTAL);
    plot.setRangeAxisLocation(AxisLocation.BOTTOM_OR_LEFT);
    plot.setBackgroundPaint(theme.background());
    plot.setOutlinePaint(theme.rule());
    plot.setRangeGridlinePaint(theme.rule());
    plot.setRangeZeroBaselineVisible(true);
    plot.setRangeZeroBaselinePaint(theme.quiet());
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    return ChartStyle.chart(plot, theme);
  }

  private static Span withRoom(Span span) {
    return span.padded(
        span.lower() < 0 ? ROOM_FOR_VALUE : 0.04, span.upper() > 0 ? ROOM_FOR_VALUE : 0.04);
  }

  private static CategoryAxis causes(PlotTheme theme) {
    CategoryAxis causes = new CauseAxis();
    ChartStyle.axis(causes, theme);
    causes.setTickLabelPaint(theme.text());
    causes.setLowerMargin(0.02);
    causes.setUpperMargin(0.02);
    causes.setCategoryMargin(0.35);
    return causes;
  }

  private static BarRenderer bars(PlotTheme theme) {
    BarRenderer bars = new SumRenderer(theme.curves().get(0), theme.accent());
    bars.setBarPainter(new StandardBarPainter());
    bars.setShadowVisible(false);
    bars.setDrawBarOutline(false);
    bars.setMaximumBarWidth(0.12);
    Values values = new Values();
    bars.setDefaultItemLabelsVisible(true);
    bars.setDefaultItemLabelGenerator(values);
    bars.setDefaultItemLabelFont(theme.small());
    bars.setDefaultItemLabelPaint(theme.text());
    bars.setDefaultPositiveItemLabelPosition(
        new ItemLabelPosition(ItemLabelAnchor.OUTSIDE3, TextAnchor.CENTER_LEFT));
    bars.setDefaultNegativeItemLabelPosition(
        new ItemLabelPosition(ItemLabelAnchor.OUTSIDE9, TextAnchor.CENTER_RIGHT));
    bars.setDefaultToolTipGenerator(values);
    return bars;
  }

  /** A bar by its place, so that two causes of one name stay two bars. */
  record Bar(int place, String cause) implements Comparable<Bar> {
    @Override
    public int compareTo(Bar other) {
      return Integer.compare(place, other.place);
    }

    @Override
    public String toString() {
      return cause;
    }
  }

  /** Gives each cause as many lines as there is height for: one long one, or up to three short. */
  private static final class CauseAxis extends CategoryAxis {
    private static final int MOST_LINES = 3;
    private static final float LONG = 0.5f;
    private static final float SHORT = 0.36f;

    @Override
    public List<?> refreshTicks(
        Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
      int bars = ((CategoryPlot) getPlot()).getDataset().getColumnCount();
      double line = g2.getFontMetrics(getTickLabelFont()).getHeight();
      int lines = (int) Math.max(1, Math.min(MOST_LINES, dataArea.getHeight() / bars / line));
      setMaximumCategoryLabelLines(lines);
      setMaximumCategoryLabelWidthRatio(lines == 1 ? LONG : SHORT);
      return super.refreshTicks(g2, state, dataArea, edge);
    }
  }

  /** Paints the last bar as what it is: the sum. */
  private static final class SumRenderer extends BarRenderer {
    private final Color share;
    private final Color sum;

    SumRenderer(Color share, Color sum) {
      this.share = share;
      this.sum = sum;
    }

    @Override
    public Paint getItemPaint(int row, int column) {
      return column == getPlot().getDataset().getColumnCount() - 1 ? sum : share;
    }
  }

  /** The value of a bar in words. */
  private static final class Values
      implements CategoryItemLabelGenerator, CategoryToolTipGenerator {
    @Override
    public String generateLabel(CategoryDataset data, int row, int column) {
      return Words.volts(data.getValue(row, column).doubleValue());
    }

    @Override
    public String generateToolTip(CategoryDataset data, int row, int column) {
      return data.getColumnKey(column) + ": " + generateLabel(data, row, column);
    }

    @Override
    public String generateRowLabel(CategoryDataset data, int row) {
      return data.getRowKey(row).toString();
    }

    @Override
    public String generateColumnLabel(CategoryDataset data, int column) {
      return data.getColumnKey(column).toString();
    }
  }
}
