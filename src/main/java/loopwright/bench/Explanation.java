package loopwright.bench;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One way to explain all readings together.
 *
 * @param kind what kind of explanation it is
 * @param part what it concerns; empty where it concerns nothing
 * @param says what it would be, in words
 * @param value of a part that has drifted, in its unit; empty otherwise
 * @param misfit rᵀ (C_m + C_p)⁻¹ r of the readings against what they would show; empty for none of
 *     these
 * @param probability among all explanations that compete, 0 to 1
 * @param alike parts whose fault would show the same, within three standard uncertainties
 */
public record Explanation(
    Kind kind,
    String part,
    String says,
    OptionalDouble value,
    OptionalDouble misfit,
    double probability,
    List<String> alike) {
  /** Kinds of explanations. */
  public enum Kind {
    NO_FAULT,
    DRIFT,
    FAULT,
    NONE_OF_THESE
  }

  /** Keeps its own copy. */
  public Explanation {
    alike = List.copyOf(alike);
  }
}
