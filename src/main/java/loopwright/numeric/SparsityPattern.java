package loopwright.numeric;

import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;

/**
 * The places of a square matrix that may differ from zero. Each has a slot: an index into the flat
 * array that holds the values. A pattern is fixed once built; values are refilled many times.
 */
public final class SparsityPattern {
  /**
   * More than any matrix has columns. Keys row × this + column have hashes that differ, those of
   * row and column in two halves of a word do not: all of a diagonal fall together.
   */
  private static final long MOST_COLUMNS = 1_000_003;

  private final int size;
  private final int[] rows;
  private final int[] columns;
  private final BitSet last;

  private SparsityPattern(int size, int[] rows, int[] columns, BitSet last) {
    this.size = size;
    this.rows = rows;
    this.columns = columns;
    this.last = last;
  }

  /** Number of rows, and of columns. */
  public int size() {
    return size;
  }

  /** Number of slots. */
  public int slots() {
    return rows.length;
  }

  /** Row of a slot. */
  public int row(int slot) {
    return rows[slot];
  }

  /** Column of a slot. */
  public int column(int slot) {
    return columns[slot];
  }

  /** Indices whose row and column are to be eliminated last; not to be changed. */
  BitSet last() {
    return last;
  }

  /** Whether another pattern has the same places in the same slots. */
  public boolean isSameAs(SparsityPattern other) {
    return this == other
        || (size == other.size
            && Arrays.equals(rows, other.rows)
            && Arrays.equals(columns, other.columns)
            && last.equals(other.last));
  }

  /** A number for each place, for maps. */
  static long key(int row, int column) {
    return row * MOST_COLUMNS + column;
  }

  /** Collects the places of a matrix and hands out their slots. */
  public static final class Builder {
    private final Map<Long, Integer> slots = new HashMap<>();
    private final BitSet last = new BitSet();

    /**
     * The slot of a place, made when it is new.
     *
     * @return the slot, or −1 when row or column is negative (ground has no row)
     */
    public int slot(int row, int column) {
      if (row < 0 || column < 0) {
        return -1;
      }
      return slots.computeIfAbsent(key(row, column), key -> slots.size());
    }

    /**
     * Says that row and column of an index are to be eliminated last in complex systems, where that
     * is safe: such rows are excited, and such unknowns read, far more often than others, and
     * {@link ComplexSystem#solveOne} then has little to do. Negative indices, ground, are ignored.
     */
    public void eliminateLast(int index) {
      if (index >= 0) {
        last.set(index);
      }
    }

    /** The pattern of a matrix of the given size. */
    public SparsityPattern build(int size) {
      int[] rows = new int[slots.size()];
      int[] columns = new int[slots.size()];
      slots.forEach(
          (place, slot) -> {
            rows[slot] = (int) (place / MOST_COLUMNS);
            columns[slot] = (int) (place % MOST_COLUMNS);
          });
      return new SparsityPattern(size, rows, columns, (BitSet) last.clone());
    }
  }
}
