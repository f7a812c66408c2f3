package loopwright.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import loopwright.design.Design;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
import loopwright.task.Progress;

/**
 * What to set and to expect when a build is powered for the first time. Margins are common
 * practice, no source: the supply's limit is twice what the worst good build takes and 5 mA at
 * least above it, and a build that takes a quarter and 1 mA more than the worst good one is
 * switched off.
 *
 * @param supplies positive rail first; a rail at 0 V is none
 */
public record FirstPower(List<Supply> supplies) {
  private static final double LIMIT = 2;
  private static final double LIMIT_LEAST = 5e-3;
  private static final double STOP = 1.25;
  private static final double STOP_LEAST = 1e-3;

  /** Keeps its own copy. */
  public FirstPower {
    supplies = List.copyOf(supplies);
  }

  /**
   * One rail.
   *
   * @param positive whether it is the positive one
   * @param volts of the rail, V
   * @param current that it should deliver at rest, or why that is not known, A
   * @param low least current of the builds sampled, A; the nominal one without tolerances
   * @param high largest current of the builds sampled, A
   */
  public record Supply(
      boolean positive, double volts, FigureValue current, double low, double high) {
    /** What the supply's current limit is set to, A. */
    public double limit() {
      return Math.max(LIMIT * high, high + LIMIT_LEAST);
    }

    /** The current above which the build is switched off at once, A. */
    public double stop() {
      return STOP * high + STOP_LEAST;
    }
  }

  /**
   * Works it out.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup that is powered first
   * @param builds how many are sampled
   * @param seed equal seeds give equal builds
   * @param progress asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  public static FirstPower of(
      Design design, String hookup, int builds, long seed, Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    List<TolerancedPart> parts = TolerancedParts.in(TolerancedParts.of(nominal), hookup);
    double[][] currents = new double[2][nominal.failure().isPresent() ? 0 : builds];
    for (int build = 0; build < currents[0].length; build++) {
      progress.check();
      double[] deviations = new double[parts.size()];
      SplittableRandom random = new SplittableRandom(seed * 0x9E3779B97F4A7C15L + build);
      for (int i = 0; i < deviations.length; i++) {
        TolerancedPart part = parts.get(i);
        deviations[i] = part.low() + (part.high() - part.low()) * random.nextDouble();
      }
      HookupFigures built = nominal.of(TolerancedParts.build(design, parts, deviations));
      currents[0][build] = built.supplyCurrent(true).number().orElse(Double.NaN);
      currents[1][build] = built.supplyCurrent(false).number().orElse(Double.NaN);
    }
    List<Supply> supplies = new ArrayList<>();
    supplies.add(supply(nominal, true, design.rails().positive().value(), currents[0]));
    if (design.rails().negative().value() != 0) {
      supplies.add(supply(nominal, false, design.rails().negative().value(), currents[1]));
    }
    return new FirstPower(supplies);
  }

  private static Supply supply(
      HookupFigures nominal, boolean positive, double volts, double[] sampled) {
    FigureValue current = nominal.supplyCurrent(positive);
    double middle = current.number().orElse(Double.NaN);
    double low = Arrays.stream(sampled).filter(Double::isFinite).min().orElse(middle);
    double high = Arrays.stream(sampled).filter(Double::isFinite).max().orElse(middle);
    return new Supply(positive, volts, current, Math.min(low, middle), Math.max(high, middle));
  }
}
