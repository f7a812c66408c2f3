package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Figures of steps, of amplifiers whose answers are known in closed form. */
class StepFiguresTest {
  private static final String FOLLOWER = "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": 0}";

  /**
   * The loop K/(s(1 + s/p₂)) closed: overshoot e^(−πζ/√(1 − ζ²)), ζ = sin PM/(2√cos PM), p₂ = 4ζ² K
   * (worked out from the loop's own equations; the overshoot is in every text on control). The last
   * digit printed is 1e-6 of the step; the integrator's own error is below 1e-3 of it.
   */
  @ParameterizedTest
  @CsvSource({
    "0.288675, 0.416373",
    "0.707107, 0.233212",
    "1.008608, 0.161345",
    "1.5, 0.087732",
    "3.891644, 0"
  })
  void overshootFollowsTheTwoPoleTable(double pole, double overshoot) {
    Predicted loop =
        Predicted.figures("\"gain\": 1e9, \"poles\": [0.001, " + pole * 1e6 + "]", FOLLOWER);
    assertThat(loop.solved("overshoot")).isCloseTo(overshoot, within(2e-3));
  }

  /** One pole: to 1 % after ln 100 time constants of the closed loop. */
  @Test
  void settlesAfterFourAndAHalfTimeConstants() {
    Predicted loop = Predicted.figures("\"gain\": 1e6, \"poles\": [1]", FOLLOWER);
    double expected = Math.log(100) / (2 * Math.PI * 1e6);
    assertThat(loop.solved("settlingTime")).isCloseTo(expected, within(0.03 * expected));
  }

  /** SR/(2π V_p): 0.5 V/µs at 10 V is 7.95774715 kHz. */
  @Test
  void fullPowerBandwidthIsTheSlewRateOverTheSteepestSine() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1e6, \"poles\": [10], \"slewRate\": 5e5",
            FOLLOWER + ", \"source\": {\"amplitude\": 10}");
    assertThat(loop.hookup().figures().get("fullPowerBandwidth").formula().number().orElseThrow())
        .isCloseTo(7957.74715, within(1e-4));
    assertThat(loop.solved("slewRising")).isCloseTo(5e5, within(500.0));
    assertThat(loop.solved("slewFalling")).isCloseTo(5e5, within(500.0));
    assertThat(loop.solved("fullPowerBandwidth")).isCloseTo(7957.74715, within(8.0));
  }

  /** Where something grows at rest there is nothing to settle to. */
  @Test
  void saysWhyThereIsNoSettling() {
    Predicted loop = Predicted.figures("\"gain\": 1e9, \"poles\": [0.001, 1e5, 1e5]", FOLLOWER);
    FigureValue settling = loop.hookup().figures().get("settlingTime").solved();
    assertThat(settling.number()).isEmpty();
    assertThat(settling.says()).isEqualTo("something grows at rest");
  }
}
