package loopwright.part;

import java.util.Optional;

/** What is known of a transistor or diode. */
public sealed interface PartRecord permits TransistorRecord, DiodeRecord {
  /** Where the figures come from, for a person to read. */
  Optional<String> source();
}
