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

class SpreadCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "1%"},
       "amplifier": {"kind": "figures", "gain": 500},
       "hookups": [
        {"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}]}
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
    CapturedCall call = call("spread", "-", "--samples", "200", "--seed", "3", "--json");

    assertThat(call.status()).isZero();
    JsonNode hookup = new ObjectMapper().readTree(call.out()).at("/hookups/0");
    assertThat(hookup.get("name").asText()).isEqualTo("divider");
    assertThat(hookup.get("yield").isNull()).isTrue();
    JsonNode gain = hookup.at("/figures/closedLoopGainAtRest");
    assertThat(gain.get("low").asDouble()).isLessThan(gain.get("nominal").asDouble());
    assertThat(gain.get("high").asDouble()).isGreaterThan(gain.get("nominal").asDouble());
    assertThat(gain.get("samples").asInt()).isEqualTo(200);
    assertThat(gain.at("/matters/0/part").asText()).startsWith("hookups.divider.feedback.");
    assertThat(hookup.at("/nodes/out/nominal").isNumber()).isTrue();
  }

  @Test
  void printsText() {
    CapturedCall call = call("spread", "-", "--samples", "40");

    assertThat(call.status()).isZero();
    assertThat(call.out())
        .contains("River gauge")
        .contains("Closed-loop gain")
        .contains("None: the design states no limits");
  }

  @Test
  void refusesACountThatIsNone() {
    CapturedCall call = call("spread", "-", "--samples", "0");

    assertThat(call.status()).isEqualTo(2);
    assertThat(call.err()).contains("Found 0 samples, expected 1 to 1000000.");
  }
}
