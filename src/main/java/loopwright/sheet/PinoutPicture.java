package loopwright.sheet;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.part.Pin;

/** The pins of a type, drawn small: seen on the flat face, leads down; a diode lies on its side. */
final class PinoutPicture {
  private static final double HEIGHT = 58;
  private static final double NARROWEST = 76;
  private static final double BODY = 34;
  private static final double BODY_HEIGHT = 16;
  private static final double LEAD = 12;
  private static final float SMALL = 6.5f;
  private static final String ABSENT = "pins not given:";
  private static final String LOOK = "look in the data sheet";

  private final SheetPinout pinout;
  private final double width;

  private PinoutPicture(SheetPinout pinout) {
    this.pinout = pinout;
    this.width =
        Math.max(
            NARROWEST,
            8 + Math.max(width(pinout.part(), SheetFonts.BOLD), width(who(), SheetFonts.REGULAR)));
  }

  static Piece.Picture of(SheetPinout pinout) {
    PinoutPicture picture = new PinoutPicture(pinout);
    return new Piece.Picture(picture.says(), picture.width, HEIGHT, picture::paint);
  }

  private static double width(String text, Font font) {
    FontRenderContext plain = new FontRenderContext(null, true, true);
    return font.deriveFont(SMALL).getStringBounds(text, plain).getWidth();
  }

  private String who() {
    return String.join(" ", pinout.designators());
  }

  private String says() {
    return "Pins of "
        + pinout.part()
        + ": "
        + (pinout.pins().isEmpty()
            ? ABSENT + " " + LOOK
            : pinout.pins().stream()
                    .map(pin -> pin.name().toLowerCase(java.util.Locale.ROOT))
                    .collect(Collectors.joining(", "))
                + (pinout.diode() ? ", left to right" : ", flat face forward, left to right"));
  }

  private void paint(Graphics2D graphics) {
    graphics.setColor(Color.BLACK);
    graphics.setStroke(new BasicStroke(0.6f));
    text(graphics, SheetFonts.BOLD, 0, 7, pinout.part());
    text(graphics, SheetFonts.REGULAR, 0, 14.5, who());
    if (pinout.pins().isEmpty()) {
      text(graphics, SheetFonts.REGULAR, 0, 30, ABSENT);
      text(graphics, SheetFonts.REGULAR, 0, 38, LOOK);
    } else if (pinout.diode()) {
      diode(graphics);
    } else {
      transistor(graphics);
    }
  }

  private void transistor(Graphics2D graphics) {
    double top = 19;
    graphics.draw(new Rectangle2D.Double(0.5, top, BODY, BODY_HEIGHT));
    List<Pin> pins = pinout.pins();
    double step = BODY / pins.size();
    for (int i = 0; i < pins.size(); i++) {
      double x = 0.5 + step * (i + 0.5);
      graphics.draw(new Line2D.Double(x, top + BODY_HEIGHT, x, top + BODY_HEIGHT + LEAD));
      text(graphics, SheetFonts.BOLD, x - 2, top + BODY_HEIGHT + LEAD + 7, letter(pins.get(i)));
    }
    text(graphics, SheetFonts.REGULAR, 3, top + 7, "flat face");
  }

  /** The band marks the cathode (common practice, no source). */
  private void diode(Graphics2D graphics) {
    double y = 33;
    double left = LEAD + 2;
    graphics.draw(new Line2D.Double(2, y, left, y));
    graphics.draw(new Rectangle2D.Double(left, y - 5, BODY, 10));
    graphics.draw(new Line2D.Double(left + BODY, y, left + BODY + LEAD, y));
    boolean first = pinout.pins().get(0) == Pin.CATHODE;
    double band = first ? left + 5 : left + BODY - 5;
    graphics.setStroke(new BasicStroke(2f));
    graphics.draw(new Line2D.Double(band, y - 4, band, y + 4));
    text(graphics, SheetFonts.BOLD, 2, y + 15, letter(pinout.pins().get(0)));
    Pin last = pinout.pins().get(pinout.pins().size() - 1);
    text(graphics, SheetFonts.BOLD, left + BODY + LEAD - 5, y + 15, letter(last));
  }

  private static String letter(Pin pin) {
    return switch (pin) {
      case EMITTER -> "E";
      case BASE -> "B";
      case COLLECTOR -> "C";
      case ANODE -> "A";
      case CATHODE -> "K";
    };
  }

  private static void text(Graphics2D graphics, Font font, double x, double y, String text) {
    graphics.setFont(font.deriveFont(font == SheetFonts.BOLD ? Font.BOLD : Font.PLAIN, SMALL));
    graphics.drawString(text, (float) x, (float) y);
  }
}
