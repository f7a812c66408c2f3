package loopwright.bench;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;

/**
 * What the judged readings, and every node beside them, would show of a build. It starts each solve
 * from the nominal circuit and serves one thread.
 */
final class FaultyReadings {
  private final Design design;
  private final List<Integer> judged;
  private final List<ReadingGroup> groups;
  private final List<HookupFigures> nominal;

  FaultyReadings(Design design, List<Integer> judged) {
    this.design = design;
    this.judged = judged;
    this.groups = ReadingGroup.of(design);
    this.nominal =
        groups.stream().map(group -> HookupFigures.of(group.circuit(), group.hookup())).toList();
    for (int i = 0; i < groups.size(); i++) {
      values(i, nominal.get(i), new double[design.bench().readings().size()]);
    }
  }

  /**
   * What a build shows.
   *
   * @param values of the judged readings; NaN where a circuit finds no rest
   * @param nodes voltages by hookup and node, V
   */
  record Shown(double[] values, Map<String, Map<String, Double>> nodes) {}

  /** What a candidate would show. */
  Shown of(Candidate candidate) {
    Shown shown = of(candidate::build);
    double[] values = shown.values();
    for (int row = 0; row < values.length; row++) {
      Reading reading = design.bench().readings().get(judged.get(row));
      values[row] = candidate.shown(reading, values[row]);
    }
    return shown;
  }

  /** What a build of the design would show, made anew for each circuit. */
  Shown of(Function<Design, Build> builder) {
    double[] all = new double[design.bench().readings().size()];
    Arrays.fill(all, Double.NaN);
    Map<String, Map<String, Double>> nodes = new LinkedHashMap<>();
    for (int i = 0; i < groups.size(); i++) {
      HookupFigures built = nominal.get(i).of(builder.apply(groups.get(i).circuit()));
      values(i, built, all);
      nodes.putIfAbsent(groups.get(i).hookup(), built.nodes());
    }
    return new Shown(judged.stream().mapToDouble(index -> all[index]).toArray(), nodes);
  }

  private void values(int group, HookupFigures figures, double[] all) {
    for (int reading : groups.get(group).readings()) {
      if (judged.contains(reading)) {
        all[reading] =
            new Expectation(design.bench().readings().get(reading))
                .of(figures)
                .number()
                .orElse(Double.NaN);
      }
    }
  }
}
