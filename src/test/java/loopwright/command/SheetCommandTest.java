package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.part.Shelf;
import loopwright.predict.Predictor;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SheetCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River <gauge>", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 1000, "poles": ["10k", "5M"]},
       "hookups": [
        {"name": "divider",
         "feedback": {"kind": "nonInverting", "upper": "91k", "lower": "47k"}},
        {"name": "follower", "feedback": {"kind": "nonInverting", "upper": 0}}]}
      """;

  @TempDir Path folder;

  private static CapturedCall call(String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of()), Predictor::predict, prediction -> List.of());
    return CapturedCall.of(
        new CommandLineProgram(services), DESIGN.getBytes(StandardCharsets.UTF_8), arguments);
  }

  @Test
  void theEndOfTheNameDecides() throws IOException {
    Path pdf = folder.resolve("a.pdf");
    Path html = folder.resolve("a.HTML");

    assertThat(call("sheet", "-", "-o", pdf.toString()).status()).isZero();
    assertThat(call("sheet", "-", "-o", html.toString(), "--paper", "letter").status()).isZero();
    assertThat(Files.readAllBytes(pdf)).startsWith("%PDF".getBytes(StandardCharsets.US_ASCII));
    assertThat(Files.readString(html))
        .startsWith("<!DOCTYPE html>")
        .contains("size: Letter")
        .contains("<h1>River &lt;gauge&gt;</h1>");
  }

  @Test
  void jsonSaysWhatWasWritten() throws IOException {
    Path pdf = folder.resolve("a.pdf");
    CapturedCall call = call("sheet", "-", "-o", pdf.toString(), "--hookup", "follower", "--json");

    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    assertThat(json.get("file").asText()).isEqualTo(pdf.toString());
    assertThat(json.get("hookup").asText()).isEqualTo("follower");
    assertThat(json.get("checksum").asText()).matches("[0-9a-f]{64}");
    assertThat(json.at("/nodes").findValuesAsText("name")).contains("out", "positive");
    assertThat(json.at("/nodes/0/low").isNull()).isTrue();
    assertThat(json.get("reason").isNull()).isTrue();
  }

  @Test
  void wrongCallsAreRefusedAndWriteNothing() throws IOException {
    CapturedCall kind = call("sheet", "-", "-o", folder.resolve("a.doc").toString());
    assertThat(kind.status()).isEqualTo(2);
    assertThat(kind.err()).contains("expected a name that ends in .pdf or .html");
    CapturedCall paper =
        call("sheet", "-", "-o", folder.resolve("a.pdf").toString(), "--paper", "B5");
    assertThat(paper.status()).isEqualTo(2);
    assertThat(paper.err()).contains("Found paper \"B5\", expected A4 or Letter");
    CapturedCall hookup =
        call("sheet", "-", "-o", folder.resolve("a.pdf").toString(), "--hookup", "none");
    assertThat(hookup.status()).isEqualTo(2);
    assertThat(hookup.err()).contains("Unknown hookup \"none\"");
    assertThat(call("sheet", "-").status()).isEqualTo(2);
    try (var files = Files.list(folder)) {
      assertThat(files).isEmpty();
    }
  }

  @Test
  void aFolderThatIsNotThereIsRefused() {
    CapturedCall call = call("sheet", "-", "-o", folder.resolve("none/a.pdf").toString());

    assertThat(call.status()).isEqualTo(1);
    assertThat(call.err()).contains("the folder to write it into does not exist");
  }
}
