package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.part.Shelf;
import loopwright.predict.Predictor;
import org.junit.jupiter.api.Test;

class CureCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 1000, "poles": ["10k", "5M"],
                     "inputCapacitance": "5p"},
       "hookups": [
        {"name": "divider",
         "feedback": {"kind": "nonInverting", "upper": "91k", "lower": "47k"}},
        {"name": "open", "feedback": {"kind": "open"}}]}
      """;

  private static CapturedCall call(String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of()), Predictor::predict, prediction -> List.of());
    return CapturedCall.of(
        new CommandLineProgram(services), DESIGN.getBytes(StandardCharsets.UTF_8), arguments);
  }

  @Test
  void printsJson() throws IOException {
    CapturedCall call = call("cure", "-", "--hookup", "divider", "--margin", "60", "--json");

    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    JsonNode best = json.at("/cures/0");
    assertThat(best.at("/changes/0/path").asText()).startsWith("hookups.divider.");
    assertThat(best.at("/changes/0/value").isNumber()).isTrue();
    assertThat(best.get("worstPhaseMargin").asDouble()).isGreaterThanOrEqualTo(60);
    assertThat(best.get("cornerPhaseMargin").asDouble()).isGreaterThanOrEqualTo(60);
    assertThat(best.get("loopGainDc").asDouble()).isPositive();
    assertThat(json.at("/cannot").findValuesAsText("kind")).contains("Miller capacitor");
  }

  @Test
  void printsText() {
    CapturedCall call = call("cure", "-", "--hookup", "divider", "--margin", "60");

    assertThat(call.status()).isZero();
    assertThat(call.out())
        .contains("Cures for a phase margin of 60°")
        .contains("feedback.leadCapacitance = ")
        .contains("Ways that do not lead there");
  }

  @Test
  void refusesWhatCannotBe() {
    assertThat(call("cure", "-", "--hookup", "divider", "--margin", "120").status()).isEqualTo(2);
    assertThat(call("cure", "-", "--hookup", "none", "--margin", "60").err())
        .contains("Unknown hookup \"none\": River gauge has divider, open");
    CapturedCall open = call("cure", "-", "--hookup", "open", "--margin", "60");
    assertThat(open.status()).isEqualTo(1);
    assertThat(open.err()).contains("hookups.open.feedback: found an open hookup");
  }
}
