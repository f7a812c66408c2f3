package loopwright.part;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** Figures of a diode type as a datasheet prints them. */
public record DiodeDatasheet(
    List<ForwardVoltage> forwardVoltage,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) Optional<Quantity> capacitance,
    @Measure(unit = Unit.SECOND, range = Range.NOT_NEGATIVE) Optional<Quantity> recoveryTime) {
  /** Keeps its own copy of the list. */
  public DiodeDatasheet {
    forwardVoltage = List.copyOf(forwardVoltage);
  }

  /** Forward voltage at a current. */
  public record ForwardVoltage(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> typical,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> maximum) {}
}
