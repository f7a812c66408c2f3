package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.numeric.Cholesky;
import loopwright.predict.Catalogue;
import loopwright.predict.CostClass;
import loopwright.predict.Figure;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.quantity.Unit;

/**
 * The readings that can be judged, with their covariance, and how well a set of values explains
 * them. Each reading counts in units of its own spread.
 */
final class Evidence {
  /** What a fault changes is predicted to this share of the change; an assumption, no source. */
  private static final double OF_CHANGE = 0.01;

  /** Beyond what is predicted a reading may be anywhere within this many times its value. */
  private static final double ANYWHERE = 10;

  private static final Set<String> TOO_LONG =
      Set.of(
          "worstPhaseMargin",
          "worstGrowth",
          "oscillationFrequency",
          "clipHigh",
          "clipLow",
          "hottestJunction",
          "shortCircuitCurrent",
          "offsetDrift",
          "inputNoise",
          "outputNoise");

  /** Keeps readings that repeat one another from making the covariance singular. */
  private static final double TINY = 1e-9;

  private final Design design;
  private final PredictedReadings predicted;
  private final List<Integer> judged = new ArrayList<>();
  private final double[] measured;
  private final double[] nominal;
  private final double[] spread;
  private final double[][] covariance;

  Evidence(Design design, PredictedReadings predicted) {
    this.design = design;
    this.predicted = predicted;
    List<Reading> readings = design.bench().readings();
    List<MeasuredValue> values =
        readings.stream().map(reading -> MeasuredValue.of(design, reading)).toList();
    for (int i = 0; i < readings.size(); i++) {
      boolean isKnown = predicted.standard(i).isPresent();
      boolean isUsed = isKnown && both(values.get(i), i) > 0;
      if (isUsed && readings.get(i).hookup().isPresent() && isQuick(readings.get(i))) {
        judged.add(i);
      }
    }
    int count = judged.size();
    measured = new double[count];
    nominal = new double[count];
    spread = new double[count];
    covariance = new double[count][count];
    for (int row = 0; row < count; row++) {
      int i = judged.get(row);
      measured[row] = values.get(i).value();
      nominal[row] = predicted.nominal(i).number().orElseThrow();
      spread[row] = both(values.get(i), i);
    }
    for (int row = 0; row < count; row++) {
      for (int column = 0; column < count; column++) {
        double sum =
            row == column ? Math.pow(values.get(judged.get(row)).uncertainty().standard(), 2) : 0;
        for (int part = 0; part < predicted.parts().size(); part++) {
          sum += moves(row)[part] * moves(column)[part];
        }
        covariance[row][column] = sum / spread[row] / spread[column];
      }
    }
  }

  /**
   * Whether hundreds of faults can be solved for it: figures of the whole swing, of drift and of
   * noise take too long.
   */
  private static boolean isQuick(Reading reading) {
    return !TOO_LONG.contains(reading.quantity())
        && Catalogue.find(reading.quantity())
            .map(Figure::cost)
            .filter(cost -> cost == CostClass.TIME)
            .isEmpty();
  }

  private double both(MeasuredValue value, int reading) {
    return Math.hypot(value.uncertainty().standard(), predicted.standard(reading).orElse(0));
  }

  private double[] moves(int row) {
    return predicted.moves(judged.get(row));
  }

  /** The design's first hookup. */
  HookupFigures first() {
    return predicted.first();
  }

  /** The circuits in which builds that differ little are predicted. */
  List<ReadingGroup> light() {
    return predicted.light();
  }

  /** Number of readings that are judged. */
  int count() {
    return judged.size();
  }

  /** Indices of these readings on the bench. */
  List<Integer> judged() {
    return judged;
  }

  /** What the design predicts for them. */
  double[] nominal() {
    return nominal;
  }

  /** What spreads. */
  List<TolerancedPart> parts() {
    return predicted.parts();
  }

  /** Measured less nominal. */
  double[] residual() {
    double[] residual = new double[count()];
    for (int row = 0; row < residual.length; row++) {
      residual[row] = measured[row] - nominal[row];
    }
    return residual;
  }

