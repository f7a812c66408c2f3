package loopwright.numeric;

import java.util.Arrays;
import java.util.List;

/**
 * A real system of a fixed pattern, eliminated by a plan that was made once: the numeric
 * factorisation allocates nothing, hashes nothing and searches nothing; see {@link SparseSystem}
 * for how far it is trusted.
 */
final class SparseRealSystem extends SparseSystem implements RealSystem {
  private final double[] work;
  private EliminationPlan plan;
  private double[] entries;
  private DenseRealSystem dense;

  SparseRealSystem(SystemFamily family) {
    super(family, 1);
    this.work = new double[family.pattern().size()];
    this.entries = new double[0];
  }

  private boolean eliminateBy(EliminationPlan next, double[] values) {
    plan = next;
    if (entries.length < next.entries) {
      entries = new double[next.entries];
    }
    return eliminate(values);
  }

  @Override
  public boolean factor(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += Math.abs(value);
    }
    if (!(sum < Double.POSITIVE_INFINITY)) {
      return false;
    }
    EliminationPlan last = plan;
    if (last != null && eliminate(values)) {
      return true;
    }
    List<EliminationPlan> plans = family.realPlans();
    for (int i = 0; i < plans.size(); i++) {
      if (plans.get(i) != last && eliminateBy(plans.get(i), values)) {
        return true;
      }
    }
    EliminationPlan fresh = family.analyseReal(values);
    if (fresh != null && eliminateBy(fresh, values)) {
      return true;
    }
    giveUp();
    return factorDense(values);
  }

  @Override
  boolean factorDense(KeptMatrix matrix) {
    return factorDense(matrix.re());
  }

  private boolean factorDense(double[] values) {
    if (dense == null) {
      dense = new DenseRealSystem(family.pattern());
    }
    return dense.factor(values);
  }

  @Override
  void solveDense(double[] vector, boolean transposed) {
    if (transposed) {
      dense.solveTransposed(vector);
    } else {
      dense.solve(vector);
    }
  }

  private boolean eliminate(double[] values) {
    double[] a = entries;
    int[] place = plan.place;
    Arrays.fill(a, 0, plan.entries, 0);
    for (int slot = 0; slot < place.length; slot++) {
      a[place[slot]] = values[slot];
    }
    int[] start = plan.start;
    int[] startBelow = plan.startBelow;
    int[] target = plan.target;
    int update = 0;
    double largest = 0;
    for (int k = 0; k < plan.size; k++) {
      int pivot = start[k];
      double inverse = 1 / a[pivot];
      if (!(Math.abs(inverse) < Double.MAX_VALUE)) {
        return false;
      }
      a[pivot] = inverse;
      int right = pivot + 1;
      int below = startBelow[k];
      int end = start[k + 1];
      for (int l = below; l < end; l++) {
        double multiplier = a[l] * inverse;
        double magnitude = Math.abs(multiplier);
        if (!(magnitude <= LARGEST_MULTIPLIER)) {
          return false;
        }
        largest = Math.max(largest, magnitude);
        a[l] = multiplier;
        for (int u = right; u < below; u++) {
          a[target[update++]] -= multiplier * a[u];
        }
      }
    }
    if (largest > WATCHED_MULTIPLIER) {
      watch().keep(values);
    } else {
      trust();
    }
    return true;
  }

  @Override
  void substitute(double[] vector, boolean transposed) {
    if (transposed) {
      substituteTransposed(vector);
    } else {
      substitute(vector);
    }
  }

  private void substitute(double[] rightHandSide) {
    double[] a = entries;
    double[] w = work;
    int[] line = plan.line;
    System.arraycopy(rightHandSide, 0, w, 0, plan.size);
    for (int k = 0; k < plan.size; k++) {
      double value = w[plan.rows[k]];
      if (value == 0) {
        continue;
      }
      for (int l = plan.startBelow[k]; l < plan.start[k + 1]; l++) {
        w[line[l]] -= a[l] * value;
      }
    }
    for (int k = plan.size - 1; k >= 0; k--) {
      double sum = w[plan.rows[k]];
      int pivot = plan.start[k];
      for (int u = pivot + 1; u < plan.startBelow[k]; u++) {
        sum -= a[u] * rightHandSide[line[u]];
      }
      rightHandSide[plan.columns[k]] = sum * a[pivot];
    }
  }

  private void substituteTransposed(double[] rightHandSide) {
    double[] a = entries;
    double[] w = work;
    int[] line = plan.line;
    System.arraycopy(rightHandSide, 0, w, 0, plan.size);
    for (int k = 0; k < plan.size; k++) {
      int pivot = plan.start[k];
      double value = w[plan.columns[k]] * a[pivot];
      w[plan.columns[k]] = value;
      for (int u = pivot + 1; u < plan.startBelow[k]; u++) {
        w[line[u]] -= a[u] * value;
      }
    }
    for (int k = plan.size - 1; k >= 0; k--) {
      double sum = w[plan.columns[k]];
      for (int l = plan.startBelow[k]; l < plan.start[k + 1]; l++) {
        sum -= a[l] * rightHandSide[line[l]];
      }
      rightHandSide[plan.rows[k]] = sum;
    }
  }

  @Override
  public int determinantSign() {
    if (isDense()) {
      return dense.determinantSign();
    }
    int sign = plan.permutationSign;
    for (int k = 0; k < plan.size; k++) {
      if (entries[plan.start[k]] < 0) {
        sign = -sign;
      }
    }
    return sign;
  }
}
