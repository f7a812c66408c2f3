package loopwright.design;

/**
 * One thing that is wrong with a design.
 *
 * @param path where: a path of the file such as {@code amplifier.gainStage.emitterResistance}
 * @param says what was found there and what was expected
 */
public record Problem(String path, String says) {
  /** Place and sentence together, as a person reads it. */
  public String message() {
    return path.isEmpty() ? says : path + ": " + says;
  }
}
