package loopwright.view.path;

import java.awt.BasicStroke;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.util.List;
import loopwright.view.theme.Palette;

/** Draws one block within its bounds: frame, words, and the symbol of what hangs. */
final class BlockPainter {
  private final Graphics2D g2;
  private final Block block;
  private final BlockFrame frame;
  private final int width;
  private final int height;
  private final PathFonts fonts;
  private final FittedText text;

  BlockPainter(
      Graphics2D g2, Block block, double scale, int width, int height, BlockFrame.Look look) {
    this.g2 = g2;
    this.block = block;
    this.width = width;
    this.height = height;
    this.frame = new BlockFrame(g2, block, scale, width, height, look);
    this.fonts = PathFonts.at(scale);
    this.text = new FittedText(g2);
  }

  /** Paints; returns the words that were drawn. */
  List<FittedText.Drawn> paint() {
    frame.paint();
    if (block.hangs()) {
      hanging();
    } else if (block.kind() == Block.Kind.FEEDBACK) {
      feedback();
    } else {
      inRow();
    }
    return text.drawn();
  }

  private void inRow() {
    int point = block.kind() == Block.Kind.STAGE ? pixels(BlockFrame.POINT) : 0;
    int x = pixels(10);
    int room = width - 2 * x - point / 2;
    FontMetrics title = g2.getFontMetrics(fonts.title());
    FontMetrics number = g2.getFontMetrics(fonts.number());
    int y = pixels(6) + title.getAscent();
    g2.setColor(block.kind() == Block.Kind.ABSENT ? Palette.quiet() : Palette.text());
    text.draw(block.title(), fonts.title(), x, y, room - frame.markWidth());
    int bottom = height - pixels(7) - number.getDescent();
    int lowest = block.headline().isEmpty() ? bottom : bottom - number.getHeight();
    g2.setColor(Palette.quiet());
    PackedLines packed =
        PackedLines.of(block.says(), fonts.line(), g2::getFontMetrics, room, lowest - y);
    for (String line : packed.lines()) {
      y += packed.step();
      text.draw(line, packed.font(), x, y, room);
    }
    g2.setColor(Palette.text());
    text.draw(block.headline(), fonts.number(), x, bottom, room);
    frame.mark(width - pixels(14) - point, pixels(15));
  }

  private void feedback() {
    FontMetrics line = g2.getFontMetrics(fonts.line());
    int baseline = (height + line.getAscent() - line.getDescent()) / 2;
    int room = width - pixels(20) - frame.markWidth();
    g2.setColor(Palette.text());
    text.centred(block.says().get(0), fonts.line(), pixels(10) + room / 2, baseline, room);
    frame.mark(width - pixels(13), height / 2);
  }

  private void hanging() {
    int x = pixels(16);
    symbol(x);
    int left = x + pixels(17);
    int room = width - left - pixels(4) - frame.markWidth();
    FontMetrics line = g2.getFontMetrics(fonts.line());
    int y = pixels(8) + line.getAscent();
    g2.setColor(Palette.quiet());
    String says = block.title() + ": " + block.says().get(0);
    int used = text.draw(says, fonts.line(), left, y, room);
    for (String more : block.says().subList(1, block.says().size())) {
      y += line.getHeight();
      text.draw(more, fonts.line(), left, y, room + frame.markWidth());
    }
    g2.setColor(Palette.text());
    text.draw(
        block.headline(), fonts.number(), left, y + line.getHeight(), room + frame.markWidth());
    frame.mark(left + used + pixels(10), pixels(18));
  }

  /** A resistor's box, or a source's circle with its arrow, on a wire down to the rail. */
  private void symbol(int x) {
    int top = pixels(10);
    int size = pixels(22);
    int foot = height - pixels(6);
    g2.setColor(Palette.wire());
    g2.setStroke(new BasicStroke(pixels(14) / 10f));
    g2.drawLine(x, 0, x, top);
    g2.drawLine(x, top + size, x, foot);
    g2.drawLine(x - pixels(6), foot, x + pixels(6), foot);
    if (block.kind() == Block.Kind.RESISTOR) {
      g2.drawRect(x - pixels(4.5), top, pixels(9), size);
      return;
    }
    int across = pixels(20);
    g2.drawOval(x - across / 2, top + (size - across) / 2, across, across);
    arrow(x, top + size / 2, block.kind() == Block.Kind.CURRENT_SOURCE ? -1 : 1);
  }

  /** An arrow through a point, down (1) or up (−1). */
  private void arrow(int x, int middle, int direction) {
    g2.drawLine(x, middle - direction * pixels(6), x, middle + direction * pixels(4));
    Path2D tip = new Path2D.Double();
    tip.moveTo(x, middle + direction * pixels(6.5));
    tip.lineTo(x - pixels(3.5), middle + direction * pixels(1));
    tip.lineTo(x + pixels(3.5), middle + direction * pixels(1));
    tip.closePath();
    g2.fill(tip);
  }

  private int pixels(double measure) {
    return frame.pixels(measure);
  }
}
