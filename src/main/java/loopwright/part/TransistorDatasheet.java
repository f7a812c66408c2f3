package loopwright.part;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** Figures of a transistor type as a datasheet prints them, polarity signs dropped. */
public record TransistorDatasheet(
    List<Beta> beta,
    List<BaseEmitterVoltage> baseEmitterVoltage,
    Optional<TransitionFrequency> transitionFrequency,
    Optional<Capacitance> outputCapacitance,
    Optional<Capacitance> inputCapacitance,
    Optional<OutputConductance> outputConductance,
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE_OR_INFINITE) Optional<Quantity> earlyVoltage,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) Optional<Quantity> baseResistance) {
  /** Keeps its own copies of the lists. */
  public TransistorDatasheet {
    beta = List.copyOf(beta);
    baseEmitterVoltage = List.copyOf(baseEmitterVoltage);
  }

  /** Current gain at a collector current; where no voltage is given, 5 V is meant. */
  public record Beta(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> collectorEmitterVoltage,
      @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> minimum,
      @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> typical,
      @Measure(unit = Unit.ONE, range = Range.POSITIVE) Optional<Quantity> maximum) {}

  /** Base-emitter voltage at a collector current, in the active region or saturated. */
  public record BaseEmitterVoltage(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> minimum,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> typical,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> maximum,
      @Otherwise("false") boolean saturated) {}

  /** Transition frequency at a collector current. */
  public record TransitionFrequency(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> collectorEmitterVoltage,
      @Measure(unit = Unit.HERTZ, range = Range.POSITIVE) Optional<Quantity> minimum,
      @Measure(unit = Unit.HERTZ, range = Range.POSITIVE) Optional<Quantity> typical) {}

  /** A junction capacitance at a reverse voltage. */
  public record Capacitance(
      @Measure(unit = Unit.VOLT, range = Range.NOT_NEGATIVE) Quantity voltage,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<Quantity> typical,
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<Quantity> maximum) {}

  /** Output conductance h_oe at a collector current. */
  public record OutputConductance(
      @Measure(unit = Unit.AMPERE, range = Range.POSITIVE) Quantity current,
      @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> collectorEmitterVoltage,
      @Measure(unit = Unit.SIEMENS, range = Range.POSITIVE) Optional<Quantity> minimum,
      @Measure(unit = Unit.SIEMENS, range = Range.POSITIVE) Optional<Quantity> maximum) {}
}
