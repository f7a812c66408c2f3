package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Current mirrors in the full solver, under the assumptions of their formulas (Gray, Hurst, Lewis
 * and Meyer, chapter 4, from memory; numbers worked out from the formulas).
 */
class CurrentMirrorTest {
  private static final double ROOM = 298.15;
  private static final double REFERENCE = 1e-3;
  private static final String GROUND = CircuitBuilder.GROUND;

  /** A reference current into node {@code reference}, and a supply at node {@code output}. */
  private static CircuitBuilder mirror(double outputVolts) {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.currentSource("reference", GROUND, "reference", REFERENCE);
    builder.supply("output", "output", outputVolts);
    return builder;
  }

  private static void npn(
      CircuitBuilder builder,
      String role,
      String collector,
      String base,
      String emitter,
      TransistorParameters parameters) {
    builder.transistor(role, Polarity.NPN, collector, base, emitter, parameters, ROOM);
  }

  /** 1/(1 + 2/β). */
  @ParameterizedTest
  @CsvSource({"100, 0.9803921569", "200, 0.9900990099"})
  void aSimpleMirrorLosesTwoBaseCurrents(double beta, double ratio) {
    TransistorParameters parameters = IdealParts.carrying(REFERENCE, 0.7, beta, ROOM);
    CircuitBuilder builder = mirror(0.7);
    npn(builder, "q1", "reference", "reference", GROUND, parameters);
    npn(builder, "q2", "output", "reference", GROUND, parameters);
    assertThat(SolvedCircuit.of(builder).collectorCurrent("q2") / REFERENCE)
        .isCloseTo(ratio, within(1e-9));
  }

  /**
   * (1 + (V_CE2 − V_CE1)/V_A)/(1 + 2/β): β 100, V_A 80 V, 15 V against 0.7 V. The shunt
   * conductances of the junctions carry some 1e-9 of the current at this voltage.
   */
  @Test
  void theEarlyEffectMakesTheOutputLarger() {
    double ratio = 1 / 1.02;
    TransistorParameters parameters =
        IdealParts.carrying(ratio * REFERENCE, 0.7, 100, ROOM).withEarlyVoltage(80);
    CircuitBuilder builder = mirror(15);
    npn(builder, "q1", "reference", "reference", GROUND, parameters);
    npn(builder, "q2", "output", "reference", GROUND, parameters);
    assertThat(SolvedCircuit.of(builder).collectorCurrent("q2") / REFERENCE)
        .isCloseTo(1.1556372549, within(4e-9));
  }

  /** 1/(1 + 2/(β(β + 1))), β 100: a third transistor feeds the bases. */
  @Test
  void aHelperFeedsTheBases() {
    TransistorParameters parameters = IdealParts.carrying(REFERENCE, 0.7, 100, ROOM);
    CircuitBuilder builder = mirror(0.7);
    builder.supply("positive", "positive", 5);
    npn(builder, "q1", "reference", "bases", GROUND, parameters);
    npn(builder, "q2", "output", "bases", GROUND, parameters);
    npn(builder, "helper", "positive", "reference", "bases", parameters);
    assertThat(SolvedCircuit.of(builder).collectorCurrent("q2") / REFERENCE)
        .isCloseTo(0.9998020194, within(2e-9));
  }

  private static CircuitBuilder wilson(double earlyVoltage, double outputVolts) {
    TransistorParameters parameters =
        IdealParts.carrying(REFERENCE, 0.7, 100, ROOM).withEarlyVoltage(earlyVoltage);
    CircuitBuilder builder = mirror(outputVolts);
    npn(builder, "q1", "reference", "bases", GROUND, parameters);
    npn(builder, "q2", "bases", "bases", GROUND, parameters);
    npn(builder, "q3", "output", "reference", "bases", parameters);
    return builder;
  }

  /** 1/(1 + 2/(β² + 2β)), β 100. */
  @Test
  void aWilsonMirrorLosesFarLess() {
    assertThat(
            SolvedCircuit.of(wilson(Double.POSITIVE_INFINITY, 1.4)).collectorCurrent("q3")
                / REFERENCE)
        .isCloseTo(0.9998039600, within(2e-9));
  }

  /**
   * β 100, r_o 100 kΩ: the Wilson mirror's output resistance is 5 MΩ where the simple mirror's is
   * 100 kΩ (a textbook problem on mirrors, 8.26; one digit and three).
   */
  @Test
  void aWilsonMirrorHasFiftyTimesTheOutputResistance() {
    SolvedCircuit wilson = SolvedCircuit.of(wilson(100, 1.4));
    assertThat(wilson.resistanceSeenBy("output")).isCloseTo(5e6, within(0.5e6));

    TransistorParameters parameters =
        IdealParts.carrying(REFERENCE / 1.02, 0.7, 100, ROOM).withEarlyVoltage(100 / 1.02);
    CircuitBuilder builder = mirror(0.7);
    npn(builder, "q1", "reference", "reference", GROUND, parameters);
    npn(builder, "q2", "output", "reference", GROUND, parameters);
    assertThat(SolvedCircuit.of(builder).resistanceSeenBy("output"))
        .isCloseTo(100e3, within(0.5e3));
  }

  private static double widlar(double resistance) {
    TransistorParameters parameters = IdealParts.carrying(REFERENCE, 0.7, 1e9, ROOM);
    CircuitBuilder builder = mirror(0.7);
    npn(builder, "q1", "reference", "reference", GROUND, parameters);
    npn(builder, "q2", "output", "reference", "emitter", parameters);
    builder.resistor("emitter", "emitter", GROUND, resistance);
    return SolvedCircuit.of(builder).collectorCurrent("q2");
  }

  /**
   * I_O R₂ = V_T ln(I_REF/I_O) (Widlar, IEEE Transactions on Circuit Theory 12, 1965, 586, from
   * memory): 1 mA to 10 µA takes 11831.869937 Ω; 10 kΩ gives 11.477759177 µA. The shunt
   * conductances of the junctions carry 1e-8 of such a current.
   */
  @Test
  void aWidlarSourceTakesTheLogarithm() {
    assertThat(widlar(11831.869937)).isCloseTo(10e-6, within(2e-13));
    assertThat(widlar(10e3)).isCloseTo(11.477759177e-6, within(2e-13));
  }
}
