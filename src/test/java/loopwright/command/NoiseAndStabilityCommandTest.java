package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

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

class NoiseAndStabilityCommandTest {
  /** A noiseless amplifier, so that its resistors alone are heard. */
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 1e6, "poles": [100, "30M", "50M"]},
       "hookups": [
        {"name": "divider", "source": {"resistance": "1k"},
         "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"},
         "load": {"capacitance": "1n"}},
        {"name": "open", "feedback": {"kind": "open"}}]}
      """;

  private static CapturedCall call(String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(Shelf.empty(), Map.of()), Predictor::predict, prediction -> List.of());
    return CapturedCall.of(
        new CommandLineProgram(services), DESIGN.getBytes(StandardCharsets.UTF_8), arguments);
  }

  /** √(4kT(R_source + R_upper ∥ R_lower)) at 25 °C (Johnson 1928): 1.9 kΩ, 5.593 nV/√Hz. */
  @Test
  void noiseOfResistorsAsJson() throws IOException {
    CapturedCall call = call("noise", "-", "--frequencies", "1k", "--json");

    assertThat(call.status()).isZero();
    JsonNode density = new ObjectMapper().readTree(call.out()).at("/densities/0");
    double expected = 4.057785107e-9 * Math.sqrt(1.9);
    assertThat(density.get("input").asDouble()).isEqualTo(expected, within(1e-4 * expected));
    assertThat(density.at("/contributors/0/part").asText())
        .isEqualTo("hookups.divider.source.resistance");
    assertThat(density.at("/contributors/0/share").asDouble()).isEqualTo(1 / 1.9, within(1e-3));
  }

  @Test
  void noiseAsText() {
    assertThat(call("noise", "-", "--hookup", "divider").out())
        .contains("referred to the generator")
        .contains("From 10 Hz to 100 kHz");
  }

  @Test
  void stabilityAsJson() throws IOException {
    CapturedCall call = call("stability", "-", "--json");

    assertThat(call.status()).isZero();
    JsonNode json = new ObjectMapper().readTree(call.out());
    assertThat(json.get("hookup").asText()).isEqualTo("divider");
    JsonNode load = json.at("/sweeps/0");
    assertThat(load.get("path").asText()).isEqualTo("hookups.divider.load.capacitance");
    assertThat(load.get("points").findValuesAsText("present")).contains("true");
    assertThat(json.get("sweeps").findValuesAsText("path"))
        .contains("hookups.divider.probes.out")
        .doesNotContain("hookups.divider.probes.generator", "hookups.divider.probes.ground");
    JsonNode gain = json.at("/sweeps/3");
    assertThat(gain.get("path").asText()).isEqualTo("hookups.divider.feedback.upper");
    // The lower the gain, the less stable: T = A/NG with poles at 30 and 50 MHz.
    assertThat(gain.at("/points/0/stable").asBoolean()).isFalse();
    assertThat(gain.get("points").get(gain.get("points").size() - 1).get("stable").asBoolean())
        .isTrue();
  }

  @Test
  void stabilityAsTextAndRefusal() {
    assertThat(call("stability", "-").out())
        .contains("Load capacitance: ")
        .contains("worst of the whole swing");
    CapturedCall open = call("stability", "-", "--hookup", "open");
    assertThat(open.status()).isEqualTo(1);
    assertThat(open.err()).contains("hookups.open.feedback: found an open hookup");
  }
}
