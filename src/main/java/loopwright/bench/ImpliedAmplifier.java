package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupGains;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * What closed-loop readings say of the amplifier itself. A closed-loop gain is ideal/(1 + NG/A)
 * (Black 1934), so that 1/A = (ideal/G − 1)/NG; an output offset is −NG₀ times the input offset,
 * beside what bias currents add. Readings of several hookups are weighted by their uncertainty.
 */
final class ImpliedAmplifier {
  private static final Set<String> GAINS = Set.of("gain", "closedLoopGain", "closedLoopGainAtRest");

  /** An interval of A whose ends are further apart than this ratio determines nothing. */
  private static final double WIDE = 5;

  private static final String INSTEAD =
      "measure v(in+) − v(in−) with the loop closed, or the gain of an open hookup, instead.";

  private ImpliedAmplifier() {}

  /** An estimate with its expanded uncertainty. */
  record Estimate(double value, double uncertainty) {
    /** Those of several readings, weighted by the inverse squares of their uncertainties. */
    static Optional<Estimate> of(List<Estimate> estimates) {
      double weights = 0;
      double sum = 0;
      for (Estimate estimate : estimates) {
        double weight = 1 / (estimate.uncertainty * estimate.uncertainty);
        weights += weight;
        sum += weight * estimate.value;
      }
      return weights > 0 && Double.isFinite(weights)
          ? Optional.of(new Estimate(sum / weights, 1 / Math.sqrt(weights)))
          : Optional.empty();
    }
  }

  static List<String> says(Design design, List<ReadingVerdict> verdicts) {
    List<String> says = new ArrayList<>();
    List<Estimate> inverses = new ArrayList<>();
    List<Estimate> offsets = new ArrayList<>();
    for (ReadingVerdict verdict : verdicts) {
      Optional<Hookup> hookup = verdict.reading().hookup().flatMap(design::hookup);
      if (hookup.isPresent() && verdict.predicted().number().isPresent()) {
        HookupGains gains = new HookupGains(hookup.get());
        if (GAINS.contains(verdict.reading().quantity())) {
          inverseGain(design, verdict, gains).ifPresent(inverses::add);
        } else if (verdict.reading().quantity().equals("outputOffset")) {
          offset(design, verdict, gains).ifPresent(offsets::add);
        }
      }
    }
    Estimate.of(inverses).ifPresent(inverse -> says.add(gain(inverse)));
    Estimate.of(offsets).ifPresent(offset -> says.add(offset(offset)));
    return says;
  }

  private static Optional<Estimate> inverseGain(
      Design design, ReadingVerdict verdict, HookupGains gains) {
    OptionalDouble ideal = gains.idealGain();
    if (ideal.isEmpty() || verdict.measured() == 0) {
      return Optional.empty();
    }
    double noiseGain = gains.noiseGain().getAsDouble();
    double ratio = Math.abs(ideal.getAsDouble() / verdict.measured());
    double ofReading = verdict.measuredUncertainty() / Math.abs(verdict.measured());
    double ofIdeal = DividerSpread.relative(design, noiseGain);
    return Optional.of(
        new Estimate((ratio - 1) / noiseGain, ratio * Math.hypot(ofReading, ofIdeal) / noiseGain));
  }

  /** 1/A within an interval: as an interval of A, or why it is none. */
  private static String gain(Estimate inverse) {
    double most = inverse.value() + inverse.uncertainty();
    double least = inverse.value() - inverse.uncertainty();
    if (most <= 0) {
      return "The closed-loop gains read are above the ideal ones by more than their uncertainty:"
          + " look at resistors and instruments before the amplifier.";
    }
    String above = EngineeringFormat.format(1 / most, Unit.ONE, 2);
    if (least <= 0) {
      return "Open-loop gain: not determined, anything above "
          + above
          + " gives these closed-loop gains; "
          + INSTEAD;
    }
    String interval = above + " to " + EngineeringFormat.format(1 / least, Unit.ONE, 2);
    return most / least > WIDE
        ? "Open-loop gain: not determined, "
            + interval
            + " gives these closed-loop gains; "
            + INSTEAD
        : "Open-loop gain implied by the closed-loop gains: " + interval + ".";
  }

  /** The offset that was predicted, and what the reading adds to it behind the noise gain. */
  private static Optional<Estimate> offset(
      Design design, ReadingVerdict verdict, HookupGains gains) {
    OptionalDouble noiseGain = gains.restNoiseGain();
    OptionalDouble predicted =
        HookupFigures.of(design, verdict.reading().hookup().orElseThrow())
            .solved(Catalogue.find("inputOffset").orElseThrow())
            .number();
    if (noiseGain.isEmpty() || predicted.isEmpty() || !(verdict.measuredUncertainty() > 0)) {
      return Optional.empty();
    }
    double difference = verdict.measured() - verdict.predicted().number().getAsDouble();
    return Optional.of(
        new Estimate(
            predicted.getAsDouble() - difference / noiseGain.getAsDouble(),
            verdict.measuredUncertainty() / noiseGain.getAsDouble()));
  }

  private static String offset(Estimate offset) {
    return "Input offset implied by the output offsets: "
        + EngineeringFormat.format(offset.value() - offset.uncertainty(), Unit.VOLT, 3)
        + " to "
        + EngineeringFormat.format(offset.value() + offset.uncertainty(), Unit.VOLT, 3)
        + ", if the bias currents are as predicted.";
  }
}
