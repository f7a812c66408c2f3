package loopwright.benchmark;

import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import loopwright.design.Design;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.Level;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;

/**
 * Samples of a design's tolerances, each solved for what a band needs: operating point at rest,
 * high and low; output offset; gain and phase margin at the three levels. Serves one thread.
 */
final class ToleranceSamples {
  private static final Figure OFFSET = Catalogue.find("outputOffset").orElseThrow();

  private final Design design;
  private final HookupFigures nominal;
  private final List<TolerancedPart> parts;
  private final Map<String, Integer> reasons = new TreeMap<>();
  private int solved;

  /** The design's first hookup, its nominal build solved. */
  ToleranceSamples(Design design) {
    this.design = design;
    String hookup = design.hookups().get(0).name();
    this.nominal = HookupFigures.of(design, hookup);
    this.parts = TolerancedParts.in(TolerancedParts.of(nominal), hookup);
    figures(nominal);
  }

  /** Solves one sample; equal seeds give equal samples. */
  FigureValue[] solve(long seed) {
    Random random = new Random(seed);
    double[] deviations = new double[parts.size()];
    for (int i = 0; i < deviations.length; i++) {
      TolerancedPart part = parts.get(i);
      deviations[i] = part.low() + (part.high() - part.low()) * random.nextDouble();
    }
    FigureValue[] figures = figures(nominal.of(TolerancedParts.build(design, parts, deviations)));
    boolean all = true;
    for (FigureValue figure : figures) {
      if (figure.number().isEmpty()) {
        reasons.merge(figure.says(), 1, Integer::sum);
        all = false;
      }
    }
    solved += all ? 1 : 0;
    return figures;
  }

  private static FigureValue[] figures(HookupFigures build) {
    Level[] levels = Level.values();
    FigureValue[] figures = new FigureValue[1 + 2 * levels.length];
    figures[0] = build.solved(OFFSET);
    for (int i = 0; i < levels.length; i++) {
      figures[1 + 2 * i] = build.midbandGain(levels[i]);
      figures[2 + 2 * i] = build.phaseMargin(levels[i]);
    }
    return figures;
  }

  /** How many samples had every figure. */
  int solved() {
    return solved;
  }

  /** Why figures are missing, and how often. */
  Map<String, Integer> reasons() {
    return reasons;
  }
}
