package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.VoltageSource;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Pairs with a tail resistor that published solutions to a university electronics text work out by
 * hand. Tolerances are half a unit of the last printed digit. The solutions take collector and
 * emitter current as one unless they speak of base current; the circuits here do the same by a β a
 * thousand times the stated one, which leaves an input resistance a thousand times as large.
 */
class WorkedPairTest {

  /** Which factor on β makes base currents vanish. */
  private static final double THOUSANDFOLD = 1000;

  /**
   * What a solution states of its pair.
   *
   * @param rails ± V
   * @param load R_C of either side, Ω
   * @param tail Ω
   * @param thermalVoltage kT/q that it works with, V
   * @param bases voltage that both bases are held at, V
   * @param baseResistance in each base, Ω
   * @param device both transistors at 25 °C
   */
  private record Pair(
      double rails,
      double load,
      double tail,
      double thermalVoltage,
      double bases,
      double baseResistance,
      TransistorParameters device) {
    SolvedCircuit solve() {
      double kelvin = IdealParts.kelvinWhere(thermalVoltage);
      CircuitBuilder builder = new CircuitBuilder(kelvin);
      builder.supply("positive", "positive", rails);
      builder.supply("negative", "negative", -rails);
      builder.supply("input1", "in1", bases);
      builder.supply("input2", "in2", bases);
      for (int side = 1; side <= 2; side++) {
        builder.resistor("base" + side, "in" + side, "b" + side, baseResistance);
        builder.resistor("load" + side, "positive", "c" + side, load);
        builder.transistor(
            "q" + side, Polarity.NPN, "c" + side, "b" + side, "tail", device, kelvin);
      }
      builder.resistor("tail", "tail", "negative", tail);
      return SolvedCircuit.of(builder);
    }
  }

  private static TransistorParameters device(double current, double beta, double thermalVoltage) {
    return IdealParts.carrying(current, 0.7, beta, IdealParts.kelvinWhere(thermalVoltage));
  }

  private static double tailCurrent(SolvedCircuit pair, Pair values) {
    return (pair.voltage("tail") + values.rails()) / values.tail();
  }

  private static double gainToOne(SolvedCircuit pair) {
    return (pair.gain("input1", "c2") - pair.gain("input2", "c2")) / 2;
  }

  /** Chapter 17: ±15 V, R_C 5 kΩ, tail 7.5 kΩ, β 300, V_T 25 mV, V_BE neglected. */
  @Test
  void aPairOfTwoMilliamperesWithoutBaseEmitterVoltage() {
    // A base-emitter voltage is neglected where both bases stand that much above ground.
    Pair values = new Pair(15, 5e3, 7.5e3, 25e-3, 0.7, 0, device(1e-3, 300 * THOUSANDFOLD, 25e-3));
    SolvedCircuit pair = values.solve();
    assertThat(tailCurrent(pair, values)).isCloseTo(2e-3, within(5e-7));
    assertThat(pair.voltage("c1")).isCloseTo(10, within(5e-3));
    assertThat(2 * gainToOne(pair)).isCloseTo(200, within(0.5));
    assertThat(differentialResistance(pair) / THOUSANDFOLD).isCloseTo(15e3, within(50.0));
  }

  /** The same with 0.7 V: 1.907 mA, 10.23 V, gain 190.7, 15.73 kΩ. */
  @Test
  void theSamePairWithItsBaseEmitterVoltage() {
    Pair values =
        new Pair(15, 5e3, 7.5e3, 25e-3, 0, 0, device(0.9535e-3, 300 * THOUSANDFOLD, 25e-3));
    SolvedCircuit pair = values.solve();
    assertThat(tailCurrent(pair, values)).isCloseTo(1.907e-3, within(5e-7));
    assertThat(pair.voltage("c1")).isCloseTo(10.23, within(5e-3));
    assertThat(2 * gainToOne(pair)).isCloseTo(190.7, within(0.05));
    assertThat(differentialResistance(pair) / THOUSANDFOLD).isCloseTo(15.73e3, within(5.0));
  }

  /** One base against the other: twice what one sees with the other held. */
  private static double differentialResistance(SolvedCircuit pair) {
    int one = pair.circuit().element("input1", VoltageSource.class).branch();
    int other = pair.circuit().element("input2", VoltageSource.class).branch();
    double byOne = pair.smallSignal().response(0, one, one)[0];
    double byOther = pair.smallSignal().response(0, other, one)[0];
    return 2 / (byOne - byOther);
  }

  /** Chapter 1, exercise 3: ±12 V, R_C and tail 10 kΩ, β 75. */
  @ParameterizedTest
  @CsvSource({
    // V_BE neglected; 0.7 V; 0.7 V and the collectors' share of the emitter current.
    "0.7, 75000, 6.00, 5e-3",
    "0, 75000, 6.35, 5e-3",
    "0, 75, 6.424, 5e-4"
  })
  void collectorVoltagesByThreeApproximations(
      double bases, double beta, double collector, double tolerance) {
    double current = (12 - 0.7 + bases) / 10e3 / 2;
    Pair values = new Pair(12, 10e3, 10e3, 26e-3, bases, 0, device(current, beta, 26e-3));
    assertThat(values.solve().voltage("c1")).isCloseTo(collector, within(tolerance));
  }

  /** The same exercise: 0.6 mA through a collector puts this on a base behind 20 kΩ. */
  @ParameterizedTest
  @CsvSource({"75, -0.160", "60, -0.200", "80, -0.150"})
  void baseCurrentDropsAcrossTheBaseResistor(double beta, double base) {
    double emitterCurrents = 2 * 0.6e-3 * (1 + 1 / beta);
    // The tail resistor that carries them from a base at the stated voltage.
    double tail = (base - 0.7 + 12) / emitterCurrents;
    Pair values = new Pair(12, 10e3, tail, 26e-3, 0, 20e3, device(0.6e-3, beta, 26e-3));
    assertThat(values.solve().voltage("b1")).isCloseTo(base, within(5e-4));
  }

  /** Exercise 10: ±9 V, R_C 47 kΩ, tail 43 kΩ, source 20 Ω, β 75, V_T 26 mV. */
  @Test
  void aPairOfAHundredMicroamperes() {
    Pair values = new Pair(9, 47e3, 43e3, 26e-3, 0, 20, device(96.5e-6, 75 * THOUSANDFOLD, 26e-3));
    SolvedCircuit pair = values.solve();
    double current = pair.collectorCurrent("q1");
    assertThat(current).isCloseTo(96.5e-6, within(5e-8));
    assertThat(pair.voltage("c1") - pair.voltage("tail")).isCloseTo(5.16, within(5e-3));
    assertThat(26e-3 / current).isCloseTo(269, within(0.5));
    assertThat(gainToOne(pair)).isCloseTo(87.2, within(0.05));
  }

  /** With the stated β the collectors get 75/76 of that. */
  @Test
  void theStatedBetaTakesItsShare() {
    Pair values = new Pair(9, 47e3, 43e3, 26e-3, 0, 20, device(96.5e-6, 75, 26e-3));
    assertThat(values.solve().collectorCurrent("q1"))
        .isCloseTo(96.5e-6 * 75 / 76, within(1e-3 * 96.5e-6));
  }
}
