/**
 * From solved circuits to the figures of the trade: the catalogue, hand formulas, solved values,
 * error budgets. May import {@code quantity}, {@code task}, {@code part}, {@code design}, {@code
 * numeric}, {@code circuit}, {@code characterise}, {@code assembly} and {@code solve}.
 */
package loopwright.predict;
