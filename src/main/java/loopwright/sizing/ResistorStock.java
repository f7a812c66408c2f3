package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Drawer;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;

/**
 * Resistors to choose from, ascending.
 *
 * @param singles one part each, Ω
 * @param choices one part, or also two in series or in parallel
 * @param tolerance of a part that the design states none for, a fraction
 * @param says where they come from
 */
record ResistorStock(
    List<Double> singles, List<ResistorChoice> choices, double tolerance, String says) {
  static final String DRAWER = "drawer";

  private static final double LEAST = 10;
  private static final double MOST = 1e6;

  /**
   * The resistors of a series or of the design's drawer, from 10 Ω to 1 MΩ.
   *
   * @param series {@code E12}, {@code E24}, {@code E96} or {@code drawer}
   * @param twoParts whether two parts may make one resistance
   * @throws DesignException when the drawer is asked for and holds no resistor
   */
  static ResistorStock of(Design design, String series, boolean twoParts) {
    List<Double> singles = series.equals(DRAWER) ? drawer(design) : series(series);
    List<ResistorChoice> choices = new ArrayList<>();
    singles.forEach(value -> choices.add(ResistorChoice.single(value)));
    if (twoParts) {
      for (int i = 0; i < singles.size(); i++) {
        for (int j = i; j < singles.size(); j++) {
          choices.add(ResistorChoice.inSeries(singles.get(i), singles.get(j)));
          choices.add(ResistorChoice.sideBySide(singles.get(i), singles.get(j)));
        }
      }
      choices.sort(Comparator.comparingDouble(ResistorChoice::value));
    }
    return new ResistorStock(
        singles,
        choices,
        tolerance(series.equals(DRAWER) ? seriesInDrawer(design) : series),
        series.equals(DRAWER) ? "the drawer" : "series " + series);
  }

  /**
   * Common practice, no source: parts of a series come within the tolerance that makes its values
   * meet.
   */
  private static double tolerance(String series) {
    return switch (series) {
      case "E12" -> 0.1;
      case "E96" -> 0.01;
      default -> 0.05;
    };
  }

  /** The series that the drawer holds; its own name where it holds single values. */
  private static String seriesInDrawer(Design design) {
    return design.drawer().resistors().orElseThrow() instanceof Drawer.Stock.Series held
        ? held.series()
        : DRAWER;
  }

  private static List<Double> series(String name) {
    return PreferredValues.named(name)
        .orElseThrow(() -> new IllegalArgumentException("no series is called " + name))
        .between(LEAST, MOST);
  }

  private static List<Double> drawer(Design design) {
    Optional<Drawer.Stock> stock = design.drawer().resistors();
    if (stock.isEmpty()) {
      throw new DesignException(
          "drawer.resistors", "found no resistors, expected a list of values or a series");
    }
    if (stock.get() instanceof Drawer.Stock.Values values) {
      return values.values().stream().map(Quantity::value).sorted().distinct().toList();
    }
    return series(((Drawer.Stock.Series) stock.get()).series());
  }

  /** Whether a resistance may be made of two parts. */
  boolean hasTwoParts() {
    return choices.size() > singles.size();
  }

  /** Index of the first choice that is not below a value. */
  int firstNotBelow(double value) {
    int low = 0;
    int high = choices.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (choices.get(middle).value() < value) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }
}
