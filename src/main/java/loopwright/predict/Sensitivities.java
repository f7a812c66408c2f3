package loopwright.predict;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Parameter;
import loopwright.design.Design;
import loopwright.predict.PartSensitivity.Method;
import loopwright.predict.VariableParts.VariablePart;
import loopwright.task.Progress;

/**
 * How figures of a hookup change with every part: every resistor and capacitor, every device's
 * junction voltage and every transistor's current gain, the rails.
 *
 * <p>Operating point, linear figures and natural frequencies go by adjoint solutions, all parts at
 * once. What is read off a waveform or a search, and everything with self-heating, where junction
 * temperatures move too, goes by differences of whole solutions.
 */
public final class Sensitivities {
  /** The larger step of the differences: 2 %. */
  private static final double STEP = 0.02;

  /** The larger step of a junction voltage, V. */
  private static final double VOLTAGE_STEP = 2e-3;

  private static final String VANISHES = "the figure has no value when this part moves";

  private final HookupFigures nominal;
  private final HookupSolution solution;
  private final List<VariablePart> parts;
  private final Progress progress;

  private Sensitivities(HookupFigures nominal, Progress progress) {
    this.nominal = nominal;
    this.solution = nominal.solution();
    this.parts = VariableParts.of(nominal, solution.assembled());
    this.progress = progress;
  }

  /**
   * Sensitivities of figures.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @param keys of the catalogue's figures; empty means all
   * @param progress reported to, and asked whether the result is still wanted
   * @return one entry for each key, in that order
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   * @throws IllegalArgumentException when there is no such hookup or figure
   */
  public static List<FigureSensitivity> of(
      Design design, String hookup, List<String> keys, Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    List<Figure> figures =
        keys.isEmpty() ? Catalogue.figures() : keys.stream().map(Sensitivities::figure).toList();
    return nominal.failure().isPresent()
        ? figures.stream()
            .map(figure -> new FigureSensitivity(figure, nominal.solved(figure), List.of()))
            .toList()
        : new Sensitivities(nominal, progress).of(figures);
  }

  private static Figure figure(String key) {
    return Catalogue.find(key)
        .orElseThrow(() -> new IllegalArgumentException("no figure is called " + key));
  }

  private List<FigureSensitivity> of(List<Figure> figures) {
    SolutionSensitivity adjoint = new SolutionSensitivity(solution);
    Map<Figure, List<PartSensitivity>> found = new HashMap<>();
    List<Figure> byDifferences = new ArrayList<>();
    for (Figure figure : figures) {
      progress.check();
      if (nominal.solved(figure).number().isPresent()) {
        Optional<List<PartSensitivity>> exact = exact(figure, adjoint);
        exact.ifPresentOrElse(list -> found.put(figure, list), () -> byDifferences.add(figure));
      }
    }
    if (!byDifferences.isEmpty()) {
      differences(byDifferences, found);
    }
    return figures.stream()
        .map(
            figure ->
                new FigureSensitivity(
                    figure, nominal.solved(figure), found.getOrDefault(figure, List.of())))
        .toList();
  }

  private Optional<List<PartSensitivity>> exact(Figure figure, SolutionSensitivity adjoint) {
    boolean heats =
        solution.design().surroundings().selfHeating() && figure.cost() != CostClass.DESIGN;
    if (heats) {
      return Optional.empty();
    }
    return AdjointFigures.find(figure.key(), solution)
        .flatMap(
            road ->
                Optional.ofNullable(
                    Outcome.of(
                            () -> {
                              ElementSensitivities sums = new ElementSensitivities();
                              road.add(adjoint, sums);
                              return parts.stream().map(part -> exact(part, sums)).toList();
                            })
                        .value()));
  }

  private static PartSensitivity exact(VariablePart part, ElementSensitivities sums) {
    return new PartSensitivity(
        part.parameter(), part.name(), OptionalDouble.of(part.of(sums)), Method.ADJOINT, 0, "");
  }

  private void differences(List<Figure> figures, Map<Figure, List<PartSensitivity>> found) {
    figures.forEach(figure -> found.put(figure, new ArrayList<>()));
    for (int i = 0; i < parts.size(); i++) {
      VariablePart part = parts.get(i);
      progress.report((double) i / parts.size(), "moving " + part.name());
      double step = part.parameter() == Parameter.JUNCTION_VOLTAGE ? VOLTAGE_STEP : STEP;
      Map<Double, HookupFigures> builds = new HashMap<>();
      for (double share : new double[] {1, 0.5, -0.5, -1}) {
        progress.check();
        Build build = part.build(nominal.design(), share * step);
        HookupFigures moved = nominal.of(build);
        figures.forEach(moved::solved);
        builds.put(share, moved);
      }
      for (Figure figure : figures) {
        found.get(figure).add(difference(part, figure, step, builds));
      }
    }
  }

  private static PartSensitivity difference(
      VariablePart part, Figure figure, double step, Map<Double, HookupFigures> builds) {
    OptionalDouble coarse = quotient(figure, step, builds.get(1.0), builds.get(-1.0));
    OptionalDouble fine = quotient(figure, step / 2, builds.get(0.5), builds.get(-0.5));
    if (coarse.isEmpty() || fine.isEmpty()) {
      return new PartSensitivity(
          part.parameter(), part.name(), OptionalDouble.empty(), Method.DIFFERENCES, 0, VANISHES);
    }
    double slope = (4 * fine.getAsDouble() - coarse.getAsDouble()) / 3;
    double error = Math.abs(slope - fine.getAsDouble());
    return new PartSensitivity(
        part.parameter(), part.name(), OptionalDouble.of(slope), Method.DIFFERENCES, error, "");
  }

  private static OptionalDouble quotient(
      Figure figure, double step, HookupFigures more, HookupFigures less) {
    OptionalDouble above = more.solved(figure).number();
    OptionalDouble below = less.solved(figure).number();
    return above.isPresent() && below.isPresent()
        ? OptionalDouble.of((above.getAsDouble() - below.getAsDouble()) / (2 * step))
        : OptionalDouble.empty();
  }
}
