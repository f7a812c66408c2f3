package loopwright.solve;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalInt;
import loopwright.solve.NaturalFrequencies.Pole;

/**
 * Counts growing natural frequencies by the argument principle: along s = jω from zero to infinity
 * the argument of a polynomial turns by π/2 for every root on the left and by −π/2 for every root
 * on the right.
 *
 * <p>The determinant is compared with a model whose roots are known, those of a neighbouring
 * network of the same pattern. Their quotient turns little where the roots have moved little, so
 * that a coarse grid of frequencies follows it; it turns by π for every root that has crossed.
 */
public final class RootCount {
  /** A turn between neighbours above this could be one the other way round, rad. */
  private static final double AMBIGUOUS = 2.4;

  /** A count further than this from a whole number is none. */
  private static final double LARGEST_REST = 0.25;

  private RootCount() {}

  /**
   * Argument of the determinant at one frequency.
   *
   * @param omega rad/s
   * @param argument rad, up to a multiple of 2π
   */
  public record Sample(double omega, double argument) {}

  /**
   * Counts.
   *
   * @param samples along the imaginary axis, in any order
   * @param model all finite roots of the neighbouring network, one of each conjugate pair
   * @return how many roots grow, each of a pair counted; empty when the samples do not tell
   */
  public static OptionalInt growing(List<Sample> samples, List<Pole> model) {
    List<Sample> sorted =
        samples.stream().sorted(Comparator.comparingDouble(Sample::omega)).toList();
    double turned = 0;
    double before = Double.NaN;
    for (Sample sample : sorted) {
      double quotient = sample.argument() - modelArgument(model, sample.omega());
      if (!Double.isNaN(before)) {
        double step = Math.IEEEremainder(quotient - before, 2 * Math.PI);
        if (!(Math.abs(step) < AMBIGUOUS)) {
          return OptionalInt.empty();
        }
        turned += step;
      }
      before = quotient;
    }
    double count = growing(model) - turned / Math.PI;
    long whole = Math.round(count);
    return Math.abs(count - whole) < LARGEST_REST && whole >= 0
        ? OptionalInt.of((int) whole)
        : OptionalInt.empty();
  }

  /** How many of the roots grow, each of a pair counted. */
  public static int growing(List<Pole> poles) {
    return poles.stream().filter(Pole::grows).mapToInt(pole -> pole.im() > 0 ? 2 : 1).sum();
  }

  private static double modelArgument(List<Pole> model, double omega) {
    double sum = 0;
    for (Pole pole : model) {
      sum += Math.atan2(omega - pole.im(), -pole.re());
      if (pole.im() > 0) {
        sum += Math.atan2(omega + pole.im(), -pole.re());
      }
    }
    return sum;
  }
}
