package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;

/**
 * What this build must meet: a figure by its key, or the voltage of a node. Values are in the
 * figure's unit, or volts.
 */
public record Limit(
    String hookup,
    Optional<String> figure,
    Optional<String> node,
    Optional<Quantity> minimum,
    Optional<Quantity> maximum,
    @Otherwise("0") Quantity guard) {}
