package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Collectors;
import loopwright.check.Findings;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Predictor;
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FirstCommandTest {
  private static final Map<String, Unit> UNITS =
      Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit));

  @TempDir private Path folder;

  private static CapturedCall call(String... arguments) {
    DesignFile files = new DesignFile(new ShelfFile().shipped(), UNITS);
    CommandServices services = new CommandServices(files, Predictor::predict, Findings::of);
    return CapturedCall.of(new CommandLineProgram(services), new byte[0], arguments);
  }

  @Test
  void writesADesignThatTrimReads() throws IOException {
    String file = folder.resolve("first.json").toString();
    CapturedCall first =
        call(
            "first", "--rails", "12,-12", "--gain", "1", "--load", "2k", "--swing", "5", "-o", file,
            "--json");
    assertThat(first.status()).as(first.out()).isZero();
    JsonNode json = new ObjectMapper().readTree(first.out());
    assertThat(json.at("/demands/0/met").asBoolean()).isTrue();
    assertThat(json.at("/reasons").size()).isGreaterThan(10);
    assertThat(new ObjectMapper().readTree(Path.of(file).toFile())).isEqualTo(json.get("design"));

    CapturedCall trim = call("trim", file, "--json");
    assertThat(trim.status()).as(trim.err()).isZero();
    assertThat(new ObjectMapper().readTree(trim.out()).at("/offsetTrims/0/perCent").isNumber())
        .isTrue();
    assertThat(call("trim", file).out()).contains("Output offset: ", "One per cent more of ");

    CapturedCall again =
        call("first", "--rails", "12,-12", "--gain", "1", "--swing", "5", "-o", file);
    assertThat(again.status()).isEqualTo(1);
    assertThat(again.err()).contains("found a file there already");
  }

  @Test
  void refusesInWordsAndWritesNothing() {
    Path file = folder.resolve("none.json");
    CapturedCall refused =
        call(
            "first",
            "--rails",
            "9,-9",
            "--gain",
            "10",
            "--load",
            "600",
            "--swing",
            "9",
            "-o",
            file.toString());
    assertThat(refused.status()).isEqualTo(1);
    assertThat(refused.out()).contains("No design is offered.", "Swing", "not met");
    assertThat(Files.exists(file)).isFalse();
  }

  @Test
  void saysWhatIsWrongWithACall() {
    CapturedCall rails = call("first", "--rails", "12", "--gain", "1", "--swing", "5");
    assertThat(rails.status()).isEqualTo(2);
    assertThat(rails.err()).contains("--rails: found \"12\", expected two voltages");
    CapturedCall gain = call("first", "--rails", "12,-12", "--gain", "much", "--swing", "5");
    assertThat(gain.status()).isEqualTo(2);
    assertThat(gain.err()).contains("--gain: ");
    CapturedCall prefer =
        call("first", "--rails", "12,-12", "--gain", "1", "--swing", "5", "--prefer", "cheap");
    assertThat(prefer.err()).contains("expected quiet, cool or simple");
    CapturedCall below = call("first", "--rails", "12,-12", "--gain", "0.5", "--swing", "5");
    assertThat(below.status()).isEqualTo(1);
    assertThat(below.err()).contains("gain: found 0.5, expected from 1 to 1000");
  }
}
