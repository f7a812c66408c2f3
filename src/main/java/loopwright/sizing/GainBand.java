package loopwright.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import loopwright.predict.HookupFigures;
import loopwright.predict.Level;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;

/** The band of a closed-loop gain for the tolerances, first order. */
final class GainBand {
  private static final double FACTOR = 2;

  private GainBand() {}

  /**
   * Half the 95 % band over the gain: every part that spreads is moved by its standard uncertainty.
   *
   * @param resistors paths of the divider's resistors
   * @param tolerance of those that the design states none for
   * @return NaN where the gain is not solved
   */
  static double half(HookupFigures nominal, List<String> resistors, double tolerance) {
    List<TolerancedPart> parts =
        new ArrayList<>(TolerancedParts.in(TolerancedParts.of(nominal), nominal.hookup().name()));
    Set<String> known = parts.stream().map(TolerancedPart::name).collect(Collectors.toSet());
    for (String resistor : resistors) {
      if (!known.contains(resistor)) {
        parts.add(
            new TolerancedPart(TolerancedPart.Kind.RESISTOR, resistor, -tolerance, tolerance));
      }
    }
    double gain = gain(nominal);
    double sum = 0;
    for (int part = 0; part < parts.size(); part++) {
      double[] deviations = new double[parts.size()];
      deviations[part] = parts.get(part).standardUncertainty();
      double moved =
          gain(nominal.of(TolerancedParts.build(nominal.design(), parts, deviations))) / gain - 1;
      sum += moved * moved;
    }
    return FACTOR * Math.sqrt(sum);
  }

  /** Mean of the gains at the high and the low level, which moves as the waveform's does. */
  private static double gain(HookupFigures figures) {
    return (figures.midbandGain(Level.HIGH).number().orElse(Double.NaN)
            + figures.midbandGain(Level.LOW).number().orElse(Double.NaN))
        / 2;
  }
}
