package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The follower of an amplifier with an integrator and one more pole, L = K/(s(1 + s/p₂)): ζ = sin
 * PM/(2√cos PM), p₂/K = 4ζ², ω_c/K = sin PM, peak 1/(2ζ√(1 − ζ²)) (worked out from the loop's own
 * equations). The integrator is a pole at 1 mHz of a gain of 1e9.
 */
class TwoPoleLoopTest {
  private static final double UNITY = 1e6;

  private static final String FOLLOWER = "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": 0}";

  private static Predicted follower(double... poles) {
    StringBuilder list = new StringBuilder("0.001");
    for (double pole : poles) {
      list.append(", ").append(pole);
    }
    return Predicted.figures("\"gain\": 1e9, \"poles\": [" + list + "]", FOLLOWER);
  }

  @ParameterizedTest
  @CsvSource({
    "30, 0.268642, 0.288675, 0.500000, 5.7212",
    "45, 0.420448, 0.707107, 0.707107, 2.3500",
    "52, 0.502147, 1.008608, 0.788011, 1.2246",
    "60, 0.612372, 1.500000, 0.866025, 0.2803",
    "65.5, 0.706528, 1.996728, 0.909961, 0.0000",
    "76, 0.986362, 3.891644, 0.970296, 0"
  })
  void marginDampingAndPeakingFollowTheTable(
      double margin, double damping, double pole, double crossing, double peaking) {
    Predicted loop = follower(pole * UNITY);
    assertThat(loop.solved("phaseMargin")).isCloseTo(margin, within(1e-4));
    assertThat(loop.solved("unityFrequency") / UNITY).isCloseTo(crossing, within(1e-6));
    assertThat(loop.solved("peaking")).isCloseTo(peaking, within(5e-5));
    SwingLevel rest = loop.hookup().overSwing().get(0);
    double growth = rest.growth().orElseThrow();
    double omega = 2 * Math.PI * rest.frequency().orElseThrow();
    assertThat(-growth / Math.hypot(growth, omega)).isCloseTo(damping, within(1e-6));
    assertThat(loop.solvedOrNone("gainMargin")).isEmpty();
  }

  /** L = K/(s(1 + s/p₂)(1 + s/p₃)): gain margin (p₂ + p₃)/K; 1, 2 and 5 give 16.90196 dB. */
  @ParameterizedTest
  @ValueSource(doubles = {1, 14})
  void aThirdPoleLimitsTheGain(double scale) {
    Predicted loop = follower(2 * UNITY / scale, 5 * UNITY / scale);
    double margin = Math.pow(10, 16.90196 / 20) / scale;
    if (margin > 1) {
      assertThat(20 * Math.log10(loop.solved("gainMargin"))).isCloseTo(16.90196, within(1e-5));
      assertThat(loop.hookup().unstablePoles()).isEmpty();
    } else {
      assertThat(loop.solvedOrNone("gainMargin")).isEmpty();
      assertThat(loop.hookup().unstablePoles()).hasSize(1);
      assertThat(loop.solved("phaseMargin")).isNegative();
    }
  }

  /** −3 dB of a loop with one pole: K/2π, the loop's unity-gain frequency. */
  @ParameterizedTest
  @ValueSource(doubles = {1e3, 1e5})
  void onePoleGivesTheBandwidthOfTheLoop(double gain) {
    double pole = UNITY / gain;
    Predicted loop =
        Predicted.figures("\"gain\": " + gain + ", \"poles\": [" + pole + "]", FOLLOWER);
    double expected = pole * (1 + gain);
    assertThat(loop.solved("bandwidth")).isCloseTo(expected, within(1e-8 * expected));
    assertThat(loop.solved("unityFrequency"))
        .isCloseTo(pole * Math.sqrt(gain * gain - 1), within(1e-8 * expected));
  }
}