  /** How the readings move with a part, per unit of its deviation. */
  double[] slope(int part) {
    double[] slope = new double[count()];
    double standard = predicted.parts().get(part).standardUncertainty();
    for (int row = 0; row < slope.length; row++) {
      slope[row] = standard == 0 ? 0 : moves(row)[part] / standard;
    }
    return slope;
  }

  /**
   * How well predicted values explain the readings.
   *
   * @param misfit rᵀ C⁻¹ r
   * @param logDensity natural logarithm of the probability density of these readings
   */
  record Fit(double misfit, double logDensity) {
    static final Fit IMPOSSIBLE = new Fit(Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY);
  }

  /** Weighs values of the judged readings; NaN among them explains nothing. */
  Fit fit(double[] values) {
    double[] differences = new double[count()];
    double[][] wider = new double[count()][];
    for (int row = 0; row < count(); row++) {
      if (!Double.isFinite(values[row])) {
        return Fit.IMPOSSIBLE;
      }
      differences[row] = (measured[row] - values[row]) / spread[row];
      double change = OF_CHANGE * (values[row] - nominal[row]) / spread[row];
      wider[row] = covariance[row].clone();
      wider[row][row] += change * change + TINY;
    }
    Cholesky cholesky = new Cholesky(wider);
    double misfit = cholesky.quadraticForm(differences);
    return new Fit(misfit, -0.5 * (misfit + cholesky.logDeterminant()) + scale());
  }

  /**
   * The most that {@link #fit} can come to when values that are not known yet turn out as well as
   * they can. The misfit of some of the readings is never more than that of all, and what a fault
   * changes never makes the covariance less.
   *
   * @param values NaN where not known
   */
  Fit atMost(double[] values) {
    int[] known = IntStream.range(0, count()).filter(row -> Double.isFinite(values[row])).toArray();
    double[] differences = new double[known.length];
    double[][] part = new double[known.length][known.length];
    for (int i = 0; i < known.length; i++) {
      int row = known[i];
      differences[i] = (measured[row] - values[row]) / spread[row];
      for (int j = 0; j < known.length; j++) {
        part[i][j] = covariance[row][known[j]];
      }
      double change = OF_CHANGE * (values[row] - nominal[row]) / spread[row];
      part[i][i] += change * change + TINY;
    }
    double misfit = known.length == 0 ? 0 : new Cholesky(part).quadraticForm(differences);
    return new Fit(misfit, -0.5 * (misfit + cholesky().logDeterminant()) + scale());
  }

  /** aᵀ C⁻¹ b for two changes of the readings. */
  double product(double[] one, double[] other) {
    Cholesky cholesky = cholesky();
    double[] a = cholesky.whiten(scaled(one));
    double[] b = cholesky.whiten(scaled(other));
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  /** Squared distance of two sets of values in units of their uncertainty. */
  double distance(double[] one, double[] other) {
    double[] difference = new double[one.length];
    for (int i = 0; i < one.length; i++) {
      difference[i] = one[i] - other[i];
      if (!Double.isFinite(difference[i])) {
        return Double.POSITIVE_INFINITY;
      }
    }
    return product(difference, difference);
  }

  /** Density of readings that may be anywhere. */
  double logDensityAnywhere() {
    double sum = 0;
    double rails = design.rails().positive().value() - design.rails().negative().value();
    for (int row = 0; row < count(); row++) {
      Reading reading = design.bench().readings().get(judged.get(row));
      double range =
          ReadingUnit.of(reading) == Unit.VOLT
              ? rails
              : ANYWHERE * Math.max(Math.abs(nominal[row]), spread[row]);
      sum -= Math.log(Math.max(range, spread[row]));
    }
    return sum;
  }

  private Cholesky cholesky() {
    double[][] firm = new double[count()][];
    for (int row = 0; row < count(); row++) {
      firm[row] = covariance[row].clone();
      firm[row][row] += TINY;
    }
    return new Cholesky(firm);
  }

  private double[] scaled(double[] vector) {
    double[] scaled = new double[vector.length];
    for (int i = 0; i < vector.length; i++) {
      scaled[i] = vector[i] / spread[i];
    }
    return scaled;
  }

  private double scale() {
    double sum = -count() / 2.0 * Math.log(2 * Math.PI);
    for (double each : spread) {
      sum -= Math.log(each);
    }
    return sum;
  }
}
