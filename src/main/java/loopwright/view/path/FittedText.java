package loopwright.view.path;

import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;

/** Draws a line of text no wider than its room: smaller first, then cut with an ellipsis. */
final class FittedText {
  private static final float[] SIZES = {1f, 0.93f, 0.87f};
  private static final String ELLIPSIS = "\u2026";

  private FittedText() {}

  /**
   * Draws from a point to the right.
   *
   * @param baseline height of the base line
   * @return the width of what was drawn
   */
  static int draw(Graphics2D g2, String text, Font font, int x, int baseline, int room) {
    for (float size : SIZES) {
      FontMetrics metrics = g2.getFontMetrics(font.deriveFont(font.getSize2D() * size));
      if (metrics.stringWidth(text) <= room) {
        return put(g2, text, metrics, x, baseline);
      }
    }
    FontMetrics metrics =
        g2.getFontMetrics(font.deriveFont(font.getSize2D() * SIZES[SIZES.length - 1]));
    String cut = text;
    while (cut.length() > 1 && metrics.stringWidth(cut + ELLIPSIS) > room) {
      cut = cut.substring(0, cut.length() - 1);
    }
    return put(g2, cut.stripTrailing() + ELLIPSIS, metrics, x, baseline);
  }

  private static int put(Graphics2D g2, String text, FontMetrics metrics, int x, int baseline) {
    g2.setFont(metrics.getFont());
    g2.drawString(text, x, baseline);
    return metrics.stringWidth(text);
  }

  /** Draws centred on a point. */
  static void centred(Graphics2D g2, String text, Font font, int middle, int baseline, int room) {
    FontMetrics metrics = g2.getFontMetrics(font);
    int width = Math.min(metrics.stringWidth(text), room);
    draw(g2, text, font, middle - width / 2, baseline, room);
  }

  /** Draws so that the text ends at a point. */
  static void ending(Graphics2D g2, String text, Font font, int end, int baseline, int room) {
    FontMetrics metrics = g2.getFontMetrics(font);
    int width = Math.min(metrics.stringWidth(text), room);
    draw(g2, text, font, end - width, baseline, room);
  }
}
