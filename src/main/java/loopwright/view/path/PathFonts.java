package loopwright.view.path;

import java.awt.Font;
import loopwright.view.theme.Palette;

/**
 * The theme's fonts at the scale of the drawing.
 *
 * @param title of blocks
 * @param line of what they are made of
 * @param number of what is predicted
 */
record PathFonts(Font title, Font line, Font number) {
  /** Smaller than this no one reads. */
  private static final double LEAST = 0.85;

  static PathFonts at(double scale) {
    float factor = (float) Math.max(scale, LEAST);
    Font strong = Palette.strong();
    Font small = Palette.small();
    return new PathFonts(
        strong.deriveFont(strong.getSize2D() * factor),
        small.deriveFont(small.getSize2D() * factor),
        small.deriveFont(Font.BOLD, small.getSize2D() * factor));
  }
}
