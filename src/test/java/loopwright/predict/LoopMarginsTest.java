package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Margins of loops whose margins are known in closed form. */
class LoopMarginsTest {
  private static final double[] GRID =
      IntStream.range(0, 33).mapToDouble(i -> 1e-2 * Math.pow(10, i / 4.0)).toArray();

  /** L = K/(s (1 + s/p₂) (1 + s/p₃)), in rad/s. */
  private static DoubleFunction<double[]> integrator(double k, double p2, double p3) {
    return frequency -> {
      double w = 2 * Math.PI * frequency;
      double magnitude = k / (w * Math.hypot(1, w / p2) * Math.hypot(1, w / p3));
      double angle = -Math.PI / 2 - Math.atan(w / p2) - Math.atan(w / p3);
      return new double[] {magnitude * Math.cos(angle), magnitude * Math.sin(angle)};
    };
  }

  /** Two-pole loop: p₂/K = 4ζ², ω_c/K = sin PM (derived from the two-pole loop's own equations). */
  @ParameterizedTest
  @CsvSource({
    "30, 0.288675, 0.500000",
    "45, 0.707107, 0.707107",
    "52, 1.008608, 0.788011",
    "60, 1.500000, 0.866025",
    "65.5, 1.996728, 0.909961",
    "76, 3.891644, 0.970296"
  })
  void theTwoPoleLoopFollowsTheTable(double margin, double poleOverK, double crossingOverK) {
    double k = 1e4;
    LoopMargins margins =
        LoopMargins.of(integrator(k, poleOverK * k, Double.POSITIVE_INFINITY), GRID);
    assertThat(margins.crossing().frequency() * 2 * Math.PI / k)
        .isCloseTo(crossingOverK, within(1e-6));
    assertThat(margins.crossing().phaseMargin()).isCloseTo(margin, within(1e-4));
    assertThat(margins.gainMargin()).isEmpty();
  }

  @Test
  void theThreePoleLoopHasItsGainMarginAtTheGeometricMean() {
    // GM = (p₂ + p₃)/K at ω = √(p₂ p₃): K = 1, poles 2 and 5 give 7, that is 16.90196 dB.
    LoopMargins margins = LoopMargins.of(integrator(1, 2, 5), GRID);
    assertThat(20 * Math.log10(margins.gainMargin().orElseThrow()))
        .isCloseTo(16.90196, within(5e-6));
  }

  @Test
  void aMarginBelowOneIsNamed() {
    LoopMargins margins = LoopMargins.of(integrator(14, 2, 5), GRID);
    assertThat(margins.gainMargin()).isEmpty();
    assertThat(margins.marginsBelowOne()).hasSize(1);
    assertThat(margins.marginsBelowOne().get(0)).isCloseTo(0.5, within(1e-9));
    assertThat(margins.crossing().phaseMargin()).isNegative();
  }

  @Test
  void aLoopGainThatNeverPassesOneHasNoMargin() {
    LoopMargins margins = LoopMargins.of(frequency -> new double[] {0.5, 0}, GRID);
    assertThat(margins.unity()).isEmpty();
  }
}
