package loopwright.bench;

import java.util.OptionalDouble;
import loopwright.numeric.ChiSquared;
import loopwright.quantity.EngineeringFormat;

/** The verdict on all readings together, in words. */
final class SetWords {
  private SetWords() {}

  static SetVerdict of(OptionalDouble chiSquared, int count) {
    if (chiSquared.isEmpty()) {
      return new SetVerdict(
          chiSquared,
          count,
          OptionalDouble.empty(),
          "The readings repeat one another so closely that they cannot be judged together.");
    }
    double probability = ChiSquared.exceeded(chiSquared.getAsDouble(), count);
    String chance = EngineeringFormat.percent(probability);
    String readings = count == 1 ? "The reading agrees" : "The " + count + " readings agree";
    String says =
        probability >= SetVerdict.LEAST_PROBABILITY
            ? readings
                + " with the prediction: a fault-free build with these tolerances would differ more in "
                + chance
                + " of cases."
            : readings.replace("agree", "do not agree").replace("do not agrees", "does not agree")
                + " with the prediction: a fault-free build with these tolerances would differ as"
                + " much in only "
                + chance
                + " of cases.";
    return new SetVerdict(chiSquared, count, OptionalDouble.of(probability), says);
  }
}
