package loopwright.check;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/** A junction that gets hot at some level of the swing. */
final class HotJunctionCheck implements Check {
  /** Most silicon transistors in plastic are specified to this, °C; common practice, no source. */
  private static final double LIMIT = 150;

  private static final double HOT = 120;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    OptionalDouble hottest = Solved.of(prediction, "hottestJunction");
    if (hottest.isEmpty() || hottest.getAsDouble() < HOT) {
      return List.of();
    }
    String says = prediction.figures().get("hottestJunction").solved().says();
    boolean beyond = hottest.getAsDouble() > LIMIT;
    return List.of(
        new Finding(
            beyond ? Finding.Severity.FAILS : Finding.Severity.RISKY,
            says.contains(" ") ? says.substring(0, says.indexOf(' ')) : "hookups",
            "The junction of "
                + says
                + " reaches "
                + Say.celsius(hottest.getAsDouble())
                + (beyond ? ", beyond the usual limit of 150 °C." : ", close to the usual 150 °C."),
            "A heat sink, a larger part, or less supply voltage; parts this hot burn skin."));
  }
}
