package loopwright.design;

import java.util.Optional;
import loopwright.part.TransistorMeasured;

/** A device whose part, or whose tester readings, differ from its twin's. */
public record DeviceChoice(Optional<String> part, Optional<TransistorMeasured> measured) {}
