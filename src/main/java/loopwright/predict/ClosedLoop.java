package loopwright.predict;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import loopwright.numeric.RootSearch;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies.Pole;

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
   * @param poles natural frequencies, where a resonance could stand between points of a grid
   * @param midband gain at signal frequency that levels are related to
   * @param start a frequency within the band, Hz
   */
  static ClosedLoop of(LinearNetwork network, List<Pole> poles, double midband, double start) {
    Level level =
        frequency -> {
          double[] value = network.response(frequency);
          return 20 * Math.log10(Math.hypot(value[0], value[1]) / Math.abs(midband));
        };
    double within = withinBand(level, start);
    double[] up = grid(within, HIGHEST, poles).toArray();
    double[] down = grid(LOWEST, within, poles).map(f -> -f).sorted().map(f -> -f).toArray();
    return new ClosedLoop(fall(level, up), fall(level, down), peaking(level, up));
  }

  /** Frequencies from one to another, Hz, ascending, with every resonance and its flanks. */
  private static DoubleStream grid(double from, double to, List<Pole> poles) {
    DoubleStream regular = DoubleStream.iterate(from, f -> f < to, f -> f * RATIO);
    DoubleStream resonances =
        poles.stream()
            .filter(pole -> pole.im() > Math.abs(pole.re()))
            .flatMapToDouble(
                pole -> DoubleStream.of(-1, 0, 1).map(k -> pole.im() + k * Math.abs(pole.re())))
            .map(omega -> omega / (2 * Math.PI))
            .filter(f -> f > from && f < to);
    return DoubleStream.concat(DoubleStream.concat(regular, DoubleStream.of(to)), resonances)
        .sorted()
        .distinct();
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

  private static OptionalDouble fall(Level level, double[] frequencies) {
    for (int i = 1; i < frequencies.length; i++) {
      if (level.at(frequencies[i]) < FALL) {
        double root =
            RootSearch.find(
                x -> level.at(Math.exp(x)) - FALL,
                Math.log(frequencies[i - 1]),
                Math.log(frequencies[i]),
                1e-10);
        return OptionalDouble.of(Math.exp(root));
      }
    }
    return OptionalDouble.empty();
  }

  private static double peaking(Level level, double[] frequencies) {
    double best = 0;
    int at = 0;
    for (int i = 1; i < frequencies.length - 1; i++) {
      double here = level.at(frequencies[i]);
      if (here > best) {
        best = here;
        at = i;
      }
    }
    return at == 0 ? 0 : Math.max(best, highest(level, frequencies[at - 1], frequencies[at + 1]));
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
