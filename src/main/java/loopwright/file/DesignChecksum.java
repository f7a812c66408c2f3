package loopwright.file;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.design.Bench;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;

/** The checksum by which paper, record and file know that they are about one design. */
public final class DesignChecksum {
  private DesignChecksum() {}

  /**
   * SHA-256 (FIPS 180-4), in 64 hexadecimal digits, of the text in UTF-8 that {@link
   * DesignFile#write} gives without a previous document, the bench left out, so that noting a
   * reading does not change it.
   *
   * @throws loopwright.design.DesignException when the text could not be read again
   */
  public static String of(Design design) {
    Bench nothing = new Bench(Map.of(), List.of(), List.of(), Optional.empty());
    DesignFile files =
        new DesignFile(
            Shelf.empty(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    String text = files.write(DesignPath.set(design, "bench", nothing), Optional.empty());
    return Sha256.of(text.getBytes(StandardCharsets.UTF_8));
  }
}
