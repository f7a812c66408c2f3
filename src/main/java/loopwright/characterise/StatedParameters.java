package loopwright.characterise;

import java.util.Optional;
import java.util.function.Function;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeParameters;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorParameters;
import loopwright.quantity.Quantity;

/**
 * The parameters that a record states outright: its model's, then those that a datasheet prints as
 * such, then the defaults. What is left to be solved is NaN or at its default.
 */
final class StatedParameters {
  private StatedParameters() {}

  /** A transistor's parameters as far as they are stated. */
  static TransistorParameters of(
      Optional<TransistorModel> model, Optional<TransistorDatasheet> datasheet) {
    TransistorParameters defaults = TransistorParameters.DEFAULTS;
    return new TransistorParameters(
        stated(model, TransistorModel::saturationCurrent, defaults.saturationCurrent()),
        stated(model, TransistorModel::forwardBeta, defaults.forwardBeta()),
        stated(model, TransistorModel::reverseBeta, defaults.reverseBeta()),
        stated(
            model,
            TransistorModel::earlyVoltage,
            stated(datasheet, TransistorDatasheet::earlyVoltage, defaults.earlyVoltage())),
        stated(model, TransistorModel::kneeCurrent, defaults.kneeCurrent()),
        stated(model, TransistorModel::recombinationCurrent, defaults.recombinationCurrent()),
        stated(model, TransistorModel::recombinationIdeality, defaults.recombinationIdeality()),
        stated(
            model,
            TransistorModel::baseResistance,
            stated(datasheet, TransistorDatasheet::baseResistance, defaults.baseResistance())),
        stated(model, TransistorModel::emitterResistance, defaults.emitterResistance()),
        stated(model, TransistorModel::collectorResistance, defaults.collectorResistance()),
        stated(model, TransistorModel::baseEmitterCapacitance, defaults.baseEmitterCapacitance()),
        stated(
            model, TransistorModel::baseCollectorCapacitance, defaults.baseCollectorCapacitance()),
        stated(model, TransistorModel::transitTime, defaults.transitTime()),
        stated(model, TransistorModel::reverseTransitTime, defaults.reverseTransitTime()),
        stated(model, TransistorModel::flickerCorner, defaults.flickerCorner()));
  }

  /**
   * A diode's parameters as far as they are stated.
   *
   * @param model the record's model
   * @param ideality what holds where the model states none
   */
  static DiodeParameters of(Optional<DiodeModel> model, double ideality) {
    DiodeParameters defaults = DiodeParameters.DEFAULTS;
    return new DiodeParameters(
        stated(model, DiodeModel::saturationCurrent, defaults.saturationCurrent()),
        stated(model, DiodeModel::ideality, ideality),
        stated(model, DiodeModel::seriesResistance, defaults.seriesResistance()),
        stated(model, DiodeModel::capacitance, defaults.capacitance()),
        stated(model, DiodeModel::transitTime, defaults.transitTime()));
  }

  private static <R> double stated(
      Optional<R> record, Function<R, Optional<Quantity>> field, double otherwise) {
    return record.flatMap(field).map(Quantity::value).orElse(otherwise);
  }
}
