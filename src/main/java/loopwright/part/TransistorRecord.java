package loopwright.part;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Kind;

/**
 * The record of a bipolar transistor type.
 *
 * @param kind npn or pnp
 * @param model parameters of the device equations; each one given wins over the datasheet
 * @param datasheet figures as printed
 * @param measured figures of the part in hand; they win over both
 * @param limits what the part stands
 * @param source where the figures come from
 * @param pins pin order, flat face forward, left to right; empty when unknown
 */
@Kind({"npn", "pnp"})
public record TransistorRecord(
    Polarity kind,
    Optional<TransistorModel> model,
    Optional<TransistorDatasheet> datasheet,
    Optional<TransistorMeasured> measured,
    Optional<TransistorLimits> limits,
    Optional<String> source,
    List<Pin> pins)
    implements PartRecord {
  /** Keeps its own copy of the pins. */
  public TransistorRecord {
    pins = List.copyOf(pins);
  }
}
