package loopwright.sheet;

import loopwright.design.GainStage;
import loopwright.sheet.SchematicLabel.Align;

/** The gain stage with its buffer and compensation; its load is drawn with the output stage. */
final class GainSketch {
  /** Height of the gain stage's output. */
  static final double OUT = 24;

  private static final double TAP = 41;

  /** What compensation needs beside its tap. */
  private static final double COMPENSATED = 12;

  private static final double BUFFERED = 14;
  private static final String PATH = "amplifier.gainStage.";

  private GainSketch() {}

  /**
   * Draws it; the place along the page of its collector.
   *
   * @param reach how far to the left what hangs on its collector needs room
   */
  static double draw(SchematicDraft draft, GainStage stage, double reach) {
    double in = PairSketch.OUT;
    double first = TAP + (stage.compensation().isPresent() ? COMPENSATED - 3 : 1);
    double base =
        Math.max(first + (stage.buffer().isPresent() ? BUFFERED : 0), PairSketch.MINUS + 2 + reach);
    double level = in;
    draft.mark("pairOut", TAP - 0.5, in - 0.8, Align.RIGHT);
    if (stage.buffer().isPresent()) {
      GainStage.Buffer buffer = stage.buffer().get();
      draft.wire(PairSketch.LEFT, in, first, in);
      draft.transistor("gain.buffer", first, in, true, true);
      draft.port(draft.tailRail(), first + 3, in + 3, true);
      level = in - 4;
      draft.wire(first + 3, in - 3, first + 3, level, base, level);
      draft.resistor(
          PATH + "buffer.emitterResistance",
          buffer.emitterResistance(),
          first + 3,
          level - 5,
          first + 3,
          level);
      draft.port(draft.loadRail(), first + 3, level - 5, false);
      draft.mark("gainBase", first + 4, level - 0.8, Align.LEFT);
    } else {
      draft.wire(PairSketch.LEFT, in, base, in);
    }
    double x = base + 3;
    draft.transistor("gain.q1", base, level, true, true);
    draft.wire(x, level + 3, x, OUT);
    emitter(draft, stage, x, level - 3);
    stage
        .compensation()
        .ifPresent(
            compensation -> {
              draft.wire(TAP, in, TAP, OUT, TAP + 0.5, OUT);
              draft.resistor(
                  PATH + "compensation.resistance",
                  compensation.resistance(),
                  TAP + 0.5,
                  OUT,
                  TAP + 5.5,
                  OUT);
              draft.capacitor(
                  PATH + "compensation.capacitance",
                  compensation.capacitance(),
                  TAP + 5.5,
                  OUT,
                  TAP + 10.5,
                  OUT);
              draft.wire(TAP + 10.5, OUT, x, OUT);
            });
    return x;
  }

  private static void emitter(SchematicDraft draft, GainStage stage, double x, double y) {
    boolean resistor = stage.emitterResistance().effective() > 0;
    double end = resistor ? y - 5 : y - 1;
    draft.resistor(PATH + "emitterResistance", stage.emitterResistance(), x, end, x, y);
    draft.port(draft.loadRail(), x, end, false);
    stage
        .emitterBypass()
        .ifPresent(
            bypass -> {
              double right = x + 7;
              draft.wire(x, y, right, y);
              draft.capacitor(PATH + "emitterBypass", bypass, right, y - 5, right, y);
              draft.port(draft.loadRail(), right, y - 5, false);
            });
  }
}
