package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Worked examples of the guides. */
class UncertaintyTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;

  /**
   * JCGM 100:2008, H.1, end gauge calibration, in nm: u_c = 32, effective degrees of freedom 16.
   * The inputs are from the guide's own table; unrounded u_c = 31.66.
   */
  @Test
  void theEndGaugeOfTheGuide() {
    double length = 50.000623e6;
    Uncertainty difference =
        Uncertainty.of(
            Contribution.normal("repeated observations", 5.8, 24),
            Contribution.normal("random effects of the comparator", 3.9, 5),
            Contribution.normal("systematic effects of the comparator", 6.7, 8));
    assertThat(difference.standard()).isEqualTo(9.7, within(0.05));
    assertThat(difference.degreesOfFreedom()).isEqualTo(25.6, within(0.3));
    double expansion =
        Contribution.rectangular("difference of expansion coefficients", 1e-6).standard();
    double temperature = Contribution.rectangular("difference of temperature", 0.05).standard();
    Uncertainty gauge =
        Uncertainty.of(
            Contribution.normal("standard", 25, 18),
            Contribution.normal("comparison", difference.standard(), difference.degreesOfFreedom()),
            Contribution.normal("expansion", length * 0.1 * expansion, 50),
            Contribution.normal("temperature", length * 11.5e-6 * temperature, 2));
    assertThat(gauge.standard()).isEqualTo(32, within(0.5));
    assertThat(gauge.standard()).isEqualTo(31.66, within(0.05));
    assertThat(Math.floor(gauge.degreesOfFreedom())).isEqualTo(16);
    // For 95 % the guide's Table G.2 has 2.17 at 16 degrees (95.45 %).
    assertThat(gauge.coverageFactor()).isEqualTo(2.17, within(0.005));
  }

  /**
   * EA-4/02 (1999), S3, calibration of a 10 kΩ resistor, in mΩ: 8.33 from a published worked file
   * of the example; U = 17 with k = 2. Inputs from memory.
   */
  @Test
  void theTenKilohmStandard() {
    Uncertainty resistor =
        Uncertainty.of(
            Contribution.normal("standard", 2.5, INFINITE),
            Contribution.rectangular("drift", 10),
            Contribution.rectangular("temperature of the standard", 2.75),
            Contribution.triangular("parasitics", 10_000e3 * 1.0e-6),
            Contribution.normal("ratio", 10_000e3 * 0.07e-6, INFINITE),
            Contribution.rectangular("temperature of the unknown", 5.5));
    assertThat(resistor.standard()).isEqualTo(8.33, within(0.01));
    assertThat(resistor.coverageFactor()).isEqualTo(2);
    assertThat(resistor.expanded()).isEqualTo(17, within(0.5));
  }

  /**
   * EA-4/02 (1999), S9, hand-held multimeter at 100 V: u = 0.030 V, and since the rectangular
   * resolution dominates k = 1.65 and U = 0.05 V. Inputs from memory.
   */
  @Test
  void theHandHeldMultimeter() {
    Uncertainty meter =
        Uncertainty.of(
            Contribution.normal("standard", 0.001, INFINITE),
            Contribution.rectangular("resolution", 0.05),
            Contribution.rectangular("calibrator", 0.011));
    assertThat(meter.standard()).isEqualTo(0.030, within(0.0005));
    assertThat(meter.dominant().map(Contribution::cause)).contains("resolution");
    assertThat(meter.coverageFactor()).isEqualTo(1.65);
    assertThat(meter.expanded()).isEqualTo(0.05, within(0.005));
  }

  @Test
  void aCycleBetweenLimits() {
    // JCGM 100:2008, H.1.3.4: ± 0.5 K, U-shaped: 0.35 K.
    assertThat(Contribution.uShaped("thermostat", 0.5).standard()).isEqualTo(0.35, within(0.005));
  }

  @Test
  void nothingIsKnownExactly() {
    assertThat(new Uncertainty(List.of()).expanded()).isZero();
    assertThat(new Uncertainty(List.of()).dominant()).isEmpty();
  }
}
