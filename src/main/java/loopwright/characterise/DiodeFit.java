package loopwright.characterise;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.circuit.Physics;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeDatasheet.ForwardVoltage;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeParameters;
import loopwright.part.DiodeRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * From a diode's record to the parameters of its equations. What the model states holds; forward
 * voltages at two currents give saturation current and ideality, more of them by least squares; one
 * gives the saturation current with an ideality of 1.8.
 */
public final class DiodeFit {
  /** Ideality that is usual for small silicon diodes, where one forward voltage is all there is. */
  private static final double USUAL_IDEALITY = 1.8;

  private static final double LEAST_IDEALITY = 0.1;
  private static final double MOST_IDEALITY = 20;
  private static final double LEAST_LOGARITHM = Math.log(1e-60);
  private static final double MOST_LOGARITHM = Math.log(1e-2);

  /** Largest departure of a forward voltage that still counts as coming back, V. */
  private static final double COMES_BACK = 1e-10;

  private final Optional<DiodeModel> model;
  private final Optional<DiodeDatasheet> datasheet;
  private final List<PrintedFigure<DiodeParameters>> voltages;
  private final boolean isCurrentFree;
  private final boolean isIdealityFree;

  private DiodeFit(DiodeRecord record) {
    this.model = record.model();
    this.datasheet = record.datasheet();
    this.voltages = printed(datasheet).filter(figure -> figure.nominal().isUsable()).toList();
    this.isCurrentFree = model.flatMap(DiodeModel::saturationCurrent).isEmpty();
    this.isIdealityFree =
        model.flatMap(DiodeModel::ideality).isEmpty()
            && voltages.stream().mapToDouble(PrintedFigure::at).distinct().count() > 1;
  }

  /**
   * Fits a record.
   *
   * @param record what is known of the type
   * @throws FitException when the record lacks what a fit needs, or no parameters give its figures
   */
  public static FittedDiode fit(DiodeRecord record) {
    return new DiodeFit(record).run();
  }

  private FittedDiode run() {
    if (isCurrentFree && voltages.isEmpty()) {
      throw new FitException(
          "Found no forward voltage with a typical value, expected one, or a saturation current in"
              + " the model.");
    }
    double ideality = voltages.isEmpty() ? DiodeParameters.DEFAULTS.ideality() : USUAL_IDEALITY;
    DiodeParameters at = withCharges(StatedParameters.of(model, ideality));
    List<String> notes = new ArrayList<>();
    if (isCurrentFree || isIdealityFree) {
      at = forVoltages(at);
      printed(datasheet)
          .map(PrintedFigure::note)
          .filter(note -> !note.isEmpty())
          .forEach(notes::add);
    }
    DiodeParameters found = at;
    List<FigureComparison> comparison = new ArrayList<>();
    voltages.forEach(figure -> comparison.add(figure.compare(found, use())));
    compareCharges(found, comparison);
    return new FittedDiode(found, comparison, notes);
  }

  private int unknowns() {
    return (isCurrentFree ? 1 : 0) + (isIdealityFree ? 1 : 0);
  }

  private FigureUse use() {
    if (unknowns() == 0) {
      return FigureUse.COMPARED;
    }
    return voltages.size() <= unknowns() ? FigureUse.SOLVED : FigureUse.LEAST_SQUARES;
  }

