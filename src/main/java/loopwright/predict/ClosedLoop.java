package loopwright.predict;

import java.util.OptionalDouble;
import loopwright.numeric.RootSearch;
import loopwright.solve.LinearNetwork;

/**
 * The closed loop against frequency at rest.
 *
 * @param bandwidth first fall to −3 dB of the midband gain going up, Hz; empty when it never falls
 * @param lowCorner the same going down; empty when it never falls
 * @param peaking largest rise above the midband gain, dB
 */
record ClosedLoop(OptionalDouble bandwidth, OptionalDouble lowCorner, double peaking) {
  private static final double LOWEST = 1e-4;
  private static final double HIGHEST = 1e11;
  private static final double RATIO = Math.pow(10, 1.0 / 16);
  private static final double FALL = 20 * Math.log10(Math.sqrt(0.5));
  private static final int PEAK_STEPS = 60;

  /**
   * Searches a network.
   *
   * @param midband gain at signal frequency that levels are related to
   * @param start a frequency within the band, Hz
   */
  static ClosedLoop of(LinearNetwork network, double midband, double start) {
    Level level =
        frequency -> {
          double[] value = network.response(frequency);
          return 20 * Math.log10(Math.hypot(value[0], value[1]) / Math.abs(midband));
        };
    double within = withinBand(level, start);
    return new ClosedLoop(
        fall(level, within, RATIO), fall(level, within, 1 / RATIO), peaking(level, within));
  }

  /** Level against the midband gain in dB at a frequency in Hz. */
  private interface Level {
    double at(double frequency);
  }

  private static double withinBand(Level level, double start) {
    double frequency = start;
    while (level.at(frequency) < FALL) {
      frequency /= RATIO;
      if (frequency < LOWEST) {
        throw new UnsolvedException("the response is nowhere near the midband gain");
      }
    }
    return frequency;
  }

  private static OptionalDouble fall(Level level, double within, double ratio) {
    double before = within;
    double frequency = within * ratio;
    while (frequency > LOWEST && frequency < HIGHEST) {
      if (level.at(frequency) < FALL) {
        double root =
            RootSearch.find(
                x -> level.at(Math.exp(x)) - FALL, Math.log(before), Math.log(frequency), 1e-10);
        return OptionalDouble.of(Math.exp(root));
      }
      before = frequency;
      frequency *= ratio;
    }
    return OptionalDouble.empty();
  }

  private static double peaking(Level level, double within) {
    double best = 0;
    double at = Double.NaN;
    for (double f = within; f < HIGHEST; f *= RATIO) {
      double here = level.at(f);
      if (here > best) {
        best = here;
        at = f;
      }
    }
    return Double.isNaN(at) ? 0 : Math.max(best, highest(level, at / RATIO, at * RATIO));
  }

  /** Golden-section search for the top between two frequencies. */
  private static double highest(Level level, double from, double to) {
    double golden = (Math.sqrt(5) - 1) / 2;
    double low = Math.log(from);
    double high = Math.log(to);
    double inner = high - golden * (high - low);
    double outer = low + golden * (high - low);
    double levelInner = level.at(Math.exp(inner));
    double levelOuter = level.at(Math.exp(outer));
    for (int i = 0; i < PEAK_STEPS && high - low > 1e-7; i++) {
      if (levelInner > levelOuter) {
        high = outer;
        outer = inner;
        levelOuter = levelInner;
        inner = high - golden * (high - low);
        levelInner = level.at(Math.exp(inner));
      } else {
        low = inner;
        inner = outer;
        levelInner = levelOuter;
        outer = low + golden * (high - low);
        levelOuter = level.at(Math.exp(outer));
      }
    }
    return Math.max(levelInner, levelOuter);
  }
}
