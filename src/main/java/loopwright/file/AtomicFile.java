package loopwright.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.UUID;

/** Writes a file so that at every moment either the old one or the new one is there, whole. */
public final class AtomicFile {
  private AtomicFile() {}

  /**
   * Writes a text in UTF-8. A link is followed, permissions of an existing file are kept.
   *
   * @throws FileException when it cannot; what was there before is then untouched
   */
  static void write(Path file, String text) {
    write(file, text.getBytes(StandardCharsets.UTF_8));
  }

  /**
   * Writes bytes. A link is followed, permissions of an existing file are kept.
   *
   * @param content not modified
   * @throws FileException when it cannot; what was there before is then untouched
   */
  public static void write(Path file, byte[] content) {
    if (Files.isDirectory(file)) {
      throw new FileException(file + ": found a folder, expected the name of a file to write");
    }
    try {
      replace(Files.exists(file) ? file.toRealPath() : file.toAbsolutePath(), content);
    } catch (IOException e) {
      throw unwritable(file, e);
    }
  }

  private static void replace(Path file, byte[] content) throws IOException {
    Path beside = file.resolveSibling("." + UUID.randomUUID() + ".part");
    try {
      try (FileChannel channel =
          FileChannel.open(beside, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
        ByteBuffer bytes = ByteBuffer.wrap(content);
        while (bytes.hasRemaining()) {
          channel.write(bytes);
        }
        channel.force(true);
      }
      keepPermissions(file, beside);
      move(beside, file);
    } finally {
      Files.deleteIfExists(beside);
    }
  }

  private static void keepPermissions(Path from, Path to) throws IOException {
    PosixFileAttributeView target = Files.getFileAttributeView(to, PosixFileAttributeView.class);
    if (target != null && Files.exists(from)) {
      target.setPermissions(Files.getPosixFilePermissions(from));
    }
  }

  private static void move(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException e) {
      throw new IOException("this disk cannot replace a file in one step", e);
    }
  }

  private static FileException unwritable(Path file, IOException e) {
    String says = "the file cannot be written";
    if (e instanceof NoSuchFileException) {
      says = "the folder to write it into does not exist";
    } else if (e instanceof AccessDeniedException) {
      says = "writing it is not permitted";
    }
    return new FileException(file + ": " + says + "; what was there before is unchanged", e);
  }
}
