package loopwright.characterise;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.DepletionCapacitance;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TransistorFiguresTest {
  /** kT/q at 25 °C with the constants of the SI of 2019, V. */
  private static final double THERMAL_VOLTAGE = 25.692579121e-3;

  private static final TransistorParameters PLAIN =
      TransistorParameters.DEFAULTS.withSaturationCurrent(1e-14).withForwardBeta(200);

  /**
   * The transport form of Gummel and Poon (Bell System Technical Journal 49, 1970, 827–852) with
   * I_S = 1e-14 A, β_F = 200, β_R = 4, V_A = 100 V, I_K = 0.1 A, I_rec = 1e-13 A, n_rec = 2 at V_CE
   * = 5 V, computed from the formula without shunts, which here weigh up to 6e-7 of the base
   * current.
   */
  @ParameterizedTest
  @CsvSource({
    "0.60, 1.44610113e-4, 205.02947, 7.21941e5",
    "0.65, 1.00371248e-3, 205.39351, 1.03964e5",
    "0.70, 6.66545819e-3, 195.59542, 1.56478e4",
    "0.75, 3.67030258e-2, 154.06706, 2.84037e3",
    "0.80, 1.45130590e-1, 87.06416, 7.17974e2"
  })
  void giveBackTheTransportModel(double voltage, double current, double beta, double resistance) {
    TransistorFigures figures =
        new TransistorFigures(
            new TransistorParameters(1e-14, 200, 4, 100, 0.1, 1e-13, 2, 0, 0, 0, 0, 0, 0, 0, 0));

    // Half a digit of the printed current is 3.5e-9 of it, or 1e-10 V, and the shunt's share.
    assertThat(figures.baseEmitterVoltage(current, 5)).isCloseTo(voltage, within(5e-10));
    assertThat(figures.beta(current, 5)).isCloseTo(beta, within(1e-6 * beta));
    // At constant base current the shunt of 1e-13 S from the collector counts 1 + β times.
    double shunt = 1e-13 * (1 + beta) * resistance;
    assertThat(1 / figures.outputConductance(current, 5))
        .isCloseTo(resistance, within((5e-6 + 1.01 * shunt) * resistance));
  }

  /**
   * f_T = g_m/(2π(C_je + τ_F g_m + C_µ)): Gray, Hurst, Lewis and Meyer, chapter 1 (from memory).
   */
  @ParameterizedTest
  @CsvSource({"1e-4, 51.378079", "1e-3, 237.625526", "1e-2, 372.748100"})
  void giveTheTransitionFrequencyOfTheTexts(double current, double megahertz) {
    double baseEmitter = THERMAL_VOLTAGE * Math.log(current / 1e-14);
    TransistorParameters parameters =
        PLAIN
            .withTransitTime(400e-12)
            .withBaseEmitterCapacitance(8e-12 / DepletionCapacitance.factor(baseEmitter))
            .withBaseCollectorCapacitance(2.5e-12 / DepletionCapacitance.factor(baseEmitter - 5));

    assertThat(new TransistorFigures(parameters).transitionFrequency(current, 5) / 1e6)
        .isCloseTo(megahertz, within(2e-8 * megahertz));
  }

  /** C_µ of the collector shunted by C_µ (r_C + r_E) adds to the delay: same chapter. */
  @Test
  void letOhmicResistancesSlowTheTransistorDown() {
    double current = 1e-3;
    TransistorParameters parameters =
        new TransistorParameters(
            1e-14,
            200,
            3,
            Double.POSITIVE_INFINITY,
            Double.POSITIVE_INFINITY,
            0,
            2,
            50,
            2,
            30,
            0,
            10e-12,
            400e-12,
            0,
            0);
    double baseEmitter = THERMAL_VOLTAGE * Math.log(current / 1e-14);
    double across = 5 - current * 30 - current * (1 + 1 / 200.0) * 2;
    double collector = 10e-12 * DepletionCapacitance.factor(baseEmitter - across);
    double transconductance = current / THERMAL_VOLTAGE;
    double delay = 400e-12 + collector / transconductance + collector * (30 + 2 * (1 + 1 / 200.0));

    assertThat(new TransistorFigures(parameters).transitionFrequency(current, 5))
        .isCloseTo(1 / (2 * Math.PI * delay), within(1e-7 / (2 * Math.PI * delay)));
  }

  /** Built-in voltage 0.7 V and exponent 1/3: C(−5 V) = C₀/(1 + 5/0.7)^(1/3). */
  @Test
  void giveJunctionCapacitancesUnderReverseVoltage() {
    TransistorFigures figures =
        new TransistorFigures(
            PLAIN.withBaseCollectorCapacitance(8e-12).withBaseEmitterCapacitance(16e-12));

    assertThat(figures.outputCapacitance(5))
        .isCloseTo(8e-12 / Math.cbrt(1 + 5 / 0.7), within(1e-24));
    assertThat(figures.inputCapacitance(0.5))
        .isCloseTo(16e-12 / Math.cbrt(1 + 0.5 / 0.7), within(1e-24));
  }

  /**
   * Saturated with I_B = I_C/10 the ideal equations solve in closed form: the two exponentials are
   * unknowns of two linear equations (Ebers and Moll, Proceedings of the IRE 42, 1954, 1761–1772).
   */
  @Test
  void giveTheSaturatedBaseEmitterVoltage() {
    double collector = 10e-3;
    double base = 1e-3;
    // I_C = I_S (F − R) − (I_S/3) R and I_B = (I_S/200) F + (I_S/3) R, F and R less one.
    double forward = (collector + 4 * base) / (1 + 4 / 200.0) / 1e-14;

    assertThat(new TransistorFigures(PLAIN).saturatedBaseEmitterVoltage(collector))
        .isCloseTo(THERMAL_VOLTAGE * Math.log1p(forward), within(1e-11));
  }

  /** Published: with E_G = 1.12 V and X = 3, 0.65 V at 25 °C become these at the same current. */
  @ParameterizedTest
  @CsvSource({"0, 0.6955938", "25, 0.65", "50, 0.6038636", "75, 0.5572267"})
  void followTheTemperatureLaw(double celsius, double voltage) {
    double current = 1e-14 * Math.expm1(0.65 / THERMAL_VOLTAGE);

    assertThat(new TransistorFigures(PLAIN, celsius + 273.15).baseEmitterVoltage(current, 5))
        .isCloseTo(voltage, within(5.1e-8));
  }

  @Test
  void sayWhenABiasIsOutOfReach() {
    TransistorFigures figures =
        new TransistorFigures(
            new TransistorParameters(1e-14, 8, 3, 100, 0.1, 0, 2, 0, 0, 100, 0, 0, 0, 0, 0));

    assertThatThrownBy(() -> figures.beta(0.1, 5))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "A collector current of 100 mA at 5 V between collector and emitter is out of this"
                + " transistor's reach: the resistances leave no voltage.");
    assertThatThrownBy(() -> figures.saturatedBaseEmitterVoltage(1e-3))
        .isInstanceOf(FitException.class)
        .hasMessageStartingWith("A current gain of 10 does not saturate this transistor at 1 mA");
  }
}
