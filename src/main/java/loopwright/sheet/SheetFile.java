package loopwright.sheet;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BiFunction;
import loopwright.file.AtomicFile;

/** The kinds of file that a sheet is written as. */
public enum SheetFile {
  PDF(".pdf", SheetPdf::of),
  HTML(".html", (sheet, paper) -> SheetHtml.of(sheet, paper).getBytes(StandardCharsets.UTF_8));

  private final String suffix;
  private final BiFunction<BenchSheet, Paper, byte[]> writer;

  SheetFile(String suffix, BiFunction<BenchSheet, Paper, byte[]> writer) {
    this.suffix = suffix;
    this.writer = writer;
  }

  /** How its files end. */
  public String suffix() {
    return suffix;
  }

  /** The kind that a file's name asks for; empty where it ends in neither. */
  public static Optional<SheetFile> of(Path file) {
    String name = file.getFileName() == null ? "" : file.getFileName().toString();
    for (SheetFile kind : values()) {
      if (name.toLowerCase(Locale.ROOT).endsWith(kind.suffix)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }

  /** The whole file; equal sheets give equal bytes. */
  public byte[] bytes(BenchSheet sheet, Paper paper) {
    return writer.apply(sheet, paper);
  }

  /**
   * Writes it; at every moment the old or the new file is there, whole.
   *
   * @throws loopwright.file.FileException when it cannot be written
   */
  public void write(BenchSheet sheet, Paper paper, Path file) {
    AtomicFile.write(file, bytes(sheet, paper));
  }
}
