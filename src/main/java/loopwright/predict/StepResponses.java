package loopwright.predict;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import loopwright.assembly.DeviceModels;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.task.Progress;

/**
 * What a hookup does in time when its generator steps, and what it looks like when it oscillates.
 *
 * @param hookup name
 * @param figures in the catalogue's order those that are solved in time, by hand formula and solved
 * @param curves the small step and the large ones, in this order; what could not be run has a
 *     reason
 * @param overloads beyond clipping, above and below, in this order
 * @param oscillation what grows at some level of the swing; empty when nothing does
 * @param says why the oscillation could not be run, or empty
 */
public record StepResponses(
    String hookup,
    Map<String, FigureResult> figures,
    List<Curve> curves,
    List<Recovery> overloads,
    Optional<Oscillation> oscillation,
    String says) {
  /**
   * The output after a step of the generator at time 0.
   *
   * @param kind {@code small}, {@code rising} or {@code falling}
   * @param from where the output comes from, V
   * @param to where it is to come to, V
   * @param times s; empty where it could not be run
   * @param output V, as many
   * @param says why it could not be run, or empty
   */
  public record Curve(
      String kind, double from, double to, List<Double> times, List<Double> output, String says) {
    /** Keeps its own copies. */
    public Curve {
      times = List.copyOf(times);
      output = List.copyOf(output);
    }
  }

  /**
   * The output while the generator drives it half as far again as clips it, and after.
   *
   * @param isAbove whether it clips above
   * @param rest output at rest, V
   * @param width how long the overload lasts from time 0, s
   * @param recovery how long after it the output stays near rest, s
   * @param times s; empty where it could not be run
   * @param output V, as many
   * @param says why it could not be run, or empty
   */
  public record Recovery(
      boolean isAbove,
      double rest,
      double width,
      double recovery,
      List<Double> times,
      List<Double> output,
      String says) {
    /** Keeps its own copies. */
    public Recovery {
      times = List.copyOf(times);
      output = List.copyOf(output);
    }
  }

  /** Keeps its own copies. */
  public StepResponses {
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
    curves = List.copyOf(curves);
    overloads = List.copyOf(overloads);
  }

  /**
   * Runs a hookup.
   *
   * @param design a valid design, every part it names among its own
   * @param progress asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  public static StepResponses of(Design design, Hookup hookup, Progress progress) {
    HookupSolution solution =
        new HookupSolution(design, hookup, new DeviceModels(design), Optional.empty(), progress);
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    for (Figure figure : Catalogue.figures()) {
      if (figure.cost() == CostClass.TIME) {
        progress.check();
        figures.put(
            figure.key(),
            new FigureResult(figure, figure.estimate(solution), figure.solve(solution)));
      }
    }
    LargeSignal steps = solution.largeSignal();
    List<Curve> curves = new ArrayList<>();
    curves.add(
        curve(
            "small",
            () -> {
              steps.settling();
              return steps.small();
            }));
    curves.add(curve("rising", () -> run(steps, 1)));
    curves.add(curve("falling", () -> run(steps, -1)));
    Outcome<Optional<Oscillation>> oscillation =
        Outcome.of(() -> Oscillation.of(design, hookup, progress));
    return new StepResponses(
        hookup.name(),
        figures,
        curves,
        List.of(recovery(steps, true), recovery(steps, false)),
        oscillation.isPresent() ? oscillation.value() : Optional.empty(),
        oscillation.reason());
  }

  private static Recovery recovery(LargeSignal steps, boolean isAbove) {
    Outcome<Overload.Run> run = Outcome.of(() -> steps.overloaded(isAbove ? 1 : -1));
    if (!run.isPresent()) {
      return new Recovery(
          isAbove, Double.NaN, Double.NaN, Double.NaN, List.of(), List.of(), run.reason());
    }
    Overload.Run value = run.value();
    return new Recovery(
        isAbove,
        value.rest(),
        value.width(),
        value.recovery(),
        boxed(value.times()),
        boxed(value.volts()),
        "");
  }

  private static StepRun run(LargeSignal steps, int direction) {
    steps.slew(direction);
    return steps.large(direction);
  }

  private static Curve curve(String kind, Supplier<StepRun> step) {
    Outcome<StepRun> run = Outcome.of(step);
    return run.isPresent()
        ? new Curve(
            kind,
            run.value().start(),
            run.value().end(),
            boxed(run.value().times()),
            boxed(run.value().volts()),
            "")
        : new Curve(kind, Double.NaN, Double.NaN, List.of(), List.of(), run.reason());
  }

  private static List<Double> boxed(double[] values) {
    List<Double> list = new ArrayList<>(values.length);
    for (double value : values) {
      list.add(value);
    }
    return list;
  }
}
