package loopwright.sizing;

import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.Drawer;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;

/** The values that there are: those of the design's drawer, or a series of preferred values. */
final class Stock {
  private static final PreferredValues USUAL = PreferredValues.E12;

  private Stock() {}

  /** Resistors between two values, Ω, ascending. */
  static List<Double> resistors(Design design, double low, double high) {
    return values(design.drawer().resistors(), low, high);
  }

  /** Capacitors between two values, F, ascending. */
  static List<Double> capacitors(Design design, double low, double high) {
    return values(design.drawer().capacitors(), low, high);
  }

  private static List<Double> values(Optional<Drawer.Stock> stock, double low, double high) {
    if (stock.isPresent() && stock.get() instanceof Drawer.Stock.Values values) {
      return values.values().stream()
          .map(Quantity::value)
          .filter(value -> value >= low && value <= high)
          .sorted()
          .distinct()
          .toList();
    }
    return stock
        .map(Drawer.Stock.Series.class::cast)
        .flatMap(series -> PreferredValues.named(series.series()))
        .orElse(USUAL)
        .between(low, high);
  }
}
