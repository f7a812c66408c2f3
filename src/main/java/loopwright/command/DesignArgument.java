package loopwright.command;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.FileException;

/**
 * The design that a call is about.
 *
 * @param name of a file, or {@code -} for standard input
 */
record DesignArgument(String name) {
  private static final String STANDARD_INPUT = "standard input";

  /**
   * Reads it.
   *
   * @throws FileException when it is missing or no design
   */
  Design read(DesignFile designs, InputStream standardInput) {
    if (name.equals("-")) {
      return designs.read(text(standardInput), STANDARD_INPUT).design();
    }
    return designs.read(path()).design();
  }

  private Path path() {
    try {
      return Path.of(name);
    } catch (InvalidPathException e) {
      throw new FileException(name + ": found a name that no file can have, expected a design", e);
    }
  }

  private static String text(InputStream input) {
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .decode(ByteBuffer.wrap(input.readAllBytes()))
          .toString();
    } catch (CharacterCodingException e) {
      throw new FileException(
          STANDARD_INPUT + ": found bytes that are no UTF-8 text, expected a design", e);
    } catch (IOException e) {
      throw new FileException(STANDARD_INPUT + ": cannot be read: " + e.getMessage(), e);
    }
  }
}
