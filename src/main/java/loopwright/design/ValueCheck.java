package loopwright.design;

import java.util.Optional;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** Single values: every one inside the range of its field, also in a design built by a program. */
final class ValueCheck {
  private static final double ABSOLUTE_ZERO = -273.15;

  private final Problems problems;

  private ValueCheck(Problems problems) {
    this.problems = problems;
  }

  static void check(Design design, Problems problems) {
    ValueCheck check = new ValueCheck(problems);
    DesignWalk.over(design, check::value);
    check.stock("drawer.resistors", Unit.OHM, design.drawer().resistors());
    check.stock("drawer.capacitors", Unit.FARAD, design.drawer().capacitors());
    problems.checkOrder(
        "tolerances.ambient",
        design.tolerances().ambient().map(Tolerances.AmbientRange::minimum),
        design.tolerances().ambient().map(Tolerances.AmbientRange::maximum));
    if (design.amplifier() instanceof FiguresAmplifier figures) {
      check.outputs(design.rails(), figures);
    }
  }

  private void value(String path, Field field, Object value) {
    if (value instanceof Quantity quantity) {
      range(path, field.range(), field.unit(), quantity);
      boolean cold = field.unit().equals(Optional.of(Unit.CELSIUS));
      if (cold && quantity.value() <= ABSOLUTE_ZERO) {
        problems.add(path, written(quantity), "a temperature above -273.15 °C");
      }
    } else if (value instanceof PartValue part) {
      part.measured()
          .filter(measured -> measured.value() == 0)
          .ifPresent(
              measured ->
                  problems.add(
                      path + ".measured", written(measured), "a measured value above zero"));
    } else if (value instanceof Tolerances.BetaSpread.ByFraction spread) {
      range(path, Range.FRACTION, Optional.of(Unit.ONE), spread.fraction());
    } else if (value instanceof Integer count && field.name().equals("count")) {
      if (count < 1 || count > DeviceRoles.MOST_DIODES) {
        problems.add(
            path,
            count.toString(),
            "a whole number from 1 to " + DeviceRoles.MOST_DIODES + " of diodes");
      }
    }
  }

  private void range(String path, Range range, Optional<Unit> unit, Quantity quantity) {
    try {
      quantity.requireWithin(range, unit.orElse(Unit.ONE));
    } catch (QuantityException e) {
      problems.add(new Problem(path, e.getMessage()));
    }
  }

  private void stock(String path, Unit unit, Optional<Drawer.Stock> stock) {
    if (stock.isEmpty()) {
      return;
    }
    if (stock.get() instanceof Drawer.Stock.Series series) {
      if (PreferredValues.named(series.series()).isEmpty()) {
        problems.add(path, "\"" + series.series() + "\"", "a series from E3 to E96");
      }
    } else if (stock.get() instanceof Drawer.Stock.Values values) {
      for (int i = 0; i < values.values().size(); i++) {
        range(path + "." + i, Range.POSITIVE, Optional.of(unit), values.values().get(i));
      }
    }
  }

  private void outputs(Rails rails, FiguresAmplifier figures) {
    Quantity low = figures.outputLow().orElse(rails.negative());
    Quantity high = figures.outputHigh().orElse(rails.positive());
    if (low.value() >= high.value()) {
      problems.add(
          "amplifier.outputHigh",
          written(high) + " with a lowest output of " + written(low),
          "a highest output above the lowest");
    }
  }

  private static String written(Quantity quantity) {
    return quantity.spelling();
  }
}
