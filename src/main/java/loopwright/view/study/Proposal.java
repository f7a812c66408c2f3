package loopwright.view.study;

import java.util.List;
import loopwright.design.Change;

/**
 * One row of a study: what it would give, and what would have to be changed.
 *
 * @param cells as many as there are columns
 * @param says in words
 * @param changes what makes it of the design; empty where there is nothing to apply
 */
record Proposal(List<String> cells, String says, List<Change> changes) {
  /** Keeps its own copies. */
  Proposal {
    cells = List.copyOf(cells);
    changes = List.copyOf(changes);
  }
}
