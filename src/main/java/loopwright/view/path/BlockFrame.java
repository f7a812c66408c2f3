package loopwright.view.path;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;
import java.util.Optional;
import loopwright.check.Finding;
import loopwright.check.Finding.Severity;
import loopwright.view.theme.Palette;

/** Draws around a block: its outline by what it is, selection, focus, and the mark of a finding. */
final class BlockFrame {
  /** How far the edge of a stage points the way of the signal. */
  static final double POINT = 9;

  /** A block that hangs begins its frame below the stage it hangs from. */
  private static final double BELOW_STAGE = 5;

  private static final double RING = 4;

  private final Graphics2D g2;
  private final Block block;
  private final double scale;
  private final int width;
  private final int height;
  private final Look look;

  /**
   * How it is to look.
   *
   * @param selected whether it is the chosen one
   * @param focused whether it has the keyboard
   * @param hovered whether the mouse is over it
   * @param worst its worst finding
   */
  record Look(boolean selected, boolean focused, boolean hovered, Optional<Finding> worst) {
    Severity severity() {
      return worst.map(Finding::severity).orElse(Severity.REMARK);
    }
  }

  BlockFrame(Graphics2D g2, Block block, double scale, int width, int height, Look look) {
    this.g2 = g2;
    this.block = block;
    this.scale = scale;
    this.width = width;
    this.height = height;
    this.look = look;
  }

  /** Pixels for a measure at normal size. */
  int pixels(double measure) {
    return (int) Math.round(measure * scale);
  }

  /** Ground, outline and focus ring. What hangs shows them only while it is meant. */
  void paint() {
    if (block.hangs() && !look.selected() && !look.hovered() && !look.focused()) {
      return;
    }
    Shape outline = shape(block.hangs() ? 0 : 1);
    g2.setColor(look.selected() ? Palette.accentGround() : Palette.card());
    g2.fill(outline);
    float weight = (float) ((look.selected() ? 2 : 1.2) * scale);
    boolean isAbsent = block.kind() == Block.Kind.ABSENT;
    g2.setColor(colour());
    g2.setStroke(isAbsent ? dashes(weight, 5, 4) : new BasicStroke(weight));
    g2.draw(outline);
    if (look.focused()) {
      g2.setColor(Palette.accent());
      g2.setStroke(dashes(1.2f, 2, 2));
      g2.draw(shape(RING * scale));
    }
  }

  private Color colour() {
    if (look.severity() == Severity.FAILS) {
      return Palette.fails();
    }
    if (look.selected() || look.hovered()) {
      return Palette.accent();
    }
    return block.kind() == Block.Kind.ABSENT ? Palette.quiet() : Palette.rule();
  }

  private BasicStroke dashes(float weight, float on, float off) {
    return new BasicStroke(
        weight,
        BasicStroke.CAP_BUTT,
        BasicStroke.JOIN_ROUND,
        1f,
        new float[] {(float) (on * scale), (float) (off * scale)},
        0f);
  }

  private Shape shape(double inset) {
    return switch (block.kind()) {
      case STAGE -> tag(inset);
      case FEEDBACK -> box(inset, 0, height);
      case RESISTOR, CURRENT_SINK, CURRENT_SOURCE -> box(inset, BELOW_STAGE * scale, 6 * scale);
      default -> box(inset, 0, 6 * scale);
    };
  }

  private Shape box(double inset, double below, double arc) {
    return new RoundRectangle2D.Double(
        inset, inset + below, width - 2 * inset - 1, height - 2 * inset - below - 1, arc, arc);
  }

  private Shape tag(double inset) {
    double right = width - inset - 1;
    double bottom = height - inset - 1;
    double shoulder = right - POINT * scale;
    Path2D tag = new Path2D.Double();
    tag.moveTo(inset, inset);
    tag.lineTo(shoulder, inset);
    tag.lineTo(right, height * PathLayout.SIGNAL);
    tag.lineTo(shoulder, bottom);
    tag.lineTo(inset, bottom);
    tag.closePath();
    return tag;
  }

  /** Width that a mark takes; 0 for a block without one. */
  int markWidth() {
    return look.severity() == Severity.REMARK ? 0 : pixels(16);
  }

  /** A filled disc for what fails, a ring for what is risky: told apart without colour. */
  void mark(int x, int y) {
    int radius = pixels(5);
    g2.setStroke(new BasicStroke((float) (2 * scale)));
    switch (look.severity()) {
      case FAILS -> {
        g2.setColor(Palette.fails());
        g2.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
      }
      case RISKY -> {
        g2.setColor(Palette.risky());
        g2.drawOval(x - radius, y - radius, 2 * radius, 2 * radius);
      }
      case REMARK -> {}
    }
  }
}
