package loopwright.check;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.DeviceRoles;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Quantity;

/** A junction that gets hot at some level of the swing. */
final class HotJunctionCheck implements Check {
  /** Most silicon transistors in plastic are specified to this, °C; common practice, no source. */
  private static final double USUAL = 150;

  /** So close to the limit is worth a word, K; common practice, no source. */
  private static final double CLOSE = 30;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    OptionalDouble hottest = Solved.of(prediction, "hottestJunction");
    if (hottest.isEmpty()) {
      return List.of();
    }
    String says = prediction.figures().get("hottestJunction").solved().says();
    String where = says.contains(" ") ? says.substring(0, says.indexOf(' ')) : "hookups";
    Optional<Quantity> stated = limit(design, where);
    double limit = stated.map(Quantity::value).orElse(USUAL);
    if (hottest.getAsDouble() < limit - CLOSE) {
      return List.of();
    }
    boolean beyond = hottest.getAsDouble() > limit;
    return List.of(
        new Finding(
            beyond ? Finding.Severity.FAILS : Finding.Severity.RISKY,
            where,
            "The junction of "
                + says
                + " reaches "
                + Say.celsius(hottest.getAsDouble())
                + (beyond ? ", beyond " : ", close to ")
                + (stated.isPresent() ? "its part's limit of " : "the usual limit of ")
                + Say.celsius(limit)
                + ".",
            "A heat sink, a larger part, or less supply voltage; parts this hot burn skin."));
  }

  private static Optional<Quantity> limit(Design design, String role) {
    return DeviceRoles.find(design, role)
        .map(device -> design.parts().get(device.part()))
        .filter(TransistorRecord.class::isInstance)
        .flatMap(record -> ((TransistorRecord) record).limits())
        .flatMap(TransistorLimits::junctionTemperature);
  }
}
