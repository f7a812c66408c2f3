package loopwright.sizing;

import java.util.List;
import java.util.Optional;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.StagesAmplifier;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/**
 * The smallest Miller capacitor of E6 that keeps every level of the swing stable: a first help,
 * found in a moment. {@link CureSearch} looks at more ways, at tolerances and at what they cost.
 *
 * @param capacitance F
 */
public record Compensation(double capacitance) {
  /** Phase margin that it gives at the least, degrees. */
  public static final double MARGIN = 45;

  private static final String PATH = "amplifier.gainStage.compensation.capacitance";
  private static final double LEAST = 1e-12;
  private static final double MOST = 10e-9;

  /** The change that fits it. */
  public Change change() {
    return new Change(PATH, EngineeringFormat.spelling(capacitance, Unit.FARAD));
  }

  /** Searches; empty where none does, or nothing in the amplifier can be changed. */
  public static Optional<Compensation> of(Design design, String hookup) {
    if (!(design.amplifier() instanceof StagesAmplifier stages)) {
      return Optional.empty();
    }
    double present =
        stages
            .gainStage()
            .compensation()
            .map(compensation -> compensation.capacitance().effective())
            .orElse(0.0);
    SwingMargin margin = new SwingMargin(MARGIN);
    HookupFigures start = HookupFigures.of(design, hookup);
    for (double value : PreferredValues.E6.between(Math.max(LEAST, present * 1.01), MOST)) {
      Compensation trial = new Compensation(value);
      Design changed = Change.applyAll(design, List.of(trial.change()));
      HookupFigures compensated = start.of(Build.nominal(changed));
      if (margin.seemsHeld(compensated) && margin.isHeld(compensated)) {
        return Optional.of(trial);
      }
    }
    return Optional.empty();
  }
}
