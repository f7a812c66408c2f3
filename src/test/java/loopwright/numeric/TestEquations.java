package loopwright.numeric;

/** A few equations in time, given as functions; the pattern is full. */
abstract class TestEquations implements ChargeEquations {
  private final int size;
  private final SystemFamily systems;
  private final double tolerance;
  final double[] x;
  final double[] f;
  final double[] q;
  final double[] g;
  final double[] c;

  /**
   * @param tolerance of every unknown
   * @param start values at the beginning
   */
  TestEquations(double tolerance, double... start) {
    this.size = start.length;
    this.tolerance = tolerance;
    SparsityPattern.Builder pattern = new SparsityPattern.Builder();
    for (int row = 0; row < size; row++) {
      for (int column = 0; column < size; column++) {
        pattern.slot(row, column);
      }
    }
    this.systems = new SystemFamily(pattern.build(size));
    this.x = start.clone();
    this.f = new double[size];
    this.q = new double[size];
    this.g = new double[size * size];
    this.c = new double[size * size];
  }

  /** Fills f, q, g and c at x; rows one after the other in g and c. */
  abstract void fill(double time);

  /** Charges that are the unknowns themselves. */
  final void plainCharges() {
    for (int i = 0; i < size; i++) {
      q[i] = x[i];
      c[i * size + i] = 1;
    }
  }

  /** Integrates from time 0. */
  final TrBdf2 integrate(double relative, double firstLength, double end) {
    TrBdf2 integrator = new TrBdf2(this, relative);
    integrator.start(0, firstLength);
    advance(integrator, end);
    return integrator;
  }

  static void advance(TrBdf2 integrator, double end) {
    while (integrator.time() < end) {
      integrator.step(end, Double.POSITIVE_INFINITY);
    }
  }

  @Override
  public SystemFamily systems() {
    return systems;
  }

  @Override
  public double[] unknowns() {
    return x;
  }

  @Override
  public void evaluate(double time) {
    fill(time);
  }

  @Override
  public double[] f() {
    return f;
  }

  @Override
  public double[] q() {
    return q;
  }

  @Override
  public double[] g() {
    return g;
  }

  @Override
  public double[] c() {
    return c;
  }

  @Override
  public boolean limited() {
    return false;
  }

  @Override
  public double tolerance(int unknown) {
    return tolerance;
  }
}
