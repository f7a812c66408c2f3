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
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;

class ExplainCommandTest {
  /** An output offset and a gain as an open lower resistor would leave them: a follower's. */
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "1%"},
       "amplifier": {"kind": "figures", "gain": 500, "inputOffset": "5m"},
       "hookups": [
        {"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}],
       "bench": {"readings": [
        {"hookup": "divider", "quantity": "gain", "value": 0.998, "uncertainty": 0.002},
        {"hookup": "divider", "quantity": "outputOffset", "value": "-5m", "uncertainty": "0.1m"}]}}
      """;

  private static CapturedCall call(String design, String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of("outputOffset", Unit.VOLT)),
            Predictor::predict,
            prediction -> List.of());
    return CapturedCall.of(
        new CommandLineProgram(services), design.getBytes(StandardCharsets.UTF_8), arguments);
  }

  @Test
  void printsJson() throws IOException {
    CapturedCall call = call(DESIGN, "explain", "-", "--json");

    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    JsonNode first = json.at("/explanations/0");
    assertThat(first.get("kind").asText()).isEqualTo("fault");
    assertThat(first.get("part").asText()).startsWith("hookups.divider.feedback.");
    assertThat(first.get("probability").asDouble()).isGreaterThan(0.1);
    assertThat(json.get("explanations").findValuesAsText("kind"))
        .contains("noFault", "noneOfThese");
    assertThat(json.at("/nextReading/quantity").asText()).isEqualTo("nodeVoltage");
  }

  @Test
  void printsText() {
    CapturedCall call = call(DESIGN, "explain", "-");

    assertThat(call.status()).isZero();
    assertThat(call.out())
        .contains("what explains the readings")
        .contains("no fault: every part within its tolerance");
  }

  @Test
  void saysWhenThereIsNothingToExplain() {
    String none = DESIGN.replaceAll("\"readings\": \\[[^\\]]*\\]", "\"readings\": []");
    assertThat(call(none, "explain", "-").out()).contains("nothing to explain");
  }
}
