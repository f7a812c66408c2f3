package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.design.Instrument;
import loopwright.design.Reading;
import loopwright.quantity.Quantity;

/**
 * A reading with its uncertainty.
 *
 * @param value in the quantity's own unit and meaning
 * @param uncertainty what it is known to
 * @param says what the uncertainty rests on
 */
record MeasuredValue(double value, Uncertainty uncertainty, String says) {
  /** Quantities that are the ratio of two voltages. */
  private static final Set<String> RATIOS =
      Set.of(
          "gain",
          "openLoopGain",
          "openLoopGainHigh",
          "openLoopGainLow",
          "openLoopGainAtRest",
          "closedLoopGain",
          "closedLoopGainAtRest");

  /** An uncertainty that a person states covers 95 %. */
  private static final double STATED_FACTOR = 2;

  static MeasuredValue of(Design design, Reading reading) {
    double factor = Expression.factor(reading.quantity(), reading.expression());
    double value = reading.value().value() * factor;
    if (reading.uncertainty().isPresent()) {
      double standard = reading.uncertainty().get().value() * factor / STATED_FACTOR;
      return new MeasuredValue(
          value,
          Uncertainty.of(Contribution.normal("as stated", standard, Double.POSITIVE_INFINITY)),
          "uncertainty as stated");
    }
    List<Contribution> contributions = new ArrayList<>();
    Optional<Instrument> instrument =
        reading.instrument().map(name -> design.bench().instruments().get(name));
    if (instrument.isPresent()) {
      String name = reading.instrument().get();
      List<Contribution> shown =
          RATIOS.contains(reading.quantity())
              ? InstrumentAccuracy.ofRatio(
                  name, instrument.get(), reading.value().value(), input(design, reading))
              : InstrumentAccuracy.of(name, instrument.get(), reading.value().value());
      shown.forEach(each -> contributions.add(times(each, factor)));
    }
    if (contributions.isEmpty()) {
      contributions.add(
          Contribution.rectangular(
              "last digit as written", factor * LastDigit.of(reading.value()) / 2));
      return new MeasuredValue(
          value,
          new Uncertainty(contributions),
          "no instrument says how far to believe it: known to its last digit as written");
    }
    return new MeasuredValue(
        value, new Uncertainty(contributions), "accuracy of " + reading.instrument().get());
  }

  /** Peak of what drives the hookup, V; 0 when not known. */
  private static double input(Design design, Reading reading) {
    return reading
        .amplitude()
        .map(Quantity::value)
        .or(
            () ->
                reading
                    .hookup()
                    .flatMap(design::hookup)
                    .map(Hookup::source)
                    .map(source -> source.amplitude().value()))
        .orElse(0.0);
  }

  private static Contribution times(Contribution contribution, double factor) {
    return new Contribution(
        contribution.cause(),
        contribution.standard() * factor,
        contribution.degreesOfFreedom(),
        contribution.rectangular());
  }
}
