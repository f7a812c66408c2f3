package loopwright.predict;

import java.util.List;

/**
 * Noise of a hookup within a band.
 *
 * @param low lower end of the band, Hz
 * @param high upper end, Hz
 * @param output at {@code out}, V rms
 * @param shares who makes it, the largest first
 */
public record NoiseBand(double low, double high, double output, List<NoiseShare> shares) {
  /** Keeps its own copy. */
  public NoiseBand {
    shares = List.copyOf(shares);
  }
}
