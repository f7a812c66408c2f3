package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Instrument;
import loopwright.design.InstrumentKind;
import loopwright.quantity.Quantity;

/**
 * From an instrument's statement to uncertainty. A statement such as ± (0.5 % of reading + 2
 * digits) is one limit: its terms are added, and the reading is uniform within it. An oscilloscope
 * also has the steps of its converter.
 */
public final class InstrumentAccuracy {
  /** Steps of an eight-bit converter over the full scale; common practice, no source. */
  private static final int STEPS = 256;

  /** Correlation of the accuracy of two channels of one instrument; an assumption, no source. */
  private static final double CORRELATION = 0.5;

  private static final String ACCURACY = "accuracy of ";

  private InstrumentAccuracy() {}

  /**
   * Contributions to a single value read.
   *
   * @param name of the instrument
   * @param value what it shows, in the unit of its ranges
   */
  public static List<Contribution> of(String name, Instrument instrument, double value) {
    List<Contribution> contributions = new ArrayList<>();
    double limit =
        number(instrument.percentOfReading()) * Math.abs(value)
            + number(instrument.percentOfRange()) * fullScale(instrument)
            + number(instrument.digits()) * number(instrument.resolution());
    if (limit > 0) {
      contributions.add(Contribution.rectangular(ACCURACY + name, limit));
    }
    if (instrument.digits().isEmpty() && instrument.resolution().isPresent()) {
      contributions.add(
          Contribution.rectangular("resolution of " + name, number(instrument.resolution()) / 2));
    }
    if (instrument.kind() == InstrumentKind.OSCILLOSCOPE && fullScale(instrument) > 0) {
      contributions.add(
          Contribution.rectangular("steps of " + name, fullScale(instrument) / STEPS / 2));
    }
    return contributions;
  }

  /**
   * Contributions to a ratio of two values that one instrument shows, such as a gain. What its
   * accuracy does to both is partly the same and cancels in the ratio.
   *
   * @param ratio output over input
   * @param input what it shows of the input, in the unit of its ranges; 0 when not known
   */
  static List<Contribution> ofRatio(
      String name, Instrument instrument, double ratio, double input) {
    if (input == 0) {
      double relative = number(instrument.percentOfReading()) + number(instrument.percentOfRange());
      return relative == 0
          ? List.of()
          : List.of(Contribution.rectangular(ACCURACY + name, correlated(ratio * relative)));
    }
    List<Contribution> contributions = new ArrayList<>();
    double output = ratio * input;
    List<Contribution> ofOutput = of(name, instrument, output);
    List<Contribution> ofInput = of(name, scaled(instrument, input, output), input);
    for (int i = 0; i < ofOutput.size(); i++) {
      double fromOutput = ofOutput.get(i).standard() / Math.abs(input);
      double fromInput = ofInput.get(i).standard() * Math.abs(ratio / input);
      boolean accuracy = ofOutput.get(i).cause().startsWith(ACCURACY);
      double product = accuracy ? 2 * CORRELATION * fromOutput * fromInput : 0;
      contributions.add(
          Contribution.normal(
              ofOutput.get(i).cause(),
              Math.sqrt(fromOutput * fromOutput + fromInput * fromInput - product),
              Double.POSITIVE_INFINITY));
    }
    return contributions;
  }

  private static double correlated(double limit) {
    return limit * Math.sqrt(2 - 2 * CORRELATION);
  }

  /** A person sets each channel so that its trace fills the screen alike. */
  private static Instrument scaled(Instrument instrument, double input, double output) {
    double share = output == 0 ? 1 : Math.min(1, Math.abs(input / output));
    return new Instrument(
        instrument.kind(),
        instrument.percentOfReading(),
        instrument.percentOfRange(),
        instrument.range().map(range -> Quantity.of(range.value() * share)),
        instrument.digits(),
        instrument.resolution().map(step -> Quantity.of(step.value() * share)),
        instrument.divisions(),
        instrument.voltsPerDivision().map(volts -> Quantity.of(volts.value() * share)),
        instrument.inputResistance(),
        instrument.inputCapacitance(),
        instrument.displayLoad());
  }

  private static double fullScale(Instrument instrument) {
    return instrument.range().isPresent()
        ? number(instrument.range())
        : number(instrument.divisions()) * number(instrument.voltsPerDivision());
  }

  private static double number(Optional<Quantity> quantity) {
    return quantity.map(Quantity::value).orElse(0.0);
  }
}
