package loopwright.predict;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import loopwright.numeric.RootSearch;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies.Pole;

/**
 * Where the loop gain T passes 1 and where it passes the negative real axis, found by root search
 * between the points of a coarse grid. The grid is made finer where T turns quickly, and has a
 * point at every complex natural frequency, where a resonance could hide a crossing.
 *
 * @param unity highest place where |T| = 1; empty when there is none
 * @param gainMargins 1/|T| at every crossing of the negative real axis, ascending
 */
record LoopMargins(Optional<UnityCrossing> unity, List<Double> gainMargins) {
  private static final double LOWEST = 1e-2;
  private static final double HIGHEST = 1e11;
  private static final int PER_DECADE = 4;

  /**
   * Below this the loop gain is rounding, and no margin is of interest; natural logarithm of 1e-9.
   */
  private static final double LEAST = Math.log(1e-9);

  private static final double QUICK_TURN = Math.toRadians(60);
  private static final int MOST_HALVINGS = 12;

  /** A point of the loop gain: frequency, magnitude's logarithm, argument made continuous. */
  private record Point(double frequency, double re, double im, double argument) {
    double logMagnitude() {
      return 0.5 * Math.log(re * re + im * im);
    }
  }

  /** Searches the margins of a network whose natural frequencies are known. */
  static LoopMargins of(LinearNetwork network, List<Pole> poles) {
    return of(network::loopGain, grid(poles));
  }

  static LoopMargins of(DoubleFunction<double[]> loopGain, double[] frequencies) {
    List<Point> points = trace(loopGain, frequencies);
    List<Double> gains = new ArrayList<>();
    for (int i = points.size() - 1; i > 0; i--) {
      Point low = points.get(i - 1);
      Point high = points.get(i);
      if (oddTurns(low) != oddTurns(high) && low.logMagnitude() > LEAST) {
        Point crossing =
            refine(loopGain, low, high, point -> point.argument() - boundary(low, high));
        gains.add(Math.exp(-crossing.logMagnitude()));
      }
    }
    gains.sort(null);
    return new LoopMargins(crossing(loopGain, points), List.copyOf(gains));
  }

  /** Where the loop gain passes 1, without the gain margins; empty when it never does. */
  static Optional<UnityCrossing> crossing(DoubleFunction<double[]> loopGain, double[] frequencies) {
    return crossing(loopGain, trace(loopGain, frequencies));
  }

  private static Optional<UnityCrossing> crossing(
      DoubleFunction<double[]> loopGain, List<Point> points) {
    for (int i = points.size() - 1; i > 0; i--) {
      Point low = points.get(i - 1);
      Point high = points.get(i);
      if (low.logMagnitude() * high.logMagnitude() < 0) {
        Point crossing = refine(loopGain, low, high, Point::logMagnitude);
        return Optional.of(
            new UnityCrossing(crossing.frequency(), 180 + Math.toDegrees(crossing.argument())));
      }
    }
    return Optional.empty();
  }

  /**
   * Where the loop gain passes 1.
   *
   * @throws UnsolvedException when it never does
   */
  UnityCrossing crossing() {
    return unity.orElseThrow(() -> new UnsolvedException("the loop gain never passes 1"));
  }

  /** Smallest gain margin above 1. */
  OptionalDouble gainMargin() {
    return gainMargins.stream().mapToDouble(Double::doubleValue).filter(m -> m > 1).min();
  }

  /** Gain margins below 1: the gain may not fall by so much. */
  List<Double> marginsBelowOne() {
    return gainMargins.stream().filter(m -> m < 1).toList();
  }

  /** How many half turns past ±180° lie behind a point: it changes where T is negative real. */
  private static long oddTurns(Point point) {
    return Math.floorDiv((long) Math.floor(point.argument() / Math.PI) + 1, 2L);
  }

  /** The odd multiple of π between two arguments. */
  private static double boundary(Point low, Point high) {
    return (2 * Math.max(oddTurns(low), oddTurns(high)) - 1) * Math.PI;
  }

  /** Frequencies to begin with, Hz: a regular grid, and the resonances among the roots. */
  static double[] grid(List<Pole> poles) {
    int count = (int) Math.round(Math.log10(HIGHEST / LOWEST)) * PER_DECADE + 1;
    double[] regular = new double[count];
    for (int i = 0; i < count; i++) {
      regular[i] = LOWEST * Math.pow(10, (double) i / PER_DECADE);
    }
    double[] resonances =
        poles.stream()
            .filter(pole -> pole.im() > Math.abs(pole.re()))
            .mapToDouble(pole -> pole.im() / (2 * Math.PI))
            .filter(f -> f > LOWEST && f < HIGHEST)
            .toArray();
    double[] all = Arrays.copyOf(regular, count + resonances.length);
    System.arraycopy(resonances, 0, all, count, resonances.length);
    Arrays.sort(all);
    return Arrays.stream(all).distinct().toArray();
  }

  private static List<Point> trace(DoubleFunction<double[]> loopGain, double[] frequencies) {
    List<Point> points = new ArrayList<>();
    double[] first = loopGain.apply(frequencies[0]);
    points.add(new Point(frequencies[0], first[0], first[1], Math.atan2(first[1], first[0])));
    for (int i = 1; i < frequencies.length; i++) {
      extend(loopGain, points, frequencies[i], MOST_HALVINGS);
    }
    return points;
  }

  /**
   * Adds a point, and points before it as long as the argument turns quickly between neighbours.
   */
  private static void extend(
      DoubleFunction<double[]> loopGain, List<Point> points, double frequency, int halvings) {
    Point last = points.get(points.size() - 1);
    Point next = point(loopGain, last, frequency);
    if (Math.abs(next.argument() - last.argument()) > QUICK_TURN && halvings > 0) {
      extend(loopGain, points, Math.sqrt(last.frequency() * frequency), halvings - 1);
      extend(loopGain, points, frequency, halvings - 1);
    } else {
      points.add(next);
    }
  }

  /** The loop gain at a frequency, its argument made continuous from a neighbour's. */
  private static Point point(DoubleFunction<double[]> loopGain, Point neighbour, double frequency) {
    double[] value = loopGain.apply(frequency);
    if (!Double.isFinite(value[0]) || !Double.isFinite(value[1])) {
      throw new UnsolvedException("the loop gain cannot be solved at " + Text.hertz(frequency));
    }
    double argument = Math.atan2(value[1], value[0]);
    double turns = Math.rint((neighbour.argument() - argument) / (2 * Math.PI));
    return new Point(frequency, value[0], value[1], argument + 2 * Math.PI * turns);
  }

  private interface Measure {
    double of(Point point);
  }

  private static Point refine(
      DoubleFunction<double[]> loopGain, Point low, Point high, Measure measure) {
    if (measure.of(low) * measure.of(high) > 0) {
      return low;
    }
    double root =
        RootSearch.find(
            logarithm -> measure.of(between(loopGain, low, high, Math.exp(logarithm))),
            Math.log(low.frequency()),
            Math.log(high.frequency()),
            1e-11);
    return between(loopGain, low, high, Math.exp(root));
  }

  private static Point between(
      DoubleFunction<double[]> loopGain, Point low, Point high, double frequency) {
    double slack = 1e-12 * frequency;
    if (frequency <= low.frequency() + slack) {
      return low;
    }
    return frequency >= high.frequency() - slack ? high : point(loopGain, low, frequency);
  }
}
