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

class SizeCommandTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 500},
       "hookups": [
        {"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}},
        {"name": "bare", "feedback": {"kind": "open"}}]}
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
    CapturedCall call = call("size", "-", "--hookup", "divider", "--gain", "11", "--json");

    assertThat(call.status()).isZero();
    JsonNode best = new ObjectMapper().readTree(call.out()).at("/dividers/0");
    assertThat(best.get("changes").findValuesAsText("path"))
        .containsExactly("hookups.divider.feedback.upper", "hookups.divider.feedback.lower");
    assertThat(best.at("/changes/0/value").isNumber()).isTrue();
    assertThat(best.get("gain").asDouble()).isBetween(10.5, 11.5);
    assertThat(best.get("gainLow").asDouble()).isLessThan(best.get("gain").asDouble());
    assertThat(best.get("dividerCurrent").asDouble()).isPositive();
    assertThat(best.get("score").isNumber()).isTrue();
  }

  @Test
  void printsText() {
    CapturedCall call = call("size", "-", "--hookup", "divider", "--gain", "11", "--series", "E96");

    assertThat(call.status()).isZero();
    assertThat(call.out())
        .contains("Dividers for a gain of 11")
        .contains("What the first gives up");
  }

  @Test
  void refusesWhatCannotBe() {
    assertThat(call("size", "-", "--hookup", "divider", "--gain", "much").err())
        .contains("Found the gain \"much\", expected a number.");
    assertThat(call("size", "-", "--hookup", "divider", "--gain", "2", "--series", "E7").status())
        .isEqualTo(2);
    assertThat(call("size", "-", "--hookup", "divider", "--gain", "0.5").status()).isEqualTo(1);
    CapturedCall open = call("size", "-", "--hookup", "bare", "--gain", "11");
    assertThat(open.status()).isEqualTo(1);
    assertThat(open.err())
        .isEqualToIgnoringNewLines(
            "hookups.bare.feedback: found an open hookup, expected one with feedback");
    CapturedCall tooMuch = call("size", "-", "--hookup", "divider", "--gain", "600");
    assertThat(tooMuch.status()).isEqualTo(1);
    assertThat(tooMuch.err()).contains("expected less than 500");
  }

  /** A wire for a divider: null takes the lower resistor away. */
  @Test
  void aFollowerLosesItsLowerResistor() throws IOException {
    CapturedCall call = call("size", "-", "--hookup", "divider", "--gain", "1", "--json");

    assertThat(call.status()).isZero();
    JsonNode changes = new ObjectMapper().readTree(call.out()).at("/dividers/0/changes");
    assertThat(changes.findValuesAsText("path"))
        .containsExactly("hookups.divider.feedback.upper", "hookups.divider.feedback.lower");
    assertThat(changes.at("/0/value").asDouble()).isZero();
    assertThat(changes.at("/1/value").isNull()).isTrue();
  }
}
