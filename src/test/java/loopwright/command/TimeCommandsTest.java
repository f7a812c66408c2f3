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

/** The sub-commands that solve in time. */
class TimeCommandsTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 1e5, "poles": [100], "slewRate": 1e6,
         "deadZone": 0.5},
       "hookups": [
        {"name": "divider", "source": {"amplitude": 0.2},
         "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}},
        {"name": "follower", "feedback": {"kind": "nonInverting", "upper": 0}}]}
      """;

  private static final String OSCILLATING =
      DESIGN.replace("[100]", "[100, 1e5, 1e5]").replace("\"deadZone\": 0.5", "\"deadZone\": 0");

  private static CapturedCall call(String design, String... arguments) {
    CommandLineProgram program =
        new CommandLineProgram(
            new CommandServices(
                new DesignFile(Shelf.empty(), Map.of()),
                Predictor::predict,
                prediction -> List.of()));
    return CapturedCall.of(program, design.getBytes(StandardCharsets.UTF_8), arguments);
  }

  @Test
  void stepPrintsCurvesAndFigures() throws IOException {
    CapturedCall call = call(DESIGN, "step", "-", "--json");
    assertThat(call.status()).isZero();
    assertThat(call.err()).isEmpty();
    JsonNode json = new ObjectMapper().readTree(call.out());
    assertThat(json.get("hookups").findValuesAsText("name")).containsExactly("divider", "follower");
    JsonNode divider = json.at("/hookups/0");
    assertThat(divider.at("/figures/slewRising/formula").asDouble()).isEqualTo(1e6);
    // 0.8 of 0.8 of 24 V, and on the way the output waits for 1 V of dead zone.
    assertThat(divider.at("/figures/slewRising/solved").asDouble())
        .isCloseTo(1e6 * 15.36 / 16.36, within(1e3));
    assertThat(divider.get("steps").findValuesAsText("kind"))
        .containsExactly("small", "rising", "falling");
    JsonNode rising = divider.at("/steps/1");
    assertThat(rising.get("times")).hasSameSizeAs(rising.get("output"));
    assertThat(rising.at("/output/0").asDouble())
        .isCloseTo(rising.get("from").asDouble(), within(1e-6));
    assertThat(divider.get("oscillation").isNull()).isTrue();
    assertThat(divider.get("reason").asText()).isEqualTo("nothing oscillates at any level");
  }

  @Test
  void stepShowsTheOscillation() throws IOException {
    CapturedCall json = call(OSCILLATING, "step", "-", "--hookup", "follower", "--json");
    JsonNode oscillation = new ObjectMapper().readTree(json.out()).at("/hookups/0/oscillation");
    double forecast = oscillation.get("forecastFrequency").asDouble();
    assertThat(oscillation.get("earlyFrequency").asDouble())
        .isCloseTo(forecast, within(0.01 * forecast));
    assertThat(oscillation.at("/settled/amplitude").asDouble()).isBetween(0.01, 12.0);

    CapturedCall text = call(OSCILLATING, "step", "-", "--hookup", "follower");
    assertThat(text.out()).contains("hookup 'follower'", "It settles to", "It rides on");
  }

  @Test
  void distortionPrintsBothRoads() throws IOException {
    CapturedCall call = call(DESIGN, "distortion", "-", "--hookup", "divider", "--json");
    assertThat(call.status()).isZero();
    JsonNode divider = new ObjectMapper().readTree(call.out()).at("/hookups/0");
    assertThat(divider.get("harmonics")).hasSize(51);
    assertThat(divider.get("output")).hasSize(1024);
    assertThat(divider.get("change").asDouble())
        .isLessThan(divider.get("changeAllowed").asDouble());
    // The loop gain at 1 kHz is a tenth of that at rest.
    assertThat(divider.get("thd").asDouble()).isGreaterThan(divider.get("staticThd").asDouble());

    CapturedCall text = call(DESIGN, "distortion", "-");
    assertThat(text.out()).contains("Distortion at 1 kHz", "Steady: the last two of");
    assertThat(text.out()).contains("Not solved: the source has no amplitude.");
  }

  @Test
  void refusesAnUnknownHookup() {
    for (String command : List.of("step", "distortion")) {
      CapturedCall call = call(DESIGN, command, "-", "--hookup", "inverting");
      assertThat(call.status()).isEqualTo(2);
      assertThat(call.err()).contains("inverting", "divider, follower");
      assertThat(call.out()).isEmpty();
      assertThat(call(DESIGN, command, "--help").out()).contains("FILE", "--hookup", "--json");
    }
  }
}
