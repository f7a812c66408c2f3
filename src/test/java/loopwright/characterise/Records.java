package loopwright.characterise;

import java.util.List;
import java.util.Optional;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Short ways to write records for the tests. */
final class Records {
  private Records() {}

  /** A value that is there, or none where it is NaN. */
  static Optional<Quantity> of(double value) {
    return Double.isNaN(value) ? Optional.empty() : Optional.of(Quantity.of(value));
  }

  /** No value. */
  static Optional<Quantity> none() {
    return Optional.empty();
  }

  /** A datasheet with nothing but these betas and base-emitter voltages. */
  static TransistorDatasheet datasheet(
      List<TransistorDatasheet.Beta> betas, TransistorDatasheet.BaseEmitterVoltage... voltages) {
    return new TransistorDatasheet(
        betas,
        List.of(voltages),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        none(),
        none());
  }

  /** A typical current gain at 5 V. */
  static TransistorDatasheet.Beta beta(double current, double typical) {
    return beta(current, Double.NaN, typical, Double.NaN);
  }

  /** A current gain at 5 V; NaN leaves a column empty. */
  static TransistorDatasheet.Beta beta(
      double current, double minimum, double typical, double maximum) {
    return new TransistorDatasheet.Beta(
        Quantity.of(current), none(), of(minimum), of(typical), of(maximum));
  }

  /** A typical base-emitter voltage in the active region. */
  static TransistorDatasheet.BaseEmitterVoltage voltage(double current, double typical) {
    return new TransistorDatasheet.BaseEmitterVoltage(
        Quantity.of(current), none(), of(typical), none(), false);
  }

  /** The same datasheet with a transition frequency in Hz at 5 V; NaN leaves a column empty. */
  static TransistorDatasheet withTransitionFrequency(
      TransistorDatasheet sheet, double current, double minimum, double typical) {
    return new TransistorDatasheet(
        sheet.beta(),
        sheet.baseEmitterVoltage(),
        Optional.of(
            new TransistorDatasheet.TransitionFrequency(
                Quantity.of(current), none(), of(minimum), of(typical))),
        sheet.outputCapacitance(),
        sheet.inputCapacitance(),
        sheet.outputConductance(),
        sheet.earlyVoltage(),
        sheet.baseResistance());
  }

  /** The same datasheet with typical capacitances in F at reverse voltages in V. */
  static TransistorDatasheet withCapacitances(
      TransistorDatasheet sheet,
      TransistorDatasheet.Capacitance output,
      TransistorDatasheet.Capacitance input) {
    return new TransistorDatasheet(
        sheet.beta(),
        sheet.baseEmitterVoltage(),
        sheet.transitionFrequency(),
        Optional.of(output),
        Optional.of(input),
        sheet.outputConductance(),
        sheet.earlyVoltage(),
        sheet.baseResistance());
  }

  /** A capacitance at a reverse voltage; NaN leaves a column empty. */
  static TransistorDatasheet.Capacitance capacitance(
      double voltage, double typical, double maximum) {
    return new TransistorDatasheet.Capacitance(Quantity.of(voltage), of(typical), of(maximum));
  }

  /** The same datasheet with an output conductance in S at 10 V. */
  static TransistorDatasheet withOutputConductance(
      TransistorDatasheet sheet, double current, double minimum, double maximum) {
    return new TransistorDatasheet(
        sheet.beta(),
        sheet.baseEmitterVoltage(),
        sheet.transitionFrequency(),
        sheet.outputCapacitance(),
        sheet.inputCapacitance(),
        Optional.of(
            new TransistorDatasheet.OutputConductance(
                Quantity.of(current), of(10), of(minimum), of(maximum))),
        sheet.earlyVoltage(),
        sheet.baseResistance());
  }

  /** The same datasheet with an Early voltage, V. */
  static TransistorDatasheet withEarlyVoltage(TransistorDatasheet sheet, double voltage) {
    return new TransistorDatasheet(
        sheet.beta(),
        sheet.baseEmitterVoltage(),
        sheet.transitionFrequency(),
        sheet.outputCapacitance(),
        sheet.inputCapacitance(),
        sheet.outputConductance(),
        of(voltage),
        sheet.baseResistance());
  }

  /** A model that states these alone; NaN leaves a field out. */
  static TransistorModel model(
      double saturationCurrent, double forwardBeta, double recombinationCurrent) {
    return new TransistorModel(
        of(saturationCurrent),
        of(forwardBeta),
        none(),
        none(),
        none(),
        of(recombinationCurrent),
        none(),
        none(),
        none(),
        none(),
        none(),
        none(),
        none(),
        none(),
        none());
  }

  /** A model that states nothing but resistances in Ω and the reverse beta. */
  static TransistorModel resistances(
      double base, double emitter, double collector, double reverseBeta) {
    return new TransistorModel(
        none(),
        none(),
        of(reverseBeta),
        none(),
        none(),
        none(),
        none(),
        of(base),
        of(emitter),
        of(collector),
        none(),
        none(),
        none(),
        none(),
        none());
  }

  /** An npn type known by its datasheet. */
  static TransistorRecord transistor(TransistorDatasheet sheet) {
    return transistor(Optional.empty(), Optional.of(sheet), Optional.empty());
  }

  /** An npn type. */
  static TransistorRecord transistor(
      Optional<TransistorModel> model,
      Optional<TransistorDatasheet> sheet,
      Optional<TransistorMeasured> measured) {
    return new TransistorRecord(
        Polarity.NPN, model, sheet, measured, Optional.empty(), Optional.empty(), List.of());
  }

  /** A tester's current gain. */
  static TransistorMeasured measuredBeta(double current, double value) {
    return new TransistorMeasured(
        Optional.of(new TransistorMeasured.Beta(Quantity.of(current), Quantity.of(value))),
        Optional.empty());
  }

  /** A tester's base-emitter voltage at a temperature in °C. */
  static TransistorMeasured measuredVoltage(double current, double value, double celsius) {
    return new TransistorMeasured(
        Optional.empty(),
        Optional.of(
            new TransistorMeasured.BaseEmitterVoltage(
                Quantity.of(current), Quantity.of(value), Quantity.of(celsius))));
  }

  /** A diode known by its datasheet. */
  static DiodeRecord diode(DiodeDatasheet.ForwardVoltage... voltages) {
    return diode(
        Optional.empty(), Optional.of(new DiodeDatasheet(List.of(voltages), none(), none())));
  }

  /** A diode. */
  static DiodeRecord diode(Optional<DiodeModel> model, Optional<DiodeDatasheet> sheet) {
    return new DiodeRecord(model, sheet, Optional.empty(), Optional.empty(), List.of());
  }

  /** A forward voltage; NaN leaves a column empty. */
  static DiodeDatasheet.ForwardVoltage forward(double current, double typical, double maximum) {
    return new DiodeDatasheet.ForwardVoltage(Quantity.of(current), of(typical), of(maximum));
  }
}
