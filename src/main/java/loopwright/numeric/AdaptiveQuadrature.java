package loopwright.numeric;

import java.util.Arrays;
import java.util.Comparator;
import java.util.PriorityQueue;

/**
 * Integrals of several functions over one range at once, by the pair of Gauss and Kronrod with 7
 * and 15 points (Piessens, de Doncker-Kapenga, Überhuber and Kahaner, QUADPACK, 1983). The part
 * whose two values differ most is halved until all differences together are small. The value kept
 * is that of 15 points, whose error is far below the difference.
 */
public final class AdaptiveQuadrature {
  private static final double[] NODES = {
    0.991455371120812639206854697526329,
    0.949107912342758524526189684047851,
    0.864864423359769072789712788640926,
    0.741531185599394439863864773280788,
    0.586087235467691130294144838258730,
    0.405845151377397166906606412076961,
    0.207784955007898467600689403773245,
    0
  };

  private static final double[] FIFTEEN = {
    0.022935322010529224963732008058970,
    0.063092092629978553290700663189204,
    0.104790010322250183839876322541518,
    0.140653259715525918745189590510238,
    0.169004726639267902826583426598550,
    0.190350578064785409913256402421014,
    0.204432940075298892414161999234649,
    0.209482141084727828012999174891714
  };

  /** Of every second node, from the outermost but one. */
  private static final double[] SEVEN = {
    0.129484966168869693270611432679082,
    0.279705391489276667901467771423780,
    0.381830050505118944950369775488975,
    0.417959183673469387755102040816327
  };

  private static final int MOST_PARTS = 4000;

  private AdaptiveQuadrature() {}

  /** Functions of one variable. */
  @FunctionalInterface
  public interface Functions {
    /**
     * All values at a point.
     *
     * @param at the point
     * @param values filled by function
     */
    void evaluate(double at, double[] values);
  }

  private record Part(double low, double high, double[] values, double error) {}

  /**
   * Integrates.
   *
   * @param functions none negative: their sum decides where parts are halved
   * @param count how many there are
   * @param limits of the parts to begin with, ascending; the first and last are the range's own
   * @param accuracy largest sum of differences as a share of the sum of all integrals
   * @return integrals by function
   * @throws ArithmeticException when the accuracy is not reached, or a value is not finite
   */
  public static double[] integrate(
      Functions functions, int count, double[] limits, double accuracy) {
    PriorityQueue<Part> parts =
        new PriorityQueue<>(Comparator.comparingDouble(Part::error).reversed());
    for (int i = 1; i < limits.length; i++) {
      parts.add(part(functions, count, limits[i - 1], limits[i]));
    }
    double[] sums = new double[count];
    while (true) {
      double total = sum(parts, sums);
      double error = parts.stream().mapToDouble(Part::error).sum();
      if (!Double.isFinite(total)) {
        throw new ArithmeticException("what is to be integrated is not finite");
      }
      if (error <= accuracy * total) {
        return sums;
      }
      if (parts.size() >= MOST_PARTS) {
        throw new ArithmeticException("the integral does not converge");
      }
      Part worst = parts.remove();
      double middle = 0.5 * (worst.low() + worst.high());
      parts.add(part(functions, count, worst.low(), middle));
      parts.add(part(functions, count, middle, worst.high()));
    }
  }

  private static double sum(Iterable<Part> parts, double[] sums) {
    Arrays.fill(sums, 0);
    double total = 0;
    for (Part part : parts) {
      for (int i = 0; i < sums.length; i++) {
        sums[i] += part.values()[i];
        total += part.values()[i];
      }
    }
    return total;
  }

  private static Part part(Functions functions, int count, double low, double high) {
    double half = 0.5 * (high - low);
    double middle = 0.5 * (high + low);
    double[] sums = new double[count];
    double[] values = new double[count];
    double coarse = 0;
    double fine = 0;
    for (int node = 0; node < NODES.length; node++) {
      for (int side = -1; side <= (node == NODES.length - 1 ? -1 : 1); side += 2) {
        functions.evaluate(middle + side * half * NODES[node], values);
        double all = 0;
        for (int i = 0; i < count; i++) {
          all += values[i];
          sums[i] += half * FIFTEEN[node] * values[i];
        }
        fine += half * FIFTEEN[node] * all;
        coarse += node % 2 == 1 ? half * SEVEN[node / 2] * all : 0;
      }
    }
    return new Part(low, high, sums, Math.abs(fine - coarse));
  }
}
