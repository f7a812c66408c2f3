package loopwright.predict;

import loopwright.design.FiguresAmplifier;

/**
 * Currents into the two inputs at rest, positive into the base, A.
 *
 * @param plus into the non-inverting input
 * @param minus into the inverting input
 */
record BiasCurrents(double plus, double minus) {
  /** The currents of a hookup's amplifier. */
  static BiasCurrents of(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      double current = figures.inputBiasCurrent().value();
      return new BiasCurrents(current, current);
    }
    int sign = OffsetFormula.polarity(solution).sign();
    return new BiasCurrents(
        sign * HandTransistor.of(solution, "pair.q1").baseCurrent(),
        sign * HandTransistor.of(solution, "pair.q2").baseCurrent());
  }
}
