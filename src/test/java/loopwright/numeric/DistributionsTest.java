package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.distribution.continuous.ChiSquaredDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Against a general library and a printed table. */
class DistributionsTest {
  @ParameterizedTest
  @CsvSource({"0.1, 1", "3.84, 1", "1, 2", "12, 3", "40, 20", "5, 20", "150, 60", "700, 61"})
  void chiSquaredAsHipparchusHasIt(double value, int degrees) {
    double expected = 1 - new ChiSquaredDistribution(degrees).cumulativeProbability(value);
    assertThat(ChiSquared.exceeded(value, degrees)).isEqualTo(expected, within(1e-10));
  }

  @Test
  void nothingIsExceededByCertainty() {
    assertThat(ChiSquared.exceeded(0, 4)).isEqualTo(1);
  }

  /** JCGM 100:2008, Table G.2: 16 degrees of freedom. */
  @ParameterizedTest
  @CsvSource({"0.95, 16, 2.12", "0.9545, 16, 2.17", "0.99, 16, 2.92", "0.95, 1, 12.71"})
  void studentsFactorsAsPrinted(double coverage, int degrees, double printed) {
    assertThat(StudentT.factor(coverage, degrees)).isEqualTo(printed, within(0.005));
  }

  @ParameterizedTest
  @CsvSource({"0.5, 2", "0.9545, 3", "0.99, 7", "0.95, 30", "0.6827, 200"})
  void studentsFactorsAsHipparchusHasThem(double coverage, int degrees) {
    double expected = new TDistribution(degrees).inverseCumulativeProbability((1 + coverage) / 2);
    assertThat(StudentT.factor(coverage, degrees)).isEqualTo(expected, within(1e-7 * expected));
  }
}
