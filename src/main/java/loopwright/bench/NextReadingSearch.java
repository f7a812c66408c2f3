package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import loopwright.bench.FaultSearch.Hypothesis;
import loopwright.design.Design;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * The node voltage that tells most: the one in which the explanations that lead differ most, in
 * units of what a hand-held meter is believed, weighted by how probable each pair of them is.
 */
final class NextReadingSearch {
  private static final int LEADING = 6;

  /** Less probable explanations do not decide what to read. */
  private static final double LEAST = 1e-3;

  /** A hand-held meter: 0.5 % of the reading and 3 mV; common practice, no source. */
  private static final double SHARE = 0.005;

  private static final double VOLTS = 3e-3;

  /** Explanations further apart than this are told from one another whatever else. */
  private static final double APART = 4;

  private NextReadingSearch() {}

  static Optional<NextReading> of(Design design, List<Hypothesis> ranked, double sum, double most) {
    List<Hypothesis> leading =
        ranked.stream()
            .filter(each -> each.shown().isPresent())
            .filter(
                each -> Math.exp(each.logWeight() - most) / sum > LEAST || isFirstTwo(ranked, each))
            .limit(LEADING)
            .toList();
    if (leading.size() < 2) {
      return Optional.empty();
    }
    Set<String> read =
        design.bench().readings().stream()
            .filter(reading -> reading.quantity().equals("nodeVoltage"))
            .map(reading -> reading.hookup().orElse("") + " " + reading.node().orElse(""))
            .collect(Collectors.toSet());
    NextReading best = null;
    double bestWorth = 0;
    Map<String, Map<String, Double>> nodes = leading.get(0).shown().get().nodes();
    for (Map.Entry<String, Map<String, Double>> hookup : nodes.entrySet()) {
      for (String node : hookup.getValue().keySet()) {
        if (!isRead(leading, hookup, node, read)) {
          double worth = worth(leading, hookup.getKey(), node, sum, most);
          if (worth > bestWorth) {
            bestWorth = worth;
            best =
                new NextReading(
                    hookup.getKey(), "nodeVoltage", node, says(leading, hookup.getKey(), node));
          }
        }
      }
    }
    return Optional.ofNullable(best);
  }

  /** Whether the node was read, or one that stands where it does whatever the explanation. */
  private static boolean isRead(
      List<Hypothesis> leading,
      Map.Entry<String, Map<String, Double>> hookup,
      String node,
      Set<String> read) {
    return hookup.getValue().keySet().stream()
        .filter(other -> read.contains(hookup.getKey() + " " + other))
        .anyMatch(
            other ->
                other.equals(node)
                    || leading.stream()
                        .allMatch(
                            each ->
                                Math.abs(
                                        volts(each, hookup.getKey(), node)
                                            - volts(each, hookup.getKey(), other))
                                    < VOLTS / 3));
  }

  /** With a single cause left, the next one says what would speak against it. */
  private static boolean isFirstTwo(List<Hypothesis> ranked, Hypothesis one) {
    return ranked.stream().filter(each -> each.shown().isPresent()).limit(2).anyMatch(one::equals);
  }

  private static double worth(
      List<Hypothesis> leading, String hookup, String node, double sum, double most) {
    double worth = 0;
    for (int i = 0; i < leading.size(); i++) {
      for (int j = 0; j < i; j++) {
        double one = volts(leading.get(i), hookup, node);
        double other = volts(leading.get(j), hookup, node);
        double believed = VOLTS + SHARE * Math.max(Math.abs(one), Math.abs(other));
        double apart = Math.min(APART, Math.abs(one - other) / believed);
        if (Double.isFinite(apart)) {
          worth +=
              apart
                  * Math.exp(leading.get(i).logWeight() - most)
                  / sum
                  * Math.exp(leading.get(j).logWeight() - most)
                  / sum;
        }
      }
    }
    return worth;
  }

  private static double volts(Hypothesis hypothesis, String hookup, String node) {
    Map<String, Double> nodes =
        hypothesis.shown().orElseThrow().nodes().getOrDefault(hookup, Map.of());
    return nodes.getOrDefault(node, Double.NaN);
  }

  private static String says(List<Hypothesis> leading, String hookup, String node) {
    List<String> each = new ArrayList<>();
    for (Hypothesis hypothesis : leading) {
      double volts = volts(hypothesis, hookup, node);
      if (Double.isFinite(volts)) {
        each.add(EngineeringFormat.format(volts, Unit.VOLT, 3) + " if " + hypothesis.says());
      }
    }
    return "Measure node " + node + " in hookup " + hookup + ": " + String.join("; ", each) + ".";
  }
}
