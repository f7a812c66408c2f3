package loopwright.numeric;

import java.util.Arrays;
import java.util.List;

/**
 * A complex system (G + sC) x = b of a fixed pattern, eliminated by a plan that was made once; see
 * {@link SparseSystem} for how far it is trusted. Complex entries are interleaved.
 */
final class SparseComplexSystem extends SparseSystem implements ComplexSystem {
  private static final double LARGEST_SQUARE = LARGEST_MULTIPLIER * LARGEST_MULTIPLIER;
  private static final double WATCHED_SQUARE = WATCHED_MULTIPLIER * WATCHED_MULTIPLIER;

  private final double[] work;
  private EliminationPlan plan;
  private double[] entries;
  private DenseComplexSystem dense;

  SparseComplexSystem(SystemFamily family) {
    super(family, 2);
    this.work = new double[2 * family.pattern().size()];
    this.entries = new double[0];
  }

  private boolean eliminateBy(EliminationPlan next, double[] g, double[] c, double re, double im) {
    plan = next;
    if (entries.length < 2 * next.entries) {
      entries = new double[2 * next.entries];
    }
    return eliminate(g, c, re, im);
  }

  @Override
  public boolean factor(double[] g, double[] c, double re, double im) {
    double sum = Math.abs(re) + Math.abs(im);
    for (int slot = 0; slot < g.length; slot++) {
      sum += Math.abs(g[slot]) + Math.abs(c[slot]);
    }
    if (!(sum < Double.POSITIVE_INFINITY)) {
      return false;
    }
    EliminationPlan last = plan;
    if (last != null && eliminate(g, c, re, im)) {
      return true;
    }
    List<EliminationPlan> plans = family.complexPlans();
    for (int i = 0; i < plans.size(); i++) {
      if (plans.get(i) != last && eliminateBy(plans.get(i), g, c, re, im)) {
        return true;
      }
    }
    double[] realParts = new double[g.length];
    double[] imaginaryParts = new double[g.length];
    for (int slot = 0; slot < g.length; slot++) {
      realParts[slot] = g[slot] + re * c[slot];
      imaginaryParts[slot] = im * c[slot];
    }
    EliminationPlan fresh = family.analyseComplex(realParts, imaginaryParts);
    if (fresh != null && eliminateBy(fresh, g, c, re, im)) {
      return true;
    }
    giveUp();
    return denseSystem().factor(g, c, re, im);
  }

  @Override
  boolean factorDense(KeptMatrix matrix) {
    return denseSystem().factor(matrix.re(), matrix.im(), 0, 1);
  }

  private DenseComplexSystem denseSystem() {
    if (dense == null) {
      dense = new DenseComplexSystem(family.pattern());
    }
    return dense;
  }

  @Override
  void solveDense(double[] vector, boolean transposed) {
    if (transposed) {
      dense.solveTransposed(vector);
    } else {
      dense.solve(vector);
    }
  }

