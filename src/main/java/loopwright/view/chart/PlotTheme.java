package loopwright.view.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.List;
import java.util.stream.IntStream;
import loopwright.view.theme.Palette;

/**
 * The theme's colours and fonts as plots use them, read anew whenever a picture is made.
 *
 * @param background behind everything
 * @param text titles and labels
 * @param quiet sentences, tick labels
 * @param rule frames and major gridlines
 * @param curves a colour-blind-safe set in the order of use
 * @param accent marks what is meant
 * @param fails marks what fails
 * @param risky marks what deserves a look
 * @param font of sentences
 * @param small of tick labels and of labels on curves
 * @param title of titles
 */
record PlotTheme(
    Color background,
    Color text,
    Color quiet,
    Color rule,
    List<Color> curves,
    Color accent,
    Color fails,
    Color risky,
    Font font,
    Font small,
    Font title) {

  /** The theme in force. */
  static PlotTheme current() {
    return new PlotTheme(
        own(Palette.card()),
        own(Palette.text()),
        own(Palette.quiet()),
        own(Palette.rule()),
        IntStream.range(0, Palette.PLOT_COLOURS).mapToObj(i -> own(Palette.plot(i))).toList(),
        own(Palette.accent()),
        own(Palette.fails()),
        own(Palette.risky()),
        own(Palette.normal()),
        own(Palette.small()),
        own(Palette.title()));
  }

  /** A colour that a change of the look and feel does not take for one of its own. */
  private static Color own(Color colour) {
    return new Color(colour.getRGB(), true);
  }

  /** A font that a change of the look and feel does not take for one of its own. */
  private static Font own(Font font) {
    return font.deriveFont(font.getStyle());
  }

  /** Between rule and ground: minor gridlines. */
  Color faint() {
    return thin(rule, 0.45f);
  }

  /** The colour, thinned to a share of itself. */
  static Color thin(Color colour, float share) {
    return new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), Math.round(255 * share));
  }

  /** The strokes that tell curves apart without their colours, in the order of use. */
  static Stroke stroke(int curve) {
    return switch (curve % 4) {
      case 0 -> new BasicStroke(2f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
      case 1 -> dashed(1.8f, 7f, 4f);
      case 2 -> dashed(1.8f, 2f, 3.5f);
      default -> dashed(1.8f, 9f, 3f, 2f, 3f);
    };
  }

  /** A dashed stroke. */
  static Stroke dashed(float width, float... dashes) {
    return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, dashes, 0f);
  }
}
