package loopwright.characterise;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.circuit.DepletionCapacitance;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorParameters;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;

/**
 * From a transistor's record to the parameters of its equations. What the model states holds; each
 * other parameter is solved from the datasheet in the full equations, so that every figure used
 * comes back; a tester's readings then have the last word on saturation current and forward beta.
 */
public final class TransistorFit {
  /**
   * More than this share of a base current that a tester showed is never laid to recombination: a
   * part with a higher gain than its type recombines less too.
   */
  private static final double MOST_RECOMBINATION = 0.5;

  private final Optional<TransistorModel> model;
  private final Optional<TransistorDatasheet> datasheet;
  private final PrintedTransistor print;
  private final Optional<PrintedFigure<TransistorParameters>> measuredBeta;
  private final Optional<PrintedFigure<TransistorParameters>> measuredVoltage;
  private final Map<PrintedFigure<TransistorParameters>, FigureUse> uses = new IdentityHashMap<>();
  private final List<String> notes = new ArrayList<>();

  private TransistorFit(TransistorRecord record, Optional<TransistorMeasured> own) {
    this.model = record.model();
    this.datasheet = record.datasheet();
    this.print = datasheet.map(PrintedTransistor::of).orElse(PrintedTransistor.NOTHING);
    this.measuredBeta =
        own.flatMap(TransistorMeasured::beta)
            .or(() -> record.measured().flatMap(TransistorMeasured::beta))
            .map(PrintedTransistor::measured);
    this.measuredVoltage =
        own.flatMap(TransistorMeasured::baseEmitterVoltage)
            .or(() -> record.measured().flatMap(TransistorMeasured::baseEmitterVoltage))
            .map(PrintedTransistor::measured);
  }

  /**
   * Fits a record.
   *
   * @param record what is known of the type
   * @param own readings of the very part; each wins over the record's own
   * @throws FitException when the record lacks what a fit needs, or no parameters give its figures
   */
  public static FittedTransistor fit(TransistorRecord record, Optional<TransistorMeasured> own) {
    return new TransistorFit(record, own).run();
  }

  private FittedTransistor run() {
    TransistorParameters parameters = ofTheType();
    if (measuredBeta.isPresent() || measuredVoltage.isPresent()) {
      parameters = ofThePart(parameters);
    }
    noteTransitTime(parameters);
    TransistorParameters found = parameters;
    List<FigureComparison> comparison =
        Stream.of(measuredVoltage.stream(), measuredBeta.stream(), print.all())
            .flatMap(figures -> figures)
            .filter(figure -> figure.nominal().isUsable())
            .map(figure -> figure.compare(found, uses.getOrDefault(figure, FigureUse.COMPARED)))
            .toList();
    return new FittedTransistor(found, comparison, notes);
  }

  /** Parameters of the type, from model and datasheet. */
  private TransistorParameters ofTheType() {
    TransistorParameters stated = StatedParameters.of(model, datasheet);
    Optional<BetaFit> beta = betaOfTheType();
    TransistorRules rules =
        new TransistorRules(
            voltageOfTheType(),
            beta,
            model.flatMap(TransistorModel::earlyVoltage).isPresent()
                    || datasheet.flatMap(TransistorDatasheet::earlyVoltage).isPresent()
                ? Optional.empty()
                : solved(print.outputConductance()),
            model.flatMap(TransistorModel::transitTime).isPresent()
                ? Optional.empty()
                : solved(print.transitionFrequency()));
    TransistorParameters found = rules.settle(withCapacitances(stated));
    if (beta.isPresent() && !beta.get().comesBack(found)) {
      print.betas().forEach(figure -> uses.replace(figure, FigureUse.LEAST_SQUARES));
    }
    return found;
  }

  /** The same with the tester's readings put through. */
  private TransistorParameters ofThePart(TransistorParameters type) {
    print.baseEmitterVoltages().forEach(figure -> uses.put(figure, FigureUse.COMPARED));
    print.betas().forEach(figure -> uses.put(figure, FigureUse.COMPARED));
    TransistorParameters at =
        new TransistorRules(
                solved(measuredVoltage), Optional.empty(), Optional.empty(), Optional.empty())
            .settle(type);
    Optional<BetaFit> beta =
        solved(measuredBeta)
            .map(figure -> new BetaFit(List.of(figure), EnumSet.of(BetaFit.Unknown.FORWARD_BETA)));
    if (measuredBeta.isPresent() && !isInModel(BetaFit.Unknown.RECOMBINATION_CURRENT)) {
      at = withLessRecombination(at, measuredBeta.get());
    }
    return new TransistorRules(
            measuredVoltage,
            beta,
            used(print.outputConductance()),
            used(print.transitionFrequency()))
        .settle(at);
  }

  private Optional<PrintedFigure<TransistorParameters>> voltageOfTheType() {
    if (model.flatMap(TransistorModel::saturationCurrent).isPresent()) {
      return Optional.empty();
    }
    List<PrintedFigure<TransistorParameters>> usable = usable(print.baseEmitterVoltages());
    if (usable.isEmpty() && measuredVoltage.isEmpty()) {
      throw new FitException(
          "Found "
              + found(print.baseEmitterVoltages(), "base-emitter voltage")
              + ", expected one with a typical value, or a saturation current in the model.");
    }
    return usable.isEmpty() ? measuredVoltage : solved(Optional.of(usable.get(0)));
  }

