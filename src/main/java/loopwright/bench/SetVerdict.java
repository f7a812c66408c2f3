package loopwright.bench;

import java.util.OptionalDouble;

/**
 * All readings together, with what their predictions share through their parts.
 *
 * @param chiSquared rᵀ (C_m + C_p)⁻¹ r; empty where no reading can be judged
 * @param degreesOfFreedom number of readings judged
 * @param probability of a larger value if nothing is wrong; empty likewise
 * @param says the verdict in words
 */
public record SetVerdict(
    OptionalDouble chiSquared, int degreesOfFreedom, OptionalDouble probability, String says) {
  /** Below this probability the readings are held not to agree. */
  public static final double LEAST_PROBABILITY = 0.05;

  /** Whether the set agrees; false where nothing can be judged. */
  public boolean agrees() {
    return probability.isPresent() && probability.getAsDouble() >= LEAST_PROBABILITY;
  }
}
