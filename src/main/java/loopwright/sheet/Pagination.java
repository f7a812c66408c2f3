package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;

/** Shares chunks out among pages. */
final class Pagination {
  private final List<List<Chunk>> pages = new ArrayList<>();
  private final double room;
  private double left;

  private Pagination(double firstRoom, double room) {
    this.room = room;
    this.left = firstRoom;
    pages.add(new ArrayList<>());
  }

  /**
   * The chunks of each page; a chunk is on one page with what it keeps, and a table that goes on
   * has its head again.
   *
   * @param firstRoom height that the first page has, points
   * @param room height that every other page has, points
   */
  static List<List<Chunk>> of(List<Chunk> chunks, double firstRoom, double room) {
    Pagination pagination = new Pagination(firstRoom, room);
    for (int i = 0; i < chunks.size(); i++) {
      pagination.place(chunks.get(i), together(chunks, i));
    }
    return pagination.pages;
  }

  private static double together(List<Chunk> chunks, int first) {
    double height = chunks.get(first).height();
    for (int i = first; chunks.get(i).keepsNext() && i + 1 < chunks.size(); i++) {
      height += chunks.get(i + 1).height();
    }
    return height;
  }

  private void place(Chunk chunk, double together) {
    boolean fresh = pages.get(pages.size() - 1).isEmpty();
    if (together > left && !(fresh && left == room)) {
      pages.add(new ArrayList<>());
      left = room;
      chunk.again().ifPresent(this::put);
    }
    put(chunk);
  }

  private void put(Chunk chunk) {
    pages.get(pages.size() - 1).add(chunk);
    left -= chunk.height();
  }
}
