package loopwright.part;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Kind;

/**
 * The record of a diode type.
 *
 * @param model parameters of the device equations; each one given wins over the datasheet
 * @param datasheet figures as printed
 * @param limits what the part stands
 * @param source where the figures come from
 * @param pins pin order; empty when unknown
 */
@Kind("diode")
public record DiodeRecord(
    Optional<DiodeModel> model,
    Optional<DiodeDatasheet> datasheet,
    Optional<DiodeLimits> limits,
    Optional<String> source,
    List<Pin> pins)
    implements PartRecord {
  /** Keeps its own copy of the pins. */
  public DiodeRecord {
    pins = List.copyOf(pins);
  }
}
