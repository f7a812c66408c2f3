package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** How the output comes back to the input. */
public sealed interface Feedback permits Feedback.NonInverting, Feedback.Inverting, Feedback.Open {
  /** A divider to the inverting input; {@code upper} 0 is a wire, that is a follower. */
  @Kind("nonInverting")
  record NonInverting(
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) PartValue upper,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<PartValue> lower,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> lowerCapacitance,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> leadCapacitance,
      @Otherwise("ground") ReturnNode returnTo,
      @Otherwise("out") TakenFrom from)
      implements Feedback {}

  /** The source drives the inverting input through a resistor. */
  @Kind("inverting")
  record Inverting(
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue upper,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue inputResistor,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> leadCapacitance,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue returnResistance,
      @Otherwise("ground") ReturnNode returnTo,
      @Otherwise("out") TakenFrom from)
      implements Feedback {}

  /** No feedback: the inverting input is returned to ground. */
  @Kind("open")
  record Open(
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue returnResistance)
      implements Feedback {}
}
