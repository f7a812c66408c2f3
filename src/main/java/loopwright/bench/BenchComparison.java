package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.numeric.Cholesky;
import loopwright.predict.FigureValue;
import loopwright.task.Progress;

/** Compares the readings of a design's bench with its prediction. */
public final class BenchComparison {
  /** Coverage factor of a prediction's band. */
  private static final double FACTOR = 2;

  /**
   * No reading is believed closer than this share of its spread: first-order propagation is not,
   * and readings that repeat one another would else weigh by rounding.
   */
  private static final double LEAST_OWN = 1e-3;

  private final Design design;
  private final PredictedReadings predicted;
  private final List<MeasuredValue> measured;

  private BenchComparison(Design design, Progress progress) {
    this.design = design;
    this.predicted = PredictedReadings.of(design, progress);
    this.measured =
        design.bench().readings().stream()
            .map(reading -> MeasuredValue.of(design, reading))
            .toList();
  }

  /**
   * Compares.
   *
   * @param design a valid design, every part it names among its own
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public static Comparison of(Design design, Progress progress) {
    BenchComparison comparison = new BenchComparison(design, progress);
    List<ReadingVerdict> verdicts = new ArrayList<>();
    for (int i = 0; i < comparison.measured.size(); i++) {
      verdicts.add(comparison.verdict(i));
    }
    return new Comparison(
        verdicts,
        comparison.set(verdicts),
        ImpliedAmplifier.says(design, verdicts),
        Suspects.of(design, verdicts));
  }

  private ReadingVerdict verdict(int index) {
    Reading reading = design.bench().readings().get(index);
    MeasuredValue value = measured.get(index);
    FigureValue expected = predicted.nominal(index);
    OptionalDouble standard = predicted.standard(index);
    OptionalDouble expanded =
        standard.isPresent()
            ? OptionalDouble.of(FACTOR * standard.getAsDouble())
            : OptionalDouble.empty();
    double uncertainty = value.uncertainty().expanded();
    OptionalDouble en =
        expected.number().isPresent() && expanded.isPresent()
            ? normalised(
                value.value(), uncertainty, expected.number().getAsDouble(), expanded.getAsDouble())
            : OptionalDouble.empty();
    return new ReadingVerdict(
        reading,
        value.value(),
        uncertainty,
        expected,
        expanded,
        en,
        VerdictWords.of(reading, value, expected, expanded, en));
  }

  /**
   * E_n = (measured − predicted)/√(U_m² + U_p²) (ISO/IEC 17043).
   *
   * @return empty where nothing is uncertain and the two differ
   */
  static OptionalDouble normalised(
      double measured, double uncertainty, double predicted, double expanded) {
    double both = Math.hypot(uncertainty, expanded);
    if (measured == predicted) {
      return OptionalDouble.of(0);
    }
    return both > 0 ? OptionalDouble.of((measured - predicted) / both) : OptionalDouble.empty();
  }

  private SetVerdict set(List<ReadingVerdict> verdicts) {
    List<Integer> judged = new ArrayList<>();
    for (int i = 0; i < verdicts.size(); i++) {
      if (verdicts.get(i).en().isPresent() && spread(i) > 0) {
        judged.add(i);
      }
    }
    if (judged.isEmpty()) {
      return new SetVerdict(
          OptionalDouble.empty(), 0, OptionalDouble.empty(), "No reading can be judged.");
    }
    int count = judged.size();
    double[][] covariance = new double[count][count];
    double[] differences = new double[count];
    for (int row = 0; row < count; row++) {
      int i = judged.get(row);
      // Readings may differ by twelve decades in size; each is taken in units of its own spread.
      differences[row] =
          (measured.get(i).value() - predicted.nominal(i).number().orElseThrow()) / spread(i);
      for (int column = 0; column < count; column++) {
        int j = judged.get(column);
        double own = measured.get(i).uncertainty().standard();
        double sum = row == column ? square(own) + square(LEAST_OWN * spread(i)) : 0;
        for (int part = 0; part < predicted.parts().size(); part++) {
          sum += predicted.moves(i)[part] * predicted.moves(j)[part];
        }
        covariance[row][column] = sum / spread(i) / spread(j);
      }
    }
    return SetWords.of(chiSquared(covariance, differences), count);
  }

  private static OptionalDouble chiSquared(double[][] covariance, double[] differences) {
    try {
      return OptionalDouble.of(new Cholesky(covariance).quadraticForm(differences));
    } catch (ArithmeticException e) {
      return OptionalDouble.empty();
    }
  }

  private double spread(int reading) {
    return Math.hypot(
        measured.get(reading).uncertainty().standard(), predicted.standard(reading).orElse(0));
  }

  private static double square(double value) {
    return value * value;
  }
}
