package loopwright.sheet;

import java.util.List;
import java.util.Optional;

/**
 * Something on paper that stays together.
 *
 * @param height points
 * @param keepsNext whether the next one belongs on the same page
 * @param again what stands above it where it begins a page: the head of its table
 * @param ink draws it
 */
record Chunk(double height, boolean keepsNext, Optional<Chunk> again, Ink ink) {
  /** Draws something with its upper left corner at a place, in points. */
  @FunctionalInterface
  interface Ink {
    void draw(PdfPage page, double x, double y);
  }

  static Chunk of(double height, Ink ink) {
    return new Chunk(height, false, Optional.empty(), ink);
  }

  static Chunk space(double height) {
    return of(height, (page, x, y) -> {});
  }

  Chunk keepingNext() {
    return new Chunk(height, true, again, ink);
  }

  Chunk under(Chunk head) {
    return new Chunk(height, keepsNext, Optional.of(head), ink);
  }

  static double height(List<Chunk> chunks) {
    return chunks.stream().mapToDouble(Chunk::height).sum();
  }

  /** All of them below one another as one. */
  static void draw(List<Chunk> chunks, PdfPage page, double x, double y) {
    double at = y;
    for (Chunk chunk : chunks) {
      chunk.ink().draw(page, x, at);
      at += chunk.height();
    }
  }
}
