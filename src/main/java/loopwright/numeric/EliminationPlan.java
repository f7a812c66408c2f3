package loopwright.numeric;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/**
 * The symbolic factorisation of a pattern in a given order: where every value of G and C goes, and
 * every update of the elimination as an index, so that a numeric factorisation is one straight pass
 * over flat arrays. The entries of pivot step k lie together: the pivot, then its row to the right,
 * then its column below. Immutable; shared by all systems of one family.
 */
final class EliminationPlan {
  /** Number of unknowns. */
  final int size;

  /** Number of entries of L and U together. */
  final int entries;

  /** Row of each pivot. */
  final int[] rows;

  /** Column of each pivot. */
  final int[] columns;

  /** Step at which each row is the pivot's. */
  final int[] rowStep;

  /** Step at which each column is the pivot's. */
  final int[] columnStep;

  /** Entry of each pivot; behind the last the number of entries. */
  final int[] start;

  /** Entry behind the last of the pivot's row. */
  final int[] startBelow;

  /** Original column of entries to the right, original row of entries below. */
  final int[] line;

  /** Entry that each update goes to, in the order of the elimination. */
  final int[] target;

  /** Entry of each slot of the pattern. */
  final int[] place;

  /** Sign of the row and column permutations together. */
  final int permutationSign;

  EliminationPlan(SparsityPattern pattern, EliminationOrder order) {
    size = pattern.size();
    rows = order.rows;
    columns = order.columns;
    start = new int[size + 1];
    startBelow = new int[size];
    rowStep = inverse(rows);
    columnStep = inverse(columns);
    Map<Long, Integer> at = new HashMap<>();
    int next = 0;
    int updates = 0;
    for (int k = 0; k < size; k++) {
      start[k] = next;
      at.put(SparsityPattern.key(rows[k], columns[k]), next++);
      for (int j : byStep(order.right[k], columnStep, columns)) {
        at.put(SparsityPattern.key(rows[k], j), next++);
      }
      startBelow[k] = next;
      for (int i : byStep(order.below[k], rowStep, rows)) {
        at.put(SparsityPattern.key(i, columns[k]), next++);
      }
      updates += order.right[k].length * order.below[k].length;
    }
    start[size] = next;
    entries = next;
    line = new int[entries];
    target = new int[updates];
    int update = 0;
    for (int k = 0; k < size; k++) {
      int[] right = byStep(order.right[k], columnStep, columns);
      int[] below = byStep(order.below[k], rowStep, rows);
      line[start[k]] = columns[k];
      System.arraycopy(right, 0, line, start[k] + 1, right.length);
      System.arraycopy(below, 0, line, startBelow[k], below.length);
      for (int i : below) {
        for (int j : right) {
          target[update++] = at.get(SparsityPattern.key(i, j));
        }
      }
    }
    place = new int[pattern.slots()];
    for (int slot = 0; slot < place.length; slot++) {
      place[slot] = at.get(SparsityPattern.key(pattern.row(slot), pattern.column(slot)));
    }
    permutationSign = Permutation.sign(rows, size) * Permutation.sign(columns, size);
  }

  /** Multiplications with additions in one factorisation and one solution. */
  int multiplyAdds() {
    return target.length + entries - size;
  }

  private static int[] inverse(int[] order) {
    int[] inverse = new int[order.length];
    for (int k = 0; k < order.length; k++) {
      inverse[order[k]] = k;
    }
    return inverse;
  }

  private static int[] byStep(int[] lines, int[] step, int[] order) {
    return Arrays.stream(lines).map(line -> step[line]).sorted().map(at -> order[at]).toArray();
  }
}
