package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.Limit;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** A figure or node outside the limits that this build must meet, with every part nominal. */
final class BuildLimitsCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    List<Limit> limits = design.limits();
    for (int i = 0; i < limits.size(); i++) {
      Limit limit = limits.get(i);
      if (limit.hookup().equals(prediction.hookup().name()) && prediction.rest().isPresent()) {
        against("limits." + i, limit, prediction, findings);
      }
    }
    return findings;
  }

  private static void against(
      String path, Limit limit, HookupPrediction prediction, List<Finding> findings) {
    OptionalDouble value = value(limit, prediction);
    if (value.isEmpty()) {
      return;
    }
    boolean low = limit.minimum().filter(least -> value.getAsDouble() < least.value()).isPresent();
    boolean high = limit.maximum().filter(most -> value.getAsDouble() > most.value()).isPresent();
    if (!low && !high) {
      return;
    }
    Unit unit = limit.figure().flatMap(Catalogue::find).map(Figure::unit).orElse(Unit.VOLT);
    String what =
        limit
            .figure()
            .flatMap(Catalogue::find)
            .map(Figure::label)
            .orElseGet(() -> "Node " + limit.node().orElse(""));
    double bound = (low ? limit.minimum() : limit.maximum()).orElseThrow().value();
    findings.add(
        new Finding(
            Finding.Severity.FAILS,
            path,
            what
                + " is "
                + EngineeringFormat.format(value.getAsDouble(), unit)
                + " with every part nominal, "
                + (low ? "below" : "above")
                + " the limit of "
                + EngineeringFormat.format(bound, unit)
                + ".",
            ""));
  }

  private static OptionalDouble value(Limit limit, HookupPrediction prediction) {
    if (limit.figure().isPresent()) {
      return Solved.of(prediction, limit.figure().get());
    }
    Double volts = prediction.rest().orElseThrow().nodes().get(limit.node().orElse(""));
    return volts == null ? OptionalDouble.empty() : OptionalDouble.of(volts);
  }
}
