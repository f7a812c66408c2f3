package loopwright.sizing;

import java.util.List;
import java.util.Optional;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.numeric.RootSearch;
import loopwright.predict.Build;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupFigures;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/**
 * The load resistor of the pair that brings the output to its reference at rest.
 *
 * @param exact Ω
 * @param preferred nearest value of E24, Ω
 * @param left what the preferred value leaves at the output, V
 */
public record PairCentring(double exact, double preferred, double left) {
  private static final String PATH = "amplifier.inputPair.load.output";
  private static final Figure OFFSET = Catalogue.find("outputOffset").orElseThrow();

  /** The resistor is looked for up to this factor from its present value. */
  private static final double FURTHEST = 8;

  private static final int STEPS = 12;

  /** Searches; empty where no resistor centres the output, or the pair has no load resistor. */
  public static Optional<PairCentring> of(Design design, String hookup) {
    Optional<Object> present = DesignPath.find(design, PATH);
    if (present.isEmpty()) {
      return Optional.empty();
    }
    double value = ((PartValue) present.get()).effective();
    HookupFigures start = HookupFigures.of(design, hookup);
    start.node("out");
    double ratio = Math.pow(FURTHEST, 1.0 / STEPS);
    for (int direction : new int[] {1, -1}) {
      double from = value;
      double before = offset(start, design, from);
      for (int i = 0; i < STEPS; i++) {
        double to = direction > 0 ? from * ratio : from / ratio;
        double after = offset(start, design, to);
        if (before * after <= 0) {
          double exact =
              RootSearch.find(
                  resistance -> offset(start, design, resistance), from, to, 1e-6 * value);
          double preferred = PreferredValues.E24.nearest(exact);
          return Double.isNaN(exact)
              ? Optional.empty()
              : Optional.of(new PairCentring(exact, preferred, offset(start, design, preferred)));
        }
        from = to;
        before = after;
      }
    }
    return Optional.empty();
  }

  /** Output offset with a load resistor, V; NaN where the circuit finds no rest. */
  private static double offset(HookupFigures start, Design design, double resistance) {
    Change change = new Change(PATH, EngineeringFormat.spelling(resistance, Unit.OHM));
    Design changed = Change.applyAll(design, List.of(change));
    return start.of(Build.nominal(changed)).solved(OFFSET).number().orElse(Double.NaN);
  }
}
