package loopwright.propose;

import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
import loopwright.design.Drawer;

/** Specifications as people would write them. */
final class Specifications {
  private static final double[] LOADS = {32, 100, 600, 1e3, 2e3, 10e3, 47e3, 0};
  private static final double[] SOURCES = {50, 50, 600, 1e3, 10e3};
  private static final double[] RAILS = {5, 9, 12, 15};
  private static final double[] GAINS = {1, 2, 5, 10, 11, 20, 50, 100};
  private static final double[] WIDTHS = {20e3, 50e3, 100e3, 200e3, 500e3};

  private Specifications() {}

  static Specification of(
      double positive,
      double negative,
      double gain,
      boolean inverting,
      double load,
      double swing,
      double bandwidth,
      Preference... preferences) {
    return new Specification(
        positive,
        negative,
        gain,
        inverting,
        load > 0 ? OptionalDouble.of(load) : OptionalDouble.empty(),
        100e-12,
        swing,
        bandwidth,
        50,
        1e3,
        List.of(),
        new Drawer.Stock.Series("E24"),
        new Drawer.Stock.Series("E6"),
        Specification.USUAL_MARGIN,
        Specification.USUAL_GAIN_TOLERANCE,
        Set.of(preferences));
  }

  /** A plausible one of a seed. */
  static Specification plausible(long seed) {
    Random dice = new Random(seed);
    dice.nextInt();
    double rail = one(RAILS, dice);
    boolean single = dice.nextInt(4) == 0;
    double room = single ? rail / 2 : rail;
    boolean inverting = dice.nextInt(3) == 0;
    double load = one(LOADS, dice);
    Set<Preference> preferences = EnumSet.noneOf(Preference.class);
    if (dice.nextInt(3) == 0) {
      preferences.add(Preference.values()[dice.nextInt(Preference.values().length)]);
    }
    return new Specification(
        rail,
        single ? 0 : -rail,
        one(GAINS, dice),
        inverting,
        load > 0 ? OptionalDouble.of(load) : OptionalDouble.empty(),
        dice.nextInt(3) == 0 ? 1e-9 : 100e-12,
        Math.round(10 * room * (0.2 + 0.55 * dice.nextDouble())) / 10.0,
        one(WIDTHS, dice),
        one(SOURCES, dice),
        1e3,
        List.of(),
        new Drawer.Stock.Series("E24"),
        new Drawer.Stock.Series("E6"),
        dice.nextBoolean() ? 45 : 60,
        Specification.USUAL_GAIN_TOLERANCE,
        preferences);
  }

  private static double one(double[] values, Random dice) {
    return values[dice.nextInt(values.length)];
  }
}
