package loopwright.characterise;

import loopwright.quantity.Unit;

/**
 * A figure of a record beside the same figure as the fitted parameters give it.
 *
 * @param figure what it is, in words, with how its nominal value was taken where no typical value
 *     is given
 * @param unit unit of both values
 * @param bias where it holds, in words
 * @param printed nominal value of the record
 * @param returned what the fitted parameters give in the full equations at that bias; NaN where
 *     they cannot reach it
 * @param use what part the figure had in the fit
 */
public record FigureComparison(
    String figure, Unit unit, String bias, double printed, double returned, FigureUse use) {}
