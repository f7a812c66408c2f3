package loopwright.sheet;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The typeface of paper: one that has the signs of the trade, from the program's own files. */
public final class SheetFonts {
  private static final String REGULAR_FILE = "DejaVuSansCondensed.ttf";
  private static final String BOLD_FILE = "DejaVuSansCondensed-Bold.ttf";

  /** The upright face for drawings, of size 1. */
  public static final Font REGULAR = load(false);

  /** The bold face for drawings, of size 1. */
  public static final Font BOLD = load(true);

  private SheetFonts() {}

  /** The file of the upright face or of the bold one. */
  static InputStream file(boolean bold) {
    return SheetFonts.class.getResourceAsStream(bold ? BOLD_FILE : REGULAR_FILE);
  }

  private static Font load(boolean bold) {
    try (InputStream stream = file(bold)) {
      return Font.createFont(Font.TRUETYPE_FONT, stream);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (FontFormatException e) {
      throw new IllegalStateException("the program's own typeface cannot be read", e);
    }
  }
}
