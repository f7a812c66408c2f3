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

class CompareCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "1%"},
       "amplifier": {"kind": "figures", "gain": 500},
       "hookups": [
        {"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}],
       "bench": {"readings": [
        {"hookup": "divider", "quantity": "gain", "value": 9.81, "frequency": 20,
         "uncertainty": 0.05},
        {"hookup": "divider", "quantity": "supplyCurrent", "rail": "positive", "value": "0.1m"}]}}
      """;

  private static CapturedCall call(String design, String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of()), Predictor::predict, prediction -> List.of());
    return CapturedCall.of(
        new CommandLineProgram(services), design.getBytes(StandardCharsets.UTF_8), arguments);
  }

  @Test
  void printsJson() throws IOException {
    CapturedCall call = call(DESIGN, "compare", "-", "--json");

    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    JsonNode gain = json.at("/readings/0");
    assertThat(gain.get("quantity").asText()).isEqualTo("gain");
    assertThat(gain.get("frequency").asDouble()).isEqualTo(20);
    assertThat(gain.get("agrees").asBoolean()).isTrue();
    assertThat(gain.get("predictedLow").asDouble()).isLessThan(gain.get("predicted").asDouble());
    assertThat(json.at("/readings/1/rail").asText()).isEqualTo("positive");
    assertThat(json.at("/set/degreesOfFreedom").asInt()).isEqualTo(2);
    assertThat(json.at("/set/probability").isNumber()).isTrue();
  }

  @Test
  void printsText() {
    CapturedCall call = call(DESIGN, "compare", "-");

    assertThat(call.status()).isZero();
    assertThat(call.out()).contains("River gauge, readings").contains("divider gain: Agrees");
  }

  @Test
  void saysWhereReadingsGoWhenThereAreNone() {
    String none = DESIGN.replaceAll("\"readings\": \\[[^\\]]*\\]", "\"readings\": []");
    CapturedCall call = call(none, "compare", "-");

    assertThat(call.status()).isZero();
    assertThat(call.out()).contains("holds no readings");
  }
}
