package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Design files as people write them, edit them and damage them. */
class DesignFileTest {
  @TempDir private Path folder;

  private final DesignFile files =
      new DesignFile(
          new ShelfFile().shipped(),
          Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));

  private static String example(String name) throws IOException {
    return Files.readString(Path.of("examples", name + ".json"));
  }

  private String withChange(String text, String path, String value) {
    DesignDocument document = files.read(text, "design.json");
    Design changed = new Change(path, value).applyTo(document.design());
    return files.write(changed, Optional.of(document));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "seismometer-coil",
        "hydrophone-follower",
        "measured-amplifier",
        "nine-volt-preamplifier",
        "everything-fitted"
      })
  void whatIsWrittenReadsAsTheSameDesign(String name) throws IOException {
    DesignDocument document = files.read(example(name), name);
    String kept = files.write(document.design(), Optional.of(document));
    assertThat(files.read(kept, "kept").design()).isEqualTo(document.design());
    String fresh = files.write(document.design(), Optional.empty());
    assertThat(files.read(fresh, "fresh").design()).isEqualTo(document.design());
    String again = files.write(document.design(), Optional.of(files.read(kept, "kept")));
    assertThat(again).isEqualTo(kept);
  }

  @Test
  void anEditTouchesOnlyItsOwnLine() throws IOException {
    String text = example("everything-fitted");
    DesignDocument document = files.read(text, "design.json");
    List<String> before = files.write(document.design(), Optional.of(document)).lines().toList();
    List<String> after =
        withChange(text, "amplifier.gainStage.emitterResistance", "56R").lines().toList();
    assertThat(after).hasSameSizeAs(before);
    long changed = 0;
    for (int line = 0; line < after.size(); line++) {
      if (!after.get(line).equals(before.get(line))) {
        changed++;
        assertThat(after.get(line)).contains("\"56R\"");
      }
    }
    assertThat(changed).isEqualTo(1);
  }

  @ParameterizedTest
  @ValueSource(strings = {"\"8.2k\"", "\"8k2\"", "8200.0", "8.2e3", "\"8,2 kΩ\"", "8200"})
  void theAuthorsSpellingStays(String spelling) throws IOException {
    String text = example("seismometer-coil").replace("\"8k2\"", spelling);
    DesignDocument document = files.read(text, "design.json");
    assertThat(DesignPath.get(document.design(), "amplifier.gainStage.load.resistance"))
        .extracting("value.value")
        .isEqualTo(8200.0);
    assertThat(withChange(text, "amplifier.gainStage.emitterResistance", "47"))
        .contains("\"resistance\": " + spelling);
  }

  @Test
  void savingBringsEveryUsedRecordIntoTheFile() throws IOException {
    DesignDocument document = files.read(example("seismometer-coil"), "design.json");
    Path file = folder.resolve("whole.json");
    files.save(file, document.design(), Optional.of(document));
    DesignFile withoutShelf =
        new DesignFile(
            Shelf.empty(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    assertThat(withoutShelf.read(file).design()).isEqualTo(document.design());
  }

  @Test
  void aPartMaySayItsOwnToleranceAndMeasuredValue() throws IOException {
    String text =
        example("seismometer-coil")
            .replace(
                "\"8k2\"", "{\"value\": \"8k2\", \"tolerance\": \"1%\", \"measured\": \"8.183k\"}");
    DesignDocument document = files.read(text, "design.json");
    Object part = DesignPath.get(document.design(), "amplifier.gainStage.load.resistance");
    assertThat(((PartValue) part).effective()).isEqualTo(8183);
    String written = files.write(document.design(), Optional.of(document));
    assertThat(files.read(written, "written").design()).isEqualTo(document.design());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "\"8k2\"|\"8k2 Hz\"|amplifier.gainStage.load.resistance: found \"8k2 Hz\"",
        "\"8k2\"|-8200|amplifier.gainStage.load.resistance: found",
        "\"8k2\"|\"lots\"|amplifier.gainStage.load.resistance: found \"lots\"",
        "\"8k2\"|true|amplifier.gainStage.load.resistance: found true",
        "\"8k2\"|[1]|amplifier.gainStage.load.resistance: found",
        "\"8k2\"|1e999|amplifier.gainStage.load.resistance: found",
        "\"transistor\": \"BC557B\"|\"transistor\": \"BC999\"|BC999",
        "\"transistor\": \"BC557B\"|\"transistor\": \"BC547B\"|amplifier.gainStage.transistor",
        "\"emitterResistance\": \"4R7\"|\"emiterResistance\": \"4R7\"|emitterResistance",
        "\"loopwright\": 1|\"loopwright\": 7|version 7",
        "\"kind\": \"joined\"|\"kind\": \"glued\"|amplifier.outputStage.bias",
        "\"name\": \"follower\"|\"name\": \"divider\"|divider",
        "\"lower\": \"1k\"|\"lower\": \"1k\", \"returnTo\": \"midRail\"|midRail",
        "\"quantity\": \"closedLoopGain\"|\"quantity\": \"loudness\"|loudness",
        "\"upper\": 0|\"upper\": 0, \"upper\": 1|twice"
      })
  void whatDoesNotFitIsSaidWithItsPlace(String good, String bad, String says) throws IOException {
    String text = example("seismometer-coil");
    assertThat(text).contains(good);
    Throwable thrown = catchThrowable(() -> files.read(text.replace(good, bad), "design.json"));
    assertPlain(thrown);
    assertThat(thrown.getMessage()).contains(says);
  }

  @Test
  void damagedFilesAreRefusedInOneSentence() throws IOException {
    String text = example("seismometer-coil");
    for (String damaged :
        List.of(
            "",
            "   ",
            "[]",
            "\"text\"",
            "once upon a time",
            text.substring(0, text.length() / 2),
            text + " trailing",
            "[".repeat(100_000) + "]".repeat(100_000),
            "{\"a\":".repeat(100_000),
            "{\"loopwright\": 1}")) {
      assertPlain(catchThrowable(() -> files.read(damaged, "design.json")));
    }
    assertPlain(catchThrowable(() -> files.read(folder.resolve("missing.json"))));
    assertPlain(catchThrowable(() -> files.read(folder)));
    Path binary = Files.write(folder.resolve("binary.json"), new byte[] {0, 1, 2, (byte) 0xff, 9});
    assertPlain(catchThrowable(() -> files.read(binary)));
  }

  @Test
  void aFileThatCannotBeWrittenLeavesTheOldOneWhole() throws IOException {
    Path nowhere = folder.resolve("missing folder").resolve("design.json");
    Design design = files.read(example("measured-amplifier"), "design.json").design();
    assertThatThrownBy(() -> files.save(nowhere, design, Optional.empty()))
        .isInstanceOf(FileException.class);
    assertThat(nowhere).doesNotExist();
    Path file = Files.writeString(folder.resolve("design.json"), "old");
    files.save(file, design, Optional.empty());
    assertThat(files.read(file).design()).isEqualTo(design);
    try (var left = Files.list(folder)) {
      assertThat(left).containsExactly(file);
    }
  }

  /** Whatever one slip of the hand does to a file, the answer is a sentence and never a crash. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void anyOneSlipIsReadOrRefusedInASentence(long seed) throws IOException {
    Random random = new Random(seed);
    String text = example("everything-fitted");
    for (int i = 0; i < 150; i++) {
      String slipped = slip(text, random);
      Throwable thrown = catchThrowable(() -> files.read(slipped, "design.json"));
      if (thrown != null) {
        assertPlain(thrown);
      }
    }
  }

  private static String slip(String text, Random random) {
    int at = random.nextInt(text.length() - 10);
    return switch (random.nextInt(4)) {
      case 0 -> text.substring(0, at) + text.substring(at + 1);
      case 1 -> text.substring(0, at) + "x" + text.substring(at);
      case 2 -> text.substring(0, at) + text.substring(at + 1 + random.nextInt(9));
      default -> text.substring(0, at) + "}" + text.substring(at + 1);
    };
  }

  private static void assertPlain(Throwable thrown) {
    assertThat(thrown).isInstanceOfAny(FileException.class, DesignException.class);
    assertThat(thrown.getMessage())
        .isNotBlank()
        .doesNotContainIgnoringCase("jackson")
        .doesNotContain("Exception")
        .doesNotContain("java.");
    assertThat(thrown.getMessage().getBytes(StandardCharsets.UTF_8).length).isLessThan(2000);
    assertThat(Arrays.stream(thrown.getMessage().split("\n"))).hasSize(1);
  }
}
