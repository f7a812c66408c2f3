package loopwright.file;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignValidation;
import loopwright.design.UsedParts;
import loopwright.part.Shelf;
import loopwright.quantity.Unit;

/** Reads and writes design files. */
public final class DesignFile {
  private final Shelf shelf;
  private final BlockBinding<Design> binding;

  /**
   * @param shelf where a part comes from that a design uses and its file does not bring along
   * @param figures units of the figures that a reading or a limit may be of, by their keys
   */
  public DesignFile(Shelf shelf, Map<String, Unit> figures) {
    this.shelf = shelf;
    this.binding = new Bindings(new BenchQuantities(figures)).block(Design.class);
  }

  /** Where parts come from that a file does not bring along. */
  public Shelf shelf() {
    return shelf;
  }

  /**
   * Reads a file.
   *
   * @throws FileException when it cannot be read, or is no design of a version that this program
   *     knows
   * @throws loopwright.design.DesignException when values in it do not fit, with all of them
   */
  public DesignDocument read(Path file) {
    return read(TextFile.read(file), file.toString());
  }

  /**
   * Reads a text.
   *
   * @param text the whole of it
   * @param where what messages call it: a file's name, or {@code standard input}
   * @throws FileException when it is no design of a version that this program knows
   * @throws loopwright.design.DesignException when values in it do not fit, with all of them
   */
  public DesignDocument read(String text, String where) {
    Json json = JsonReader.read(text, where);
    if (!(json instanceof Json.Block block)) {
      throw new FileException(
          where
              + ", "
              + json.position().says()
              + ": found "
              + json.found()
              + ", expected a design: a block {…} of loopwright, name, rails, amplifier, hookups");
    }
    FormatVersion.check(block, where);
    Design written = binding.read(block, Spot.WHOLE);
    Design design = UsedParts.withPartsFrom(written, shelf);
    return new DesignDocument(DesignValidation.requireSound(design), written, block);
  }

  /**
   * The text of a design, with every part record that it uses. Where it is what a document said,
   * the document's own spelling, order and silence about defaults are kept.
   *
   * @param previous the document that the design has grown out of, if any
   * @throws loopwright.design.DesignException when the text could not be read again
   */
  public String write(Design design, Optional<DesignDocument> previous) {
    return JsonWriter.write(
        binding.write(
            design, previous.map(document -> new Before<>(document.written(), document.source()))));
  }

  /**
   * Writes a design into a file; at every moment the old or the new file is there, whole.
   *
   * @param previous the document that the design has grown out of, if any
   * @throws FileException when the file cannot be written
   * @throws loopwright.design.DesignException when the text could not be read again
   */
  public void save(Path file, Design design, Optional<DesignDocument> previous) {
    AtomicFile.write(file, write(design, previous));
  }
}
