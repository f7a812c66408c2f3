package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What a probe or meter lays between a node and ground. */
public record Probe(
    String node,
    @Measure(unit = Unit.OHM, range = Range.POSITIVE) Optional<PartValue> resistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) Optional<PartValue> capacitance) {}
