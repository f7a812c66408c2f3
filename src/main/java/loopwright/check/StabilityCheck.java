package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.Compensation;

/** Something that grows: at rest, at some level of the swing, or latching. */
final class StabilityCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    boolean everStable = prediction.overSwing().stream().allMatch(SwingLevel::stable);
    Optional<Compensation> cure =
        everStable && prediction.unstablePoles().isEmpty()
            ? Optional.empty()
            : Compensation.of(design, prediction.hookup().name());
    String where = "hookups." + prediction.hookup().name();
    for (Root root : prediction.unstablePoles()) {
      findings.add(
          root.im() == 0
              ? new Finding(
                  Finding.Severity.FAILS,
                  where,
                  "Latches at rest: a disturbance grows with a time constant of "
                      + EngineeringFormat.format(1 / root.re(), Unit.SECOND)
                      + " without oscillating.",
                  "")
              : new Finding(
                  Finding.Severity.FAILS,
                  where,
                  "Oscillates at rest: it grows at "
                      + EngineeringFormat.format(root.im() / (2 * Math.PI), Unit.HERTZ)
                      + ".",
                  remedy(cure),
                  changes(cure)));
    }
    boolean overSwing = prediction.overSwing().stream().anyMatch(level -> !level.stable());
    if (overSwing && prediction.unstablePoles().isEmpty()) {
      findings.add(overSwing(prediction, where, cure));
    }
    return findings;
  }

  private static String remedy(Optional<Compensation> cure) {
    return cure.map(
            found ->
                "A compensation capacitor of "
                    + EngineeringFormat.format(found.capacitance(), Unit.FARAD, 3)
                    + " keeps every level stable, with "
                    + EngineeringFormat.format(Compensation.MARGIN, Unit.DEGREE, 2)
                    + " of phase margin or more.")
        .orElse(
            "No compensation capacitor alone keeps every level stable; look for an isolation"
                + " resistor, a snubber or a lead capacitor.");
  }

  private static List<Change> changes(Optional<Compensation> cure) {
    return cure.map(found -> List.of(found.change())).orElse(List.of());
  }

  private static Finding overSwing(
      HookupPrediction prediction, String where, Optional<Compensation> cure) {
    double least =
        prediction.overSwing().stream()
            .filter(level -> !level.stable())
            .mapToDouble(SwingLevel::output)
            .boxed()
            .min((a, b) -> Double.compare(Math.abs(a), Math.abs(b)))
            .orElseThrow();
    String how =
        Optional.ofNullable(prediction.figures().get("worstGrowth"))
            .map(FigureResult::solved)
            .map(value -> value.says())
            .orElse("");
    return new Finding(
        Finding.Severity.FAILS,
        where,
        "Quiet at rest but oscillates from "
            + EngineeringFormat.format(least, Unit.VOLT)
            + " on: "
            + how
            + ".",
        remedy(cure),
        changes(cure));
  }
}
