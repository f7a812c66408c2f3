package loopwright.predict;

/** Resistances in parallel, infinite ones included. */
final class Resistances {
  private Resistances() {}

  /** Parallel connection, Ω; infinite when every one is. */
  static double parallel(double... resistances) {
    double conductance = 0;
    for (double resistance : resistances) {
      conductance += 1 / resistance;
    }
    return 1 / conductance;
  }
}
