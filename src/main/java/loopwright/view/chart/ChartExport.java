package loopwright.view.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import javax.imageio.ImageIO;
import loopwright.file.CurveTable;
import loopwright.quantity.Unit;
import loopwright.sheet.VectorPicture;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.CategoryPlot;
import org.jfree.data.category.CategoryDataset;
import org.jfree.data.xy.XYDataset;

/** A chart with its title as a picture, as lines and letters, and as numbers. */
final class ChartExport {
  /** Pixels of a picture for one of the screen. */
  private static final int FINE = 2;

  private static final int ABOVE_TITLE = 6;
  private static final float LEAST_FONT = 9f;

  private final JFreeChart chart;
  private final String title;
  private final Color background;
  private final Color text;
  private final Font font;
  private final int width;
  private final int height;

  /**
   * @param width in pixels of the screen
   * @param height in pixels of the screen, title included
   */
  ChartExport(JFreeChart chart, String title, PlotTheme theme, int width, int height) {
    this.chart = chart;
    this.title = title;
    this.background = theme.background();
    this.text = theme.text();
    this.font = theme.title();
    this.width = width;
    this.height = height;
  }

  /** The picture in pixels. */
  BufferedImage image() {
    BufferedImage image =
        new BufferedImage(FINE * width, FINE * height, BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    g2.scale(FINE, FINE);
    paint(g2);
    g2.dispose();
    return image;
  }

  byte[] png() {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try {
      ImageIO.write(image(), "png", bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  byte[] svg() {
    return VectorPicture.svg(width, height, this::paint);
  }

  private void paint(Graphics2D g2) {
    g2.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g2.setColor(background);
    g2.fillRect(0, 0, width, height);
    Font fitting = font;
    while (fitting.getSize2D() > LEAST_FONT
        && fitting.getStringBounds(title, g2.getFontRenderContext()).getWidth() > width - 16) {
      fitting = fitting.deriveFont(fitting.getSize2D() - 0.5f);
    }
    int head = ABOVE_TITLE + Math.round(1.4f * font.getSize2D());
    g2.setColor(text);
    g2.setFont(fitting);
    g2.drawString(title, 8f, ABOVE_TITLE + font.getSize2D());
    chart.draw(g2, new Rectangle2D.Double(0, head, width, height - head));
  }

  /** Every curve as it was predicted, whatever part of it is shown. */
  CurveTable table() {
    List<CurveTable.Column> columns = new ArrayList<>();
    double[] before = null;
    for (StripPlot plot : DrawnStrip.plots(chart)) {
      XYDataset data = plot.getDataset();
      for (int series = 0; series < data.getSeriesCount(); series++) {
        int curve = series;
        double[] x = numbers(data.getItemCount(series), i -> data.getXValue(curve, i));
        String name = data.getSeriesKey(series).toString();
        if (!Arrays.equals(x, before)) {
          columns.add(new CurveTable.Column(head("place", plot.along()), x));
          before = x;
        }
        columns.add(
            new CurveTable.Column(
                head(name, plot.unit()),
                numbers(data.getItemCount(series), i -> data.getYValue(curve, i))));
      }
    }
    if (chart.getPlot() instanceof CategoryPlot bars) {
      CategoryDataset data = bars.getDataset();
      for (int bar = 0; bar < data.getColumnCount(); bar++) {
        columns.add(
            new CurveTable.Column(
                data.getColumnKey(bar).toString(),
                new double[] {data.getValue(0, bar).doubleValue()}));
      }
    }
    return new CurveTable(columns);
  }

  private interface Point {
    double at(int index);
  }

  private static double[] numbers(int count, Point point) {
    double[] numbers = new double[count];
    for (int i = 0; i < count; i++) {
      numbers[i] = point.at(i);
    }
    return numbers;
  }

  private static String head(String name, Unit unit) {
    String what =
        switch (unit) {
          case HERTZ -> "frequency";
          case SECOND -> "time";
          default -> name;
        };
    String says = name.equals("place") ? what : name;
    return unit.symbol().isEmpty() ? says : says + " [" + unit.symbol() + "]";
  }
}
