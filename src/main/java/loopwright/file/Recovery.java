package loopwright.file;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import java.util.UUID;
import loopwright.design.Design;
import loopwright.design.DesignException;

/**
 * Unsaved work of this run, kept in a file of its own until it is saved or given up, so that the
 * next run finds it when this one ended badly.
 */
public final class Recovery {
  private static final String FOLDER = "unsaved";
  private static final String DESIGN = ".json";
  private static final String ABOUT = ".properties";

  private final DesignFile files;
  private final Path folder;
  private final String name = UUID.randomUUID().toString();

  /**
   * Work that an earlier run left.
   *
   * @param design as it was
   * @param of the file that it was opened from; empty when it was in none
   * @param when it was kept
   * @param kept where it is kept
   */
  public record Left(Design design, Optional<Path> of, Instant when, Path kept) {}

  /**
   * @param files reads and writes designs
   * @param user where it is kept
   */
  public Recovery(DesignFile files, UserFolder user) {
    this.files = files;
    this.folder = user.path().resolve(FOLDER);
  }

  /**
   * Keeps unsaved work in place of what was kept of this run before.
   *
   * @param of the file that it was opened from
   * @return why it cannot be kept; empty when it is
   */
  public Optional<String> keep(Design design, Optional<Path> of) {
    Properties about = new Properties();
    about.setProperty("when", Instant.now().toString());
    of.ifPresent(path -> about.setProperty("of", path.toAbsolutePath().toString()));
    Optional<String> wrong = UserFolder.write(folder.resolve(name + ABOUT), about);
    if (wrong.isPresent()) {
      return wrong;
    }
    try {
      AtomicFile.write(folder.resolve(name + DESIGN), files.write(design, Optional.empty()));
      return Optional.empty();
    } catch (FileException | DesignException e) {
      return Optional.of(e.getMessage());
    }
  }

  /** Forgets what was kept of this run: it is saved, or given up. */
  public void forget() {
    forget(folder.resolve(name + DESIGN));
  }

  /** Forgets what an earlier run left. */
  public void forget(Left left) {
    forget(left.kept());
  }

  /** What earlier runs left, the newest first; what cannot be read stays where it is. */
  public List<Left> left() {
    List<Left> left = new ArrayList<>();
    if (Files.isDirectory(folder)) {
      try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, "*" + DESIGN)) {
        for (Path file : stream) {
          if (!file.getFileName().toString().equals(name + DESIGN)) {
            read(file).ifPresent(left::add);
          }
        }
      } catch (IOException e) {
        return List.of();
      }
    }
    left.sort(Comparator.comparing(Left::when).reversed());
    return left;
  }

  private Optional<Left> read(Path file) {
    try {
      Design design =
          files.read(Files.readString(file, StandardCharsets.UTF_8), file.toString()).design();
      Properties about = UserFolder.read(about(file)).orElseGet(Properties::new);
      String when =
          about.getProperty("when", Files.getLastModifiedTime(file).toInstant().toString());
      return Optional.of(
          new Left(
              design,
              Optional.ofNullable(about.getProperty("of")).map(Path::of),
              Instant.parse(when),
              file));
    } catch (IOException | RuntimeException e) {
      return Optional.empty();
    }
  }

  private static Path about(Path design) {
    String plain = design.getFileName().toString();
    return design.resolveSibling(plain.substring(0, plain.length() - DESIGN.length()) + ABOUT);
  }

  private static void forget(Path design) {
    try {
      Files.deleteIfExists(design);
      Files.deleteIfExists(about(design));
    } catch (IOException e) {
      // It is offered again next time, which is better than to stop here.
    }
  }
}
