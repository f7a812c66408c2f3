package loopwright.sheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Base64;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TTFSubsetter;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/** The typeface cut down to the signs of one document, to be carried inside it. */
final class WebFont {
  private WebFont() {}

  /**
   * A style rule that brings the typeface along.
   *
   * @param family what the document calls it
   * @param bold whether it is the bold face
   * @param text every sign that it must have
   */
  static String rule(String family, boolean bold, String text) {
    return "@font-face { font-family: \""
        + family
        + "\"; font-weight: "
        + (bold ? "bold" : "normal")
        + "; src: url(data:font/ttf;base64,"
        + Base64.getEncoder().encodeToString(subset(bold, text))
        + ") format(\"truetype\"); }";
  }

  private static byte[] subset(boolean bold, String text) {
    try (InputStream stream = SheetFonts.file(bold);
        TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(stream))) {
      TTFSubsetter subsetter = new TTFSubsetter(font);
      text.codePoints().forEach(subsetter::add);
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      subsetter.writeToStream(bytes);
      return bytes.toByteArray();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
