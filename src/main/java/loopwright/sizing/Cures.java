package loopwright.sizing;

import java.util.List;

/**
 * What a search for cures found.
 *
 * @param cures the best first
 * @param cannot ways that do not lead there, and why
 * @param needed false when the design has the margin already
 */
public record Cures(List<Cure> cures, List<Cannot> cannot, boolean needed) {
  /**
   * A way that does not lead there.
   *
   * @param kind which
   * @param says why
   */
  public record Cannot(String kind, String says) {}

  /** Keeps its own copies. */
  public Cures {
    cures = List.copyOf(cures);
    cannot = List.copyOf(cannot);
  }
}
