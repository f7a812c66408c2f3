package loopwright.sizing;

import java.util.Optional;

/**
 * A divider to be tried.
 *
 * @param upper from output to inverting input; 0 Ω is a wire
 * @param lower from the inverting input to its return, or to the source; empty for a follower
 */
record DividerCandidate(ResistorChoice upper, Optional<ResistorChoice> lower) {
  private static final ResistorChoice WIRE = ResistorChoice.single(0);

  static DividerCandidate wire() {
    return new DividerCandidate(WIRE, Optional.empty());
  }

  static DividerCandidate of(ResistorChoice upper, ResistorChoice lower) {
    return new DividerCandidate(upper, Optional.of(lower));
  }

  int partCount() {
    return (upper.value() == 0 ? 0 : upper.parts().size())
        + lower.map(resistor -> resistor.parts().size()).orElse(0);
  }

  double lowerOhms() {
    return lower.map(ResistorChoice::value).orElse(Double.POSITIVE_INFINITY);
  }
}
