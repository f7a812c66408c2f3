package loopwright.design;

import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** A resistor or capacitor between any two named nodes: filters, bootstraps, trimmers, loads. */
public sealed interface Extra permits Extra.ExtraResistor, Extra.ExtraCapacitor {
  /** What the author calls it; unique, without dots. */
  String name();

  /** A named node. */
  String from();

  /** A named node. */
  String to();

  /** Its value, Ω or F. */
  PartValue value();

  /** A resistor. */
  @Kind("resistor")
  record ExtraResistor(
      String name,
      String from,
      String to,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue value)
      implements Extra {}

  /** A capacitor. */
  @Kind("capacitor")
  record ExtraCapacitor(
      String name,
      String from,
      String to,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) PartValue value)
      implements Extra {}
}
