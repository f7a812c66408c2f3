package loopwright.sheet;

import java.awt.geom.Point2D;
import java.util.List;
import java.util.Optional;
import loopwright.assembly.Nodes;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.design.Source;
import loopwright.design.TakenFrom;
import loopwright.quantity.Unit;
import loopwright.sheet.SchematicLabel.Align;
import loopwright.sheet.SchematicSymbol.Kind;

/** What stands around the amplifier: source, feedback and load. */
final class HookupSketch {
  private static final double STEP = 7;

  private final SchematicDraft draft;
  private final Hookup hookup;
  private final String path;
  private final Point2D plus;
  private final Point2D minus;

  /**
   * @param plus where in+ ends
   * @param minus where in- ends; below it the feedback comes up
   */
  HookupSketch(SchematicDraft draft, Hookup hookup, Point2D plus, Point2D minus) {
    this.draft = draft;
    this.hookup = hookup;
    this.path = "hookups." + hookup.name() + ".";
    this.plus = plus;
    this.minus = minus;
  }

  /**
   * Draws it.
   *
   * @param out where the output is
   * @param floor below all that the amplifier drew
   */
  void draw(Point2D out, double floor) {
    double loadAt = load(out);
    Feedback feedback = hookup.feedback();
    double x = minus.getX();
    draft.mark(Nodes.IN_MINUS, x - 0.4, minus.getY() + 2.7, Align.RIGHT);
    draft.mark(Nodes.IN_PLUS, plus.getX() + 0.2, plus.getY() + 1.2, Align.LEFT);
    if (feedback instanceof Feedback.Open open) {
      double end = open.returnResistance().effective() == 0 ? 1 : 6;
      draft.wire(x, minus.getY(), x, minus.getY() + 1);
      draft.resistor(
          path + "feedback.returnResistance",
          open.returnResistance(),
          x,
          minus.getY() + 1,
          x,
          minus.getY() + end);
      draft.port(SchematicDraft.GROUND, x, minus.getY() + end, true);
      source(plus, Nodes.IN_PLUS);
      return;
    }
    draft.wire(x, minus.getY(), x, floor);
    if (feedback instanceof Feedback.NonInverting divider) {
      source(plus, Nodes.IN_PLUS);
      double from = divider.from() == TakenFrom.LOAD ? loadAt : out.getX() + 2;
      upper(divider.upper(), divider.leadCapacitance(), out.getY(), from, floor);
      divider.lower().ifPresent(lower -> lower(divider, floor));
    } else if (feedback instanceof Feedback.Inverting inverting) {
      double from = inverting.from() == TakenFrom.LOAD ? loadAt : out.getX() + 2;
      upper(inverting.upper(), inverting.leadCapacitance(), out.getY(), from, floor);
      double end = x - 2;
      draft.wire(end, floor, x, floor);
      draft.resistor(
          path + "feedback.inputResistor", inverting.inputResistor(), end - 5, floor, end, floor);
      draft.mark(Nodes.INPUT_END, end - 5.8, floor + 1.2, Align.LEFT);
      source(new Point2D.Double(end - 6, floor), Nodes.INPUT_END);
      draft.wire(end - 6, floor, end - 5, floor);
      double foot = inverting.returnResistance().effective() == 0 ? 1 : 6;
      draft.wire(plus.getX(), plus.getY(), plus.getX(), plus.getY() + 1);
      draft.resistor(
          path + "feedback.returnResistance",
          inverting.returnResistance(),
          plus.getX(),
          plus.getY() + 1,
          plus.getX(),
          plus.getY() + foot,
          Align.RIGHT);
      draft.port(SchematicDraft.node(inverting.returnTo()), plus.getX(), plus.getY() + foot, true);
    }
  }

  /** From the output beneath everything back to in-. */
  private void upper(
      PartValue upper, Optional<PartValue> lead, double level, double from, double floor) {
    double x = minus.getX();
    double middle = x + 10;
    draft.wire(from, level, from, floor, middle + 5, floor);
    draft.resistor(path + "feedback.upper", upper, middle, floor, middle + 5, floor);
    draft.wire(x, floor, middle, floor);
    lead.ifPresent(
        capacitance -> {
          double row = floor + 5;
          draft.wire(middle - 1.5, floor, middle - 1.5, row, middle, row);
          draft.capacitor(
              path + "feedback.leadCapacitance", capacitance, middle + 5, row, middle, row);
          draft.wire(middle + 5, row, middle + 6.5, row, middle + 6.5, floor);
        });
  }

  private void lower(Feedback.NonInverting divider, double floor) {
    double x = minus.getX();
    draft.wire(x, floor, x, floor + 1);
    draft.resistor(
        path + "feedback.lower",
        divider.lower().orElseThrow(),
        x,
        floor + 1,
        x,
        floor + 6,
        Align.RIGHT);
    String foot = SchematicDraft.node(divider.returnTo());
    if (divider.lowerCapacitance().isPresent()) {
      draft.two(
          Kind.CAPACITOR,
          path + "feedback.lowerCapacitance",
          SchematicDraft.text(divider.lowerCapacitance().get().effective(), Unit.FARAD),
          x,
          floor + 6,
          x,
          floor + 11,
          Align.RIGHT);
      draft.port(foot, x, floor + 11, true);
    } else {
      draft.port(foot, x, floor + 6, true);
    }
  }

