package loopwright.numeric;

import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.decompose.lu.LUDecompositionAlt_ZDRM;
import org.ejml.dense.row.linsol.lu.LinearSolverLu_ZDRM;

/**
 * A complex system solved by EJML's dense complex LU with partial pivoting; singularity is judged
 * as in {@link DenseRealSystem}.
 */
public final class DenseComplexSystem implements ComplexSystem {
  private final SparsityPattern pattern;
  private final ZMatrixRMaj matrix;
  private final ZMatrixRMaj vector;
  private final LUDecompositionAlt_ZDRM decomposition = new LUDecompositionAlt_ZDRM();
  private final LinearSolverLu_ZDRM solver = new LinearSolverLu_ZDRM(decomposition);
  private final LinearSolverLu_ZDRM transposedSolver =
      new LinearSolverLu_ZDRM(new LUDecompositionAlt_ZDRM());
  private boolean transposedReady;
  private double[] g;
  private double[] c;
  private double re;
  private double im;

  /** A system of the given pattern. */
  public DenseComplexSystem(SparsityPattern pattern) {
    this.pattern = pattern;
    this.matrix = new ZMatrixRMaj(pattern.size(), pattern.size());
    this.vector = new ZMatrixRMaj(pattern.size(), 1);
  }

  @Override
  public boolean factor(double[] gValues, double[] cValues, double real, double imaginary) {
    g = gValues;
    c = cValues;
    re = real;
    im = imaginary;
    transposedReady = false;
    scatter(matrix, false);
    return usable(solver, matrix);
  }

  @Override
  public void solve(double[] rightHandSide) {
    solve(solver, rightHandSide);
  }

  @Override
  public void solveTransposed(double[] rightHandSide) {
    if (!transposedReady) {
      ZMatrixRMaj transposed = new ZMatrixRMaj(pattern.size(), pattern.size());
      scatter(transposed, true);
      if (!usable(transposedSolver, transposed)) {
        throw new IllegalStateException("the matrix that was factored is singular");
      }
      transposedReady = true;
    }
    solve(transposedSolver, rightHandSide);
  }

  @Override
  public double logDeterminant() {
    double sum = 0;
    for (int i = 0; i < pattern.size(); i++) {
      sum += Math.log(Math.hypot(pivotRe(i), pivotIm(i)));
    }
    return sum;
  }

  @Override
  public double determinantArgument() {
    double sum = 0;
    for (int i = 0; i < pattern.size(); i++) {
      sum += Math.atan2(pivotIm(i), pivotRe(i));
    }
    return Permutation.sign(decomposition.getPivot(), pattern.size()) > 0 ? sum : sum + Math.PI;
  }

  private double pivotRe(int i) {
    return decomposition.getLU().data[2 * (i * pattern.size() + i)];
  }

  private double pivotIm(int i) {
    return decomposition.getLU().data[2 * (i * pattern.size() + i) + 1];
  }

  private void scatter(ZMatrixRMaj target, boolean transposed) {
    target.zero();
    int n = pattern.size();
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = transposed ? pattern.column(slot) : pattern.row(slot);
      int column = transposed ? pattern.row(slot) : pattern.column(slot);
      int at = 2 * (row * n + column);
      target.data[at] += g[slot] + re * c[slot];
      target.data[at + 1] += im * c[slot];
    }
  }

  private static boolean usable(LinearSolverLu_ZDRM solver, ZMatrixRMaj matrix) {
    for (double value : matrix.data) {
      if (!Double.isFinite(value)) {
        return false;
      }
    }
    if (!solver.setA(matrix)) {
      return false;
    }
    int n = matrix.numRows;
    ZMatrixRMaj factors = solver.getDecomposition().getLU();
    for (int column = 0; column < n; column++) {
      double largest = 0;
      for (int row = 0; row < n; row++) {
        int at = 2 * (row * n + column);
        largest = Math.max(largest, Math.hypot(matrix.data[at], matrix.data[at + 1]));
      }
      int at = 2 * (column * n + column);
      double pivot = Math.hypot(factors.data[at], factors.data[at + 1]);
      if (!(pivot > DenseRealSystem.SINGULAR * largest)) {
        return false;
      }
    }
    return true;
  }

  private void solve(LinearSolverLu_ZDRM with, double[] rightHandSide) {
    System.arraycopy(rightHandSide, 0, vector.data, 0, 2 * pattern.size());
    with.solve(vector, vector);
    System.arraycopy(vector.data, 0, rightHandSide, 0, 2 * pattern.size());
  }
}
