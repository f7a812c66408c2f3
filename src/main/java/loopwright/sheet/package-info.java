/**
 * The schematic and the printed sheet, drawn on any {@code Graphics2D}: AWT but no Swing, and the
 * only package that knows PDFBox and Batik. May import everything up to {@code file}.
 */
package loopwright.sheet;
