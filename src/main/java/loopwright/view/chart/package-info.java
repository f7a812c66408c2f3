/**
 * Plots of a prediction: axes in engineering form, the pictures and their words, and the deck that
 * shows them. The only package that imports JFreeChart; may import everything before {@code view}
 * but {@code command}.
 */
package loopwright.view.chart;
