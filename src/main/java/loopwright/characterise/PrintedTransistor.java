package loopwright.characterise;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import loopwright.circuit.Physics;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorDatasheet.BaseEmitterVoltage;
import loopwright.part.TransistorDatasheet.Beta;
import loopwright.part.TransistorDatasheet.OutputConductance;
import loopwright.part.TransistorDatasheet.TransitionFrequency;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorParameters;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * The figures of a transistor's datasheet and of a tester, each with its nominal value and with the
 * way in which parameters give it back.
 *
 * @param baseEmitterVoltages V, in the order of the record
 * @param betas current gains, in the order of the record
 * @param transitionFrequency Hz
 * @param outputCapacitance F
 * @param inputCapacitance F
 * @param outputConductance S
 */
record PrintedTransistor(
    List<PrintedFigure<TransistorParameters>> baseEmitterVoltages,
    List<PrintedFigure<TransistorParameters>> betas,
    Optional<PrintedFigure<TransistorParameters>> transitionFrequency,
    Optional<PrintedFigure<TransistorParameters>> outputCapacitance,
    Optional<PrintedFigure<TransistorParameters>> inputCapacitance,
    Optional<PrintedFigure<TransistorParameters>> outputConductance) {
  /** Collector-emitter voltage that is meant where none is given, V. */
  static final double USUAL_VOLTAGE = 5;

  /** A record without a datasheet. */
  static final PrintedTransistor NOTHING =
      new PrintedTransistor(
          List.of(),
          List.of(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty());

  /** Every figure of a datasheet. */
  static PrintedTransistor of(TransistorDatasheet datasheet) {
    return new PrintedTransistor(
        datasheet.baseEmitterVoltage().stream().map(PrintedTransistor::baseEmitterVoltage).toList(),
        datasheet.beta().stream().map(PrintedTransistor::beta).toList(),
        datasheet.transitionFrequency().map(PrintedTransistor::transitionFrequency),
        datasheet
            .outputCapacitance()
            .map(
                printed ->
                    capacitance(
                        "output capacitance",
                        "V_CB",
                        printed,
                        parameters ->
                            new TransistorFigures(parameters)
                                .outputCapacitance(printed.voltage().value()))),
        datasheet
            .inputCapacitance()
            .map(
                printed ->
                    capacitance(
                        "input capacitance",
                        "V_EB",
                        printed,
                        parameters ->
                            new TransistorFigures(parameters)
                                .inputCapacitance(printed.voltage().value()))),
        datasheet.outputConductance().map(PrintedTransistor::outputConductance));
  }

  /** A tester's current gain, at 25 °C. */
  static PrintedFigure<TransistorParameters> measured(TransistorMeasured.Beta measured) {
    return beta(measured.current(), USUAL_VOLTAGE, Nominal.measured(measured.value()));
  }

  /** A tester's base-emitter voltage, at the temperature at which it was measured. */
  static PrintedFigure<TransistorParameters> measured(
      TransistorMeasured.BaseEmitterVoltage measured) {
    double current = measured.current().value();
    double celsius = measured.temperature().value();
    return new PrintedFigure<>(
        "base-emitter voltage",
        Unit.VOLT,
        current,
        active(current, USUAL_VOLTAGE) + ", " + format(celsius, Unit.CELSIUS),
        Nominal.measured(measured.value()),
        parameters ->
            new TransistorFigures(parameters, celsius + Physics.ZERO_CELSIUS)
                .baseEmitterVoltage(current, USUAL_VOLTAGE));
  }

  /** All figures, in the order in which a person would compare them. */
  Stream<PrintedFigure<TransistorParameters>> all() {
    return Stream.of(
            baseEmitterVoltages.stream(),
            betas.stream(),
            outputConductance.stream(),
            transitionFrequency.stream(),
            outputCapacitance.stream(),
            inputCapacitance.stream())
        .flatMap(figures -> figures);
  }

  private static PrintedFigure<TransistorParameters> baseEmitterVoltage(
      BaseEmitterVoltage printed) {
    double current = printed.current().value();
    Nominal nominal = Nominal.of(printed.minimum(), printed.typical(), printed.maximum());
    return printed.saturated()
        ? new PrintedFigure<>(
            "saturated base-emitter voltage",
            Unit.VOLT,
            current,
            "at " + format(current, Unit.AMPERE) + ", I_B = I_C/10",
            nominal,
            parameters -> new TransistorFigures(parameters).saturatedBaseEmitterVoltage(current))
        : new PrintedFigure<>(
            "base-emitter voltage",
            Unit.VOLT,
            current,
            active(current, USUAL_VOLTAGE),
            nominal,
            parameters ->
                new TransistorFigures(parameters).baseEmitterVoltage(current, USUAL_VOLTAGE));
  }

  private static PrintedFigure<TransistorParameters> beta(Beta printed) {
    return beta(
        printed.current(),
        voltage(printed.collectorEmitterVoltage()),
        Nominal.ofGain(printed.minimum(), printed.typical(), printed.maximum()));
  }

  private static PrintedFigure<TransistorParameters> beta(
      Quantity current, double voltage, Nominal nominal) {
    double collector = current.value();
    return new PrintedFigure<>(
        "beta",
        Unit.ONE,
        collector,
        active(collector, voltage),
        nominal,
        parameters -> new TransistorFigures(parameters).beta(collector, voltage));
  }

  private static PrintedFigure<TransistorParameters> transitionFrequency(
      TransitionFrequency printed) {
    double current = printed.current().value();
    double voltage = voltage(printed.collectorEmitterVoltage());
    return new PrintedFigure<>(
        "transition frequency",
        Unit.HERTZ,
        current,
        active(current, voltage),
        Nominal.of(printed.minimum(), printed.typical(), Optional.empty()),
        parameters -> new TransistorFigures(parameters).transitionFrequency(current, voltage));
  }

  private static PrintedFigure<TransistorParameters> outputConductance(OutputConductance printed) {
    double current = printed.current().value();
    double voltage = voltage(printed.collectorEmitterVoltage());
    return new PrintedFigure<>(
        "output conductance",
        Unit.SIEMENS,
        current,
        active(current, voltage),
        Nominal.of(printed.minimum(), Optional.empty(), printed.maximum()),
        parameters -> new TransistorFigures(parameters).outputConductance(current, voltage));
  }

  private static PrintedFigure<TransistorParameters> capacitance(
      String name,
      String junction,
      TransistorDatasheet.Capacitance printed,
      ToDoubleFunction<TransistorParameters> model) {
    double voltage = printed.voltage().value();
    return new PrintedFigure<>(
        name,
        Unit.FARAD,
        voltage,
        "at " + junction + " = " + format(voltage, Unit.VOLT),
        Nominal.of(Optional.empty(), printed.typical(), printed.maximum()),
        model);
  }

  private static double voltage(Optional<Quantity> given) {
    return given.map(Quantity::value).orElse(USUAL_VOLTAGE);
  }

  private static String active(double current, double voltage) {
    return "at " + format(current, Unit.AMPERE) + ", V_CE = " + format(voltage, Unit.VOLT);
  }
}
