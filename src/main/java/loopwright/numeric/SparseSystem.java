package loopwright.numeric;

import java.util.Arrays;

/**
 * What real and complex systems of a fixed pattern have in common: how far a factorisation is
 * trusted.
 *
 * <p>The plan's pivots were safe for the matrix that it was made with. For another matrix a
 * multiplier may become large; then other plans of the family are tried, a plan is made anew with
 * the present values, and where no safe order is found a dense factorisation with partial pivoting
 * steps in. Where a multiplier is larger than an analysis allows, each solution's residual is
 * watched; one that is more than rounding is solved for in its turn and the solution improved by it
 * (Wilkinson, Rounding Errors in Algebraic Processes, 1963: iterative refinement), and where that
 * does not help the dense factorisation steps in too. All are counted in the {@link SystemFamily}.
 */
abstract class SparseSystem {
  /** A multiplier above this costs more digits than a new analysis costs time. */
  static final double LARGEST_MULTIPLIER = 1e4;

  /** Solutions with a multiplier above this, which no fresh analysis has, are watched. */
  static final double WATCHED_MULTIPLIER = 10;

  /** A residual that is not rounding after so many improvements is not going to be. */
  private static final int MOST_REFINEMENTS = 3;

  /** Whose pattern this is. */
  final SystemFamily family;

  private final int parts;
  private KeptMatrix kept;
  private boolean isWatched;
  private boolean isDense;

  /**
   * A system yet to be factored.
   *
   * @param parts 1 when it is real, 2 when it is complex
   */
  SparseSystem(SystemFamily family, int parts) {
    this.family = family;
    this.parts = parts;
  }

  /** Whether the dense factorisation serves the matrix that was factored last. */
  final boolean isDense() {
    return isDense;
  }

  /** Whether the plan serves and no residual is watched. */
  final boolean isTrusted() {
    return !isDense && !isWatched;
  }

  /** Says that the plan serves the matrix at hand, with no multiplier above the watched one. */
  final void trust() {
    isWatched = false;
    isDense = false;
  }

  /** Says that the plan serves the matrix at hand, to be kept, but not to be relied upon. */
  final KeptMatrix watch() {
    if (kept == null) {
      kept = new KeptMatrix(family.pattern(), parts);
    }
    isWatched = true;
    isDense = false;
    return kept;
  }

  /** Says that no plan serves the matrix at hand. */
  final void giveUp() {
    family.countDenseFallback();
    isWatched = false;
    isDense = true;
  }

  /** Solves in place by the factors of the plan. */
  abstract void substitute(double[] vector, boolean transposed);

  /** Factors the kept matrix densely; false when it is singular. */
  abstract boolean factorDense(KeptMatrix matrix);

  /** Solves in place by the dense factors. */
  abstract void solveDense(double[] vector, boolean transposed);

  /** Solves in place. */
  public final void solve(double[] rightHandSide) {
    solve(rightHandSide, false);
  }

  /** Solves in place, transposed. */
  public final void solveTransposed(double[] rightHandSide) {
    solve(rightHandSide, true);
  }

  private void solve(double[] vector, boolean transposed) {
    if (isDense) {
      solveDense(vector, transposed);
    } else if (isWatched) {
      solveWatched(vector, transposed);
    } else {
      substitute(vector, transposed);
    }
  }

  private void solveWatched(double[] vector, boolean transposed) {
    kept.keepRightHandSide(vector);
    substitute(vector, transposed);
    for (int k = 0; kept.leavesTooMuch(vector, transposed); k++) {
      if (k == MOST_REFINEMENTS) {
        solveAfresh(vector, transposed);
        return;
      }
      family.countRefinement();
      double[] correction = kept.rest();
      substitute(correction, transposed);
      for (int i = 0; i < correction.length; i++) {
        vector[i] += correction[i];
      }
    }
  }

  /** By the dense factorisation; not a number where that finds the matrix singular. */
  private void solveAfresh(double[] vector, boolean transposed) {
    if (factorDense(kept)) {
      giveUp();
      System.arraycopy(kept.rightHandSide(), 0, vector, 0, vector.length);
      solveDense(vector, transposed);
    } else {
      Arrays.fill(vector, Double.NaN);
    }
  }
}
