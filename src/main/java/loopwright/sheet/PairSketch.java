package loopwright.sheet;

import loopwright.design.InputPair;
import loopwright.design.PairLoad;
import loopwright.design.PartValue;
import loopwright.sheet.SchematicLabel.Align;

/** The pair with its load and its tail. */
final class PairSketch {
  static final double LEFT = 15;
  static final double RIGHT = 29;

  /** Height of both bases. */
  static final double BASES = 20;

  /** Height of the wire to the gain stage. */
  static final double OUT = 14;

  /** Where in+ and in- end. */
  static final double PLUS = 3;

  static final double MINUS = 37;

  private static final String PATH = "amplifier.inputPair.";

  private PairSketch() {}

  static void draw(SchematicDraft draft, InputPair pair) {
    draft.transistor("pair.q1", LEFT - 3, BASES, true, false);
    draft.transistor("pair.q2", RIGHT + 3, BASES, false, false);
    draft.resistor(
        PATH + "baseResistance@pair.q1", pair.baseResistance(), PLUS, BASES, LEFT - 3, BASES);
    draft.resistor(
        PATH + "baseResistance@pair.q2", pair.baseResistance(), MINUS, BASES, RIGHT + 3, BASES);
    draft.wire(LEFT, OUT, LEFT, BASES - 3);
    draft.wire(RIGHT, OUT - 1, RIGHT, BASES - 3);
    emitters(draft, pair.emitterResistance());
    double middle = (LEFT + RIGHT) / 2;
    double node = 29;
    draft.wire(LEFT, node, RIGHT, node);
    double start = node + SourceSketch.above(pair.tail());
    draft.wire(middle, node, middle, start);
    new SourceSketch(draft, PATH + "tail", "tail").draw(pair.tail(), middle, start);
    draft.mark("tail", middle + 0.4, node - 0.8, Align.LEFT);
    draft.mark("pairOther", RIGHT + 0.4, OUT - 0.9 - 1.2, Align.LEFT);
    if (pair.load() instanceof PairLoad.Mirror mirror) {
      mirror(draft, mirror);
    } else {
      PairLoad.Resistors resistors = (PairLoad.Resistors) pair.load();
      load(draft, "output", resistors.output(), LEFT, OUT);
      load(draft, "other", resistors.other(), RIGHT, OUT - 1);
    }
  }

  private static void emitters(SchematicDraft draft, PartValue resistance) {
    draft.resistor(
        PATH + "emitterResistance@pair.q1", resistance, LEFT, BASES + 3, LEFT, 28, Align.RIGHT);
    draft.resistor(PATH + "emitterResistance@pair.q2", resistance, RIGHT, BASES + 3, RIGHT, 28);
    draft.wire(LEFT, 28, LEFT, 29);
    draft.wire(RIGHT, 28, RIGHT, 29);
  }

  private static void load(
      SchematicDraft draft, String name, PartValue value, double x, double from) {
    draft.resistor(PATH + "load." + name, value, x, from - 6, x, from - 1);
    draft.wire(x, from - 1, x, from);
    draft.port(draft.loadRail(), x, from - 6, false);
  }

  private static void mirror(SchematicDraft draft, PairLoad.Mirror mirror) {
    double bases = 8;
    draft.transistor("pair.q4", LEFT + 3, bases, false, true);
    draft.transistor("pair.q3", RIGHT - 3, bases, true, true);
    draft.wire(LEFT, bases + 3, LEFT, OUT);
    draft.wire(RIGHT, bases + 3, RIGHT, OUT - 1);
    draft.wire(LEFT + 3, bases, RIGHT - 3, bases);
    // The diode connection, to the collector of the other side.
    draft.wire(RIGHT - 4, bases, RIGHT - 4, OUT - 1.5, RIGHT, OUT - 1.5);
    emitter(draft, "@pair.q4", mirror.emitterResistance(), LEFT, bases - 3, Align.RIGHT);
    emitter(draft, "@pair.q3", mirror.emitterResistance(), RIGHT, bases - 3, Align.LEFT);
  }

  private static void emitter(
      SchematicDraft draft, String twin, PartValue value, double x, double y, Align align) {
    double end = value.effective() == 0 ? y - 1 : y - 5;
    draft.resistor(PATH + "load.emitterResistance" + twin, value, x, end, x, y, align);
    draft.port(draft.loadRail(), x, end, false);
  }
}
