package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Integrals whose values are known in closed form. */
class AdaptiveQuadratureTest {
  private static double[] integrate(
      AdaptiveQuadrature.Functions functions, int count, double accuracy, double... limits) {
    return AdaptiveQuadrature.integrate(functions, count, limits, accuracy);
  }

  /** Fifteen points of Kronrod's are exact up to degree 23, so one part is. */
  @Test
  void polynomialsAreExact() {
    for (int degree = 0; degree <= 22; degree += 2) {
      int power = degree;
      double[] value = integrate((x, y) -> y[0] = Math.pow(x, power), 1, 1, -1, 1);
      assertThat(value[0]).isCloseTo(2.0 / (degree + 1), within(1e-15));
    }
  }

  @Test
  void severalFunctionsOfVeryDifferentSizeAreIntegratedAtOnce() {
    double[] values =
        integrate(
            (x, y) -> {
              y[0] = Math.exp(x);
              y[1] = 1e-12 * x;
            },
            2,
            1e-10,
            0,
            1,
            3);
    assertThat(values[0]).isCloseTo(Math.exp(3) - 1, within(1e-12 * Math.exp(3)));
    assertThat(values[1]).isCloseTo(4.5e-12, within(1e-26));
  }

  /** ∫ w²/(w² + x²) dx = w atan(x/w), for a peak of a ten-thousandth of the range. */
  @Test
  void aNarrowPeakIsFound() {
    double w = 1e-4;
    double[] value = integrate((x, y) -> y[0] = w * w / (w * w + x * x), 1, 1e-8, -0.7, 1);
    double exact = w * (Math.atan(1 / w) + Math.atan(0.7 / w));
    assertThat(value[0]).isCloseTo(exact, within(1e-12 * exact));
  }

  @Test
  void whatIsNotFiniteIsAFailure() {
    assertThatThrownBy(() -> integrate((x, y) -> y[0] = Double.NaN, 1, 1e-8, 0, 1))
        .isInstanceOf(ArithmeticException.class);
    assertThatThrownBy(() -> integrate((x, y) -> y[0] = 1 / x, 1, 1e-8, 0, 1))
        .isInstanceOf(ArithmeticException.class);
  }
}
