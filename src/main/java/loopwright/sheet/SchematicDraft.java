package loopwright.sheet;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import loopwright.assembly.Nodes;
import loopwright.design.Design;
import loopwright.design.DeviceRoles;
import loopwright.design.PartValue;
import loopwright.design.ReturnNode;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sheet.SchematicLabel.Align;
import loopwright.sheet.SchematicSymbol.Kind;

/**
 * Where the stages of a schematic put their parts. Stages are drawn as with an npn pair, the pair's
 * load above and its tail below; with a pnp pair all of it is mirrored upside down.
 */
final class SchematicDraft {
  static final String GROUND = "ground";

  /** Between a part's middle line and the words beside it. */
  private static final double BESIDE = 0.75;

  /** Between a part's middle line and the middle of the words above it. */
  private static final double ABOVE = 1.75;

  private final Design design;
  private final Designators designators;
  private final boolean mirrored;
  private final List<SchematicSymbol> symbols = new ArrayList<>();
  private final List<Line2D> wires = new ArrayList<>();
  private final List<SchematicPort> ports = new ArrayList<>();
  private final List<SchematicLabel> labels = new ArrayList<>();
  private final List<SchematicLabel> nodes = new ArrayList<>();

  SchematicDraft(Design design, Designators designators) {
    this.design = design;
    this.designators = designators;
    this.mirrored =
        DeviceRoles.pairPolarity(design).map(polarity -> polarity == Polarity.PNP).orElse(false);
  }

  Design design() {
    return design;
  }

  /** Whether up and down are exchanged. */
  boolean mirrored() {
    return mirrored;
  }

  /** The rail on the side of the pair's load: up before mirroring. */
  String loadRail() {
    return mirrored ? Nodes.NEGATIVE : Nodes.POSITIVE;
  }

  /** The rail on the side of the pair's tail. */
  String tailRail() {
    return mirrored ? Nodes.POSITIVE : Nodes.NEGATIVE;
  }

  /** The name of a node to return to. */
  static String node(ReturnNode node) {
    return node == ReturnNode.MID_RAIL ? Nodes.MID_RAIL : GROUND;
  }

  private Point2D point(double x, double y) {
    return new Point2D.Double(x, mirrored ? -y : y);
  }

  /** A wire through points, given as x and y in turn; each piece along or across. */
  void wire(double... points) {
    for (int k = 2; k < points.length; k += 2) {
      Point2D from = point(points[k - 2], points[k - 1]);
      Point2D to = point(points[k], points[k + 1]);
      if (from.distance(to) > 0) {
        wires.add(new Line2D.Double(from, to));
      }
    }
  }

  /**
   * A resistor, or a wire where it has no resistance, with its words to the right, or on the load's
   * side.
   *
   * @param name as the circuit calls it
   */
  void resistor(String name, PartValue value, double x1, double y1, double x2, double y2) {
    resistor(name, value, x1, y1, x2, y2, Align.LEFT);
  }

  /** The same with the words of an upright one on a side: LEFT are words that begin there. */
  void resistor(
      String name, PartValue value, double x1, double y1, double x2, double y2, Align align) {
    if (value.effective() == 0) {
      wire(x1, y1, x2, y2);
    } else {
      two(Kind.RESISTOR, name, text(value.effective(), Unit.OHM), x1, y1, x2, y2, align);
    }
  }

  /** A capacitor, with its words likewise. */
  void capacitor(String name, PartValue value, double x1, double y1, double x2, double y2) {
    two(Kind.CAPACITOR, name, text(value.effective(), Unit.FARAD), x1, y1, x2, y2, Align.LEFT);
  }

  /** Any part of two terminals. */
  void two(
      Kind kind,
      String name,
      String value,
      double x1,
      double y1,
      double x2,
      double y2,
      Align align) {
    symbols.add(new SchematicSymbol(kind, name, List.of(point(x1, y1), point(x2, y2))));
    List<String> lines = new ArrayList<>();
    String designator = designators.element(name);
    if (!designator.isEmpty()) {
      lines.add(designator);
    }
    lines.add(value);
    double wide =
        kind == Kind.CAPACITOR
            ? 0.4
            : kind == Kind.CURRENT_SOURCE || kind == Kind.GENERATOR ? 0.7 : 0;
    double x = (x1 + x2) / 2;
    double y = (y1 + y2) / 2;
    if (x1 == x2) {
      double side = align == Align.LEFT ? BESIDE + wide : -BESIDE - wide;
      label(name, x + side, y, align, lines);
    } else {
      double above = ABOVE + wide;
      label(name, x, y - above, Align.CENTRE, lines);
    }
  }

