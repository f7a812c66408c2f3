package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Feedback;
import loopwright.predict.Build;
import loopwright.predict.Catalogue;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.task.Progress;

/**
 * Searches the gentlest values that give a wanted phase margin at every level of the swing, with
 * nominal parts and at the tolerance corners, one way after the other.
 */
public final class CureSearch {
  private static final List<String> COSTS =
      List.of(
          "slewRising",
          "slewFalling",
          "inputNoise",
          "outputOffset",
          "loopGainDc",
          "loopGainAtSignal",
          "fullPowerBandwidth");

  private final Design design;
  private final String hookup;
  private final SwingMargin margin;
  private final Map<String, FigureValue> before;

  private CureSearch(HookupFigures nominal, double wanted) {
    this.design = nominal.design();
    this.hookup = nominal.hookup().name();
    this.margin = new SwingMargin(wanted);
    this.before = costs(nominal);
  }

  /** Keys of the figures that a cure is weighed by, in the order in which they are shown. */
  public static List<String> costKeys() {
    return COSTS;
  }

  /**
   * Searches.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of a hookup with feedback
   * @param wanted phase margin at every level, degrees
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws DesignException when the hookup has no loop, or its circuit finds no rest
   */
  public static Cures of(Design design, String hookup, double wanted, Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    if (nominal.hookup().feedback() instanceof Feedback.Open) {
      throw new DesignException(
          "hookups." + hookup + ".feedback", "found an open hookup, expected one with feedback");
    }
    if (nominal.failure().isPresent()) {
      throw new DesignException(
          "hookups." + hookup,
          "found no operating point, expected a circuit at rest: " + nominal.failure().get());
    }
    return new CureSearch(nominal, wanted).search(nominal, progress);
  }

  private Cures search(HookupFigures nominal, Progress progress) {
    List<CureWay> ways = CureWays.of(nominal);
    AtomicInteger done = new AtomicInteger();
    // Ways share nothing, so that each may have a core of its own.
    List<Optional<Cure>> found =
        ways.parallelStream()
            .map(
                way -> {
                  Optional<Cure> cure = follow(way, progress);
                  int count = done.incrementAndGet();
                  progress.report((double) count / ways.size(), "trying cures");
                  return cure;
                })
            .toList();
    List<Cure> cures = new ArrayList<>();
    List<Cures.Cannot> cannot = new ArrayList<>();
    for (int i = 0; i < ways.size(); i++) {
      CureWay way = ways.get(i);
      found.get(i).ifPresent(cures::add);
      if (found.get(i).isEmpty()) {
        cannot.add(new Cures.Cannot(way.kind(), why(way)));
      }
    }
    cures.sort(Comparator.comparingDouble(Cure::cost));
    return new Cures(cures, cannot, !holds(nominal));
  }

  private static String why(CureWay way) {
    return way.closed().isEmpty()
        ? "none of the "
            + way.candidates().size()
            + " values tried holds the margin at every level and corner"
        : way.closed();
  }

  private Optional<Cure> follow(CureWay way, Progress progress) {
    HookupFigures start = HookupFigures.of(design, hookup);
    start.node("out");
    for (List<Change> changes : way.candidates()) {
      progress.check();
      HookupFigures cured = start.of(Build.nominal(Change.applyAll(design, changes)));
      if (margin.seemsHeld(cured) && holds(cured)) {
        return Optional.of(cure(way, changes, cured));
      }
    }
    return Optional.empty();
  }

  /** With every part as the design says, and at each corner. */
  private boolean holds(HookupFigures figures) {
    return margin.isHeld(figures)
        && MarginCorners.of(figures).stream().allMatch(corner -> margin.isHeld(figures.of(corner)));
  }

  private Cure cure(CureWay way, List<Change> changes, HookupFigures cured) {
    OptionalDouble worst = SwingMargin.worst(cured);
    OptionalDouble corner = worst;
    for (Build build : MarginCorners.of(cured)) {
      OptionalDouble there = SwingMargin.worst(cured.of(build));
      if (there.isPresent() && there.getAsDouble() < corner.orElse(Double.POSITIVE_INFINITY)) {
        corner = there;
      }
    }
    Map<String, FigureValue> figures = costs(cured);
    return new Cure(
        way.kind(),
        changes,
        worst,
        corner,
        figures,
        CureWords.of(way.kind(), worst, corner, before, figures),
        cost(figures) + 0.05 * changes.size());
  }

  /** Solved values; where the time domain is not solved, the hand formula's. */
  private static Map<String, FigureValue> costs(HookupFigures figures) {
    Map<String, FigureValue> costs = new LinkedHashMap<>();
    for (String key : COSTS) {
      Catalogue.find(key)
          .ifPresent(
              figure -> {
                FigureValue solved = figures.solved(figure);
                FigureValue value = solved.number().isPresent() ? solved : figures.formula(figure);
                costs.put(key, value.number().isPresent() ? value : solved);
              });
    }
    return costs;
  }

  /**
   * Sum of what is lost, each as the logarithm of its ratio: slew rate, loop gain at the signal's
   * frequency, noise.
   */
  private double cost(Map<String, FigureValue> after) {
    return lost(after, "slewRising") / 2
        + lost(after, "slewFalling") / 2
        + lost(after, "loopGainAtSignal")
        - lost(after, "inputNoise");
  }

  private double lost(Map<String, FigureValue> after, String key) {
    OptionalDouble old =
        before.containsKey(key) ? before.get(key).number() : OptionalDouble.empty();
    OptionalDouble now = after.containsKey(key) ? after.get(key).number() : OptionalDouble.empty();
    return old.isPresent() && now.isPresent() && old.getAsDouble() != 0 && now.getAsDouble() != 0
        ? Math.log(Math.abs(old.getAsDouble() / now.getAsDouble()))
        : 0;
  }
}
