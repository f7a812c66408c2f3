package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;

/**
 * Counts zeros less poles of a real function of complex frequency in the right half-plane by the
 * argument principle: up the imaginary axis and back to the real one along a quarter circle, beyond
 * which a natural frequency counts as infinite. The lower half is the mirror image of the upper.
 */
final class HalfPlane {
  /** Argument of the function at a complex frequency, rad, up to a multiple of 2π. */
  interface Argument {
    double at(double re, double im);
  }

  /** Radius of the quarter circle, rad/s. */
  private static final double RADIUS = 1e13;

  /** Where the axis begins, rad/s: below every pole but one at zero. */
  private static final double LOWEST = 1e-12;

  private static final int PER_DECADE = 6;
  private static final double LARGEST_TURN = 0.7;
  private static final int MOST_HALVINGS = 40;

  private HalfPlane() {}

  /**
   * Zeros less poles.
   *
   * @param seams angular frequencies where the function may turn quickly; they only make it quicker
   */
  static int count(Argument argument, double... seams) {
    double[] axis =
        DoubleStream.concat(
                DoubleStream.iterate(
                    LOWEST, w -> w <= RADIUS, w -> w * Math.pow(10, 1.0 / PER_DECADE)),
                DoubleStream.of(seams).filter(w -> w > LOWEST && w < RADIUS))
            .sorted()
            .toArray();
    double turned = 0;
    for (int i = 1; i < axis.length; i++) {
      turned += alongAxis(argument, axis[i - 1], axis[i], 0);
    }
    turned += alongAxis(argument, axis[axis.length - 1], RADIUS, 0);
    int arcs = 40;
    for (int i = 0; i < arcs; i++) {
      double from = Math.PI / 2 * (1 - (double) i / arcs);
      double to = Math.PI / 2 * (1 - (double) (i + 1) / arcs);
      turned += alongArc(argument, from, to, 0);
    }
    // This half of the way round goes clockwise and turns by −π for every zero.
    double count = -turned / Math.PI;
    assertThat(count).isCloseTo(Math.rint(count), within(1e-3));
    return (int) Math.rint(count);
  }

  private static double alongAxis(Argument argument, double from, double to, int halvings) {
    double turn = turn(argument.at(0, to), argument.at(0, from));
    if (Math.abs(turn) < LARGEST_TURN || halvings == MOST_HALVINGS) {
      return turn;
    }
    double middle = Math.sqrt(from * to);
    return alongAxis(argument, from, middle, halvings + 1)
        + alongAxis(argument, middle, to, halvings + 1);
  }

  private static double alongArc(Argument argument, double from, double to, int halvings) {
    double turn = turn(onArc(argument, to), onArc(argument, from));
    if (Math.abs(turn) < LARGEST_TURN || halvings == MOST_HALVINGS) {
      return turn;
    }
    double middle = (from + to) / 2;
    return alongArc(argument, from, middle, halvings + 1)
        + alongArc(argument, middle, to, halvings + 1);
  }

  private static double onArc(Argument argument, double angle) {
    // On the real axis exactly, where the function is real.
    double im = angle == 0 ? 0 : RADIUS * Math.sin(angle);
    return argument.at(RADIUS * Math.cos(angle), im);
  }

  private static double turn(double to, double from) {
    return Math.IEEEremainder(to - from, 2 * Math.PI);
  }
}
