package loopwright.spread;

/**
 * How many builds are sampled.
 *
 * @param samples builds of which nodes and linear figures are solved
 * @param waveformSamples builds of which figures of waveform and swing are solved as well; they
 *     cost a hundred times as much
 * @param seed equal seeds give equal builds
 */
public record Sampling(int samples, int waveformSamples, long seed) {
  private static final int USUAL = 1000;
  private static final int USUAL_SHARE = 10;
  private static final int LEAST = 40;

  /** Checks the counts. */
  public Sampling {
    if (samples < 1 || waveformSamples < 0 || waveformSamples > samples) {
      throw new IllegalArgumentException(samples + " samples, " + waveformSamples + " in full");
    }
  }

  /** A thousand builds, a tenth of them in full. */
  public static Sampling usual() {
    return of(USUAL, 1);
  }

  /** So many builds, a tenth of them in full, but not fewer than 40. */
  public static Sampling of(int samples, long seed) {
    return new Sampling(samples, Math.min(samples, Math.max(LEAST, samples / USUAL_SHARE)), seed);
  }
}
