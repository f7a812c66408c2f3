package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.Physics;
import loopwright.numeric.RootSearch;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The long-tailed pair in the full solver, under the assumptions of its textbook formulas (Gray,
 * Hurst, Lewis and Meyer, section 3.5, from memory): no Early effect, no resistances.
 */
class PairTest {
  private static final double ROOM = 298.15;
  private static final double THERMAL = Physics.thermalVoltage(ROOM);
  private static final String GROUND = CircuitBuilder.GROUND;

  /** β so large that base currents do not count. */
  private static final double NO_BASE_CURRENT = 1e9;

  /**
   * A pair whose collectors stand 0.3 V above their bases at balance, so that neither the shunt
   * conductances of the junctions nor their reverse currents count; the tail is left to the caller.
   */
  private static CircuitBuilder pair(
      double differential,
      TransistorParameters first,
      TransistorParameters second,
      double firstLoad,
      double secondLoad) {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("positive", "positive", 0.3 + 0.5e-3 * (firstLoad + secondLoad) / 2);
    builder.supply("input1", "base1", differential / 2);
    builder.supply("input2", "base2", -differential / 2);
    builder.resistor("load1", "positive", "collector1", firstLoad);
    builder.resistor("load2", "positive", "collector2", secondLoad);
    builder.transistor("q1", Polarity.NPN, "collector1", "base1", "tail", first, ROOM);
    builder.transistor("q2", Polarity.NPN, "collector2", "base2", "tail", second, ROOM);
    return builder;
  }

  private static TransistorParameters half(double beta) {
    return IdealParts.carrying(0.5e-3, 0.65, beta, ROOM);
  }

  private static SolvedCircuit steered(double differential) {
    CircuitBuilder builder = pair(differential, half(NO_BASE_CURRENT), half(NO_BASE_CURRENT), 1, 1);
    builder.currentSource("tail", "tail", GROUND, 1e-3);
    return SolvedCircuit.of(builder);
  }

  /** Share of the tail current that goes from one side to the other. */
  private static double steering(double differential) {
    SolvedCircuit solved = steered(differential);
    double one = solved.collectorCurrent("q1");
    double other = solved.collectorCurrent("q2");
    return (one - other) / (one + other);
  }

  /** I_C1 − I_C2 = α I_EE tanh(V_id/2V_T). */
  @ParameterizedTest
  @CsvSource({"0.5, 0.2449186624", "1, 0.4621171573", "2, 0.7615941560", "4, 0.9640275801"})
  void currentIsSteeredByTheHyperbolicTangent(double thermalVoltages, double share) {
    assertThat(steering(thermalVoltages * THERMAL)).isCloseTo(share, within(1e-9));
    assertThat(steering(-thermalVoltages * THERMAL)).isCloseTo(-share, within(1e-9));
  }

  @Test
  void oneMillivoltIsFourPerCentOfCurrent() {
    SolvedCircuit solved = steered(1e-3);
    assertThat(solved.collectorCurrent("q1") / solved.collectorCurrent("q2"))
        .isCloseTo(1.0396891, within(5e-8));
  }

  /**
   * A sine of one thermal voltage: HD3 1.9612277 %, HD5 0.0466270 %, gain 0.94228566 (quadrature).
   */
  @Test
  void aSineOfOneThermalVoltageIsCompressedByTheTanh() {
    double[] harmonics = harmonics(THERMAL);
    assertThat(harmonics[3] / harmonics[1]).isCloseTo(1.9612277e-2, within(5e-10));
    assertThat(harmonics[5] / harmonics[1]).isCloseTo(0.0466270e-2, within(5e-10));
    assertThat(harmonics[1] / 0.5).isCloseTo(0.94228566, within(5e-9));
  }

  @Test
  void aSineOfATenthIsNearlyClean() {
    double[] harmonics = harmonics(0.1 * THERMAL);
    assertThat(harmonics[3] / harmonics[1]).isCloseTo(0.020820321e-2, within(5e-10));
  }

  /**
   * Peak values of the odd harmonics of the steering under a sine of a peak differential voltage.
   */
  private static double[] harmonics(double peak) {
    int points = 64;
    double[] sine = new double[6];
    for (int k = 0; k < points; k++) {
      double angle = 2 * Math.PI * k / points;
      double value = steering(peak * Math.sin(angle));
      for (int n = 1; n < sine.length; n++) {
        sine[n] += 2.0 / points * value * Math.sin(n * angle);
      }
    }
    for (int n = 1; n < sine.length; n++) {
      sine[n] = Math.abs(sine[n]);
    }
    return sine;
  }

