package loopwright.sheet;

import java.awt.geom.Point2D;
import loopwright.assembly.Nodes;
import loopwright.design.Bias;
import loopwright.design.GainStage;
import loopwright.design.OutputStage;
import loopwright.design.StagesAmplifier;
import loopwright.sheet.SchematicLabel.Align;

/** What the gain stage drives: its load, the bias in between, and the push-pull follower. */
final class OutputSketch {
  private static final String PATH = "amplifier.outputStage.";
  private static final double MULTIPLIER = 15;
  private static final double DRIVE = GainSketch.OUT;

  private final SchematicDraft draft;
  private final double x;

  /**
   * @param x of the gain stage's collector
   */
  OutputSketch(SchematicDraft draft, double x) {
    this.draft = draft;
    this.x = x;
  }

  /** How far to the left what hangs on the gain stage's collector needs room. */
  static double reach(StagesAmplifier stages) {
    double source = SourceSketch.reach(stages.gainStage().load());
    return stages.outputStage() instanceof OutputStage.PushPull stage
            && stage.bias() instanceof Bias.VbeMultiplier
        ? Math.max(source, MULTIPLIER)
        : source;
  }

  /** Draws it; where the output is. */
  Point2D draw(StagesAmplifier stages) {
    GainStage gain = stages.gainStage();
    if (!(stages.outputStage() instanceof OutputStage.PushPull stage)) {
      load(gain, DRIVE);
      draft.wire(x, DRIVE, x + 8, DRIVE);
      draft.mark("out", x + 7.5, DRIVE - 0.8, Align.RIGHT);
      return new Point2D.Double(x + 8, DRIVE);
    }
    boolean driven = stage.drivers().isPresent();
    double reached = bias(stage.bias());
    double far = Math.max(DRIVE + (driven ? 24 : 18), reached);
    draft.wire(x, reached, x, far);
    load(gain, far);
    draft.mark("gainOut", x + 0.5, DRIVE - 0.8, Align.LEFT);
    String other = draft.mirrored() ? "driveHigh" : "driveLow";
    if (!(stage.bias() instanceof Bias.Joined)) {
      draft.mark(other, x + 0.5, far - 0.8, Align.LEFT);
    }
    double first = x + 11;
    return driven ? withDrivers(stage, first, far) : followers(stage, first, DRIVE, far);
  }

  private void load(GainStage gain, double from) {
    double start = from + 1 + SourceSketch.above(gain.load());
    draft.wire(x, from, x, start);
    new SourceSketch(draft, "amplifier.gainStage.load", "gainLoad").draw(gain.load(), x, start);
  }

  /** From the gain stage's output downward; where the other drive node begins. */
  private double bias(Bias bias) {
    if (bias instanceof Bias.Diodes diodes) {
      return diodes(diodes);
    }
    if (bias instanceof Bias.VbeMultiplier multiplier) {
      return multiplier(multiplier);
    }
    double end = DRIVE + 18;
    draft.wire(x, DRIVE, x, end);
    return end;
  }

  private double diodes(Bias.Diodes diodes) {
    double at = DRIVE + 1;
    draft.wire(x, DRIVE, x, at);
    int count = diodes.count();
    for (int k = 1; k <= count; k++) {
      // They conduct from driveHigh to driveLow, and are counted from driveHigh.
      int number = draft.mirrored() ? count + 1 - k : k;
      boolean down = !draft.mirrored();
      draft.diode("bias.d" + number, x, down ? at : at + 4, down ? at + 4 : at, Align.LEFT);
      at += 4;
    }
    double end = Math.max(at + 1, DRIVE + 18);
    draft.wire(x, at, x, end);
    return end;
  }

  private double multiplier(Bias.VbeMultiplier multiplier) {
    double left = x - 9;
    double tap = DRIVE + 8;
    draft.wire(x, DRIVE, x, tap - 3);
    draft.transistor("bias.q1", x - 3, tap, true, draft.mirrored());
    draft.wire(left, tap, x - 3, tap);
    draft.wire(x, DRIVE + 2, left, DRIVE + 2, left, DRIVE + 3);
    draft.wire(left, tap + 5, left, tap + 6, x, tap + 6);
    String up = draft.mirrored() ? "lower" : "upper";
    String down = draft.mirrored() ? "upper" : "lower";
    draft.resistor(
        PATH + "bias." + up,
        draft.mirrored() ? multiplier.lower() : multiplier.upper(),
        left,
        tap - 5,
        left,
        tap,
        Align.RIGHT);
    draft.resistor(
        PATH + "bias." + down,
        draft.mirrored() ? multiplier.upper() : multiplier.lower(),
        left,
        tap,
        left,
        tap + 5,
        Align.RIGHT);
    double end = DRIVE + 18;
    draft.wire(x, tap + 3, x, end);
    return end;
  }

  private Point2D withDrivers(OutputStage.PushPull stage, double first, double far) {
    OutputStage.Drivers drivers = stage.drivers().orElseThrow();
    String near = draft.mirrored() ? "lower" : "upper";
    String other = draft.mirrored() ? "upper" : "lower";
    draft.wire(x, DRIVE, first, DRIVE);
    draft.wire(x, far, first, far);
    draft.transistor("driver." + near, first, DRIVE, true, false);
    draft.transistor("driver." + other, first, far, true, true);
    draft.port(draft.loadRail(), first + 3, DRIVE - 3, false);
    draft.port(draft.tailRail(), first + 3, far + 3, true);
    double top = DRIVE + 3;
    double bottom = far - 3;
    double middle = (top + bottom) / 2;
    draft.wire(first + 3, top, first + 3, middle - 2.5);
    draft.resistor(
        PATH + "drivers.resistance",
        drivers.resistance(),
        first + 3,
        middle - 2.5,
        first + 3,
        middle + 2.5);
    draft.wire(first + 3, middle + 2.5, first + 3, bottom);
    return followers(stage, first + 10, top, bottom);
  }

  private Point2D followers(OutputStage.PushPull stage, double base, double top, double bottom) {
    String near = draft.mirrored() ? "lower" : "upper";
    String other = draft.mirrored() ? "upper" : "lower";
    double from = stage.drivers().isPresent() ? base - 7 : x;
    double end = base + 3;
    double middle = (top + bottom) / 2;
    draft.wire(from, top, base, top);
    draft.wire(from, bottom, base, bottom);
    draft.transistor("out." + near, base, top, true, false);
    draft.transistor("out." + other, base, bottom, true, true);
    draft.port(draft.loadRail(), end, top - 3, false);
    draft.port(draft.tailRail(), end, bottom + 3, true);
    draft.resistor(
        PATH + "emitterResistance@out." + near,
        stage.emitterResistance(),
        end,
        middle - 5,
        end,
        middle);
    draft.resistor(
        PATH + "emitterResistance@out." + other,
        stage.emitterResistance(),
        end,
        middle,
        end,
        middle + 5);
    draft.wire(end, top + 3, end, middle - 5);
    draft.wire(end, middle + 5, end, bottom - 3);
    draft.wire(end, middle, end + 8, middle);
    draft.mark(Nodes.OUT, end + 7.5, middle - 0.8, Align.RIGHT);
    return new Point2D.Double(end + 8, middle);
  }
}
