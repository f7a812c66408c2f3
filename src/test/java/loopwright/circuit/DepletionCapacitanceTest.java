package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** C₀/(1 − v/0.7 V)^(1/3) below 0.42 V, its tangent above. */
class DepletionCapacitanceTest {
  /** The charge is the integral of the capacitance, by Gauss quadrature (Hipparchus). */
  @ParameterizedTest
  @ValueSource(doubles = {-40, -5, -0.3, 0.2, 0.41999, 0.42, 0.42001, 0.6, 0.9, 2})
  void chargeIsTheIntegralOfCapacitance(double voltage) {
    double join = Math.min(0.42, voltage);
    double below = integral(0, join);
    double above = voltage > 0.42 ? integral(0.42, voltage) : 0;
    assertThat(DepletionCapacitance.charge(voltage))
        .isCloseTo(below + above, within(1e-10 * (1 + Math.abs(voltage))));
  }

  @Test
  void noChargeAtZeroBias() {
    assertThat(DepletionCapacitance.charge(0)).isZero();
    assertThat(DepletionCapacitance.factor(0)).isEqualTo(1);
  }

  /** (1 + 7/0.7)^(−1/3) = 11^(−1/3). */
  @Test
  void capacitanceFallsUnderReverseBias() {
    assertThat(DepletionCapacitance.factor(-7)).isCloseTo(1 / Math.cbrt(11), within(1e-15));
  }

  /** Value and slope of the law at 0.42 V, 0.4^(−1/3) and 0.4^(−4/3)/2.1, go on above. */
  @Test
  void theTangentContinuesTheLaw() {
    double value = Math.pow(0.4, -1.0 / 3);
    double slope = Math.pow(0.4, -4.0 / 3) / 2.1;
    assertThat(DepletionCapacitance.factor(0.42)).isCloseTo(value, within(1e-14));
    assertThat(DepletionCapacitance.factor(0.62)).isCloseTo(value + 0.2 * slope, within(1e-14));
    assertThat(DepletionCapacitance.factor(0.42 - 1e-9))
        .isCloseTo(value - 1e-9 * slope, within(1e-14));
  }

  private static double integral(double from, double to) {
    if (from == to) {
      return 0;
    }
    double low = Math.min(from, to);
    double high = Math.max(from, to);
    double area =
        new IterativeLegendreGaussIntegrator(12, 1e-13, 1e-13)
            .integrate(100_000, DepletionCapacitance::factor, low, high);
    return to > from ? area : -area;
  }
}
