package loopwright.sheet;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** Paper that a sheet is printed on, upright. */
public enum Paper {
  /** ISO 216: 210 mm by 297 mm. */
  A4("A4", 210 / 25.4 * 72, 297 / 25.4 * 72),
  /** ANSI/ASME Y14.1 size A: 8.5 in by 11 in. */
  LETTER("Letter", 8.5 * 72, 11 * 72);

  private final String says;
  private final double width;
  private final double height;

  Paper(String says, double width, double height) {
    this.says = says;
    this.width = width;
    this.height = height;
  }

  /** What people call it, and CSS does. */
  public String says() {
    return says;
  }

  /** Width in points of 1/72 in. */
  public double width() {
    return width;
  }

  /** Height in points of 1/72 in. */
  public double height() {
    return height;
  }

  /** The paper of that name, in capital or small letters. */
  public static Optional<Paper> find(String name) {
    return Arrays.stream(values())
        .filter(paper -> paper.says.toLowerCase(Locale.ROOT).equals(name.toLowerCase(Locale.ROOT)))
        .findFirst();
  }
}
