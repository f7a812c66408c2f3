package loopwright.file;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Map;
import loopwright.part.PartRecord;
import loopwright.part.RecordShelf;
import loopwright.part.Shelf;

/** Reads files of part records: those that ship with the program, and the user's own. */
public final class ShelfFile {
  private static final String SHIPPED = "/loopwright/shelf/shelf.json";

  /**
   * What a file of part records holds.
   *
   * @param loopwright version of the format
   * @param parts records by name
   */
  public record Content(int loopwright, Map<String, PartRecord> parts) {}

  private final BlockBinding<Content> binding =
      new Bindings(new BenchQuantities(Map.of())).block(Content.class);

  /**
   * The records that ship with the program.
   *
   * @throws FileException when they cannot be read: the program is damaged
   */
  public Shelf shipped() {
    try (InputStream stream = ShelfFile.class.getResourceAsStream(SHIPPED)) {
      if (stream == null) {
        throw new FileException("the program's own part records are missing");
      }
      return read(TextFile.decode(stream.readAllBytes(), SHIPPED), SHIPPED);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * The records of one file.
   *
   * @throws FileException when it cannot be read, or is no file of part records
   * @throws loopwright.design.DesignException when values in it do not fit, with all of them
   */
  public RecordShelf read(Path file) {
    return read(TextFile.read(file), file.toString());
  }

  RecordShelf read(String text, String where) {
    Json json = JsonReader.read(text, where);
    if (!(json instanceof Json.Block block)) {
      throw new FileException(
          where + ": found " + json.found() + ", expected a block {…} of loopwright and parts");
    }
    FormatVersion.check(block, where);
    return new RecordShelf(binding.read(block, Spot.WHOLE).parts());
  }
}
