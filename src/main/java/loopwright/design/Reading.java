package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * One value that a person read at the bench.
 *
 * @param hookup name of the hookup that was built; absent for a loose part
 * @param quantity what was read: a quantity of the bench or the key of a figure
 * @param value in the unit of that quantity
 * @param node node name, where it applies
 * @param device device role, where it applies
 * @param part part path, where it applies
 * @param rail {@code positive} or {@code negative}, where it applies
 * @param frequency Hz
 * @param amplitude peak, V
 * @param instrument name of the instrument
 * @param uncertainty expanded uncertainty, in the unit of the value
 * @param expression how an alternating value is expressed
 * @param note free text
 * @param when date and time, ISO 8601
 */
public record Reading(
    Optional<String> hookup,
    String quantity,
    Quantity value,
    Optional<String> node,
    Optional<String> device,
    Optional<String> part,
    Optional<Rail> rail,
    @Measure(unit = Unit.HERTZ, range = Range.POSITIVE) Optional<Quantity> frequency,
    @Measure(unit = Unit.VOLT, range = Range.POSITIVE) Optional<Quantity> amplitude,
    Optional<String> instrument,
    Optional<Quantity> uncertainty,
    Optional<Expression> expression,
    Optional<String> note,
    Optional<String> when) {
  /** One of the two rails. */
  public enum Rail {
    POSITIVE,
    NEGATIVE
  }

  /** How an alternating value is expressed. */
  public enum Expression {
    PEAK,
    PEAK_TO_PEAK,
    RMS
  }
}
