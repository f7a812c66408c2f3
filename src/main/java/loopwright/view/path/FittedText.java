package loopwright.view.path;

import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.util.ArrayList;
import java.util.List;

/**
 * Draws lines of text no wider than their room, smaller first and then cut with an ellipsis, and
 * remembers what became of them.
 */
final class FittedText {
  /** Sizes that a text may take before it is cut. */
  static final List<Float> SIZES = List.of(1f, 0.93f, 0.87f);

  private static final String ELLIPSIS = "\u2026";

  private final Graphics2D g2;
  private final List<Drawn> drawn = new ArrayList<>();

  /**
   * A text that was drawn.
   *
   * @param wanted all of it
   * @param text what was drawn of it
   * @param bounds where, from the top of its letters to the base line
   */
  record Drawn(String wanted, String text, Rectangle bounds) {
    boolean isCut() {
      return !text.equals(wanted);
    }
  }

  FittedText(Graphics2D g2) {
    this.g2 = g2;
  }

  /** What was drawn so far; empty texts are none. */
  List<Drawn> drawn() {
    return List.copyOf(drawn);
  }

  /**
   * Draws from a point to the right.
   *
   * @param baseline height of the base line
   * @return the width of what was drawn
   */
  int draw(String text, Font font, int x, int baseline, int room) {
    for (float size : SIZES) {
      FontMetrics metrics = g2.getFontMetrics(font.deriveFont(font.getSize2D() * size));
      if (metrics.stringWidth(text) <= room) {
        return put(text, text, metrics, x, baseline);
      }
    }
    FontMetrics metrics =
        g2.getFontMetrics(font.deriveFont(font.getSize2D() * SIZES.get(SIZES.size() - 1)));
    String cut = text;
    while (cut.length() > 1 && metrics.stringWidth(cut + ELLIPSIS) > room) {
      cut = cut.substring(0, cut.length() - 1);
    }
    return put(text, cut.stripTrailing() + ELLIPSIS, metrics, x, baseline);
  }

  private int put(String wanted, String text, FontMetrics metrics, int x, int baseline) {
    int width = metrics.stringWidth(text);
    if (!text.isEmpty()) {
      g2.setFont(metrics.getFont());
      g2.drawString(text, x, baseline);
      int top = baseline - metrics.getAscent() + metrics.getDescent();
      drawn.add(new Drawn(wanted, text, new Rectangle(x, top, width, baseline - top)));
    }
    return width;
  }

  /** Draws centred on a point. */
  void centred(String text, Font font, int middle, int baseline, int room) {
    draw(text, font, middle - width(text, font, room) / 2, baseline, room);
  }

  /** Draws so that the text ends at a point. */
  void ending(String text, Font font, int end, int baseline, int room) {
    draw(text, font, end - width(text, font, room), baseline, room);
  }

  /** Width that the text will take. */
  private int width(String text, Font font, int room) {
    int width = room;
    for (float size : SIZES) {
      width = g2.getFontMetrics(font.deriveFont(font.getSize2D() * size)).stringWidth(text);
      if (width <= room) {
        return width;
      }
    }
    return room;
  }
}