  /** A transistor; words stand beyond its collector and emitter. */
  void transistor(String role, double baseX, double baseY, boolean facesRight, boolean emitterUp) {
    double x = baseX + (facesRight ? 3 : -3);
    Point2D upper = point(x, baseY - 3);
    Point2D lower = point(x, baseY + 3);
    String part = DeviceRoles.find(design, role).orElseThrow().part();
    Kind kind =
        ((TransistorRecord) design.parts().get(part)).kind() == Polarity.NPN ? Kind.NPN : Kind.PNP;
    symbols.add(
        new SchematicSymbol(
            kind,
            role,
            List.of(emitterUp ? lower : upper, point(baseX, baseY), emitterUp ? upper : lower)));
    label(
        role,
        x + (facesRight ? 0.5 : -0.5),
        baseY,
        facesRight ? Align.LEFT : Align.RIGHT,
        List.of(designator(role), part));
  }

  /** A diode from anode to cathode, upright. */
  void diode(String role, double x, double anodeY, double cathodeY, Align align) {
    symbols.add(
        new SchematicSymbol(Kind.DIODE, role, List.of(point(x, anodeY), point(x, cathodeY))));
    String part = DeviceRoles.find(design, role).orElseThrow().part();
    double side = align == Align.LEFT ? BESIDE : -BESIDE;
    label(role, x + side, (anodeY + cathodeY) / 2, align, List.of(designator(role), part));
  }

  private String designator(String role) {
    List<String> of = designators.of(role);
    return of.isEmpty() ? role : of.get(0);
  }

  /** A symbol of another kind, its words given. */
  void symbol(SchematicSymbol.Kind kind, String name, double... points) {
    List<Point2D> terminals = new ArrayList<>();
    for (int k = 0; k < points.length; k += 2) {
      terminals.add(point(points[k], points[k + 1]));
    }
    symbols.add(new SchematicSymbol(kind, name, terminals));
  }

  /** Words of a part. */
  void label(String of, double x, double y, Align align, List<String> lines) {
    labels.add(new SchematicLabel(of, SchematicLabel.Kind.PART, point(x, y), align, lines));
  }

  /**
   * The end of a wire at a node that is drawn elsewhere too.
   *
   * @param down whether it points down before mirroring
   */
  void port(String node, double x, double y, boolean down) {
    boolean pointsDown = down != mirrored;
    String text = portText(node);
    Point2D at = point(x, y);
    ports.add(new SchematicPort(node, at, pointsDown, text));
    if (!text.isEmpty()) {
      double middle = at.getY() + (pointsDown ? 1.0 : -1.0);
      labels.add(
          new SchematicLabel(
              node,
              SchematicLabel.Kind.PORT,
              new Point2D.Double(x, middle),
              Align.CENTRE,
              List.of(text)));
    }
  }

  private String portText(String node) {
    return switch (node) {
      case GROUND -> "";
      case Nodes.POSITIVE -> rail(design.rails().positive().value());
      case Nodes.NEGATIVE -> rail(design.rails().negative().value());
      case Nodes.MID_RAIL -> "mid-rail";
      default -> node;
    };
  }

  private static String rail(double volts) {
    return (volts > 0 ? "+" : "") + EngineeringFormat.format(volts, Unit.VOLT);
  }

  /** The name of a node, near a wire of it. */
  void mark(String node, double x, double y, Align align) {
    nodes.add(
        new SchematicLabel(node, SchematicLabel.Kind.NODE, point(x, y), align, List.of(node)));
  }

  static String text(double value, Unit unit) {
    return EngineeringFormat.format(value, unit);
  }

  /** The lowest that was drawn so far, before mirroring. */
  double lowest() {
    double lowest = 0;
    for (Line2D wire : wires) {
      lowest = Math.max(lowest, Math.max(unmirrored(wire.getY1()), unmirrored(wire.getY2())));
    }
    for (SchematicSymbol symbol : symbols) {
      for (Point2D terminal : symbol.terminals()) {
        lowest = Math.max(lowest, unmirrored(terminal.getY()));
      }
    }
    return lowest;
  }

  private double unmirrored(double y) {
    return mirrored ? -y : y;
  }

  /** What was drawn. */
  SchematicLayout layout() {
    return new SchematicLayout(
        symbols, wires, ports, new SchematicNets(symbols, wires, ports).dots(), labels, nodes);
  }
}
