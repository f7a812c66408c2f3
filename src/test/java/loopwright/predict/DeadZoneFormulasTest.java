package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Describing function and harmonics of a dead zone. The describing function is that of Gelb and
 * Vander Velde, Multiple-Input Describing Functions, 1968; the values were computed from the
 * Fourier integral by quadrature to 18 digits with a general mathematics library.
 */
class DeadZoneFormulasTest {
  @ParameterizedTest
  @CsvSource({
    "0.01, 0.987267817",
    "0.05, 0.936364559",
    "0.1, 0.872888572",
    "0.2, 0.747060078",
    "0.5, 0.391002219"
  })
  void theDescribingFunctionFollowsTheTable(double zone, double fundamental) {
    assertThat(DeadZoneFormulas.describingFunction(zone)).isCloseTo(fundamental, within(5e-10));
  }

  @ParameterizedTest
  @CsvSource({"0.01, 0.0060889290", "0.1, 0.0626646212"})
  void harmonicsTwoToFiftyFollowTheTable(double zone, double distortion) {
    assertThat(DeadZoneFormulas.distortion(zone)).isCloseTo(distortion, within(5e-11));
  }

  @Test
  void aLoopGainOfHundredLeavesTheStatedDistortion() {
    // Gain 1000, feedback 0.1, dead zone 0.6 V, 1 V peak in: the zone at the input is 0.6 mV.
    double zone = 0.6 / 1000;
    assertThat(DeadZoneFormulas.distortion(zone)).isCloseTo(3.6159740e-4, within(5e-12));
    double gain = 1000 / (1 + 0.1 * 1000) * DeadZoneFormulas.describingFunction(zone);
    assertThat(gain).isCloseTo(9.89342630, within(5e-9));
  }

  @Test
  void aSignalWithinTheZoneHasNoGainAndNoDistortion() {
    assertThat(DeadZoneFormulas.describingFunction(1)).isZero();
    assertThatThrownBy(() -> DeadZoneFormulas.distortion(1.2))
        .isInstanceOf(UnsolvedException.class)
        .hasMessageContaining("dead zone");
  }
}
