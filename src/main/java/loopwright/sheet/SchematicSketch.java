package loopwright.sheet;

import java.awt.geom.Point2D;
import java.util.List;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.design.StagesAmplifier;
import loopwright.sheet.SchematicLabel.Align;
import loopwright.sheet.SchematicSymbol.Kind;

/** Lays out the schematic of a design in one of its hookups, stage by stage. */
final class SchematicSketch {
  private static final double BELOW = 6;
  private static final double FRAGMENTS = 12;

  private SchematicSketch() {}

  /**
   * The layout.
   *
   * @param design a valid design, every part it names among its own
   */
  static SchematicLayout of(Design design, Hookup hookup) {
    SchematicDraft draft = new SchematicDraft(design, Designators.of(design));
    if (design.amplifier() instanceof StagesAmplifier stages) {
      PairSketch.draw(draft, stages.inputPair());
      double collector = GainSketch.draw(draft, stages.gainStage(), OutputSketch.reach(stages));
      Point2D out = new OutputSketch(draft, collector).draw(stages);
      double floor = draft.lowest() + BELOW;
      new HookupSketch(
              draft,
              hookup,
              new Point2D.Double(PairSketch.PLUS, PairSketch.BASES),
              new Point2D.Double(PairSketch.MINUS, PairSketch.BASES))
          .draw(out, floor);
    } else {
      figures(draft, hookup);
    }
    new FragmentSketch(draft, 0, draft.lowest() + FRAGMENTS).draw(design, hookup);
    return draft.layout();
  }

  /** An amplifier known by its figures: a block with its terminals. */
  private static void figures(SchematicDraft draft, Hookup hookup) {
    double x = 14;
    draft.symbol(Kind.AMPLIFIER, "amplifier", x, 20, x, 26, x + 14, 23);
    draft.label("amplifier", x + 5.5, 23, Align.CENTRE, List.of("amplifier"));
    draft.wire(3, 20, x, 20);
    draft.wire(11, 26, x, 26);
    new HookupSketch(draft, hookup, new Point2D.Double(3, 20), new Point2D.Double(11, 26))
        .draw(new Point2D.Double(x + 14, 23), 36);
  }
}
