package loopwright.design;

import java.util.Map;
import java.util.Optional;

/**
 * What was really fitted and measured, by whom and when.
 *
 * @param who name of the person
 * @param when date and time, ISO 8601
 * @param serialNumbers by instrument or board
 * @param checksum SHA-256 of the prediction that the verdict was given on, hexadecimal
 */
public record BuildRecord(
    Optional<String> who,
    Optional<String> when,
    Map<String, String> serialNumbers,
    Optional<String> checksum) {
  /** Keeps its own copy of the map. */
  public BuildRecord {
    serialNumbers = Copies.ordered(serialNumbers);
  }
}
