package loopwright.view.theme;

import java.awt.Color;
import java.awt.Font;
import javax.swing.UIManager;

/**
 * The colours and fonts of the present theme, by what they mean. Ask at the time of painting: the
 * answers change with the theme.
 */
public final class Palette {
  /** How many colours {@link #plot} tells apart. */
  public static final int PLOT_COLOURS = 6;

  private Palette() {}

  /** The one accent: selection, links, what is chosen. */
  public static Color accent() {
    return colour("accent");
  }

  /** The accent as a faint ground behind something selected. */
  public static Color accentGround() {
    return colour("accentGround");
  }

  /** What fails. */
  public static Color fails() {
    return colour("fails");
  }

  /** A faint ground behind what fails. */
  public static Color failsGround() {
    return colour("failsGround");
  }

  /** What deserves a look. */
  public static Color risky() {
    return colour("risky");
  }

  /** Text. */
  public static Color text() {
    return colour("text");
  }

  /** Text of second rank: captions, units, values that are out of date. */
  public static Color quiet() {
    return colour("quiet");
  }

  /** The ground of cards, plots and blocks. */
  public static Color card() {
    return colour("card");
  }

  /** The ground behind the cards. */
  public static Color ground() {
    return colour("ground");
  }

  /** Thin rules: borders of cards, lines between rows, grids. */
  public static Color rule() {
    return colour("rule");
  }

  /** Wires of the signal path, zero lines and axes. */
  public static Color wire() {
    return colour("wire");
  }

  /**
   * A colour for a curve, after Okabe and Ito: told apart also with a colour-blind eye. Never the
   * only mark of a curve.
   *
   * @param index from 0; taken modulo {@link #PLOT_COLOURS}
   */
  public static Color plot(int index) {
    return colour("plot." + (Math.floorMod(index, PLOT_COLOURS) + 1));
  }

  /** The font of captions and notes. */
  public static Font small() {
    return UIManager.getFont("small.font");
  }

  /** The font of nearly everything. */
  public static Font normal() {
    return UIManager.getFont("Label.font");
  }

  /** The normal font, bold: values that count, titles of blocks. */
  public static Font strong() {
    return UIManager.getFont("strong.font");
  }

  /** The font of titles. */
  public static Font title() {
    return UIManager.getFont("title.font");
  }

  private static Color colour(String name) {
    Color colour = UIManager.getColor("Loopwright." + name);
    if (colour == null) {
      throw new IllegalStateException("no theme is applied: colour " + name + " is not known");
    }
    return colour;
  }
}
