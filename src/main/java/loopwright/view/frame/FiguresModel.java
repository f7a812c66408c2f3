package loopwright.view.frame;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiConsumer;
import javax.swing.table.AbstractTableModel;
import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Quantity;
import loopwright.session.Readings;
import loopwright.session.Snapshot;
import loopwright.view.frame.FigureCell.Tone;

/** Every figure of the catalogue, a row each: by formula, as solved, as measured. */
final class FiguresModel extends AbstractTableModel {
  static final int NAME = 0;
  static final int FORMULA = 1;
  static final int SOLVED = 2;
  static final int MEASURED = 3;

  private static final String NONE = "—";

  /** What people ask for first; the others follow in the catalogue's order. */
  private static final List<String> FIRST =
      List.of(
          "closedLoopGain",
          "outputOffset",
          "crossoverError",
          "thd",
          "openLoopGain",
          "inputOffset",
          "deadZone",
          "worstPhaseMargin",
          "oscillationFrequency",
          "phaseMargin",
          "bandwidth");

  /** Figures that fail when they are below zero. */
  private static final Set<String> FAILS_BELOW_ZERO = Set.of("phaseMargin", "worstPhaseMargin");

  /** Figures that fail when they are above zero, or there at all. */
  private static final Set<String> FAILS_ABOVE_ZERO = Set.of("worstGrowth", "oscillationFrequency");

  private final List<Figure> figures = ordered();
  private final transient BiConsumer<Figure, Optional<Quantity>> listener;
  private transient Optional<Snapshot> shown = Optional.empty();

  /**
   * @param listener takes what was measured of a figure, or that it is taken away
   */
  FiguresModel(BiConsumer<Figure, Optional<Quantity>> listener) {
    this.listener = listener;
  }

  private static List<Figure> ordered() {
    List<Figure> ordered = new ArrayList<>();
    FIRST.forEach(key -> Catalogue.find(key).ifPresent(ordered::add));
    Catalogue.figures().stream().filter(figure -> !ordered.contains(figure)).forEach(ordered::add);
    return ordered;
  }

  /** Shows another moment. */
  void show(Snapshot snapshot) {
    shown = Optional.of(snapshot);
    fireTableRowsUpdated(0, getRowCount() - 1);
  }

  /** The figure of a row. */
  Figure figure(int row) {
    return figures.get(row);
  }

  @Override
  public int getRowCount() {
    return figures.size();
  }

  @Override
  public int getColumnCount() {
    return MEASURED + 1;
  }

  @Override
  public String getColumnName(int column) {
    return switch (column) {
      case NAME -> "Figure";
      case FORMULA -> "formula";
      case SOLVED -> "solved";
      default -> "measured";
    };
  }

  @Override
  public Class<?> getColumnClass(int column) {
    return FigureCell.class;
  }

  @Override
  public boolean isCellEditable(int row, int column) {
    return column == MEASURED && shown.isPresent();
  }

  @Override
  @SuppressWarnings("unchecked")
  public void setValueAt(Object value, int row, int column) {
    listener.accept(figure(row), (Optional<Quantity>) value);
  }

  @Override
  public FigureCell getValueAt(int row, int column) {
    Figure figure = figure(row);
    FigureResult result = result(figure);
    return switch (column) {
      case NAME -> new FigureCell(figure.label(), FigureText.aboutFigure(figure), Tone.NORMAL);
      case FORMULA -> formula(result);
      case SOLVED -> solved(result);
      default -> measured(result);
    };
  }

  /** The newest reading of a row's figure in the chosen hookup. */
  Optional<Reading> reading(int row) {
    return shown.flatMap(
        snapshot -> Readings.newest(snapshot.design(), snapshot.hookup(), figure(row).key()));
  }

  /** The result to show; a solve that failed is one whose every value is the reason why. */
  private FigureResult result(Figure figure) {
    Optional<String> failed = shown.flatMap(Snapshot::unsolved).map(why -> "not solved: " + why);
    if (failed.isPresent()) {
      return none(figure, failed.get());
    }
    return shown
        .flatMap(Snapshot::prediction)
        .map(HookupPrediction::figures)
        .map(all -> all.get(figure.key()))
        .orElseGet(() -> none(figure, "not solved yet"));
  }

  private static FigureResult none(Figure figure, String reason) {
    return new FigureResult(figure, FigureValue.none(reason), FigureValue.none(reason));
  }

  private FigureCell formula(FigureResult result) {
    boolean parts = isCurrent() && FigureText.parting(result).isPresent();
    String text = text(result.figure(), result.formula());
    return new FigureCell(
        parts ? "≠ " + text : text,
        FigureText.aboutFormula(result),
        parts ? Tone.RISKY : tone(result.formula(), Tone.NORMAL));
  }

  private FigureCell solved(FigureResult result) {
    return new FigureCell(
        text(result.figure(), result.solved()),
        FigureText.aboutSolution(result),
        tone(result.solved(), fails(result) ? Tone.FAILS : Tone.STRONG));
  }

  private FigureCell measured(FigureResult result) {
    Figure figure = result.figure();
    Optional<Reading> reading = reading(figures.indexOf(figure));
    return new FigureCell(
        reading.map(read -> FigureText.shortly(figure, read.value().value())).orElse(NONE),
        FigureText.aboutReading(result, reading),
        reading.isPresent() ? Tone.MEASURED : Tone.QUIET);
  }

  private static String text(Figure figure, FigureValue value) {
    return value.number().isPresent()
        ? FigureText.shortly(figure, value.number().getAsDouble())
        : NONE;
  }

  private Tone tone(FigureValue value, Tone wanted) {
    return isCurrent() && value.number().isPresent() ? wanted : Tone.QUIET;
  }

  private boolean isCurrent() {
    return shown.filter(Snapshot::current).isPresent();
  }

  private static boolean fails(FigureResult result) {
    double value = result.solved().number().orElse(0);
    String key = result.figure().key();
    return (value < 0 && FAILS_BELOW_ZERO.contains(key))
        || (value > 0 && FAILS_ABOVE_ZERO.contains(key));
  }
}
