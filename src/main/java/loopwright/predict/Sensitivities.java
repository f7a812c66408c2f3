package loopwright.predict;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
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

  private static final String VANISHES = "it has no value when this part moves";

  /** Something whose change is asked for, and its exact road where it has one. */
  private record Measure(
      Function<HookupFigures, FigureValue> value, Optional<AdjointFigures.Road> road) {}

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
    List<Measure> measures =
        figures.stream().map(figure -> measure(figure, nominal.solution())).toList();
    List<List<PartSensitivity>> found = of(nominal, measures, progress);
    List<FigureSensitivity> sensitivities = new ArrayList<>();
    for (int i = 0; i < figures.size(); i++) {
      Figure figure = figures.get(i);
      sensitivities.add(new FigureSensitivity(figure, nominal.solved(figure), found.get(i)));
    }
    return List.copyOf(sensitivities);
  }

  /**
   * Sensitivities of node voltages at rest, V per unit of each parameter.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @param nodes names of nodes
   * @param progress reported to, and asked whether the result is still wanted
   * @return by node; empty lists where the circuit finds no rest or has no such node
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   * @throws IllegalArgumentException when there is no such hookup
   */
  public static Map<String, List<PartSensitivity>> ofNodes(
      Design design, String hookup, List<String> nodes, Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    List<Measure> measures = nodes.stream().map(node -> node(node, nominal.solution())).toList();
    List<List<PartSensitivity>> found = of(nominal, measures, progress);
    Map<String, List<PartSensitivity>> byNode = new LinkedHashMap<>();
    for (int i = 0; i < nodes.size(); i++) {
      byNode.put(nodes.get(i), found.get(i));
    }
    return byNode;
  }

  private static Measure measure(Figure figure, HookupSolution solution) {
    boolean heats =
        solution.design().surroundings().selfHeating() && figure.cost() != CostClass.DESIGN;
    return new Measure(
        figures -> figures.solved(figure),
        heats ? Optional.empty() : AdjointFigures.find(figure.key(), solution));
  }

  private static Measure node(String node, HookupSolution solution) {
    AdjointFigures.Road road = (s, sums) -> s.rest().add(s.hookup().circuit().node(node), 1, sums);
    return new Measure(
        figures -> figures.node(node),
        solution.design().surroundings().selfHeating() ? Optional.empty() : Optional.of(road));
  }

  private static Figure figure(String key) {
    return Catalogue.find(key)
        .orElseThrow(() -> new IllegalArgumentException("no figure is called " + key));
  }

  private static List<List<PartSensitivity>> of(
      HookupFigures nominal, List<Measure> measures, Progress progress) {
    return nominal.failure().isPresent()
        ? measures.stream().map(measure -> List.<PartSensitivity>of()).toList()
        : new Sensitivities(nominal, progress).of(measures);
  }

  private List<List<PartSensitivity>> of(List<Measure> measures) {
    SolutionSensitivity adjoint = new SolutionSensitivity(solution);
    Map<Measure, List<PartSensitivity>> found = new HashMap<>();
    List<Measure> byDifferences = new ArrayList<>();
    for (Measure measure : measures) {
      progress.check();
      if (measure.value().apply(nominal).number().isPresent()) {
        exact(measure, adjoint)
            .ifPresentOrElse(list -> found.put(measure, list), () -> byDifferences.add(measure));
      }
    }
    if (!byDifferences.isEmpty()) {
      differences(byDifferences, found);
    }
    return measures.stream().map(measure -> found.getOrDefault(measure, List.of())).toList();
  }

  private Optional<List<PartSensitivity>> exact(Measure measure, SolutionSensitivity adjoint) {
    return measure
        .road()
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

  private void differences(List<Measure> measures, Map<Measure, List<PartSensitivity>> found) {
    measures.forEach(measure -> found.put(measure, new ArrayList<>()));
    for (int i = 0; i < parts.size(); i++) {
      VariablePart part = parts.get(i);
      progress.report((double) i / parts.size(), "moving " + part.name());
      double step = part.parameter() == Parameter.JUNCTION_VOLTAGE ? VOLTAGE_STEP : STEP;
      Map<Double, HookupFigures> builds = new HashMap<>();
      for (double share : new double[] {1, 0.5, -0.5, -1}) {
        progress.check();
        HookupFigures moved = nominal.of(part.build(nominal.design(), share * step));
        measures.forEach(measure -> measure.value().apply(moved));
        builds.put(share, moved);
      }
      for (Measure measure : measures) {
        found.get(measure).add(difference(part, measure, step, builds));
      }
    }
  }

  private static PartSensitivity difference(
      VariablePart part, Measure measure, double step, Map<Double, HookupFigures> builds) {
    OptionalDouble coarse = quotient(measure, step, builds.get(1.0), builds.get(-1.0));
    OptionalDouble fine = quotient(measure, step / 2, builds.get(0.5), builds.get(-0.5));
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
      Measure measure, double step, HookupFigures more, HookupFigures less) {
    OptionalDouble above = measure.value().apply(more).number();
    OptionalDouble below = measure.value().apply(less).number();
    return above.isPresent() && below.isPresent()
        ? OptionalDouble.of((above.getAsDouble() - below.getAsDouble()) / (2 * step))
        : OptionalDouble.empty();
  }
}
