package loopwright.bench;

import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Reading;
import loopwright.predict.FigureValue;

/**
 * A reading beside its prediction.
 *
 * @param reading what was read
 * @param measured its value in the quantity's own unit and meaning
 * @param measuredUncertainty expanded, for 95 %
 * @param predicted what it should show, or why nothing can be said
 * @param predictedUncertainty expanded, for 95 %: what the tolerances allow; empty where it is not
 *     known
 * @param en the difference over the root of the sum of squares of both expanded uncertainties
 *     (ISO/IEC 17043); empty where it cannot be formed
 * @param says the verdict in words
 */
public record ReadingVerdict(
    Reading reading,
    double measured,
    double measuredUncertainty,
    FigureValue predicted,
    OptionalDouble predictedUncertainty,
    OptionalDouble en,
    String says) {
  /** Lower end of the prediction's band. */
  public OptionalDouble predictedLow() {
    return end(-1);
  }

  /** Upper end of the prediction's band. */
  public OptionalDouble predictedHigh() {
    return end(1);
  }

  /** Whether |E_n| ≤ 1; empty where it cannot be formed. */
  public Optional<Boolean> agrees() {
    return en.isPresent() ? Optional.of(Math.abs(en.getAsDouble()) <= 1) : Optional.empty();
  }

  private OptionalDouble end(int sign) {
    return predicted.number().isPresent() && predictedUncertainty.isPresent()
        ? OptionalDouble.of(
            predicted.number().getAsDouble() + sign * predictedUncertainty.getAsDouble())
        : OptionalDouble.empty();
  }
}
