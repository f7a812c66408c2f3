package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PhysicsTest {
  /** The SI Brochure, 9th edition, 2019: both constants are exact. */
  @Test
  void constantsAreThoseOfTheSi() {
    assertThat(Physics.BOLTZMANN).isEqualTo(1.380649e-23);
    assertThat(Physics.ELEMENTARY_CHARGE).isEqualTo(1.602176634e-19);
  }

  /** kT/q worked out from the constants of the SI Brochure 2019, eleven digits. */
  @ParameterizedTest
  @CsvSource({
    "293.15, 25.261712458e-3",
    "298.15, 25.692579121e-3",
    "300, 25.851999786e-3",
    "300.15, 25.864925786e-3"
  })
  void thermalVoltageIsKtOverQ(double kelvin, double volts) {
    assertThat(Physics.thermalVoltage(kelvin)).isCloseTo(volts, within(5e-13));
  }

  /** I_S(35 °C)/I_S(25 °C) with X = 3 and a gap of 1.12 V (form from memory: Gray and Meyer). */
  @Test
  void saturationCurrentGrowsMoreThanFourfoldInTenKelvin() {
    assertThat(Physics.saturationCurrentFactor(298.15)).isEqualTo(1);
    assertThat(Physics.saturationCurrentFactor(308.15)).isCloseTo(4.543134, within(5e-7));
  }

  /** (T/T₀)^1.5 at 75 °C (exponent typical, from memory). */
  @Test
  void betaGrowsByAQuarterInFiftyKelvin() {
    assertThat(Physics.betaFactor(298.15)).isEqualTo(1);
    assertThat(Physics.betaFactor(348.15)).isCloseTo(1.261820, within(5e-7));
  }
}
