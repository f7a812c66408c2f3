package loopwright.sheet;

import java.awt.Graphics2D;
import java.util.List;
import java.util.function.Consumer;

/** What a sheet is made of; paper and screen lay the same pieces out in their own way. */
sealed interface Piece {
  /** The beginning of a section. */
  record Heading(String text) implements Piece {}

  /** The beginning of a part of a section. */
  record Subheading(String text) implements Piece {}

  /** A paragraph. */
  record Words(String text) implements Piece {}

  /** Sentences that are done one after the other, numbered. */
  record Steps(List<String> steps) implements Piece {
    /** Keeps its own copies. */
    public Steps {
      steps = List.copyOf(steps);
    }
  }

  /** Sentences of equal rank. */
  record Points(List<String> points) implements Piece {
    /** Keeps its own copies. */
    public Points {
      points = List.copyOf(points);
    }
  }

  /**
   * A table.
   *
   * @param says what it shows
   * @param columns what stands in each column
   * @param rows cells by row, one a column
   */
  record Grid(String says, List<Column> columns, List<List<String>> rows) implements Piece {
    /** Keeps its own copies. */
    public Grid {
      columns = List.copyOf(columns);
      rows = rows.stream().map(List::copyOf).toList();
    }
  }

  /** Pictures in a row, which goes on below where it is full. */
  record Pictures(List<Picture> pictures) implements Piece {
    /** Keeps its own copies. */
    public Pictures {
      pictures = List.copyOf(pictures);
    }
  }

  /**
   * Pieces side by side where there is room.
   *
   * @param left pieces below one another
   * @param share of the width for them, 0 to 1
   * @param right pieces below one another
   */
  record Beside(List<Piece> left, double share, List<Piece> right) implements Piece {
    /** Keeps its own copies. */
    public Beside {
      left = List.copyOf(left);
      right = List.copyOf(right);
    }
  }

  /** How a column of a table is set. */
  enum Fit {
    /** As wide as its longest cell. */
    TEXT,
    /** As wide as its longest cell, set to the right. */
    NUMBER,
    /** Shares the width that the others leave; long text goes on below. */
    WRAPPED,
    /** Empty, to be written in. */
    BOX
  }

  /** A column of a table. */
  record Column(String title, Fit fit) {}

  /**
   * A drawing.
   *
   * @param says what it shows, for someone who cannot see it
   * @param width at its natural size, points
   * @param height at its natural size, points
   * @param painter draws it in points from its upper left corner
   */
  record Picture(String says, double width, double height, Consumer<Graphics2D> painter) {}
}
