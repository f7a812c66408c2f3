package loopwright.view.path;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Combinations in which every two choices of different factors meet. */
final class Pairwise {
  private record Pair(int factor, int choice, int otherFactor, int otherChoice) {}

  private final List<Integer> sizes;
  private final Set<Pair> open = new HashSet<>();

  private Pairwise(List<Integer> sizes) {
    this.sizes = sizes;
    for (int a = 0; a < sizes.size(); a++) {
      for (int b = a + 1; b < sizes.size(); b++) {
        for (int i = 0; i < sizes.get(a); i++) {
          for (int j = 0; j < sizes.get(b); j++) {
            open.add(new Pair(a, i, b, j));
          }
        }
      }
    }
  }

  /**
   * Rows of one choice for each factor.
   *
   * @param sizes how many choices each factor has
   */
  static List<int[]> rows(List<Integer> sizes) {
    Pairwise pairs = new Pairwise(sizes);
    List<int[]> rows = new ArrayList<>();
    while (!pairs.open.isEmpty()) {
      rows.add(pairs.next());
    }
    return rows;
  }

  /** A row that begins with a pair still open and then takes what closes most. */
  private int[] next() {
    int[] row = new int[sizes.size()];
    Arrays.fill(row, -1);
    Pair first = open.iterator().next();
    row[first.factor()] = first.choice();
    row[first.otherFactor()] = first.otherChoice();
    for (int factor = 0; factor < row.length; factor++) {
      if (row[factor] < 0) {
        row[factor] = best(row, factor);
      }
    }
    open.removeAll(pairs(row));
    return row;
  }

  private int best(int[] row, int factor) {
    int best = 0;
    int most = -1;
    for (int choice = 0; choice < sizes.get(factor); choice++) {
      row[factor] = choice;
      int closed = 0;
      for (Pair pair : pairs(row)) {
        closed += open.contains(pair) ? 1 : 0;
      }
      if (closed > most) {
        most = closed;
        best = choice;
      }
    }
    row[factor] = -1;
    return best;
  }

  private static List<Pair> pairs(int[] row) {
    List<Pair> pairs = new ArrayList<>();
    for (int a = 0; a < row.length; a++) {
      for (int b = a + 1; b < row.length; b++) {
        if (row[a] >= 0 && row[b] >= 0) {
          pairs.add(new Pair(a, row[a], b, row[b]));
        }
      }
    }
    return pairs;
  }
}
