package loopwright.sheet;

import loopwright.assembly.Nodes;
import loopwright.design.Design;
import loopwright.design.Extra;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.design.Probe;
import loopwright.design.Rails;
import loopwright.quantity.Unit;
import loopwright.sheet.SchematicLabel.Align;
import loopwright.sheet.SchematicSymbol.Kind;

/**
 * What hangs between named nodes, drawn apart in a row beneath: supplies, the mid-rail, extras and
 * probes.
 */
final class FragmentSketch {
  private static final double STEP = 11;

  private final SchematicDraft draft;
  private final double top;
  private double x;

  /**
   * @param x where the row begins
   * @param top its upper edge, before mirroring
   */
  FragmentSketch(SchematicDraft draft, double x, double top) {
    this.draft = draft;
    this.x = x;
    this.top = top;
  }

  void draw(Design design, Hookup hookup) {
    Rails rails = design.rails();
    for (String rail : new String[] {Nodes.POSITIVE, Nodes.NEGATIVE}) {
      supply(rails, rail);
    }
    rails.midRail().ifPresent(this::midRail);
    for (Extra extra : design.extras()) {
      boolean resistor = extra instanceof Extra.ExtraResistor;
      between(
          resistor, "extras." + extra.name() + ".value", extra.value(), extra.from(), extra.to());
    }
    for (int k = 0; k < hookup.probes().size(); k++) {
      probe(hookup.probes().get(k), "hookups." + hookup.name() + ".probes." + k);
    }
  }

  private void supply(Rails rails, String rail) {
    String ideal = "ideal." + rail;
    boolean impedance = rails.resistance().effective() > 0 || rails.inductance().value() > 0;
    if (impedance) {
      double y = top;
      draft.port(ideal, x, y, false);
      if (rails.resistance().effective() > 0) {
        draft.resistor("rails.resistance@" + rail, rails.resistance(), x, y, x, y + 5);
        y += 5;
      }
      if (rails.inductance().value() > 0) {
        String value = SchematicDraft.text(rails.inductance().value(), Unit.HENRY);
        draft.two(Kind.INDUCTOR, "rails.inductance@" + rail, value, x, y, x, y + 5, Align.LEFT);
        y += 5;
      }
      draft.port(rail, x, y, true);
      x += STEP;
    }
    rails
        .decoupling()
        .ifPresent(
            decoupling -> {
              draft.port(rail, x, top, false);
              draft.capacitor(
                  "rails.decoupling.capacitance@" + rail,
                  decoupling.capacitance(),
                  x,
                  top,
                  x,
                  top + 5);
              double end = decoupling.resistance().effective() > 0 ? top + 10 : top + 6;
              draft.resistor(
                  "rails.decoupling.resistance@" + rail,
                  decoupling.resistance(),
                  x,
                  top + 5,
                  x,
                  end);
              draft.port(SchematicDraft.GROUND, x, end, true);
              x += STEP;
            });
  }

  private void midRail(Rails.MidRail mid) {
    draft.port(Nodes.POSITIVE, x, top, false);
    draft.resistor("rails.midRail.upper", mid.upper(), x, top, x, top + 5);
    draft.resistor("rails.midRail.lower", mid.lower(), x, top + 5, x, top + 10);
    draft.port(Nodes.NEGATIVE, x, top + 10, true);
    double right = x + STEP;
    if (mid.capacitance().effective() > 0) {
      draft.wire(x, top + 5, right, top + 5);
      draft.capacitor(
          "rails.midRail.capacitance", mid.capacitance(), right, top + 5, right, top + 10);
      draft.port(SchematicDraft.GROUND, right, top + 10, true);
      draft.wire(right, top + 5, right + 6, top + 5);
      right += 6;
    } else {
      draft.wire(x, top + 5, right, top + 5);
    }
    draft.wire(right, top + 5, right, top + 4);
    draft.port(Nodes.MID_RAIL, right, top + 4, false);
    x = right + STEP;
  }

  private void between(boolean resistor, String name, PartValue value, String from, String to) {
    draft.port(from, x, top, false);
    if (resistor) {
      draft.resistor(name, value, x, top, x, top + 5);
    } else {
      draft.capacitor(name, value, x, top, x, top + 5);
    }
    draft.port(to, x, top + 5, true);
    x += STEP;
  }

  private void probe(Probe probe, String path) {
    probe
        .resistance()
        .ifPresent(
            value ->
                between(true, path + ".resistance", value, probe.node(), SchematicDraft.GROUND));
    probe
        .capacitance()
        .ifPresent(
            value ->
                between(false, path + ".capacitance", value, probe.node(), SchematicDraft.GROUND));
  }
}
