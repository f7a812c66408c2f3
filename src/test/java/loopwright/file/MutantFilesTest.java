package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Spoilt design files and part records are read rightly or refused with the place; nothing else.
 */
class MutantFilesTest {
  private static final int FEW = 1000;
  private static final int MANY = 50_000;
  private static final int LONGEST_SENTENCE = 2000;

  private final DesignFile designs =
      new DesignFile(
          new ShelfFile().shipped(),
          Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));

  @Test
  void spoiltDesignsAreReadOrRefused() throws IOException {
    hold(run(example(), this::readDesign, FEW));
  }

  @Test
  void spoiltRecordsAreReadOrRefused() throws IOException {
    hold(run(records(), MutantFilesTest::readRecords, FEW));
  }

  @Tag("campaign")
  @Test
  void manySpoiltFiles() throws IOException {
    Map<String, Integer> design = run(example(), this::readDesign, MANY);
    Map<String, Integer> record = run(records(), MutantFilesTest::readRecords, MANY);
    Path report = Files.createDirectories(Path.of("target", "campaigns"));
    Files.write(
        report.resolve("mutant-files.txt"), List.of("designs " + design, "records " + record));
    hold(design);
    hold(record);
  }

  private static void hold(Map<String, Integer> outcomes) {
    assertThat(outcomes.keySet()).containsExactlyInAnyOrder("read", "refused");
  }

  /** Outcomes by their count; what is neither read nor refused stands with its seed. */
  private static Map<String, Integer> run(String text, Consumer<String> reader, int count) {
    Map<String, Integer> outcomes = new TreeMap<>();
    for (long seed = 1; seed <= count; seed++) {
      byte[] bytes = Mutant.of(text, seed);
      outcomes.merge(
          Assertions.assertTimeout(
              Duration.ofSeconds(30), () -> outcome(bytes, reader), "a file that holds it up"),
          1,
          Integer::sum);
    }
    return outcomes;
  }

  private static String outcome(byte[] bytes, Consumer<String> reader) {
    try {
      reader.accept(TextFile.decode(bytes, "spoilt.json"));
      return "read";
    } catch (FileException e) {
      return clear(e.getMessage()) && e.getMessage().startsWith("spoilt.json") ? "refused" : "" + e;
    } catch (DesignException e) {
      boolean all =
          !e.problems().isEmpty()
              && e.problems().stream().allMatch(problem -> clear(problem.says()));
      return all ? "refused" : "" + e;
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError | AssertionError e) {
      return e + " at " + new ArrayList<>(List.of(e.getStackTrace())).subList(0, 1);
    }
  }

  private static boolean clear(String says) {
    return !says.isBlank() && !says.contains("\n") && says.length() < LONGEST_SENTENCE;
  }

  /** What is read and written is read again as the same. */
  private void readDesign(String text) {
    DesignDocument document = designs.read(text, "spoilt.json");
    Design design = document.design();
    String again;
    try {
      again = designs.write(design, Optional.of(document));
      assertThat(designs.read(again, "again.json").design()).isEqualTo(design);
    } catch (FileException | DesignException e) {
      throw new AssertionError("what was read cannot be written: " + e.getMessage(), e);
    }
  }

  private static void readRecords(String text) {
    new ShelfFile().read(text, "spoilt.json");
  }

  private static String example() throws IOException {
    return Files.readString(Path.of("examples", "everything-fitted.json"));
  }

  private static String records() throws IOException {
    try (InputStream stream =
        MutantFilesTest.class.getResourceAsStream("/loopwright/shelf/shelf.json")) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
