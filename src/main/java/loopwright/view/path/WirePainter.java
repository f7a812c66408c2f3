package loopwright.view.path;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.geom.Path2D;
import java.util.List;
import loopwright.view.path.SignalPath.Way;
import loopwright.view.path.SignalPath.Wire;
import loopwright.view.theme.Palette;

/** Draws what runs between the blocks: wires with their nodes and voltages, and the way back. */
final class WirePainter {
  private final Graphics2D g2;
  private final SignalPath path;
  private final PathLayout layout;
  private final PathFonts fonts;
  private final FittedText text;

  WirePainter(Graphics2D g2, SignalPath path, PathLayout layout) {
    this.g2 = g2;
    this.path = path;
    this.layout = layout;
    this.fonts = PathFonts.at(layout.scale());
    this.text = new FittedText(g2);
  }

  /** Paints; returns the words that were drawn. */
  List<FittedText.Drawn> paint(Rectangle feedback) {
    forward();
    otherInput();
    if (path.route().way() != Way.OPEN) {
      wayBack(feedback);
    }
    return text.drawn();
  }

  private void forward() {
    List<Block> row = path.row();
    for (int i = 0; i < path.wires().size(); i++) {
      Rectangle from = layout.bounds(row.get(i).id());
      Rectangle to = layout.bounds(row.get(i + 1).id());
      int start = from.x + from.width;
      int y = i == 0 ? layout.drivenY() : layout.signalY();
      boolean isOut = i == path.wires().size() - 1;
      plain();
      g2.drawLine(start, y, to.x, y);
      head(to.x, y, 1);
      int left = isOut && !path.route().fromLoad() ? layout.tapX() + layout.pixels(3) : start;
      int right = i == 0 ? layout.returnX() : to.x - layout.pixels(6);
      if (i == 0 && path.route().way() == Way.INVERTING) {
        resistor((start + layout.returnX()) / 2, y);
      }
      label(path.wires().get(i), (left + right) / 2, y, right - left);
    }
  }

  private void label(Wire wire, int middle, int y, int room) {
    int up = layout.pixels(path.route().way() == Way.INVERTING && y == layout.minusY() ? 9 : 5);
    int gap = layout.pixels(6);
    g2.setColor(Palette.quiet());
    text.centred(wire.node(), fonts.line(), middle, y - up, room - 4);
    g2.setColor(Palette.text());
    int ascent = g2.getFontMetrics(fonts.number()).getAscent();
    text.centred(wire.volts(), fonts.number(), middle, y + gap + ascent, room - 4);
  }

  /** The input that the source does not drive: its node, and what it is tied to. */
  private void otherInput() {
    int edge = layout.amplifierInput().x;
    int y = layout.otherY();
    int x = layout.returnX();
    boolean isFedBack = path.route().way() == Way.NON_INVERTING;
    if (isFedBack) {
      accent();
    } else {
      plain();
    }
    g2.drawLine(x, y, edge, y);
    head(edge, y, 1);
    if (!isFedBack) {
      ground(x, y);
    }
    int end = x - layout.pixels(isFedBack ? 5 : 10);
    int room = layout.pixels(58);
    g2.setColor(isFedBack ? Palette.accent() : Palette.quiet());
    text.ending(path.otherInput().node(), fonts.line(), end, y - layout.pixels(1), room);
    g2.setColor(Palette.text());
    int ascent = g2.getFontMetrics(fonts.number()).getAscent();
    text.ending(
        path.otherInput().volts(), fonts.number(), end, y + layout.pixels(1) + ascent, room);
  }

  private void wayBack(Rectangle words) {
    int lane = layout.laneY();
    int tap = layout.tapX();
    int back = layout.returnX();
    Rectangle load = layout.bounds(BlockIds.LOAD);
    int from = path.route().fromLoad() ? load.y + load.height : layout.signalY();
    accent();
    g2.drawLine(tap, from, tap, lane);
    g2.drawLine(tap, lane, words.x + words.width, lane);
    g2.drawLine(words.x, lane, back, lane);
    g2.drawLine(back, lane, back, layout.minusY());
    head((words.x + back) / 2, lane, -1);
    dot(tap, from);
    if (path.route().way() == Way.INVERTING) {
      dot(back, layout.minusY());
    }
  }

  private void plain() {
    g2.setColor(Palette.wire());
    g2.setStroke(new BasicStroke((float) (1.4 * layout.scale())));
  }

  private void accent() {
    g2.setColor(Palette.accent());
    g2.setStroke(new BasicStroke((float) (1.6 * layout.scale())));
  }

  /** An arrow head with its tip here, pointing right (1) or left (−1). */
  private void head(int x, int y, int direction) {
    double length = 6 * layout.scale();
    double half = 3 * layout.scale();
    Path2D head = new Path2D.Double();
    head.moveTo(x, y);
    head.lineTo(x - direction * length, y - half);
    head.lineTo(x - direction * length, y + half);
    head.closePath();
    g2.fill(head);
  }

  private void dot(int x, int y) {
    int radius = Math.max(2, layout.pixels(3));
    g2.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
  }

  /** A resistor in a horizontal wire. */
  private void resistor(int x, int y) {
    int half = layout.pixels(11);
    int up = layout.pixels(4);
    g2.setColor(Palette.card());
    g2.fillRect(x - half, y - up, 2 * half, 2 * up);
    plain();
    g2.drawRect(x - half, y - up, 2 * half, 2 * up);
  }

  /** Tied to ground or the mid-rail. */
  private void ground(int x, int y) {
    int half = layout.pixels(6);
    g2.drawLine(x, y - half, x, y + half);
    g2.drawLine(x - layout.pixels(3), y - half / 2, x - layout.pixels(3), y + half / 2);
  }
}
