package loopwright.propose;

import java.util.List;
import loopwright.design.DesignException;
import loopwright.design.Drawer;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;

/** The values in stock of one kind of part, ascending. */
record Values(List<Double> all) {
  /**
   * Those of a stock between two values.
   *
   * @throws DesignException when there is none
   */
  static Values of(String what, Drawer.Stock stock, double low, double high) {
    List<Double> all =
        stock instanceof Drawer.Stock.Values values
            ? values.values().stream()
                .map(Quantity::value)
                .filter(value -> value >= low && value <= high)
                .sorted()
                .distinct()
                .toList()
            : PreferredValues.named(((Drawer.Stock.Series) stock).series())
                .orElseThrow(
                    () ->
                        new DesignException(
                            what,
                            "found the series \""
                                + ((Drawer.Stock.Series) stock).series()
                                + "\", expected E3, E6, E12, E24, E48 or E96"))
                .between(low, high);
    if (all.isEmpty()) {
      throw new DesignException(what, "found no value in stock, expected at least one");
    }
    return new Values(all);
  }

  /** The value whose ratio to the wanted one is nearest to 1. */
  double nearest(double wanted) {
    double best = all.get(0);
    for (double value : all) {
      if (Math.abs(Math.log(value / wanted)) < Math.abs(Math.log(best / wanted))) {
        best = value;
      }
    }
    return best;
  }

  /** The least value that is not below the wanted one, or the largest there is. */
  double atLeast(double wanted) {
    return all.stream()
        .filter(value -> value >= wanted * (1 - 1e-9))
        .findFirst()
        .orElse(all.get(all.size() - 1));
  }

  /** The next value above, or the largest there is. */
  double above(double present) {
    return atLeast(present * (1 + 1e-6));
  }

  /** The next value below, or the least there is. */
  double below(double present) {
    double found = all.get(0);
    for (double value : all) {
      if (value < present * (1 - 1e-6)) {
        found = value;
      }
    }
    return found;
  }

  /** The largest there is. */
  double largest() {
    return all.get(all.size() - 1);
  }
}
