package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.numeric.RootSearch;
import loopwright.part.DiodeParameters;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Junctions against temperature: I_S(T) = I_S (T/T₀)³ exp((1.12 eV/k)(1/T₀ − 1/T)), β as (T/T₀)^1.5
 * (laws from memory), values worked out from them with another program.
 */
class JunctionTemperatureTest {
  private static final double CURRENT = 1e-3;

  private static final TransistorParameters PARAMETERS =
      IdealParts.carrying(CURRENT, 0.65, 200, 298.15);

  /** V_BE at constant I_C, 0.65 V at 25 °C. */
  @ParameterizedTest
  @CsvSource({"0, 0.6955938", "25, 0.65", "50, 0.6038636", "75, 0.5572267"})
  void baseEmitterVoltageFallsWithTemperature(double celsius, double volts) {
    assertThat(voltage(273.15 + celsius)).isCloseTo(volts, within(5e-8));
  }

  /** dV_BE/dT = (V_BE − E_G − 3V_T)/T at constant I_C: −1.8349077 mV/K at 0.65 V and 25 °C. */
  @Test
  void baseEmitterVoltageFallsByNearlyTwoMillivoltsPerKelvin() {
    double slope = (voltage(298.15 + 0.01) - voltage(298.15 - 0.01)) / 0.02;
    assertThat(slope).isCloseTo(-1.8349077e-3, within(5e-11));
  }

  @Test
  void currentGainRisesWithTemperature() {
    TransistorEquations equations = new TransistorEquations(PARAMETERS, 348.15, 0);
    equations.evaluate(0.55, 0);
    assertThat(equations.collectorCurrent() / equations.baseCurrent())
        .isCloseTo(200 * 1.261820, within(1e-4));
  }

  /** The recombination current follows I_S to the power 1/n_rec. */
  @Test
  void recombinationCurrentGrowsByTheRootOfTheLaw() {
    TransistorParameters leaky = IdealParts.transistor(1e-30, 1e30).withRecombinationCurrent(1e-13);
    double vbe = 0.3;
    TransistorEquations warm = new TransistorEquations(leaky, 308.15, 0);
    warm.evaluate(vbe, 0);
    double expected =
        1e-13 * Math.sqrt(4.543134) * Math.expm1(vbe / 2 / Physics.thermalVoltage(308.15));
    assertThat(warm.baseCurrent() / expected).isCloseTo(1, within(1e-7));
  }

  /** A diode's I_S follows the law to the power 1/n. */
  @Test
  void diodeCurrentGrowsByTheRootOfTheLaw() {
    DiodeParameters diode = new DiodeParameters(1e-9, 1.8, 0, 0, 0);
    DiodeEquations warm = new DiodeEquations(diode, 308.15, 0);
    warm.evaluate(-1);
    double expected =
        1e-9 * Math.pow(4.543134, 1 / 1.8) * Math.expm1(-1 / 1.8 / Physics.thermalVoltage(308.15));
    assertThat(warm.current() / expected).isCloseTo(1, within(1e-7));
  }

  private static double voltage(double kelvin) {
    TransistorEquations equations = new TransistorEquations(PARAMETERS, kelvin, 0);
    return RootSearch.find(
        vbe -> {
          equations.evaluate(vbe, 0);
          return Math.log(equations.collectorCurrent() / CURRENT);
        },
        0.4,
        0.8,
        1e-15);
  }
}
