package loopwright.sizing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.predict.Level;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;

/**
 * The builds of a design whose parts all stand at the end of their tolerance that takes most from
 * the phase margin, one for each level at which the signs differ: the corners to be afraid of.
 */
final class MarginCorners {
  private MarginCorners() {}

  /**
   * The corners of a hookup; none where nothing spreads or the margin is not there to begin with.
   */
  static List<Build> of(HookupFigures nominal) {
    List<TolerancedPart> parts =
        TolerancedParts.in(TolerancedParts.of(nominal), nominal.hookup().name());
    if (parts.isEmpty()) {
      return List.of();
    }
    double[] levels = margins(nominal);
    double[][] corners = new double[levels.length][parts.size()];
    for (int part = 0; part < parts.size(); part++) {
      double[] deviations = new double[parts.size()];
      deviations[part] = parts.get(part).standardUncertainty();
      double[] moved =
          margins(nominal.of(TolerancedParts.build(nominal.design(), parts, deviations)));
      for (int level = 0; level < levels.length; level++) {
        TolerancedPart spreads = parts.get(part);
        corners[level][part] = moved[level] < levels[level] ? spreads.high() : spreads.low();
      }
    }
    List<Build> builds = new ArrayList<>();
    List<double[]> seen = new ArrayList<>();
    for (int level = 0; level < levels.length; level++) {
      double[] corner = corners[level];
      if (!Double.isNaN(levels[level])
          && seen.stream().noneMatch(other -> Arrays.equals(other, corner))) {
        seen.add(corner);
        builds.add(TolerancedParts.build(nominal.design(), parts, corner));
      }
    }
    return builds;
  }

  private static double[] margins(HookupFigures figures) {
    return Arrays.stream(Level.values())
        .mapToDouble(level -> figures.phaseMargin(level).number().orElse(Double.NaN))
        .toArray();
  }
}