  private boolean eliminate(double[] g, double[] c, double re, double im) {
    double[] a = entries;
    int[] place = plan.place;
    Arrays.fill(a, 0, 2 * plan.entries, 0);
    for (int slot = 0; slot < place.length; slot++) {
      double capacitance = c[slot];
      int at = 2 * place[slot];
      a[at] = g[slot] + re * capacitance;
      a[at + 1] = im * capacitance;
    }
    int[] start = plan.start;
    int[] startBelow = plan.startBelow;
    int[] target = plan.target;
    int size = plan.size;
    int update = 0;
    double largest = 0;
    for (int k = 0; k < size; k++) {
      int pivot = 2 * start[k];
      double pr = a[pivot];
      double pi = a[pivot + 1];
      double scale = 1 / (pr * pr + pi * pi);
      if (!(scale < Double.MAX_VALUE && scale > 0)) {
        return false;
      }
      pr *= scale;
      pi *= -scale;
      a[pivot] = pr;
      a[pivot + 1] = pi;
      int right = pivot + 2;
      int below = 2 * startBelow[k];
      int end = 2 * start[k + 1];
      for (int l = below; l < end; l += 2) {
        double ar = a[l];
        double ai = a[l + 1];
        double lr = ar * pr - ai * pi;
        double li = ar * pi + ai * pr;
        double square = lr * lr + li * li;
        if (!(square <= LARGEST_SQUARE)) {
          return false;
        }
        largest = Math.max(largest, square);
        a[l] = lr;
        a[l + 1] = li;
        for (int u = right; u < below; u += 2) {
          int to = 2 * target[update++];
          double ur = a[u];
          double ui = a[u + 1];
          a[to] -= lr * ur - li * ui;
          a[to + 1] -= lr * ui + li * ur;
        }
      }
    }
    if (largest > WATCHED_SQUARE) {
      watch().keep(g, c, re, im);
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

  @Override
  public void solveOne(int row, int[] wanted, double[] solution) {
    if (!isTrusted()) {
      ComplexSystem.super.solveOne(row, wanted, solution);
      return;
    }
    int lowest = plan.size;
    for (int unknown : wanted) {
      lowest = unknown < 0 ? lowest : Math.min(lowest, plan.columnStep[unknown]);
    }
    Arrays.fill(work, 0);
    work[2 * row] = 1;
    forward(plan.rowStep[row]);
    backward(solution, lowest);
  }

  private void substitute(double[] b) {
    System.arraycopy(b, 0, work, 0, 2 * plan.size);
    forward(0);
    backward(b, 0);
  }

  /** From the first step whose row is excited. */
  private void forward(int first) {
    double[] a = entries;
    double[] w = work;
    int[] line = plan.line;
    for (int k = first; k < plan.size; k++) {
      int row = 2 * plan.rows[k];
      double yr = w[row];
      double yi = w[row + 1];
      if (yr == 0 && yi == 0) {
        continue;
      }
      for (int l = plan.startBelow[k]; l < plan.start[k + 1]; l++) {
        subtract(w, 2 * line[l], a[2 * l], a[2 * l + 1], yr, yi);
      }
    }
  }

  /** To the last step whose unknown is wanted. */
  private void backward(double[] b, int lowest) {
    double[] a = entries;
    double[] w = work;
    int[] line = plan.line;
    for (int k = plan.size - 1; k >= lowest; k--) {
      int row = 2 * plan.rows[k];
      double sr = w[row];
      double si = w[row + 1];
      int pivot = plan.start[k];
      for (int u = pivot + 1; u < plan.startBelow[k]; u++) {
        double ur = a[2 * u];
        double ui = a[2 * u + 1];
        double xr = b[2 * line[u]];
        double xi = b[2 * line[u] + 1];
        sr -= ur * xr - ui * xi;
        si -= ur * xi + ui * xr;
      }
      double pr = a[2 * pivot];
      double pi = a[2 * pivot + 1];
      int column = 2 * plan.columns[k];
      b[column] = sr * pr - si * pi;
      b[column + 1] = sr * pi + si * pr;
    }
  }

  private void substituteTransposed(double[] b) {
    double[] a = entries;
    double[] w = work;
    int[] line = plan.line;
    System.arraycopy(b, 0, w, 0, 2 * plan.size);
    for (int k = 0; k < plan.size; k++) {
      int pivot = plan.start[k];
      int column = 2 * plan.columns[k];
      double pr = a[2 * pivot];
      double pi = a[2 * pivot + 1];
      double yr = w[column] * pr - w[column + 1] * pi;
      double yi = w[column] * pi + w[column + 1] * pr;
      w[column] = yr;
      w[column + 1] = yi;
      for (int u = pivot + 1; u < plan.startBelow[k]; u++) {
        subtract(w, 2 * line[u], a[2 * u], a[2 * u + 1], yr, yi);
      }
    }
    for (int k = plan.size - 1; k >= 0; k--) {
      int column = 2 * plan.columns[k];
      double sr = w[column];
      double si = w[column + 1];
      for (int l = plan.startBelow[k]; l < plan.start[k + 1]; l++) {
        double lr = a[2 * l];
        double li = a[2 * l + 1];
        double xr = b[2 * line[l]];
        double xi = b[2 * line[l] + 1];
        sr -= lr * xr - li * xi;
        si -= lr * xi + li * xr;
      }
      b[2 * plan.rows[k]] = sr;
      b[2 * plan.rows[k] + 1] = si;
    }
  }

  private static void subtract(double[] w, int at, double lr, double li, double yr, double yi) {
    w[at] -= lr * yr - li * yi;
    w[at + 1] -= lr * yi + li * yr;
  }

  @Override
  public double logDeterminant() {
    if (isDense()) {
      return dense.logDeterminant();
    }
    double sum = 0;
    for (int k = 0; k < plan.size; k++) {
      int pivot = 2 * plan.start[k];
      sum -= Math.log(Math.hypot(entries[pivot], entries[pivot + 1]));
    }
    return sum;
  }

  @Override
  public double determinantArgument() {
    if (isDense()) {
      return dense.determinantArgument();
    }
    double re = plan.permutationSign;
    double im = 0;
    for (int k = 0; k < plan.size; k++) {
      int pivot = 2 * plan.start[k];
      double pr = entries[pivot];
      double pi = entries[pivot + 1];
      double scale = 1 / (Math.abs(pr) + Math.abs(pi));
      pr *= scale;
      pi *= -scale;
      double next = re * pr - im * pi;
      im = re * pi + im * pr;
      re = next;
      if ((k & 63) == 63) {
        double size = 1 / (Math.abs(re) + Math.abs(im));
        re *= size;
        im *= size;
      }
    }
    return Math.atan2(im, re);
  }
}
