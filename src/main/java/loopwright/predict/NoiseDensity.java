package loopwright.predict;

import java.util.List;

/**
 * Noise of a hookup at one frequency.
 *
 * @param frequency Hz
 * @param output density at {@code out}, V/√Hz
 * @param input the same referred to the generator, V/√Hz
 * @param gain what it was divided by: the magnitude of the ideal gain, with an open hookup of the
 *     gain solved at this frequency
 * @param shares who makes it, the largest first
 */
public record NoiseDensity(
    double frequency, double output, double input, double gain, List<NoiseShare> shares) {
  /** Keeps its own copy. */
  public NoiseDensity {
    shares = List.copyOf(shares);
  }
}
