package loopwright.sheet;

import java.util.Optional;
import loopwright.assembly.Nodes;
import loopwright.design.CurrentSource;
import loopwright.design.FeedFrom;
import loopwright.design.PartValue;
import loopwright.design.Rails;
import loopwright.quantity.Unit;
import loopwright.sheet.SchematicLabel.Align;
import loopwright.sheet.SchematicSymbol.Kind;

/** Current sources, drawn downward from the node that they feed to the tail's rail. */
final class SourceSketch {
  private final SchematicDraft draft;
  private final String path;
  private final String role;

  /**
   * @param path of the source in the file
   * @param role what its devices' roles begin with
   */
  SourceSketch(SchematicDraft draft, String path, String role) {
    this.draft = draft;
    this.path = path + ".";
    this.role = role + ".";
  }

  /** How far above its node a source reaches, for what is fed from elsewhere. */
  static double above(CurrentSource source) {
    return source instanceof CurrentSource.Mirror ? 8 : 4;
  }

  /** How far to the left of its node a source reaches, with its words. */
  static double reach(CurrentSource source) {
    if (source instanceof CurrentSource.Mirror) {
      return 19;
    }
    return source instanceof CurrentSource.DiodeBiased
            || source instanceof CurrentSource.TwoTransistor
        ? 15
        : 3;
  }

  /** Draws a source from a node at (x, y) downward. */
  void draw(CurrentSource source, double x, double y) {
    if (source instanceof CurrentSource.Resistor resistor) {
      draft.resistor(path + "resistance", resistor.resistance(), x, y, x, y + 5);
      draft.port(draft.tailRail(), x, y + 5, true);
    } else if (source instanceof CurrentSource.Ideal ideal) {
      String value = SchematicDraft.text(ideal.current().value(), Unit.AMPERE);
      // The current flows from the positive side to the negative.
      double from = draft.mirrored() ? y + 5 : y;
      double to = draft.mirrored() ? y : y + 5;
      draft.two(Kind.CURRENT_SOURCE, path + "current", value, x, from, x, to, Align.LEFT);
      draft.port(draft.tailRail(), x, y + 5, true);
    } else if (source instanceof CurrentSource.Mirror mirror) {
      mirror(mirror, x, y);
    } else if (source instanceof CurrentSource.DiodeBiased biased) {
      diodeBiased(biased, x, y);
    } else if (source instanceof CurrentSource.TwoTransistor two) {
      twoTransistor(two, x, y);
    }
  }

  private void mirror(CurrentSource.Mirror mirror, double x, double y) {
    double left = x - 13;
    draft.wire(x, y, x, y + 1);
    draft.transistor(role + "q2", x - 3, y + 4, true, false);
    draft.transistor(role + "q1", left + 3, y + 4, false, false);
    draft.wire(left + 3, y + 4, x - 3, y + 4);
    // The diode connection.
    draft.wire(left + 5, y + 4, left + 5, y, left, y, left, y + 1);
    draft.resistor(
        path + "setResistance", mirror.setResistance(), left, y - 5, left, y, Align.RIGHT);
    draft.port(feed(mirror.feedFrom()), left, y - 5, false);
    emitter("@" + role + "q2", mirror.emitterResistance(), x, y + 7, Align.LEFT);
    emitter("@" + role + "q1", mirror.emitterResistance(), left, y + 7, Align.RIGHT);
  }

  private void emitter(String twin, PartValue value, double x, double y, Align align) {
    double end = value.effective() == 0 ? y + 1 : y + 5;
    draft.resistor(path + "emitterResistance" + twin, value, x, y, x, end, align);
    draft.port(draft.tailRail(), x, end, true);
  }

  private void diodeBiased(CurrentSource.DiodeBiased biased, double x, double y) {
    double left = x - 8;
    draft.wire(x, y, x, y + 1);
    draft.transistor(role + "q1", x - 3, y + 4, true, false);
    emitter("", biased.emitterResistance(), x, y + 7, Align.LEFT);
    draft.wire(left, y + 4, x - 3, y + 4);
    draft.resistor(
        path + "feedResistance", biased.feedResistance(), left, y - 1, left, y + 4, Align.RIGHT);
    draft.port(feed(biased.feedFrom()), left, y - 1, false);
    double at = y + 4;
    // Conducting from the base to the tail's rail, or from it where that is the positive one.
    boolean toward = !draft.mirrored();
    for (int k = 1; k <= biased.count(); k++) {
      // They are counted along the current.
      int number = toward ? k : biased.count() + 1 - k;
      draft.diode(
          role + "d" + number, left, toward ? at : at + 4, toward ? at + 4 : at, Align.RIGHT);
      at += 4;
    }
    draft.port(draft.tailRail(), left, at, true);
  }

  private void twoTransistor(CurrentSource.TwoTransistor two, double x, double y) {
    double left = x - 9;
    draft.wire(x, y, x, y + 1);
    draft.transistor(role + "q1", x - 3, y + 4, true, false);
    draft.wire(x, y + 7, x, y + 11);
    draft.resistor(path + "senseResistance", two.senseResistance(), x, y + 11, x, y + 16);
    draft.port(draft.tailRail(), x, y + 16, true);
    draft.wire(left, y + 4, x - 3, y + 4);
    draft.resistor(
        path + "feedResistance", two.feedResistance(), left, y - 1, left, y + 4, Align.RIGHT);
    draft.port(feed(two.feedFrom()), left, y - 1, false);
    draft.wire(left, y + 4, left, y + 7);
    draft.transistor(role + "q2", left + 3, y + 10, false, false);
    draft.wire(left + 3, y + 10, x, y + 10);
    draft.wire(left, y + 13, left, y + 16);
    draft.port(draft.tailRail(), left, y + 16, true);
  }

  private String feed(Optional<FeedFrom> from) {
    Rails rails = draft.design().rails();
    double tail = (draft.mirrored() ? rails.positive() : rails.negative()).value();
    FeedFrom standard = tail == 0 ? FeedFrom.OPPOSITE_RAIL : FeedFrom.GROUND;
    return switch (from.orElse(standard)) {
      case GROUND -> SchematicDraft.GROUND;
      case MID_RAIL -> Nodes.MID_RAIL;
      case OPPOSITE_RAIL -> draft.loadRail();
    };
  }
}
