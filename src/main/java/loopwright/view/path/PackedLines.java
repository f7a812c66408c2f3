package loopwright.view.path;

import java.awt.Font;
import java.awt.FontMetrics;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * What a block is made of, packed into lines: each item whole, several on a line where there is
 * room, in the largest size in which all of them find a place.
 *
 * @param lines from the top; the last may be too wide where nothing helps
 * @param font that they fit in
 * @param step from one base line to the next, in pixels
 */
record PackedLines(List<String> lines, Font font, int step) {
  private static final String BETWEEN = ", ";

  /**
   * Packs.
   *
   * @param metrics measures of a font
   * @param width room for a line
   * @param height room for all lines
   */
  static PackedLines of(
      List<String> items, Font font, Function<Font, FontMetrics> metrics, int width, int height) {
    PackedLines packed = null;
    for (float size : FittedText.SIZES) {
      FontMetrics measured = metrics.apply(font.deriveFont(font.getSize2D() * size));
      List<String> own = items.stream().filter(item -> !item.isBlank()).toList();
      int most = Math.max(1, height / measured.getHeight());
      boolean isWide = own.stream().anyMatch(item -> measured.stringWidth(item) > width);
      // One item a line reads best; they share lines only where they must.
      List<String> lines = own.size() <= most ? own : shared(own, measured, width);
      packed = new PackedLines(within(lines, most), measured.getFont(), measured.getHeight());
      if (!isWide && lines.size() <= most) {
        return packed;
      }
    }
    return packed;
  }

  private static List<String> shared(List<String> items, FontMetrics metrics, int width) {
    List<String> lines = new ArrayList<>();
    for (String item : items) {
      int last = lines.size() - 1;
      String joined = last < 0 ? item : lines.get(last) + BETWEEN + item;
      if (last >= 0 && metrics.stringWidth(joined) <= width) {
        lines.set(last, joined);
      } else {
        lines.add(item);
      }
    }
    return lines;
  }

  /** What finds no line of its own goes to the last, whose end will show that there is more. */
  private static List<String> within(List<String> lines, int most) {
    if (lines.size() <= most) {
      return lines;
    }
    List<String> kept = new ArrayList<>(lines.subList(0, most - 1));
    kept.add(String.join(BETWEEN, lines.subList(most - 1, lines.size())));
    return kept;
  }
}