  private DiodeParameters forVoltages(DiodeParameters from) {
    BoundedLeastSquares squares =
        new BoundedLeastSquares(
            at -> residuals(with(from, at)),
            bounds(LEAST_LOGARITHM, LEAST_IDEALITY),
            bounds(MOST_LOGARITHM, MOST_IDEALITY));
    PrintedFigure<DiodeParameters> first = voltages.get(0);
    double emission = from.ideality() * Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);
    double guess = Math.log(first.at()) - first.wanted() / emission;
    double clamped = Math.max(LEAST_LOGARITHM, Math.min(MOST_LOGARITHM, guess));
    DiodeParameters found = with(from, squares.solve(bounds(clamped, from.ideality())));
    for (double departure : residuals(found)) {
      if (use() == FigureUse.SOLVED && !(Math.abs(departure) < COMES_BACK)) {
        throw new FitException(
            "No junction gives "
                + String.join(" and ", voltages.stream().map(PrintedFigure::saysValue).toList())
                + ".");
      }
    }
    return found;
  }

  private double[] residuals(DiodeParameters tried) {
    return voltages.stream().mapToDouble(figure -> departure(figure, tried)).toArray();
  }

  private static double departure(PrintedFigure<DiodeParameters> figure, DiodeParameters tried) {
    try {
      return figure.returned(tried) - figure.wanted();
    } catch (FitException outOfReach) {
      return Double.NaN;
    }
  }

  /** A value for each unknown, in the order of the search. */
  private double[] bounds(double logarithm, double ideality) {
    if (!isIdealityFree) {
      return new double[] {logarithm};
    }
    return isCurrentFree ? new double[] {logarithm, ideality} : new double[] {ideality};
  }

  private DiodeParameters with(DiodeParameters from, double[] at) {
    return new DiodeParameters(
        isCurrentFree ? Math.exp(at[0]) : from.saturationCurrent(),
        isIdealityFree ? at[at.length - 1] : from.ideality(),
        from.seriesResistance(),
        from.capacitance(),
        from.transitTime());
  }

  private DiodeParameters withCharges(DiodeParameters stated) {
    boolean isCapacitanceStated = model.flatMap(DiodeModel::capacitance).isPresent();
    boolean isTimeStated = model.flatMap(DiodeModel::transitTime).isPresent();
    Optional<Double> capacitance =
        datasheet.flatMap(DiodeDatasheet::capacitance).map(Quantity::value);
    Optional<Double> recovery =
        datasheet.flatMap(DiodeDatasheet::recoveryTime).map(Quantity::value);
    return new DiodeParameters(
        stated.saturationCurrent(),
        stated.ideality(),
        stated.seriesResistance(),
        isCapacitanceStated ? stated.capacitance() : capacitance.orElse(stated.capacitance()),
        isTimeStated
            ? stated.transitTime()
            : recovery.map(DiodeFigures::transitTime).orElse(stated.transitTime()));
  }

  private void compareCharges(DiodeParameters at, List<FigureComparison> comparison) {
    DiodeFigures figures = new DiodeFigures(at);
    datasheet
        .flatMap(DiodeDatasheet::capacitance)
        .ifPresent(
            value ->
                comparison.add(
                    new FigureComparison(
                        "capacitance",
                        Unit.FARAD,
                        "at 0 V",
                        value.value(),
                        figures.capacitance(),
                        model.flatMap(DiodeModel::capacitance).isPresent()
                            ? FigureUse.COMPARED
                            : FigureUse.SOLVED)));
    datasheet
        .flatMap(DiodeDatasheet::recoveryTime)
        .ifPresent(
            value ->
                comparison.add(
                    new FigureComparison(
                        "recovery time",
                        Unit.SECOND,
                        "with forward and reverse current alike",
                        value.value(),
                        figures.recoveryTime(),
                        model.flatMap(DiodeModel::transitTime).isPresent()
                            ? FigureUse.COMPARED
                            : FigureUse.SOLVED)));
  }

  private static Stream<PrintedFigure<DiodeParameters>> printed(
      Optional<DiodeDatasheet> datasheet) {
    return datasheet.stream()
        .flatMap(sheet -> sheet.forwardVoltage().stream())
        .map(DiodeFit::figure);
  }

  private static PrintedFigure<DiodeParameters> figure(ForwardVoltage printed) {
    double current = printed.current().value();
    return new PrintedFigure<>(
        "forward voltage",
        Unit.VOLT,
        current,
        "at " + EngineeringFormat.format(current, Unit.AMPERE),
        Nominal.of(Optional.empty(), printed.typical(), printed.maximum()),
        parameters -> new DiodeFigures(parameters).forwardVoltage(current));
  }
}
