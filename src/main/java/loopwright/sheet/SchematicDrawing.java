package loopwright.sheet;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.font.FontRenderContext;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.Hookup;

/**
 * The schematic of a design in one of its hookups, drawn by rule with the symbols of IEC 60617, on
 * whatever takes drawing.
 */
public final class SchematicDrawing {
  /** Points a grid unit. */
  static final double UNIT = 10;

  /** Height of the words, points. */
  static final float WORDS = 9.5f;

  private static final double LINE = 1.06 * WORDS;
  private static final double MARGIN = 12;
  private static final FontRenderContext PLAIN =
      new FontRenderContext(new AffineTransform(), true, true);

  private final SchematicLayout layout;
  private final Map<SchematicLabel, Rectangle2D> boxes = new LinkedHashMap<>();
  private final Rectangle2D bounds;

  private SchematicDrawing(SchematicLayout layout) {
    this.layout = layout;
    for (SchematicLabel label : layout.labels()) {
      boxes.put(label, box(label, label.lines()));
    }
    for (SchematicLabel label : layout.nodes()) {
      // Room for a voltage beside the name, so that an overlay changes no size.
      boxes.put(label, box(label, List.of(label.of() + " −88.88 mV")));
    }
    Rectangle2D all = new Rectangle2D.Double(0, 0, 1, 1);
    for (Line2D wire : layout.wires()) {
      all.add(scaled(wire.getP1()));
      all.add(scaled(wire.getP2()));
    }
    layout.symbols().forEach(symbol -> all.add(scaled(symbol.body())));
    layout.ports().forEach(port -> all.add(scaled(port.at())));
    boxes.values().forEach(all::add);
    bounds =
        new Rectangle2D.Double(
            all.getX() - MARGIN,
            all.getY() - MARGIN,
            all.getWidth() + 2 * MARGIN,
            all.getHeight() + 2 * MARGIN);
  }

  /**
   * The drawing of a hookup.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @throws IllegalArgumentException when the design has no hookup of this name
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public static SchematicDrawing of(Design design, String hookup) {
    Hookup found =
        design
            .hookup(hookup)
            .orElseThrow(() -> new IllegalArgumentException("no hookup is called " + hookup));
    return new SchematicDrawing(SchematicSketch.of(design, found));
  }

  SchematicLayout layout() {
    return layout;
  }

  /** Natural width, points. */
  public double width() {
    return bounds.getWidth();
  }

  /** Natural height, points. */
  public double height() {
    return bounds.getHeight();
  }

  /** What words take up, in points from the drawing's own origin, without an overlay's. */
  Map<SchematicLabel, Rectangle2D> labelBoxes() {
    Map<SchematicLabel, Rectangle2D> own = new LinkedHashMap<>();
    layout.labels().forEach(label -> own.put(label, boxes.get(label)));
    return own;
  }

  /** What the words of an overlay take up. */
  Map<SchematicLabel, Rectangle2D> nodeBoxes() {
    Map<SchematicLabel, Rectangle2D> own = new LinkedHashMap<>();
    layout.nodes().forEach(label -> own.put(label, boxes.get(label)));
    return own;
  }

