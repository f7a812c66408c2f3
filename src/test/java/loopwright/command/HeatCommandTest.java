package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Predictor;
import org.junit.jupiter.api.Test;

class HeatCommandTest {
  private static CapturedCall call(String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(new ShelfFile().shipped(), Map.of()),
            Predictor::predict,
            prediction -> List.of());
    return CapturedCall.of(new CommandLineProgram(services), new byte[0], arguments);
  }

  @Test
  void heatAsJson() throws IOException {
    CapturedCall call = call("heat", "examples/everything-fitted.json", "--json");
    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    assertThat(json.at("/hookup").asText()).isEqualTo("times 10");
    assertThat(json.at("/ambients/0/ambient").asDouble()).isEqualTo(10);
    double before = 0;
    for (JsonNode ambient : json.get("ambients")) {
      assertThat(ambient.get("idleCurrent").asDouble()).isGreaterThan(before);
      assertThat(ambient.get("loop").asDouble()).isBetween(0.0, 1.0);
      before = ambient.get("idleCurrent").asDouble();
    }
    assertThat(json.at("/runaway/0/device").asText()).isEqualTo("out.upper");
    assertThat(json.at("/overSwing/0/worstMean").asDouble())
        .isGreaterThanOrEqualTo(json.at("/overSwing/0/rest").asDouble());
    assertThat(json.get("cautions")).isNotEmpty();
  }

  @Test
  void heatAsText() {
    assertThat(call("heat", "examples/hydrophone-follower.json").out())
        .contains("against ambient temperature", "Output short-circuited", "licensed practice");
  }
}
