package loopwright.numeric;

/**
 * Real and complex systems of one pattern. What one of them learns of a good elimination order
 * serves those that are made after it. Not thread-safe.
 */
public final class SystemFamily {
  private final SparsityPattern pattern;
  private EliminationPlan realPlan;
  private EliminationPlan complexPlan;
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
    return complexPlan == null ? 0 : complexPlan.multiplyAdds();
  }

  EliminationPlan realPlan() {
    return realPlan;
  }

  EliminationPlan complexPlan() {
    return complexPlan;
  }

  /** Analyses a real matrix; null when there is no safe order. */
  EliminationPlan analyseReal(double[] values) {
    EliminationPlan plan = analyse(values, new double[values.length], false);
    realPlan = plan == null ? realPlan : plan;
    return plan;
  }

  /** Analyses a complex matrix; null when there is no safe order. */
  EliminationPlan analyseComplex(double[] re, double[] im) {
    EliminationPlan plan = analyse(re, im, true);
    complexPlan = plan == null ? complexPlan : plan;
    return plan;
  }

  void countDenseFallback() {
    denseFallbacks++;
  }

  void countRefinement() {
    refinements++;
  }

  private EliminationPlan analyse(double[] re, double[] im, boolean someLast) {
    analyses++;
    EliminationOrder order = EliminationOrder.of(pattern, re, im, someLast);
    return order == null ? null : new EliminationPlan(pattern, order);
  }
}
