package loopwright.predict;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.DeviceModels;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.task.Progress;

/** Predicts what a design should show at the bench. */
public final class Predictor {
  private static final double LOWEST = 1;
  private static final double HIGHEST = 1e9;
  private static final int PER_DECADE = 20;

  private static final String WAITS = "not solved yet: it takes longer than the others";

  private Predictor() {}

  /** Whether a prediction was made with a lower cost, so that some of its figures wait. */
  public static boolean leavesOut(Prediction prediction) {
    return prediction.hookups().stream()
        .flatMap(hookup -> hookup.figures().values().stream())
        .anyMatch(result -> result.solved().says().equals(WAITS));
  }

  /**
   * The same prediction with the figures too that only a solution in time can tell, for whoever
   * wanted to see the others first.
   *
   * @param prediction made with a lower cost
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  public static Prediction withFiguresInTime(Prediction prediction, Progress progress) {
    return new Prediction(
        prediction.design(),
        prediction.hookups().parallelStream()
            .map(hookup -> withFiguresInTime(prediction.design(), hookup, progress))
            .toList());
  }

  private static HookupPrediction withFiguresInTime(
      Design design, HookupPrediction hookup, Progress progress) {
    HookupSolution solution =
        new HookupSolution(
            design, hookup.hookup(), new DeviceModels(design), Optional.empty(), progress);
    Map<String, FigureResult> figures = new LinkedHashMap<>(hookup.figures());
    for (Figure figure : Catalogue.figures()) {
      if (figure.cost() == CostClass.TIME) {
        progress.check();
        FigureValue formula = figures.get(figure.key()).formula();
        figures.put(figure.key(), new FigureResult(figure, formula, figure.solve(solution)));
      }
    }
    return hookup.withFigures(figures);
  }

  /**
   * Predicts, with figures of every cost.
   *
   * @param design a valid design, every part it names among its own
   * @param hookups names of the hookups to solve; empty means all
   * @param frequencies of the responses, Hz; empty means 20 a decade from 1 Hz to 1 GHz
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design names a node that a hookup lacks,
   *     or a part record that no model can be made of; the message is one sentence that says where
   */
  public static Prediction predict(
      Design design, List<String> hookups, double[] frequencies, Progress progress) {
    return predict(design, hookups, frequencies, CostClass.TIME, progress);
  }

  /**
   * Predicts what does not cost too much; the other figures say that they wait.
   *
   * @param design a valid design, every part it names among its own
   * @param hookups names of the hookups to solve; empty means all
   * @param frequencies of the responses, Hz; empty means 20 a decade from 1 Hz to 1 GHz
   * @param dearest the highest cost of a figure that is solved
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException as {@link #predict(Design, List, double[],
   *     Progress)}
   */
  public static Prediction predict(
      Design design,
      List<String> hookups,
      double[] frequencies,
      CostClass dearest,
      Progress progress) {
    List<Hookup> chosen =
        design.hookups().stream()
            .filter(hookup -> hookups.isEmpty() || hookups.contains(hookup.name()))
            .toList();
    double[] grid = frequencies.length == 0 ? grid() : frequencies;
    // Hookups share nothing, so that each may have a core of its own.
    List<HookupPrediction> predictions =
        chosen.parallelStream()
            .map(
                hookup -> {
                  progress.check();
                  DeviceModels models = new DeviceModels(design);
                  return predict(
                      new HookupSolution(design, hookup, models, Optional.empty(), progress),
                      grid,
                      dearest,
                      progress);
                })
            .toList();
    return new Prediction(design, predictions);
  }

  private static double[] grid() {
    int count = (int) Math.round(Math.log10(HIGHEST / LOWEST)) * PER_DECADE + 1;
    return IntStream.range(0, count)
        .mapToDouble(i -> LOWEST * Math.pow(10, (double) i / PER_DECADE))
        .toArray();
  }

  private static HookupPrediction predict(
      HookupSolution solution, double[] frequencies, CostClass dearest, Progress progress) {
    Outcome<RestSolution> rest = solution.restOutcome();
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    for (Figure figure : Catalogue.figures()) {
      progress.check();
      FigureValue solved =
          figure.cost().compareTo(dearest) <= 0 ? figure.solve(solution) : FigureValue.none(WAITS);
      figures.put(figure.key(), new FigureResult(figure, figure.estimate(solution), solved));
    }
    Outcome<SwingStability> swing = solution.swingOutcome();
    return new HookupPrediction(
        solution.hookup(),
        rest.isPresent() ? Optional.of(restState(solution)) : Optional.empty(),
        rest.reason(),
        figures,
        response(solution, frequencies),
        loopGain(solution, frequencies),
        growing(solution),
        swing.isPresent()
            ? swing.value().levels().stream().map(SwingStability.Solved::level).toList()
            : List.of(),
        swing.isPresent() ? swing.value().remark() : swing.reason(),
        OffsetBudget.shares(solution),
        harmonics(solution),
        solution.waveformOutcome().isPresent()
            ? Optional.of(solution.waveform().toWaveform())
            : Optional.empty(),
        SolveNotes.of(solution));
  }

  private static RestState restState(HookupSolution solution) {
    CircuitState state = solution.rest().state();
    AssembledHookup hookup = solution.assembled();
    return new RestState(
        solution.nodes(),
        solution.devices(),
        hookup.positiveSupply().current(state),
        -hookup.negativeSupply().current(state));
  }

  private static List<ComplexPoint> response(HookupSolution solution, double[] frequencies) {
    if (!solution.networkOutcome().isPresent()) {
      return List.of();
    }
    LinearNetwork network = solution.network();
    List<ComplexPoint> points = new ArrayList<>();
    for (double frequency : frequencies) {
      double[] value = network.response(frequency);
      points.add(new ComplexPoint(frequency, value[0], value[1]));
    }
    return points;
  }

  private static List<ComplexPoint> loopGain(HookupSolution solution, double[] frequencies) {
    if (!solution.networkOutcome().isPresent() || solution.assembled().isOpen()) {
      return List.of();
    }
    LinearNetwork network = solution.network();
    List<ComplexPoint> points = new ArrayList<>();
    for (double frequency : frequencies) {
      double[] value = network.loopGain(frequency);
      points.add(new ComplexPoint(frequency, value[0], value[1]));
    }
    return points;
  }

  private static List<Root> growing(HookupSolution solution) {
    return solution.polesOutcome().isPresent()
        ? solution.poles().stream()
            .filter(Pole::grows)
            .map(pole -> new Root(pole.re(), pole.im()))
            .toList()
        : List.of();
  }

  private static List<Double> harmonics(HookupSolution solution) {
    if (!solution.waveformOutcome().isPresent()) {
      return List.of();
    }
    List<Double> harmonics = new ArrayList<>();
    for (int n = 0; n <= StaticWaveform.HARMONICS; n++) {
      harmonics.add(solution.waveform().harmonic(n));
    }
    return harmonics;
  }
}