  /** I_tail 1 mA, R_C 4.7 kΩ: g_m R_C/2 = 45.733050 at one collector, twice that across both. */
  @Test
  void gainIsTransconductanceTimesLoad() {
    CircuitBuilder builder = pair(0, half(200), half(200), 4700, 4700);
    builder.currentSource("tail", "tail", GROUND, 1e-3 * 201 / 200);
    SolvedCircuit solved = SolvedCircuit.of(builder);
    double atOne = (solved.gain("input1", "collector2") - solved.gain("input2", "collector2")) / 2;
    double across =
        (solved.gain("input1", "collector2", "collector1")
                - solved.gain("input2", "collector2", "collector1"))
            / 2;
    assertThat(atOne).isCloseTo(45.733050, within(5e-7));
    assertThat(across).isCloseTo(91.466100, within(5e-7));
  }

  /** R_id = 2 r_π = 20554.063 Ω at β 200: the first base sees it with the second held. */
  @Test
  void inputResistanceIsTwiceThatOfAJunction() {
    CircuitBuilder builder = pair(0, half(200), half(200), 1, 1);
    builder.currentSource("tail", "tail", GROUND, 1e-3 * 201 / 200);
    assertThat(SolvedCircuit.of(builder).resistanceSeenBy("input1"))
        .isCloseTo(20554.063, within(5e-4));
  }

  /** A 10 kΩ tail: A_cm = g_m R_C/(1 + 2 g_m R) = 0.23439777, CMRR 195.10872; β does not count. */
  @Test
  void aTailResistorLetsTheCommonModeThrough() {
    CircuitBuilder builder = pair(0, half(NO_BASE_CURRENT), half(NO_BASE_CURRENT), 4700, 4700);
    builder.supply("negative", "negative", -10 - 0.65);
    builder.resistor("tail", "tail", "negative", 10e3);
    SolvedCircuit solved = SolvedCircuit.of(builder);
    double common = solved.gain("input1", "collector1") + solved.gain("input2", "collector1");
    double differential =
        (solved.gain("input2", "collector1") - solved.gain("input1", "collector1")) / 2;
    assertThat(-common).isCloseTo(0.23439777, within(5e-9));
    assertThat(differential / -common).isCloseTo(195.10872, within(5e-6));
  }

  /**
   * V_OS = V_T ln((R_C2/R_C1)(I_S2/I_S1)): +0.7710280 mV for loads that differ by 2 % and
   * saturation currents that differ by −5 %; the approximation gives 0.7707774 mV.
   */
  @Test
  void offsetIsTheLogarithmOfTheMismatches() {
    TransistorParameters first = half(NO_BASE_CURRENT);
    TransistorParameters one = first.withSaturationCurrent(first.saturationCurrent() * 0.975);
    TransistorParameters other = first.withSaturationCurrent(first.saturationCurrent() * 1.025);
    double offset =
        RootSearch.find(
            differential -> {
              CircuitBuilder builder = pair(differential, one, other, 1010, 990);
              builder.currentSource("tail", "tail", GROUND, 1e-3);
              SolvedCircuit solved = SolvedCircuit.of(builder);
              return solved.voltage("collector1") - solved.voltage("collector2");
            },
            -10e-3,
            10e-3,
            1e-13);
    assertThat(offset).isCloseTo(0.7710280e-3, within(5e-11));
  }

  /**
   * Offset current: I_C 0.5 mA, β 200 with Δβ/β 10 %, ΔR_C/R_C 2 %: −300.75188 nA about a mean of
   * 2.5075188 µA.
   */
  @Test
  void offsetCurrentComesFromBetaAndLoads() {
    double baseCurrents = 2 * 2.5075188e-6;
    double centred =
        RootSearch.find(
            differential -> {
              SolvedCircuit solved = unequalBetas(differential, baseCurrents);
              return solved.voltage("collector1") - solved.voltage("collector2");
            },
            -10e-3,
            10e-3,
            1e-13);
    SolvedCircuit solved = unequalBetas(centred, baseCurrents);
    double one = solved.baseCurrent("q1");
    double other = solved.baseCurrent("q2");
    assertThat(one - other).isCloseTo(-300.75188e-9, within(5e-15));
    assertThat((one + other) / 2).isCloseTo(2.5075188e-6, within(5e-14));
  }

  private static SolvedCircuit unequalBetas(double differential, double baseCurrents) {
    CircuitBuilder builder = pair(differential, half(210), half(190), 1010, 990);
    builder.currentSource("tail", "tail", GROUND, 1e-3 + baseCurrents);
    return SolvedCircuit.of(builder);
  }
}
