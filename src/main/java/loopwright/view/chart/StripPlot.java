package loopwright.view.chart;

import java.util.function.BiFunction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.data.xy.XYDataset;

/** A plot that knows the units of its two axes and what each of its points means. */
final class StripPlot extends XYPlot {
  private final transient Unit along;
  private final transient Unit unit;
  private boolean isPlane;
  private transient BiFunction<Integer, Integer, String> words = (series, item) -> "";

  /**
   * @param along unit of the places
   * @param unit of the values
   * @param isPlane whether both axes are values of a third quantity, so that a curve may turn back
   */
  StripPlot(
      XYDataset data,
      ValueAxis domain,
      ValueAxis values,
      XYItemRenderer renderer,
      Unit along,
      Unit unit,
      boolean isPlane) {
    super(data, domain, values, renderer);
    this.along = along;
    this.unit = unit;
    this.isPlane = isPlane;
  }

  /**
   * Makes it a plane: both axes are values of a third quantity.
   *
   * @param says that quantity, by series and item
   */
  void asPlane(BiFunction<Integer, Integer, String> says) {
    isPlane = true;
    words = says;
  }

  Unit along() {
    return along;
  }

  Unit unit() {
    return unit;
  }

  boolean isPlane() {
    return isPlane;
  }

  /** A value of a curve in words. */
  String says(String curve, double value) {
    return (curve + " " + number(value, unit)).strip();
  }

  /** A place in words. */
  String places(double place) {
    return number(place, along);
  }

  /** A point of a curve in words. */
  String point(int series, int item) {
    String extra = words.apply(series, item);
    XYDataset data = getDataset();
    return (extra.isEmpty() ? "" : extra + ": ")
        + places(data.getXValue(series, item))
        + (isPlane ? ", " : " ")
        + number(data.getYValue(series, item), unit);
  }

  /** Rates as the axes write them, since they have no prefixes: −3.064 · 10⁶/s. */
  private static String number(double value, Unit unit) {
    if (unit != Unit.PER_SECOND || Math.abs(value) < 1e3) {
      return EngineeringFormat.format(value, unit);
    }
    AxisScale scale = AxisScale.of(unit, Math.abs(value));
    return scale.say(value, Math.pow(10, AxisScale.leadingPower(Math.abs(value)) - 3))
        + " · "
        + scale.onAxis();
  }
}