  /**
   * Paints it at its natural size, its upper left corner at the origin.
   *
   * @param overlay voltages and currents to lay over it; empty for none
   */
  public void paint(Graphics2D graphics, SchematicInk ink, Optional<SchematicOverlay> overlay) {
    Graphics2D g2 = (Graphics2D) graphics.create();
    try {
      g2.translate(-bounds.getX(), -bounds.getY());
      // Words are laid out with the widths that they have between pixels.
      g2.setRenderingHint(
          RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
      SymbolPainter painter = new SymbolPainter(g2, ink);
      for (Line2D wire : layout.wires()) {
        painter.wire(scaled(wire.getP1()), scaled(wire.getP2()));
      }
      layout.dots().forEach(dot -> painter.dot(scaled(dot)));
      for (SchematicSymbol symbol : layout.symbols()) {
        List<Point2D> terminals =
            symbol.terminals().stream().map(SchematicDrawing::scaled).toList();
        painter.symbol(symbol.kind(), terminals, health(symbol, overlay));
      }
      layout.ports().forEach(port -> painter.port(port, scaled(port.at())));
      g2.setFont(font());
      for (SchematicLabel label : layout.labels()) {
        g2.setColor(ink.words());
        words(g2, label, lines(label, overlay));
      }
      overlay.ifPresent(
          over -> {
            for (SchematicLabel label : layout.nodes()) {
              over.voltage(label.of())
                  .ifPresent(
                      volts -> {
                        g2.setColor(ink.overlay());
                        words(g2, label, List.of(label.of() + " " + volts));
                      });
            }
          });
    } finally {
      g2.dispose();
    }
  }

  private static SchematicOverlay.Health health(
      SchematicSymbol symbol, Optional<SchematicOverlay> overlay) {
    return overlay.map(over -> over.health(symbol.name())).orElse(SchematicOverlay.Health.GOOD);
  }

  /** With an overlay a device's current stands under its type. */
  private static List<String> lines(SchematicLabel label, Optional<SchematicOverlay> overlay) {
    List<String> lines = new ArrayList<>(label.lines());
    if (label.kind() == SchematicLabel.Kind.PART) {
      overlay.flatMap(over -> over.current(label.of())).ifPresent(lines::add);
    }
    return lines;
  }

  private static void words(Graphics2D g2, SchematicLabel label, List<String> lines) {
    Rectangle2D box = box(label, lines);
    for (int k = 0; k < lines.size(); k++) {
      double width = width(lines.get(k));
      double left =
          switch (label.align()) {
            case LEFT -> box.getX();
            case CENTRE -> box.getCenterX() - width / 2;
            case RIGHT -> box.getMaxX() - width;
          };
      g2.drawString(lines.get(k), (float) left, (float) (box.getY() + (k + 0.8) * LINE));
    }
  }

  private static Rectangle2D box(SchematicLabel label, List<String> lines) {
    double width = lines.stream().mapToDouble(SchematicDrawing::width).max().orElse(0);
    Point2D at = scaled(label.at());
    double left =
        switch (label.align()) {
          case LEFT -> at.getX();
          case CENTRE -> at.getX() - width / 2;
          case RIGHT -> at.getX() - width;
        };
    double height = lines.size() * LINE;
    return new Rectangle2D.Double(left, at.getY() - height / 2, width, height);
  }

  private static Font font() {
    return SheetFonts.REGULAR.deriveFont(WORDS);
  }

  private static double width(String text) {
    return font().getStringBounds(text, PLAIN).getWidth();
  }

  /** From grid units to points. */
  static Point2D scaled(Point2D point) {
    return new Point2D.Double(point.getX() * UNIT, point.getY() * UNIT);
  }

  static Rectangle2D scaled(Rectangle2D area) {
    return new Rectangle2D.Double(
        area.getX() * UNIT, area.getY() * UNIT, area.getWidth() * UNIT, area.getHeight() * UNIT);
  }

  /**
   * The part under a point.
   *
   * @param x points from the drawing's left edge
   * @param y points from its upper edge
   * @return the part's path or the device's role; empty where there is none
   */
  public Optional<String> partAt(double x, double y) {
    double ownX = x + bounds.getX();
    double ownY = y + bounds.getY();
    for (SchematicSymbol symbol : layout.symbols()) {
      if (area(symbol).contains(ownX, ownY)) {
        return Optional.of(symbol.name());
      }
    }
    return boxes.entrySet().stream()
        .filter(entry -> entry.getKey().kind() == SchematicLabel.Kind.PART)
        .filter(entry -> entry.getValue().contains(ownX, ownY))
        .map(entry -> entry.getKey().of())
        .findFirst();
  }

  /** All parts, from left to right and within a column downward: the order of a walk by keys. */
  public List<String> parts() {
    return layout.symbols().stream()
        .sorted(
            Comparator.comparingDouble((SchematicSymbol symbol) -> symbol.body().getCenterX())
                .thenComparingDouble(symbol -> symbol.body().getCenterY()))
        .map(SchematicSymbol::name)
        .toList();
  }

  /** The area of a part, points from the drawing's upper left corner; empty where it has none. */
  public Optional<Rectangle2D> area(String part) {
    return layout.symbols().stream()
        .filter(symbol -> symbol.name().equals(part))
        .findFirst()
        .map(
            symbol -> {
              Rectangle2D own = area(symbol);
              return new Rectangle2D.Double(
                  own.getX() - bounds.getX(),
                  own.getY() - bounds.getY(),
                  own.getWidth(),
                  own.getHeight());
            });
  }

  private static Rectangle2D area(SchematicSymbol symbol) {
    Rectangle2D area = scaled(symbol.body());
    symbol.terminals().forEach(terminal -> area.add(scaled(terminal)));
    double margin = 0.3 * UNIT;
    return new Rectangle2D.Double(
        area.getX() - margin,
        area.getY() - margin,
        area.getWidth() + 2 * margin,
        area.getHeight() + 2 * margin);
  }
}
