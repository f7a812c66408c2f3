package loopwright.file;

import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Properties;

/**
 * The folder in which the program keeps what a person should find again: preferences, and work that
 * was not saved. What cannot be read there is as if it were not there; it never stops the program.
 *
 * @param path of the folder; made when something is first kept
 */
public record UserFolder(Path path) {
  private static final String PREFERENCES = "preferences.properties";

  /** The usual one, {@code .loopwright} at home. */
  public static UserFolder usual() {
    return new UserFolder(Path.of(System.getProperty("user.home"), ".loopwright"));
  }

  /** What was kept of preferences; empty when nothing was. */
  public Properties preferences() {
    return read(path.resolve(PREFERENCES)).orElseGet(Properties::new);
  }

  /**
   * Keeps preferences.
   *
   * @return why they cannot be kept; empty when they are
   */
  public Optional<String> keep(Properties preferences) {
    return write(path.resolve(PREFERENCES), preferences);
  }

  static Optional<Properties> read(Path file) {
    Properties properties = new Properties();
    try {
      properties.load(new StringReader(Files.readString(file, StandardCharsets.UTF_8)));
      return Optional.of(properties);
    } catch (IOException | IllegalArgumentException e) {
      return Optional.empty();
    }
  }

  static Optional<String> write(Path file, Properties properties) {
    try {
      Files.createDirectories(file.getParent());
      StringWriter text = new StringWriter();
      properties.store(text, null);
      AtomicFile.write(file, text.toString());
      return Optional.empty();
    } catch (IOException | UncheckedIOException e) {
      return Optional.of(file + ": cannot be written");
    } catch (FileException e) {
      return Optional.of(e.getMessage());
    }
  }
}
