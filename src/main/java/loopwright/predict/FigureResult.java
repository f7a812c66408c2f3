package loopwright.predict;

/**
 * Two roads to one number.
 *
 * @param figure the catalogue entry
 * @param formula by hand formula
 * @param solved from the solved circuit
 */
public record FigureResult(Figure figure, FigureValue formula, FigureValue solved) {}
