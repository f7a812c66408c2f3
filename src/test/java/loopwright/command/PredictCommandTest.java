package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.part.Shelf;
import loopwright.predict.Prediction;
import loopwright.predict.SamplePredictions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PredictCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 500},
       "hookups": [
        {"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}},
        {"name": "follower", "feedback": {"kind": "nonInverting", "upper": 0}}]}
      """;

  @TempDir private Path folder;
  private final List<double[]> frequenciesAskedFor = new ArrayList<>();
  private Path file;

  @BeforeEach
  void writeDesign() throws IOException {
    file = Files.writeString(folder.resolve("river gauge.json"), DESIGN);
  }

  @Test
  void printsJsonForEveryHookup() throws IOException {
    CapturedCall call = call("predict", file.toString(), "--json");

    assertThat(call.status()).isZero();
    assertThat(call.err()).isEmpty();
    JsonNode json = new ObjectMapper().readTree(call.out());
    assertThat(json.get("design").asText()).isEqualTo("River gauge");
    assertThat(json.get("hookups").findValuesAsText("name")).containsExactly("divider", "follower");
    assertThat(json.at("/findings/0/where").asText()).isEqualTo("follower");
    assertThat(frequenciesAskedFor).singleElement().isEqualTo(new double[0]);
  }

  @Test
  void readsStandardInput() {
    CapturedCall call =
        CapturedCall.of(program(), DESIGN.getBytes(StandardCharsets.UTF_8), "predict", "-");

    assertThat(call.status()).isZero();
    assertThat(call.out()).contains("River gauge, hookup 'divider'");
  }

  @Test
  void predictsOneHookupAtTheFrequenciesAskedFor() {
    CapturedCall call =
        call("predict", file.toString(), "--hookup", "follower", "--frequencies", "20,1k,2.5 MHz");

    assertThat(call.status()).isZero();
    assertThat(call.out()).contains("hookup 'follower'").doesNotContain("hookup 'divider'");
    assertThat(frequenciesAskedFor).singleElement().isEqualTo(new double[] {20, 1e3, 2.5e6});
  }

  @Test
  void endsWellWhenTheSolveFails() throws IOException {
    CommandLineProgram program =
        new CommandLineProgram(
            new CommandServices(
                new DesignFile(Shelf.empty(), Map.of()),
                (design, hookups, frequencies, progress) -> SamplePredictions.failed(design),
                prediction -> List.of()));

    CapturedCall json = CapturedCall.of(program, new byte[0], "predict", file.toString(), "--json");
    CapturedCall text = CapturedCall.of(program, new byte[0], "predict", file.toString());

    assertThat(json.status()).isZero();
    assertThat(
            new ObjectMapper()
                .readTree(json.out())
                .at("/hookups/0/figures/noiseGain/solved")
                .isNull())
        .isTrue();
    assertThat(text.status()).isZero();
    assertThat(text.out()).contains("no operating point: gainOut stands at 31 V");
  }

  @Test
  void refusesAnUnknownHookupAndListsThoseThatThereAre() {
    assertWrongCall(
        call("predict", file.toString(), "--hookup", "inverting"),
        "inverting",
        "divider, follower");
  }

  @Test
  void refusesCallsThatItCannotUnderstand() {
    assertWrongCall(call(), "sub-command");
    assertWrongCall(call("predikt"), "predikt", "predict");
    assertWrongCall(call("predict"), "FILE");
    assertWrongCall(call("predict", file.toString(), "--jsn"), "--jsn", "--json");
    assertWrongCall(call("predict", file.toString(), "other.json"), "other.json");
    assertWrongCall(call("predict", file.toString(), "--hookup"), "--hookup");
    assertWrongCall(
        call("predict", file.toString(), "--hookup", "divider", "--hookup", "follower"),
        "--hookup");
    assertWrongCall(call("predict", file.toString(), "--frequencies", "1k,abc"), "abc", "Hz");
    assertWrongCall(call("predict", file.toString(), "--frequencies", "1k,,2k"), "frequency");
    assertWrongCall(call("predict", file.toString(), "--frequencies", "0"), "above 0 Hz");
    assertWrongCall(call("predict", file.toString(), "--frequencies", "-1k"), "above 0 Hz");
    assertWrongCall(call("predict", file.toString(), "--frequencies", "10 mV"), "10 mV");
  }

  @Test
  void refusesAMissingOrMalformedDesignInOneSentence() throws IOException {
    assertWrongInput(call("predict", "nowhere.json"), "nowhere.json");
    assertWrongInput(call("predict", folder.toString()), folder.toString());
    assertWrongInput(call("predict", "a\0b"), "name");
    Path list = Files.writeString(folder.resolve("list.json"), "[1, 2]");
    assertWrongInput(call("predict", list.toString()), "list.json");
    byte[] binary = {(byte) 0xff, (byte) 0xfe, 0, 1};
    assertWrongInput(CapturedCall.of(program(), binary, "predict", "-"), "standard input");
    assertWrongInput(CapturedCall.of(program(), new byte[0], "predict", "-"), "standard input");
  }

  @Test
  void leavesAnAtSignInAFileNameAlone() throws IOException {
    Path at = Files.writeString(folder.resolve("options"), "--json");

    assertWrongInput(call("predict", "@" + at), "@");
  }

  @Test
  void explainsItself() {
    CapturedCall top = call("--help");
    assertThat(top.status()).isZero();
    assertThat(top.out()).contains("predict").contains("Exit status");
    assertThat(top.err()).isEmpty();

    CapturedCall predict = call("predict", "--help");
    assertThat(predict.status()).isZero();
    assertThat(predict.out()).contains("FILE", "--hookup", "--frequencies", "--json", "--help");
    assertThat(predict.out().lines()).allMatch(line -> line.length() <= 100);
  }

  @Test
  void owensUpToAFaultOfTheProgram() {
    CommandLineProgram program =
        new CommandLineProgram(
            new CommandServices(
                new DesignFile(Shelf.empty(), Map.of()),
                (design, hookups, frequencies, progress) -> {
                  throw new IllegalStateException("a node lost its row");
                },
                prediction -> List.of()));

    assertWrongInput(
        CapturedCall.of(program, new byte[0], "predict", file.toString()),
        "fault of the program",
        "a node lost its row");
  }

  private static void assertWrongCall(CapturedCall call, String... words) {
    assertOneSentence(call, 2, words);
  }

  private static void assertWrongInput(CapturedCall call, String... words) {
    assertOneSentence(call, 1, words);
  }

  private static void assertOneSentence(CapturedCall call, int status, String... words) {
    assertThat(call.err().lines()).hasSize(1);
    assertThat(call.err()).contains(words);
    assertThat(call.out()).isEmpty();
    assertThat(call.status()).isEqualTo(status);
  }

  private CapturedCall call(String... arguments) {
    return CapturedCall.of(program(), new byte[0], arguments);
  }

  private CommandLineProgram program() {
    return new CommandLineProgram(
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of()),
            (design, hookups, frequencies, progress) -> {
              frequenciesAskedFor.add(frequencies);
              return sample(design, hookups);
            },
            prediction ->
                List.of(
                    new Finding(
                        Finding.Severity.FAILS, "follower", "It oscillates.", "Use 33 pF."))));
  }

  private static Prediction sample(Design design, List<String> hookups) {
    return new Prediction(
        design,
        design.hookups().stream()
            .filter(hookup -> hookups.isEmpty() || hookups.contains(hookup.name()))
            .map(SamplePredictions::solved)
            .toList());
  }
}
