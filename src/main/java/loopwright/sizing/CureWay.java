package loopwright.sizing;

import java.util.List;
import loopwright.design.Change;

/**
 * A way to cure an amplifier: which parts, and the values to try.
 *
 * @param kind its name
 * @param candidates each the changes of one trial, the gentlest first; empty where the way is not
 *     open
 * @param closed why it is not open; empty where it is
 */
record CureWay(String kind, List<List<Change>> candidates, String closed) {
  /** Keeps its own copy. */
  CureWay {
    candidates = List.copyOf(candidates);
  }

  static CureWay open(String kind, List<List<Change>> candidates) {
    return new CureWay(kind, candidates, "");
  }

  static CureWay closed(String kind, String why) {
    return new CureWay(kind, List.of(), why);
  }
}
