package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;

/** An amplifier known by its figures shows the figures that it was given, alone and in a loop. */
class FiguresAmplifierTest {
  private static final String OPEN = "\"feedback\": {\"kind\": \"open\"}";

  private static Map<String, Double> nodes(Predicted predicted) {
    return predicted.hookup().rest().orElseThrow().nodes();
  }

  @Test
  void gainAndOffsetComeBack() {
    Predicted open = Predicted.figures("\"gain\": 800, \"inputOffset\": \"-2 mV\"", OPEN);
    assertThat(open.solved("openLoopGain")).isCloseTo(800, within(1e-6));
    assertThat(open.solved("inputOffset")).isCloseTo(-2e-3, within(1e-9));
    assertThat(nodes(open).get("out")).isCloseTo(1.6, within(1e-9));
  }

  /** The output stops at its limit, the driver's output by the dead zone beyond it. */
  @Test
  void theOutputIsClampedAndTheDriverBeyondIt() {
    Predicted high =
        Predicted.figures(
            "\"gain\": 800, \"deadZone\": 0.6, \"outputHigh\": 9, \"outputLow\": -8",
            "\"source\": {\"dc\": 1}, " + OPEN);
    assertThat(nodes(high).get("out")).isCloseTo(9, within(1e-9));
    assertThat(nodes(high).get("gainOut")).isCloseTo(9.6, within(1e-9));
    Predicted low =
        Predicted.figures(
            "\"gain\": 800, \"deadZone\": 0.6, \"outputHigh\": 9, \"outputLow\": -8",
            "\"source\": {\"dc\": -1}, " + OPEN);
    assertThat(nodes(low).get("out")).isCloseTo(-8, within(1e-9));
    assertThat(nodes(low).get("gainOut")).isCloseTo(-8.6, within(1e-9));
  }

  @Test
  void theLimitsAreTheRailsUnlessStated() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1e5",
            """
            "source": {"amplitude": 1},
            "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}
            """);
    assertThat(loop.solved("clipHigh")).isCloseTo(12, within(1e-3));
    assertThat(loop.solved("clipLow")).isCloseTo(-12, within(1e-3));
  }

  /** Within the dead zone the output stands at zero whatever the driver does. */
  @Test
  void insideTheDeadZoneTheOutputStands() {
    Predicted open =
        Predicted.figures(
            "\"gain\": 500, \"deadZone\": 0.6", "\"source\": {\"dc\": \"1 mV\"}, " + OPEN);
    assertThat(nodes(open).get("gainOut")).isCloseTo(0.5, within(1e-9));
    assertThat(nodes(open).get("out")).isCloseTo(0, within(1e-9));
  }

  /** 500 × 10 mV = 5 V behind 100 Ω into 400 Ω. */
  @Test
  void theOutputResistanceDividesWithTheLoad() {
    Predicted open =
        Predicted.figures(
            "\"gain\": 500, \"outputResistance\": 100",
            "\"source\": {\"dc\": \"10 mV\"}, \"load\": {\"resistance\": 400}, " + OPEN);
    assertThat(nodes(open).get("out")).isCloseTo(4, within(1e-9));
    assertThat(nodes(open).get("gainOut")).isCloseTo(5, within(1e-9));
    assertThat(open.solved("outputResistance")).isCloseTo(100, within(1e-6));
  }

  /** 1 µA into each input drops 10 mV across 10 kΩ; equal resistances cancel. */
  @Test
  void biasCurrentsFlowIntoTheInputs() {
    String amplifier = "\"gain\": 1e6, \"inputBiasCurrent\": \"1u\"";
    Predicted unequal =
        Predicted.figures(
            amplifier,
            """
            "source": {"resistance": "10k"}, "feedback": {"kind": "nonInverting", "upper": 0}
            """);
    assertThat(nodes(unequal).get("in+")).isCloseTo(-10e-3, within(1e-9));
    assertThat(unequal.solved("outputOffset")).isCloseTo(-10e-3, within(2e-8));
    Predicted equal =
        Predicted.figures(
            amplifier,
            """
            "source": {"resistance": "10k"}, "feedback": {"kind": "nonInverting", "upper": "10k"}
            """);
    assertThat(equal.solved("outputOffset")).isCloseTo(0, within(2e-8));
  }

  /** R_id (1 + T): 100 kΩ and a loop gain of 99.01 behind the loaded divider. */
  @Test
  void theLoopRaisesTheInputResistance() {
    Predicted follower =
        Predicted.figures(
            "\"gain\": 1000, \"inputResistance\": \"100k\"",
            "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": 0}");
    assertThat(follower.solved("inputResistance")).isCloseTo(100e3 * 1001, within(1.0));
  }

  @Test
  void commonModeRejectionComesBack() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1e4, \"commonModeRejection\": 2000",
            "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": \"9k\", \"lower\": \"1k\"}");
    assertThat(loop.solved("commonModeRejection")).isCloseTo(2000, within(1e-3));
    // κA(1 + c/2)/(1 + A(1 − c/2)/NG) with c = 1/2000.
    double c = 1 / 2000.0;
    assertThat(loop.solved("closedLoopGain"))
        .isCloseTo(1e4 * (1 + c / 2) / (1 + 1e4 * (1 - c / 2) / 10), within(1e-9));
  }

  /** An inverting hookup: ideal/(1 + NG/A). */
  @Test
  void theInvertingHookupFollowsBlack() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 400",
            "\"feedback\": {\"kind\": \"inverting\", \"upper\": \"10k\", \"inputResistor\": \"1k\"}");
    assertThat(loop.solved("closedLoopGain")).isCloseTo(-10 / (1 + 11 / 400.0), within(1e-9));
    assertThat(loop.solved("inputResistance")).isCloseTo(1000 + 10e3 / 401, within(1e-6));
  }
}
