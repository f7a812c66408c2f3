package loopwright.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Reads a file as text, and says in one sentence why it cannot. */
final class TextFile {
  /** A hundred times any file of ours, curves included; more is the wrong file. */
  static final long LARGEST = 64L << 20;

  private static final char BYTE_ORDER_MARK = '\uFEFF';

  private TextFile() {}

  /**
   * The text of a file in UTF-8, without a byte order mark.
   *
   * @throws FileException when there is no such file, or it cannot be read, or is no text
   */
  static String read(Path file) {
    if (Files.isDirectory(file)) {
      throw new FileException(file + ": found a folder, expected a file");
    }
    try {
      long size = Files.size(file);
      if (size > LARGEST) {
        throw new FileException(
            file + ": found " + (size >> 20) + " MB, expected a file below 64 MB");
      }
      return decode(Files.readAllBytes(file), file.toString());
    } catch (IOException e) {
      throw unreadable(file, e);
    }
  }

  /** What keeps a file from being read, in words. */
  static FileException unreadable(Path file, IOException e) {
    String says = "the file cannot be read";
    if (e instanceof NoSuchFileException) {
      says = "there is no such file";
    } else if (e instanceof AccessDeniedException) {
      says = "reading it is not permitted";
    }
    return new FileException(file + ": " + says, e);
  }

  /** Decodes UTF-8; anything that no person would have typed is refused. */
  static String decode(byte[] bytes, String where) {
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer input = ByteBuffer.wrap(bytes);
    String text;
    try {
      text = decoder.decode(input).toString();
    } catch (CharacterCodingException e) {
      throw new FileException(
          where
              + ": byte "
              + (input.position() + 1)
              + " is no text in UTF-8, expected a text file in UTF-8",
          e);
    }
    for (int i = 0; i < text.length(); i++) {
      char character = text.charAt(i);
      if (character < ' ' && character != '\n' && character != '\r' && character != '\t') {
        throw new FileException(where + ": found binary data, expected a text file in UTF-8");
      }
    }
    return text.isEmpty() || text.charAt(0) != BYTE_ORDER_MARK ? text : text.substring(1);
  }
}
