package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.Extra;
import loopwright.design.Feedback;
import loopwright.design.Source;
import loopwright.predict.HookupPrediction;

/** An input whose base current has nowhere to come from. */
final class DcPathCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    Source source = prediction.hookup().source();
    boolean drivesPlus = !(prediction.hookup().feedback() instanceof Feedback.Inverting);
    boolean blocked = source.couplingCapacitance().isPresent() && source.biasResistance().isEmpty();
    if (drivesPlus && blocked && !extraPath(design, "in+")) {
      String path = "hookups." + prediction.hookup().name() + ".source.biasResistance";
      findings.add(
          new Finding(
              Finding.Severity.FAILS,
              "hookups." + prediction.hookup().name() + ".source",
              "The base at in+ has no dc path: the coupling capacitor blocks it and no resistor feeds"
                  + " it, so that the input drifts until the pair is cut off.",
              "A bias resistor of 100 kΩ at the input gives its base current a way.",
              List.of(new Change(path, "100k"))));
    }
    return findings;
  }

  private static boolean extraPath(Design design, String node) {
    return design.extras().stream()
        .anyMatch(
            extra ->
                extra instanceof Extra.ExtraResistor
                    && (extra.from().equals(node) || extra.to().equals(node)));
  }
}
