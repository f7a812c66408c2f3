package loopwright.characterise;

import java.util.function.ToDoubleFunction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * A figure of a record together with the way in which parameters give it back.
 *
 * @param name what it is, in words
 * @param unit its unit
 * @param at the current in A, or for a capacitance the reverse voltage in V, at which it holds
 * @param bias where it holds, in words
 * @param nominal its nominal value
 * @param model the same figure from parameters, in the full equations at that bias
 * @param <P> the parameters of the device's equations
 */
record PrintedFigure<P>(
    String name, Unit unit, double at, String bias, Nominal nominal, ToDoubleFunction<P> model) {
  /** The nominal value. */
  double wanted() {
    return nominal.value();
  }

  /** The figure that the parameters give. */
  double returned(P parameters) {
    return model.applyAsDouble(parameters);
  }

  /** Both side by side; NaN is returned where the parameters cannot reach the bias. */
  FigureComparison compare(P parameters, FigureUse use) {
    double returned;
    try {
      returned = returned(parameters);
    } catch (FitException outOfReach) {
      returned = Double.NaN;
    }
    return new FigureComparison(
        name + nominal.origin().says(), unit, bias, wanted(), returned, use);
  }

  /** The figure with its bias, to stand in a sentence. */
  String says() {
    return name + " " + bias;
  }

  /** The figure with its bias and nominal value, to stand in a sentence. */
  String saysValue() {
    return says() + ", " + EngineeringFormat.format(wanted(), unit);
  }

  /** What a person should know of how the nominal value was taken; empty when it is plain. */
  String note() {
    return switch (nominal.origin()) {
      case ABOVE_MINIMUM ->
          "Of the "
              + says()
              + " only a minimum is printed: 1.5 times it, "
              + EngineeringFormat.format(wanted(), unit)
              + ", is taken as nominal.";
      case MAXIMUM_ALONE ->
          "Of the "
              + says()
              + " only a maximum is printed, which is never fitted: a typical value beside it is"
              + " needed.";
      case NOTHING -> "The " + says() + " has no value and is not used.";
      case TYPICAL, MEASURED, GEOMETRIC_MEAN, MEAN -> "";
    };
  }
}
