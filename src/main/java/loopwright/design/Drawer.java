package loopwright.design;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What is in stock. */
public record Drawer(
    @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<Stock> resistors,
    @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<Stock> capacitors,
    List<String> transistors) {
  /** Keeps its own copy of the list. */
  public Drawer {
    transistors = List.copyOf(transistors);
  }

  /** Values in stock: single ones, or a whole series of preferred values. */
  public sealed interface Stock permits Stock.Values, Stock.Series {
    /** Single values; written as a list. */
    record Values(List<Quantity> values) implements Stock {
      /** Keeps its own copy of the list. */
      public Values {
        values = List.copyOf(values);
      }
    }

    /** Every value of a series such as {@code E24}; written as its name. */
    record Series(String series) implements Stock {}
  }
}
