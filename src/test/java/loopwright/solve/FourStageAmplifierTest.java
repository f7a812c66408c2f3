package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.VoltageSource;
import loopwright.part.Polarity;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/**
 * A four-stage amplifier of the published solutions of a standard text on operational amplifiers:
 * ±15 V, a pair of 0.5 mA with 20 kΩ loads, a pair of 2 mA with one load of 3 kΩ, a pnp that shifts
 * the level (2.3 kΩ, 15.7 kΩ), a follower with 3 kΩ; β 100, V_T 25 mV, V_BE 0.7 V. Tolerances are
 * half a unit of the last printed digit.
 *
 * <p>The solution leaves base currents out of its dc values and out of the step from emitter to
 * collector current, but keeps them in its resistances. Here each transistor has a current source
 * from collector to base that supplies its base current at rest, and gains are compared without the
 * share β/(β + 1) that each common-emitter stage loses.
 */
class FourStageAmplifierTest {
  private static final double KELVIN = IdealParts.kelvinWhere(25e-3);
  private static final double BETA = 100;
  private static final double SHARE = BETA / (BETA + 1);
  private SolvedCircuit amplifier;

  @BeforeEach
  void build() {
    CircuitBuilder builder = new CircuitBuilder(KELVIN);
    builder.supply("positive", "positive", 15);
    builder.supply("negative", "negative", -15);
    builder.supply("input1", "in1", 0);
    builder.supply("input2", "in2", 0);

    builder.resistor("set", CircuitBuilder.GROUND, "set", 28.6e3);
    npn(builder, "q9", "set", "set", "negative", 0.5e-3);
    npn(builder, "q3", "tail1", "set", "negative", 0.5e-3);
    npn(builder, "q6", "tail2", "set", "negative", 2e-3);

    npn(builder, "q1", "c1", "in1", "tail1", 0.25e-3);
    npn(builder, "q2", "c2", "in2", "tail1", 0.25e-3);
    builder.resistor("R1", "positive", "c1", 20e3);
    builder.resistor("R2", "positive", "c2", 20e3);

    npn(builder, "q4", "positive", "c1", "tail2", 1e-3);
    npn(builder, "q5", "c5", "c2", "tail2", 1e-3);
    builder.resistor("R3", "positive", "c5", 3e3);

    transistor(builder, "q7", Polarity.PNP, "c7", "c5", "e7", 1e-3);
    builder.resistor("R4", "positive", "e7", 2.3e3);
    builder.resistor("R5", "c7", "negative", 15.7e3);

    npn(builder, "q8", "positive", "c7", "out", 5e-3);
    builder.resistor("R6", "out", "negative", 3e3);
    amplifier = SolvedCircuit.of(builder);
  }

  private static void npn(
      CircuitBuilder builder,
      String role,
      String collector,
      String base,
      String emitter,
      double emitterCurrent) {
    transistor(builder, role, Polarity.NPN, collector, base, emitter, emitterCurrent);
  }

  private static void transistor(
      CircuitBuilder builder,
      String role,
      Polarity polarity,
      String collector,
      String base,
      String emitter,
      double emitterCurrent) {
    double baseCurrent = emitterCurrent / (BETA + 1);
    builder.transistor(
        role,
        polarity,
        collector,
        base,
        emitter,
        IdealParts.carrying(SHARE * emitterCurrent, 0.7, BETA, KELVIN),
        KELVIN);
    builder.currentSource(
        "base current of " + role, collector, base, polarity.sign() * baseCurrent);
  }

  @Test
  void voltagesAtRest() {
    assertThat(amplifier.voltage("c1")).isCloseTo(10, within(0.05));
    assertThat(amplifier.voltage("tail2")).isCloseTo(9.3, within(0.05));
    assertThat(amplifier.voltage("c5")).isCloseTo(12, within(0.05));
    assertThat(amplifier.voltage("e7")).isCloseTo(12.7, within(0.05));
    assertThat(amplifier.voltage("out")).isCloseTo(0, within(0.05));
  }

  /** 22.4 across the first loads. */
  @Test
  void gainOfTheFirstPair() {
    double gain = differential("c2") - differential("c1");
    assertThat(gain / SHARE).isCloseTo(22.4, within(0.05));
  }

  /** −59.2 from there to one collector. */
  @Test
  void gainOfTheSecondPair() {
    double gain = differential("c5") / (differential("c2") - differential("c1"));
    assertThat(gain / SHARE).isCloseTo(-59.2, within(0.05));
  }

  @Test
  void gainOfTheLevelShift() {
    assertThat(differential("c7") / differential("c5") / SHARE).isCloseTo(-6.42, within(5e-3));
  }

  @Test
  void gainOfTheFollower() {
    assertThat(differential("out") / differential("c7")).isCloseTo(0.998, within(5e-4));
  }

  @Test
  void inputResistance() {
    int one = branch("input1");
    int other = branch("input2");
    double current =
        amplifier.smallSignal().response(0, one, one)[0]
            - amplifier.smallSignal().response(0, other, one)[0];
    assertThat(2 / current).isCloseTo(20.2e3, within(50.0));
  }

  @Test
  void outputResistance() {
    assertThat(amplifier.resistanceAt("out")).isCloseTo(152, within(0.5));
  }

  /** Gain from the differential input to a node. */
  private double differential(String node) {
    return (amplifier.gain("input1", node) - amplifier.gain("input2", node)) / 2;
  }

  private int branch(String supply) {
    return amplifier.circuit().element(supply, VoltageSource.class).branch();
  }
}
