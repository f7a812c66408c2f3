package loopwright.numeric;

import java.util.Arrays;
import java.util.BitSet;

/**
 * Chooses the pivots of a sparse matrix: at each step the place whose elimination touches least
 * (Markowitz, Management Science 3, 1957, 255–269: least (r − 1)(c − 1), then least fill), among
 * those that are at least a tenth of the largest entry of their column, and that are not what
 * rounding left of larger numbers. Rows and columns that are to be eliminated last wait as long as
 * there is any other.
 *
 * <p>Works on dense copies: it is done once for a pattern, not once for a matrix.
 */
final class EliminationOrder {
  private static final double THRESHOLD = 0.1;

  /** An entry below this share of what was added up in it is rounding. */
  private static final double ROUNDING = 1e-15;

  private final int size;
  private final double[] re;
  private final double[] im;
  private final double[] bulk;
  private final long[][] rowBits;
  private final long[][] columnBits;
  private final boolean[] columnDone;
  private final int words;

  /** Row of each pivot. */
  final int[] rows;

  /** Column of each pivot. */
  final int[] columns;

  /** Rows below each pivot that have an entry in its column. */
  final int[][] below;

  /** Columns right of each pivot in which its row has an entry. */
  final int[][] right;

  private EliminationOrder(int size) {
    this.size = size;
    this.words = (size + 63) / 64;
    this.re = new double[size * size];
    this.im = new double[size * size];
    this.bulk = new double[size * size];
    this.rowBits = new long[size][words];
    this.columnBits = new long[size][words];
    this.columnDone = new boolean[size];
    this.rows = new int[size];
    this.columns = new int[size];
    this.below = new int[size][];
    this.right = new int[size][];
  }

  /**
   * The order for a matrix.
   *
   * @param re real parts by slot
   * @param im imaginary parts by slot
   * @param someLast whether the pattern's wish is heeded of what comes last
   * @return null when there is no safe pivot at some step
   */
  static EliminationOrder of(SparsityPattern pattern, double[] re, double[] im, boolean someLast) {
    EliminationOrder order = new EliminationOrder(pattern.size());
    for (int slot = 0; slot < pattern.slots(); slot++) {
      order.set(pattern.row(slot), pattern.column(slot), re[slot], im[slot]);
    }
    BitSet last = someLast ? pattern.last() : new BitSet();
    for (int step = 0; step < order.size; step++) {
      if (!order.choose(step, last)) {
        return null;
      }
      order.eliminate(step);
    }
    return order;
  }

  private void set(int row, int column, double real, double imaginary) {
    int at = row * size + column;
    re[at] += real;
    im[at] += imaginary;
    bulk[at] = magnitude(at);
    mark(row, column);
  }

  private void mark(int row, int column) {
    rowBits[row][column >> 6] |= 1L << column;
    columnBits[column][row >> 6] |= 1L << row;
  }

  private double magnitude(int at) {
    return Math.abs(re[at]) + Math.abs(im[at]);
  }

  private boolean choose(int step, BitSet last) {
    long least = Long.MAX_VALUE;
    double firmest = 0;
    int bestRow = -1;
    int bestColumn = -1;
    for (int column = 0; column < size; column++) {
      if (columnDone[column]) {
        continue;
      }
      int[] candidates = members(columnBits[column]);
      double largest = 0;
      for (int row : candidates) {
        largest = Math.max(largest, magnitude(row * size + column));
      }
      for (int row : candidates) {
        double value = magnitude(row * size + column);
        if (!(value >= THRESHOLD * largest) || !(value > ROUNDING * bulk[row * size + column])) {
          continue;
        }
        long cost = (long) (count(rowBits[row]) - 1) * (candidates.length - 1);
        if (last.get(row) || last.get(column)) {
          cost += (long) size * size;
        }
        if (cost > least >> 20) {
          continue;
        }
        long key = (cost << 20) + Math.min(fill(row, candidates), (1 << 20) - 1);
        double firmness = value / largest;
        if (key < least || key == least && firmness > firmest) {
          least = key;
          firmest = firmness;
          bestRow = row;
          bestColumn = column;
        }
      }
    }
    rows[step] = bestRow;
    columns[step] = bestColumn;
    return bestRow >= 0;
  }

  /** How many places would become non-zero by eliminating with a pivot row. */
  private int fill(int pivotRow, int[] candidates) {
    int fill = 0;
    for (int row : candidates) {
      if (row != pivotRow) {
        for (int word = 0; word < words; word++) {
          fill += Long.bitCount(rowBits[pivotRow][word] & ~rowBits[row][word]);
        }
      }
    }
    return fill;
  }

  private void eliminate(int step) {
    int row = rows[step];
    int column = columns[step];
    columnDone[column] = true;
    columnBits[column][row >> 6] &= ~(1L << row);
    rowBits[row][column >> 6] &= ~(1L << column);
    int[] lower = members(columnBits[column]);
    int[] upper = members(rowBits[row]);
    below[step] = lower;
    right[step] = upper;
    int pivot = row * size + column;
    double square = re[pivot] * re[pivot] + im[pivot] * im[pivot];
    double inverseRe = re[pivot] / square;
    double inverseIm = -im[pivot] / square;
    for (int i : lower) {
      int multiplied = i * size + column;
      double lr = re[multiplied] * inverseRe - im[multiplied] * inverseIm;
      double li = re[multiplied] * inverseIm + im[multiplied] * inverseRe;
      for (int j : upper) {
        int from = row * size + j;
        int to = i * size + j;
        double tr = lr * re[from] - li * im[from];
        double ti = lr * im[from] + li * re[from];
        re[to] -= tr;
        im[to] -= ti;
        bulk[to] += Math.abs(tr) + Math.abs(ti);
        mark(i, j);
      }
      rowBits[i][column >> 6] &= ~(1L << column);
    }
    for (int j : upper) {
      columnBits[j][row >> 6] &= ~(1L << row);
    }
    Arrays.fill(columnBits[column], 0);
  }

  private static int count(long[] bits) {
    int count = 0;
    for (long word : bits) {
      count += Long.bitCount(word);
    }
    return count;
  }

  private static int[] members(long[] bits) {
    int[] members = new int[count(bits)];
    int next = 0;
    for (int word = 0; word < bits.length; word++) {
      for (long rest = bits[word]; rest != 0; rest &= rest - 1) {
        members[next++] = (word << 6) + Long.numberOfTrailingZeros(rest);
      }
    }
    return members;
  }
}
