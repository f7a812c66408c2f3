package loopwright.numeric;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.decomposition.lu.LUDecompositionAlt_DDRM;
import org.ejml.dense.row.linsol.lu.LinearSolverLu_DDRM;

/**
 * A real system solved by EJML's dense LU with partial pivoting.
 *
 * <p>EJML's own word on singularity is not enough: its factorisation reports success for an exactly
 * singular matrix, its singularity test is absolute, and its quality, a product of relative pivots,
 * underflows for matrices of some tens of rows. Here finiteness and every pivot against the largest
 * entry of its own column decide, which no scaling of the matrix changes.
 */
public final class DenseRealSystem implements RealSystem {
  /** A pivot below this share of its column's largest entry makes the matrix singular. */
  static final double SINGULAR = 1e-25;

  private final SparsityPattern pattern;
  private final DMatrixRMaj matrix;
  private final DMatrixRMaj vector;
  private final LUDecompositionAlt_DDRM decomposition = new LUDecompositionAlt_DDRM();
  private final LinearSolverLu_DDRM solver = new LinearSolverLu_DDRM(decomposition);
  private final LinearSolverLu_DDRM transposedSolver =
      new LinearSolverLu_DDRM(new LUDecompositionAlt_DDRM());
  private boolean transposedReady;
  private double[] values;

  /** A system of the given pattern. */
  public DenseRealSystem(SparsityPattern pattern) {
    this.pattern = pattern;
    this.matrix = new DMatrixRMaj(pattern.size(), pattern.size());
    this.vector = new DMatrixRMaj(pattern.size(), 1);
  }

  @Override
  public boolean factor(double[] slotValues) {
    values = slotValues;
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
      DMatrixRMaj transposed = new DMatrixRMaj(pattern.size(), pattern.size());
      scatter(transposed, true);
      if (!usable(transposedSolver, transposed)) {
        throw new IllegalStateException("the matrix that was factored is singular");
      }
      transposedReady = true;
    }
    solve(transposedSolver, rightHandSide);
  }

  @Override
  public int determinantSign() {
    double sign = Permutation.sign(decomposition.getPivot(), pattern.size());
    DMatrixRMaj factors = decomposition.getLU();
    for (int i = 0; i < pattern.size(); i++) {
      sign *= Math.signum(factors.unsafe_get(i, i));
    }
    return (int) sign;
  }

  private void scatter(DMatrixRMaj target, boolean transposed) {
    target.zero();
    int n = pattern.size();
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = transposed ? pattern.column(slot) : pattern.row(slot);
      int column = transposed ? pattern.row(slot) : pattern.column(slot);
      target.data[row * n + column] += values[slot];
    }
  }

  private static boolean usable(LinearSolverLu_DDRM solver, DMatrixRMaj matrix) {
    for (double value : matrix.data) {
      if (!Double.isFinite(value)) {
        return false;
      }
    }
    if (!solver.setA(matrix)) {
      return false;
    }
    int n = matrix.numRows;
    DMatrixRMaj factors = solver.getDecomposition().getLU();
    for (int column = 0; column < n; column++) {
      double largest = 0;
      for (int row = 0; row < n; row++) {
        largest = Math.max(largest, Math.abs(matrix.data[row * n + column]));
      }
      if (!(Math.abs(factors.data[column * n + column]) > SINGULAR * largest)) {
        return false;
      }
    }
    return true;
  }

  private void solve(LinearSolverLu_DDRM with, double[] rightHandSide) {
    System.arraycopy(rightHandSide, 0, vector.data, 0, pattern.size());
    with.solve(vector, vector);
    System.arraycopy(vector.data, 0, rightHandSide, 0, pattern.size());
  }
}
