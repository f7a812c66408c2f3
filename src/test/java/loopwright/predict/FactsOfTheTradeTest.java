package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/**
 * A three-stage bench amplifier with a measured gain of 500 whose output, both inputs at ground,
 * would stand at 500 × −6.1 mV, behind a divider ratio of 10 (common practice, no source).
 * Tolerances are half a unit of the last digit said.
 */
class FactsOfTheTradeTest {
  private static final String MEASURED = "\"gain\": 500, \"inputOffset\": \"6.1 mV\"";

  private static final String TENFOLD =
      """
      "source": {"amplitude": 0.1},
      "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}
      """;

  @Test
  void aGainOfFiveHundredMakesTenToNinePointEight() {
    Predicted loop = Predicted.figures(MEASURED, TENFOLD);
    assertThat(loop.solved("closedLoopGain")).isCloseTo(9.804, within(5e-4));
    assertThat(loop.formula("closedLoopGain")).isCloseTo(9.804, within(5e-4));
    assertThat(loop.solved("outputOffset")).isCloseTo(-59.8e-3, within(5e-5));
    assertThat(loop.formula("outputOffset")).isCloseTo(-59.8e-3, within(5e-5));
    assertThat(loop.solved("inputOffset")).isCloseTo(6.1e-3, within(1e-9));
  }

  @Test
  void bothInputsAtGroundTheOutputStandsAtGainTimesOffset() {
    Predicted open = Predicted.figures(MEASURED, "\"feedback\": {\"kind\": \"open\"}");
    assertThat(open.hookup().rest().orElseThrow().nodes().get("out"))
        .isCloseTo(-3.05, within(1e-9));
  }

  @Test
  void aFollowerIsAFifthOfAPerCentLow() {
    Predicted follower =
        Predicted.figures(
            MEASURED,
            """
            "source": {"amplitude": 0.1}, "feedback": {"kind": "nonInverting", "upper": 0}
            """);
    assertThat(follower.solved("closedLoopGain")).isCloseTo(0.998, within(5e-5));
  }

  /**
   * With a dead zone of ±0.6 V the output rests in the zone's edge at −48.0 mV where the offset
   * formula says −59.8 mV, and the error moves between −48.0 and −71.6 mV over a cycle.
   */
  @Test
  void theCrossoverMovesTheOffsetOverACycle() {
    Predicted loop = Predicted.figures(MEASURED + ", \"deadZone\": 0.6", TENFOLD);
    assertThat(loop.formula("outputOffset")).isCloseTo(-59.8e-3, within(5e-5));
    assertThat(loop.solved("outputOffset")).isCloseTo(-48.0e-3, within(5e-5));
    assertThat(loop.hookup().rest().orElseThrow().nodes().get("out"))
        .isCloseTo(-48.0e-3, within(5e-5));

    Waveform waveform = loop.hookup().waveform().orElseThrow();
    double gain = 500 / 51.0;
    double[] error =
        IntStream.range(0, waveform.out().length)
            .mapToDouble(k -> waveform.out()[k] - gain * waveform.generator()[k])
            .sorted()
            .toArray();
    assertThat(error[0]).isCloseTo(-71.6e-3, within(5e-5));
    assertThat(error[error.length - 1]).isCloseTo(-48.0e-3, within(5e-5));
  }

  /** The zone of ±0.6 V is ±1.2 mV at the input. */
  @Test
  void theDeadZoneAtTheInputIsDividedByTheGain() {
    Predicted loop = Predicted.figures(MEASURED + ", \"deadZone\": 0.6", TENFOLD);
    assertThat(loop.solved("deadZone")).isCloseTo(0.6, within(1e-9));
    assertThat(loop.solved("deadZoneAtInput")).isCloseTo(1.2e-3, within(5e-6));
  }
}
