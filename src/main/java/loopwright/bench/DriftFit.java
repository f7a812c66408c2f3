package loopwright.bench;

import java.util.List;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;

/**
 * One part far out of its tolerance: the deviation that explains the readings best, given how far
 * parts drift at all, found by a search along it in the full circuit.
 *
 * @param deviation in the part's own measure
 * @param fit how well it explains the readings
 * @param logEvidence logarithm of the density with the deviation integrated out (Laplace's method)
 * @param shown what it would show
 */
record DriftFit(
    double deviation, Evidence.Fit fit, double logEvidence, FaultyReadings.Shown shown) {
  private static final int STEPS = 14;
  private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;
  private static final double FAR = 2.5;

  /** A resistor keeps a tenth of its value. */
  private static final double LEAST = -0.9;

  /** How far a drifted part may be, one standard deviation; an assumption, no source. */
  static double usual(TolerancedPart part) {
    return switch (part.kind()) {
      case RESISTOR, CAPACITOR -> 0.3;
      case BASE_EMITTER_VOLTAGE -> 0.02;
      case BETA -> 0.7;
      case RAIL -> 0.1;
      case AMBIENT -> 20;
    };
  }

  static DriftFit of(Evidence evidence, FaultyReadings readings, int index) {
    TolerancedPart part = evidence.parts().get(index);
    double usual = usual(part);
    double low = Math.max(-FAR * usual, part.kind() == TolerancedPart.Kind.BETA ? -2 : LEAST);
    double high = FAR * usual;
    Search search = new Search(evidence, readings, part, usual);
    double inner = high - GOLDEN * (high - low);
    double outer = low + GOLDEN * (high - low);
    double ofInner = search.cost(inner);
    double ofOuter = search.cost(outer);
    for (int i = 0; i < STEPS && high - low > 1e-3 * usual; i++) {
      if (ofInner < ofOuter) {
        high = outer;
        outer = inner;
        ofOuter = ofInner;
        inner = high - GOLDEN * (high - low);
        ofInner = search.cost(inner);
      } else {
        low = inner;
        inner = outer;
        ofInner = ofOuter;
        outer = low + GOLDEN * (high - low);
        ofOuter = search.cost(outer);
      }
    }
    double best = (low + high) / 2;
    FaultyReadings.Shown shown = search.shown(best);
    Evidence.Fit fit = evidence.fit(shown.values());
    double[] slope = evidence.slope(index);
    double occam = Math.log(1 + usual * usual * evidence.product(slope, slope)) / 2;
    return new DriftFit(
        best, fit, fit.logDensity() - best * best / usual / usual / 2 - occam, shown);
  }

  private record Search(
      Evidence evidence, FaultyReadings readings, TolerancedPart part, double usual) {
    FaultyReadings.Shown shown(double deviation) {
      List<TolerancedPart> one = List.of(part);
      return readings.of(circuit -> TolerancedParts.build(circuit, one, new double[] {deviation}));
    }

    double cost(double deviation) {
      return -2 * evidence.fit(shown(deviation).values()).logDensity()
          + deviation * deviation / usual / usual;
    }
  }
}
