package loopwright.predict;

/** The road of a figure for which the trade has no hand formula. */
final class NoFormula {
  static final Figure.Road ROAD = solution -> FigureValue.none("no hand formula");

  private NoFormula() {}
}
