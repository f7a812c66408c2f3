package loopwright.bench;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.function.Predicate;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;

/**
 * What the judged readings, and every node beside them, would show of a build. It starts each solve
 * from the nearest circuit that is solved already and serves one thread.
 */
final class FaultyReadings {
  private final List<Reading> readings;
  private final List<Integer> judged;
  private final List<ReadingGroup> groups;
  private final List<HookupFigures> nominal;

  /**
   * @param groups the circuits to solve
   * @param kin whose fits of part records are taken over
   */
  FaultyReadings(
      Design design, List<Integer> judged, List<ReadingGroup> groups, HookupFigures kin) {
    this.readings = design.bench().readings();
    this.judged = judged;
    this.groups = groups.stream().filter(group -> isJudged(group, judged)).toList();
    this.nominal = ReadingGroup.nominal(this.groups, kin);
    for (int i = 0; i < nominal.size(); i++) {
      values(i, nominal.get(i), new double[readings.size()]);
    }
  }

  private static boolean isJudged(ReadingGroup group, List<Integer> judged) {
    return group.readings().stream().anyMatch(judged::contains);
  }

  /**
   * What a build shows.
   *
   * @param values of the judged readings; NaN where a circuit finds no rest, or where it was not
   *     solved any more
   * @param nodes voltages by hookup and node, V
   * @param whole whether everything was solved that was wanted
   */
  record Shown(double[] values, Map<String, Map<String, Double>> nodes, boolean whole) {}

  /**
   * What a candidate would show.
   *
   * @param goOn asked after each circuit, with the values so far, NaN for those not yet solved,
   *     whether the others are wanted
   */
  Shown of(Candidate candidate, Predicate<double[]> goOn) {
    return of(
        candidate::build,
        values -> {
          for (int row = 0; row < values.length; row++) {
            values[row] = candidate.shown(readings.get(judged.get(row)), values[row]);
          }
          return values;
        },
        goOn);
  }

  /** What a build of the design would show, made anew for each circuit. */
  Shown of(Function<Design, Build> builder) {
    return of(builder, values -> values, values -> true);
  }

  private Shown of(
      Function<Design, Build> builder,
      Function<double[], double[]> instruments,
      Predicate<double[]> goOn) {
    double[] all = new double[readings.size()];
    Arrays.fill(all, Double.NaN);
    Map<String, Map<String, Double>> nodes = new LinkedHashMap<>();
    Map<String, HookupFigures> first = new HashMap<>();
    double[] shown = instruments.apply(ofJudged(all));
    for (int i = 0; i < groups.size(); i++) {
      String hookup = groups.get(i).hookup();
      // The same build with another instrument on it is nearer than the design's own.
      HookupFigures built =
          first.getOrDefault(hookup, nominal.get(i)).of(builder.apply(groups.get(i).circuit()));
      if (built.failure().isPresent()) {
        return new Shown(ofJudged(new double[all.length], Double.NaN), nodes, true);
      }
      values(i, built, all);
      first.putIfAbsent(hookup, built);
      nodes.putIfAbsent(hookup, built.nodes());
      shown = instruments.apply(ofJudged(all));
      if (i + 1 < groups.size() && !goOn.test(shown)) {
        return new Shown(shown, nodes, false);
      }
    }
    return new Shown(shown, nodes, true);
  }

  private double[] ofJudged(double[] all) {
    return judged.stream().mapToDouble(index -> all[index]).toArray();
  }

  private double[] ofJudged(double[] all, double value) {
    Arrays.fill(all, value);
    return ofJudged(all);
  }

  private void values(int group, HookupFigures figures, double[] all) {
    for (int reading : groups.get(group).readings()) {
      if (judged.contains(reading)) {
        all[reading] = groups.get(group).shown(readings, reading, figures);
      }
    }
  }
}