  /** From the driven terminal leftward to the generator. */
  private void source(Point2D driven, String node) {
    Source source = hookup.source();
    double y = driven.getY();
    double x = driven.getX();
    if (source.biasResistance().isPresent()) {
      double at = x - 3;
      draft.wire(at, y, x, y);
      draft.resistor(
          path + "source.biasResistance",
          source.biasResistance().get(),
          at,
          y + 1,
          at,
          y + 6,
          Align.RIGHT);
      draft.wire(at, y, at, y + 1);
      draft.port(SchematicDraft.node(source.biasTo()), at, y + 6, true);
      draft.wire(at - 5, y, at, y);
      x = at - 5;
    }
    if (source.couplingCapacitance().isPresent()) {
      draft.wire(x - 2, y, x, y);
      draft.capacitor(
          path + "source.couplingCapacitance",
          source.couplingCapacitance().get(),
          x - STEP,
          y,
          x - 2,
          y);
      x -= STEP;
    }
    if (source.attenuator().isPresent()) {
      Source.Attenuator attenuator = source.attenuator().get();
      double at = x - 6;
      draft.wire(at, y, x, y);
      draft.wire(at, y, at, y + 1);
      draft.resistor(
          path + "source.attenuator.shunt", attenuator.shunt(), at, y + 1, at, y + 6, Align.RIGHT);
      draft.port(SchematicDraft.GROUND, at, y + 6, true);
      draft.wire(at - 2, y, at, y);
      draft.resistor(
          path + "source.attenuator.series", attenuator.series(), at - STEP, y, at - 2, y);
      x = at - STEP;
    }
    if (source.resistance().effective() > 0) {
      draft.wire(x - 2, y, x, y);
      draft.resistor(path + "source.resistance", source.resistance(), x - STEP, y, x - 2, y);
      x -= STEP;
    }
    generator(source, x - 3, y, x);
  }

  private void generator(Source source, double x, double y, double from) {
    draft.wire(x, y, from, y);
    draft.symbol(Kind.GENERATOR, "generator", x, y, x, y + 7);
    draft.port(SchematicDraft.GROUND, x, y + 7, true);
    draft.label(
        "generator",
        x - 1.6,
        y + 3.5,
        Align.RIGHT,
        List.of(
            SchematicDraft.text(source.amplitude().value(), Unit.VOLT),
            SchematicDraft.text(source.frequency().value(), Unit.HERTZ)));
  }

  /** From the output rightward; the place of the node {@code load}. */
  private double load(Point2D out) {
    Load load = hookup.load();
    double y = out.getY();
    double x = out.getX() + 2;
    draft.wire(out.getX(), y, x, y);
    if (load.snubber().isPresent()) {
      Load.Snubber snubber = load.snubber().get();
      double at = x + 5;
      draft.wire(x, y, at, y, at, y + 1);
      draft.resistor(path + "load.snubber.resistance", snubber.resistance(), at, y + 1, at, y + 6);
      draft.capacitor(
          path + "load.snubber.capacitance", snubber.capacitance(), at, y + 6, at, y + 11);
      draft.port(SchematicDraft.GROUND, at, y + 11, true);
      x = at;
    }
    if (load.isolation().effective() > 0) {
      draft.wire(x, y, x + 3, y);
      draft.resistor(path + "load.isolation", load.isolation(), x + 3, y, x + 8, y);
      x += 8;
    }
    if (load.couplingCapacitance().isPresent()) {
      draft.wire(x, y, x + 3, y);
      draft.capacitor(
          path + "load.couplingCapacitance", load.couplingCapacitance().get(), x + 3, y, x + 8, y);
      x += 8;
    }
    double node = x;
    if (load.isSeparate()) {
      node = x + 2;
      draft.wire(x, y, node, y);
      draft.mark(Nodes.LOAD, node + 0.6, y - 0.8, Align.LEFT);
      x = node;
    }
    if (load.resistance().isPresent()) {
      double at = x + 6;
      draft.wire(x, y, at, y, at, y + 1);
      draft.resistor(path + "load.resistance", load.resistance().get(), at, y + 1, at, y + 6);
      draft.port(SchematicDraft.GROUND, at, y + 6, true);
      x = at;
    }
    if (load.capacitance().isPresent()) {
      double at = x + 7;
      draft.wire(x, y, at, y, at, y + 1);
      draft.capacitor(path + "load.capacitance", load.capacitance().get(), at, y + 1, at, y + 6);
      draft.port(SchematicDraft.GROUND, at, y + 6, true);
    }
    return node;
  }
}
