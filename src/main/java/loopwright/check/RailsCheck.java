package loopwright.check;

import java.util.List;
import java.util.Map;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** A node beyond the rails at rest: only an ideal source, or a mistake, can take it there. */
final class RailsCheck implements Check {
  /** How far beyond a rail a node may stand before it counts, V. */
  private static final double SLACK = 1e-3;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    double high = design.rails().positive().value() + SLACK;
    double low = design.rails().negative().value() - SLACK;
    return prediction.rest().map(RestState::nodes).stream()
        .flatMap(nodes -> nodes.entrySet().stream())
        .filter(node -> !isInput(node.getKey()))
        .filter(node -> node.getValue() > high || node.getValue() < low)
        .map(node -> finding(node, node.getValue() > high ? "above" : "below"))
        .toList();
  }

  private static boolean isInput(String node) {
    return node.equals("generator") || node.equals("attenuatorTop") || node.equals("inputEnd");
  }

  private static Finding finding(Map.Entry<String, Double> node, String side) {
    return new Finding(
        Finding.Severity.FAILS,
        node.getKey(),
        "Node "
            + node.getKey()
            + " would stand at "
            + EngineeringFormat.format(node.getValue(), Unit.VOLT)
            + ", "
            + side
            + " its rail; no real current source can do that.",
        "");
  }
}
