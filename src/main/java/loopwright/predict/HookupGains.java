package loopwright.predict;

import java.util.OptionalDouble;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.design.ReturnNode;
import loopwright.design.Source;

/**
 * What the resistors around the amplifier alone decide: the driven-input ratio κ and resistance,
 * ideal gain and noise gain, at signal frequency (blocking capacitors shorted) and at rest (open).
 */
public final class HookupGains {
  private final Feedback feedback;
  private final Source source;
  private final double ratio;
  private final double resistance;
  private final double restRatio;
  private final double restResistance;
  private final double restBiasShare;

  /** The gains of a hookup. */
  public HookupGains(Hookup hookup) {
    this.feedback = hookup.feedback();
    this.source = hookup.source();
    double ahead = source.resistance().effective();
    double share = 1;
    if (source.attenuator().isPresent()) {
      Source.Attenuator attenuator = source.attenuator().get();
      double shunt = attenuator.shunt().effective();
      ahead += attenuator.series().effective();
      share = shunt / (ahead + shunt);
      ahead = parallel(ahead, shunt);
    }
    double bias =
        source.biasResistance().map(PartValue::effective).orElse(Double.POSITIVE_INFINITY);
    double divided = Double.isInfinite(bias) ? 1 : bias / (ahead + bias);
    this.ratio = share * divided;
    this.resistance = parallel(ahead, bias);
    boolean blocked = source.couplingCapacitance().isPresent();
    this.restRatio = blocked ? 0 : ratio;
    this.restResistance = blocked ? bias : resistance;
    this.restBiasShare = blocked ? 1 : 1 - divided;
  }

  /** Driven-input ratio κ at signal frequency. */
  public double inputRatio() {
    return ratio;
  }

  /** Resistance R_src that the driven terminal sees at signal frequency, Ω. */
  public double sourceResistance() {
    return resistance;
  }

  /**
   * Resistance R₊ that the non-inverting input sees at rest, Ω; infinite when it has no dc path.
   */
  public double restResistanceAtPlus() {
    return feedback instanceof Feedback.Inverting inverting
        ? inverting.returnResistance().effective()
        : restResistance;
  }

  /** Resistance between output and inverting input, Ω; 0 without feedback. */
  public double upper() {
    if (feedback instanceof Feedback.NonInverting divider) {
      return divider.upper().effective();
    }
    return feedback instanceof Feedback.Inverting inverting ? inverting.upper().effective() : 0;
  }

  /**
   * Resistance from the inverting input to the other end of the divider; infinite when there is
   * none.
   */
  public double lower() {
    if (feedback instanceof Feedback.NonInverting divider) {
      return divider.lower().map(PartValue::effective).orElse(Double.POSITIVE_INFINITY);
    }
    return feedback instanceof Feedback.Inverting inverting
        ? inverting.inputResistor().effective() + resistance
        : Double.POSITIVE_INFINITY;
  }

  /** Ideal gain from generator to output; empty with an open hookup. */
  public OptionalDouble idealGain() {
    if (feedback instanceof Feedback.Open) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        feedback instanceof Feedback.Inverting
            ? -ratio * upper() / lower()
            : ratio * (1 + upper() / lower()));
  }

  /** Noise gain; empty with an open hookup. */
  public OptionalDouble noiseGain() {
    return feedback instanceof Feedback.Open
        ? OptionalDouble.empty()
        : OptionalDouble.of(1 + upper() / lower());
  }

  /** Noise gain at rest, blocking capacitors open; empty with an open hookup. */
  public OptionalDouble restNoiseGain() {
    return feedback instanceof Feedback.Open
        ? OptionalDouble.empty()
        : OptionalDouble.of(1 + upper() / restLower());
  }

  /** Sign of the movement of the output when the generator rises. */
  public int direction() {
    return feedback instanceof Feedback.Inverting ? -1 : 1;
  }

  /**
   * What an ideal amplifier would put at the output with the generator at dc, V.
   *
   * @param midRail voltage of the mid-rail at rest, V; not read without one
   */
  public double reference(double midRail) {
    double bias = volts(source.biasTo(), midRail);
    double driven = restRatio * source.dc().value() + restBiasShare * bias;
    if (feedback instanceof Feedback.NonInverting divider) {
      double returned = volts(divider.returnTo(), midRail);
      return returned + restNoiseGain().getAsDouble() * (driven - returned);
    }
    if (feedback instanceof Feedback.Inverting inverting) {
      double returned = volts(inverting.returnTo(), midRail);
      return returned + (restNoiseGain().getAsDouble() - 1) * (returned - driven);
    }
    return bias;
  }

  private double restLower() {
    if (feedback instanceof Feedback.NonInverting divider) {
      return divider.lowerCapacitance().isPresent() ? Double.POSITIVE_INFINITY : lower();
    }
    return feedback instanceof Feedback.Inverting inverting
        ? inverting.inputResistor().effective() + restResistance
        : Double.POSITIVE_INFINITY;
  }

  private static double volts(ReturnNode node, double midRail) {
    return node == ReturnNode.GROUND ? 0 : midRail;
  }

  private static double parallel(double one, double other) {
    if (Double.isInfinite(one)) {
      return other;
    }
    return Double.isInfinite(other) ? one : one + other == 0 ? 0 : one * other / (one + other);
  }
}