  private Optional<BetaFit> betaOfTheType() {
    EnumSet<BetaFit.Unknown> free = EnumSet.allOf(BetaFit.Unknown.class);
    free.removeIf(this::isInModel);
    List<PrintedFigure<TransistorParameters>> usable =
        free.isEmpty() ? List.of() : usable(print.betas());
    if (usable.isEmpty()) {
      if (!free.contains(BetaFit.Unknown.FORWARD_BETA)) {
        return Optional.empty();
      }
      return Optional.of(
          new BetaFit(
              List.of(
                  measuredBeta.orElseThrow(
                      () ->
                          new FitException(
                              "Found "
                                  + found(print.betas(), "beta")
                                  + ", expected one with a typical value or a minimum, or a"
                                  + " forward beta in the model."))),
              free));
    }
    BetaFit fit = new BetaFit(usable, free);
    if (!fit.isNeeded()) {
      return Optional.empty();
    }
    usable.forEach(figure -> use(figure, FigureUse.SOLVED));
    return Optional.of(fit);
  }

  private TransistorParameters withCapacitances(TransistorParameters stated) {
    TransistorParameters at = stated;
    if (model.flatMap(TransistorModel::baseCollectorCapacitance).isEmpty()) {
      Optional<PrintedFigure<TransistorParameters>> output = solved(print.outputCapacitance());
      if (output.isPresent()) {
        at = at.withBaseCollectorCapacitance(atZeroBias(output.get()));
      }
    }
    if (model.flatMap(TransistorModel::baseEmitterCapacitance).isEmpty()) {
      Optional<PrintedFigure<TransistorParameters>> input = solved(print.inputCapacitance());
      if (input.isPresent()) {
        at = at.withBaseEmitterCapacitance(atZeroBias(input.get()));
      }
    }
    return at;
  }

  private static double atZeroBias(PrintedFigure<TransistorParameters> capacitance) {
    return capacitance.wanted() / DepletionCapacitance.factor(-capacitance.at());
  }

  private TransistorParameters withLessRecombination(
      TransistorParameters at, PrintedFigure<TransistorParameters> beta) {
    double recombining = 1 / beta.returned(at) - 1 / beta.returned(at.withRecombinationCurrent(0));
    double share = recombining * beta.wanted();
    if (share <= MOST_RECOMBINATION) {
      return at;
    }
    notes.add(
        "At the "
            + beta.says()
            + " that was measured the recombination current of the type would take "
            + EngineeringFormat.percent(share)
            + " of the base current; it is reduced so that it takes half.");
    return at.withRecombinationCurrent(at.recombinationCurrent() * MOST_RECOMBINATION / share);
  }

  private void noteTransitTime(TransistorParameters parameters) {
    used(print.transitionFrequency())
        .filter(figure -> parameters.transitTime() == 0)
        .ifPresent(
            figure -> {
              uses.put(figure, FigureUse.COMPARED);
              notes.add(
                  "The "
                      + figure.saysValue()
                      + ", is more than the junction capacitances allow: the transit time is set"
                      + " to zero, which gives "
                      + EngineeringFormat.format(figure.returned(parameters), figure.unit())
                      + ".");
            });
  }

  private boolean isInModel(BetaFit.Unknown unknown) {
    return switch (unknown) {
      case FORWARD_BETA -> model.flatMap(TransistorModel::forwardBeta).isPresent();
      case RECOMBINATION_CURRENT ->
          model.flatMap(TransistorModel::recombinationCurrent).isPresent();
      case KNEE_CURRENT -> model.flatMap(TransistorModel::kneeCurrent).isPresent();
    };
  }

  /** The figures with a nominal value; of the others a note is taken. */
  private List<PrintedFigure<TransistorParameters>> usable(
      List<PrintedFigure<TransistorParameters>> figures) {
    figures.stream()
        .filter(figure -> !figure.nominal().isUsable())
        .map(PrintedFigure::note)
        .forEach(notes::add);
    return figures.stream().filter(figure -> figure.nominal().isUsable()).toList();
  }

  /** The figure, marked as one that is solved for, if it has a nominal value. */
  private Optional<PrintedFigure<TransistorParameters>> solved(
      Optional<PrintedFigure<TransistorParameters>> figure) {
    List<PrintedFigure<TransistorParameters>> usable = usable(figure.stream().toList());
    usable.forEach(one -> use(one, FigureUse.SOLVED));
    return usable.stream().findFirst();
  }

  private void use(PrintedFigure<TransistorParameters> figure, FigureUse use) {
    uses.put(figure, use);
    if (!figure.note().isEmpty()) {
      notes.add(figure.note());
    }
  }

  private Optional<PrintedFigure<TransistorParameters>> used(
      Optional<PrintedFigure<TransistorParameters>> figure) {
    return figure.filter(one -> uses.get(one) == FigureUse.SOLVED);
  }

  private static String found(List<PrintedFigure<TransistorParameters>> figures, String name) {
    return figures.isEmpty()
        ? "no " + name
        : "no " + name + " but " + figures.get(0).says() + " with a maximum alone";
  }
}
