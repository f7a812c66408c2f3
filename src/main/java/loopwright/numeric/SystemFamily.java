package loopwright.numeric;

import java.util.ArrayList;
import java.util.List;

/**
 * Real and complex systems of one pattern. What one of them learns of good elimination orders
 * serves the others. Not thread-safe.
 */
public final class SystemFamily {
  /** A sweep over all frequencies needs two or three. */
  private static final int MOST_PLANS = 4;

  private final SparsityPattern pattern;

  private final List<EliminationPlan> realPlans = new ArrayList<>();
  private final List<EliminationPlan> complexPlans = new ArrayList<>();
  private int analyses;
  private int denseFallbacks;
  private int refinements;

  /** A family of a pattern. */
  public SystemFamily(SparsityPattern pattern) {
    this.pattern = pattern;
  }

  /** A real system of the family. */
  public RealSystem real() {
    return new SparseRealSystem(this);
  }

  /** A complex system of the family. */
  public ComplexSystem complex() {
    return new SparseComplexSystem(this);
  }

  /** The pattern. */
  public SparsityPattern pattern() {
    return pattern;
  }

  /** How often an elimination order was worked out. */
  public int analyses() {
    return analyses;
  }

  /**
   * How often a dense factorisation stepped in: no safe order was found, or what a solution left
   * over could not be brought down to rounding.
   */
  public int denseFallbacks() {
    return denseFallbacks;
  }

  /** How often a solution left over more than rounding and was improved by another one. */
  public int refinements() {
    return refinements;
  }

  /**
   * Multiplications with additions in one complex factorisation and solution; 0 before the first.
   */
  public int multiplyAdds() {
    return complexPlans.isEmpty() ? 0 : complexPlans.get(0).multiplyAdds();
  }

  /** Plans for real matrices, the newest first; an analysis changes them. */
  List<EliminationPlan> realPlans() {
    return realPlans;
  }

  /** Plans for complex matrices, the newest first; an analysis changes them. */
  List<EliminationPlan> complexPlans() {
    return complexPlans;
  }

  /** Analyses a real matrix; null when there is no safe order. */
  EliminationPlan analyseReal(double[] values) {
    return analyse(values, new double[values.length], false, realPlans);
  }

  /** Analyses a complex matrix; null when there is no safe order. */
  EliminationPlan analyseComplex(double[] re, double[] im) {
    return analyse(re, im, true, complexPlans);
  }

  void countDenseFallback() {
    denseFallbacks++;
  }

  void countRefinement() {
    refinements++;
  }

  private EliminationPlan analyse(
      double[] re, double[] im, boolean someLast, List<EliminationPlan> plans) {
    analyses++;
    EliminationOrder order = EliminationOrder.of(pattern, re, im, someLast);
    if (order == null) {
      return null;
    }
    EliminationPlan plan = new EliminationPlan(pattern, order);
    plans.add(0, plan);
    if (plans.size() > MOST_PLANS) {
      plans.remove(MOST_PLANS);
    }
    return plan;
  }
}
