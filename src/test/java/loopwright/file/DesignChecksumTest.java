package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;

/** The checksum that paper and file share. */
class DesignChecksumTest {
  private final DesignFile files =
      new DesignFile(
          new ShelfFile().shipped(),
          Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
  private final Design design = files.read(Path.of("examples", "seismometer-coil.json")).design();

  /** FIPS 180-4, example of one block: "abc". */
  @Test
  void theChecksumIsSha256() {
    assertThat(Sha256.of("abc".getBytes(StandardCharsets.US_ASCII)))
        .isEqualTo("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
  }

  @Test
  void aReadingDoesNotChangeItButEverythingElseDoes() {
    String checksum = DesignChecksum.of(design);
    assertThat(checksum).matches("[0-9a-f]{64}");
    assertThat(design.bench().readings()).isNotEmpty();
    assertThat(DesignChecksum.of(DesignPath.set(design, "bench.readings", List.of())))
        .isEqualTo(checksum);
    assertThat(
            DesignChecksum.of(
                DesignPath.set(
                    design,
                    "amplifier.gainStage.compensation.resistance.value",
                    Quantity.parse("160", Unit.OHM))))
        .isNotEqualTo(checksum);
    assertThat(DesignChecksum.of(DesignPath.set(design, "name", "Another"))).isNotEqualTo(checksum);
  }

  @Test
  void theProgramsOwnTextHasIt() {
    Design bare = DesignPath.set(design, "bench.readings", List.of());
    Design empty = DesignPath.set(bare, "bench.instruments", Map.of());
    String text = files.write(empty, Optional.empty());
    assertThat(Sha256.of(text.getBytes(StandardCharsets.UTF_8)))
        .isEqualTo(DesignChecksum.of(design));
    assertThat(DesignChecksum.of(files.read(text, "text").design()))
        .isEqualTo(DesignChecksum.of(design));
  }
}
