package loopwright.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.Feedback;
import loopwright.design.PartValue;
import loopwright.design.Probe;
import loopwright.design.StagesAmplifier;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.predict.SwingLevel;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;
import loopwright.task.Progress;

/**
 * How stable a hookup is over its whole swing while one value is varied.
 *
 * @param what is varied, in words
 * @param path of the value; of a probe {@code hookups.NAME.probes.NODE}, which stands for one more
 *     probe at that node
 * @param unit of the value
 * @param points in the order of the value, the present one among them
 */
public record StabilitySweep(String what, String path, Unit unit, List<Point> points) {
  private static final int LEVELS = 41;

  /**
   * The whole swing at one value.
   *
   * @param value in the unit of the sweep
   * @param present whether the design has this value
   * @param stable whether nothing grows at any level
   * @param phaseMargin smallest over the swing, degrees; empty where the loop gain never passes 1
   * @param growth largest over the swing, 1/s; empty where there is no complex pair
   * @param frequency of the pair that grows fastest or dies slowest, Hz
   */
  public record Point(
      double value,
      boolean present,
      boolean stable,
      OptionalDouble phaseMargin,
      OptionalDouble growth,
      OptionalDouble frequency) {}

  /** Keeps its own copy. */
  public StabilitySweep {
    points = List.copyOf(points);
  }

  /**
   * Sweeps load capacitance, compensation, stray capacitance, supply inductance, the gain by the
   * upper resistor of the divider, and a probe's capacitance at each node in turn.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of a hookup with feedback
   * @throws loopwright.task.CancelledException when the result is no longer wanted
   * @throws DesignException when the hookup has no loop
   */
  public static List<StabilitySweep> of(Design design, String hookup, Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    String at = "hookups." + hookup + ".";
    if (nominal.hookup().feedback() instanceof Feedback.Open) {
      throw new DesignException(
          at + "feedback", "found an open hookup, expected one with feedback");
    }
    List<StabilitySweep> wanted = new ArrayList<>();
    double load = nominal.hookup().load().capacitance().map(part -> part.effective()).orElse(0.0);
    wanted.add(sweep("Load capacitance", at + "load.capacitance", Unit.FARAD, 1e-12, 100e-9, load));
    if (design.amplifier() instanceof StagesAmplifier stages) {
      double present =
          stages.gainStage().compensation().map(c -> c.capacitance().effective()).orElse(0.0);
      wanted.add(
          sweep(
              "Compensation",
              "amplifier.gainStage.compensation.capacitance",
              Unit.FARAD,
              1e-12,
              10e-9,
              present));
    }
    wanted.add(
        sweep(
            "Stray capacitance of every node",
            "surroundings.strayCapacitance",
            Unit.FARAD,
            1e-12,
            47e-12,
            design.surroundings().strayCapacitance().value()));
    wanted.add(
        sweep(
            "Supply lead inductance",
            "rails.inductance",
            Unit.HENRY,
            10e-9,
            10e-6,
            design.rails().inductance().value()));
    if (nominal.hookup().feedback() instanceof Feedback.NonInverting divider
        && divider.lower().isPresent()) {
      double foot = divider.lower().get().effective();
      wanted.add(
          sweep(
              "Gain, by the upper resistor",
              at + "feedback.upper",
              Unit.OHM,
              0.1 * foot,
              100 * foot,
              divider.upper().effective()));
    }
    for (String node : nominal.probedNodes()) {
      wanted.add(
          sweep("Capacitance at " + node, at + "probes." + node, Unit.FARAD, 2.2e-12, 1e-9, 0));
    }
    List<StabilitySweep> sweeps = new ArrayList<>();
    for (StabilitySweep sweep : wanted) {
      progress.report((double) sweeps.size() / wanted.size(), sweep.what());
      sweeps.add(sweep.solved(design, hookup, progress));
    }
    return sweeps;
  }

  private static StabilitySweep sweep(
      String what, String path, Unit unit, double low, double high, double present) {
    List<Double> values = new ArrayList<>(PreferredValues.E3.between(low, high));
    if (present > 0 && !values.contains(present)) {
      values.add(present);
      values.sort(null);
    }
    return new StabilitySweep(
        what,
        path,
        unit,
        values.stream()
            .map(
                value ->
                    new Point(
                        value,
                        value == present,
                        false,
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()))
            .toList());
  }

  /** The same with every point solved, each on a core of its own. */
  private StabilitySweep solved(Design design, String hookup, Progress progress) {
    Point[] solved = new Point[points.size()];
    IntStream.range(0, solved.length)
        .parallel()
        .forEach(
            i -> {
              progress.check();
              solved[i] = at(design, hookup, points.get(i));
            });
    return new StabilitySweep(what, path, unit, List.of(solved));
  }

  private Point at(Design design, String hookup, Point point) {
    HookupFigures figures =
        HookupFigures.of(design, hookup).of(Build.nominal(with(design, hookup, point.value())));
    List<SwingLevel> levels = figures.overSwing(LEVELS, level -> true);
    SwingLevel worst = null;
    for (SwingLevel level : levels) {
      if (level.growth().isPresent()
          && (worst == null || level.growth().getAsDouble() > worst.growth().getAsDouble())) {
        worst = level;
      }
    }
    return new Point(
        point.value(),
        point.present(),
        !levels.isEmpty() && levels.stream().allMatch(SwingLevel::stable),
        levels.stream()
            .filter(level -> level.phaseMargin().isPresent())
            .mapToDouble(level -> level.phaseMargin().getAsDouble())
            .min(),
        worst == null ? OptionalDouble.empty() : worst.growth(),
        worst == null ? OptionalDouble.empty() : worst.frequency());
  }

  /** The design with a value; with a probe of that capacitance where the sweep is of a node. */
  private Design with(Design design, String hookup, double value) {
    String probes = "hookups." + hookup + ".probes";
    if (!path.startsWith(probes + ".")) {
      return Change.applyAll(
          design, List.of(new Change(path, EngineeringFormat.spelling(value, unit))));
    }
    int next = design.hookup(hookup).orElseThrow().probes().size();
    String node = path.substring(probes.length() + 1);
    return DesignPath.set(
        design,
        probes + "." + next,
        new Probe(node, Optional.empty(), Optional.of(PartValue.of(value))));
  }

  /** In a sentence: where it is stable. */
  public String says() {
    List<Point> stable = points.stream().filter(Point::stable).toList();
    if (stable.size() == points.size()) {
      return what + ": stable at every value from " + text(0) + " to " + text(points.size() - 1);
    }
    if (stable.isEmpty()) {
      return what + ": grows at every value from " + text(0) + " to " + text(points.size() - 1);
    }
    List<String> spans = new ArrayList<>();
    for (int i = 0; i < points.size(); i++) {
      int from = i;
      while (i + 1 < points.size() && points.get(i + 1).stable() == points.get(from).stable()) {
        i++;
      }
      spans.add(
          (points.get(from).stable() ? "stable" : "grows")
              + (from == i ? " at " + text(i) : " from " + text(from) + " to " + text(i)));
    }
    return what + ": " + String.join(", ", spans);
  }

  private String text(int point) {
    return EngineeringFormat.format(points.get(point).value(), unit, 3);
  }
}
