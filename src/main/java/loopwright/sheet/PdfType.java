package loopwright.sheet;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/** The typeface in one PDF file: measures text, and keeps to the signs that it has. */
final class PdfType {
  private static final int UNKNOWN = '\u25A1';

  /** Where the directory of a TrueType file begins, and the length of its entries, bytes. */
  private static final int DIRECTORY = 12;

  private static final int ENTRY = 16;

  private final PDFont regular;
  private final PDFont bold;
  private final Map<Integer, Boolean> known = new HashMap<>();

  PdfType(PDDocument document) {
    this.regular = load(document, false);
    this.bold = load(document, true);
  }

  private static PDFont load(PDDocument document, boolean bold) {
    try (InputStream stream = SheetFonts.file(bold)) {
      byte[] font = stream.readAllBytes();
      hideLigatures(font);
      return PDType0Font.load(document, new ByteArrayInputStream(font), true);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * Gives the table of glyph substitutions another name, so that "fi" stays two letters, which
   * every reader finds when it is searched for.
   */
  private static void hideLigatures(byte[] font) {
    int tables = font[4] << 8 | font[5];
    for (int entry = DIRECTORY; entry < DIRECTORY + tables * ENTRY; entry += ENTRY) {
      if (new String(font, entry, 4, StandardCharsets.US_ASCII).equals("GSUB")) {
        font[entry] = 'x';
      }
    }
  }

  PDFont font(boolean isBold) {
    return isBold ? bold : regular;
  }

  /**
   * The text with an empty box for each sign that the typeface lacks, and for those that would turn
   * the direction of what follows.
   */
  String printable(String text) {
    StringBuilder printable = new StringBuilder();
    text.codePoints()
        .map(sign -> Character.isWhitespace(sign) || Character.isSpaceChar(sign) ? ' ' : sign)
        .filter(sign -> !Character.isISOControl(sign))
        .map(sign -> Character.getType(sign) != Character.FORMAT && has(sign) ? sign : UNKNOWN)
        .forEach(printable::appendCodePoint);
    return printable.toString();
  }

  private boolean has(int sign) {
    return known.computeIfAbsent(sign, this::encodes);
  }

  private boolean encodes(int sign) {
    try {
      regular.encode(Character.toString(sign));
      bold.encode(Character.toString(sign));
      return true;
    } catch (IllegalArgumentException e) {
      return false;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Width of a text in points. */
  double width(String text, double size, boolean isBold) {
    try {
      return font(isBold).getStringWidth(printable(text)) / 1000 * size;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The text in lines that are no wider; a word that is wider by itself is broken. */
  List<String> lines(String text, double size, boolean isBold, double width) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : printable(text).strip().split(" +")) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (width(longer, size, isBold) <= width) {
        line = longer;
        continue;
      }
      if (!line.isEmpty()) {
        lines.add(line);
      }
      line = word;
      while (width(line, size, isBold) > width && line.codePointCount(0, line.length()) > 1) {
        int fits = fitting(line, size, isBold, width);
        lines.add(line.substring(0, fits));
        line = line.substring(fits);
      }
    }
    lines.add(line);
    return lines;
  }

  /** At most so many lines; where there would be more, the last ends in an ellipsis. */
  List<String> fewLines(String text, double size, boolean isBold, double width, int most) {
    List<String> lines = lines(text, size, isBold, width);
    if (lines.size() <= most) {
      return lines;
    }
    List<String> few = new ArrayList<>(lines.subList(0, most));
    String last = few.get(most - 1);
    String ellipsis = "\u2026";
    few.set(
        most - 1,
        last.substring(0, fitting(last, size, isBold, width - width(ellipsis, size, isBold)))
            + ellipsis);
    return few;
  }

  private int fitting(String word, double size, boolean isBold, double width) {
    int end = word.offsetByCodePoints(0, 1);
    while (end < word.length()) {
      int next = word.offsetByCodePoints(end, 1);
      if (width(word.substring(0, next), size, isBold) > width) {
        break;
      }
      end = next;
    }
    return end;
  }
}
