package loopwright.design;

import java.util.Optional;
import loopwright.part.Polarity;
import loopwright.part.TransistorMeasured;

/**
 * A transistor or diode of the amplifier by its role.
 *
 * @param role for example {@code pair.q1}
 * @param part name of its part record
 * @param partPath the path at which that name stands, its own among the devices or the stage's
 * @param diode whether a diode stands here, else a transistor
 * @param polarity what a transistor must be here; empty for a diode, or while the pair's own
 *     polarity is not known
 * @param measured tester readings of this very device; empty where only the part record speaks
 */
public record DeviceRole(
    String role,
    String part,
    String partPath,
    boolean diode,
    Optional<Polarity> polarity,
    Optional<TransistorMeasured> measured) {}
