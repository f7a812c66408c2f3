package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import loopwright.part.TransistorRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The user's own shelf before the one that ships. */
class ShelvesTest {
  @TempDir private Path folder;

  @Test
  void theShippedShelfHasFifteenTypes() {
    assertThat(new ShelfFile().shipped().names())
        .containsExactlyInAnyOrder(
            "2N3904",
            "2N3906",
            "BC547B",
            "BC557B",
            "2N2222A",
            "2N2907A",
            "BC337-25",
            "BC327-25",
            "2N5551",
            "2N5401",
            "BD139",
            "BD140",
            "MPSA42",
            "MPSA92",
            "1N4148");
  }

  @Test
  void theUsersRecordWinsAndABrokenFileHidesNoOther() throws IOException {
    Files.writeString(folder.resolve("a broken.json"), "{\"loopwright\": 1, \"parts\": {");
    Files.writeString(
        folder.resolve("mine.json"),
        "{\"loopwright\": 1, \"parts\": {\"2N3904\": {\"kind\": \"npn\", \"source\": \"mine\","
            + " \"model\": {\"saturationCurrent\": 1e-14, \"forwardBeta\": 111}}}}");
    Shelves shelves = Shelves.load(folder);
    assertThat(shelves.problems()).singleElement().asString().contains("a broken.json");
    assertThat(((TransistorRecord) shelves.shelf().find("2N3904").orElseThrow()).source())
        .contains("mine");
    assertThat(shelves.shelf().find("BC547B")).isPresent();
    assertThat(shelves.shelf().names()).doesNotHaveDuplicates();
  }

  @Test
  void aMissingFolderIsNoProblem() {
    Shelves shelves = Shelves.load(folder.resolve("none"));
    assertThat(shelves.problems()).isEmpty();
    assertThat(shelves.shelf().names()).hasSize(15);
  }
}
