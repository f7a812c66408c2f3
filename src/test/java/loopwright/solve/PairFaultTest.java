package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;

/**
 * Readings of a pair with faults from a published exercise table (the diagnoses are ours): ±15 V,
 * R_C 1.0 kΩ, tail 1.5 kΩ, bases grounded; about 4.7 mA and 10.3 V a side when it is well. Early
 * voltage 71 V and reverse beta 2.5 make the table's own differences; β and saturation current are
 * not stated, and general-purpose ones are taken. Tolerances: half a unit of the last printed digit
 * for voltages, and for currents the share that an unstated β leaves open.
 */
class PairFaultTest {
  private static final double ROOM = 298.15;
  private static final double OPEN = 1e12;

  private static final TransistorParameters TRANSISTOR =
      IdealParts.withReverseBeta(
          IdealParts.carrying(4.7e-3, 0.7, 180, ROOM).withEarlyVoltage(71), 2.5);

  private static CircuitBuilder pair(double firstLoad, double secondLoad) {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("positive", "positive", 15);
    builder.supply("negative", "negative", -15);
    builder.resistor("load1", "positive", "c1", firstLoad);
    builder.resistor("load2", "positive", "c2", secondLoad);
    builder.resistor("tail", "tail", "negative", 1.5e3);
    builder.transistor("q2", Polarity.NPN, "c2", CircuitBuilder.GROUND, "tail", TRANSISTOR, ROOM);
    return builder;
  }

  private static SolvedCircuit whole(double firstLoad, double secondLoad) {
    CircuitBuilder builder = pair(firstLoad, secondLoad);
    builder.transistor("q1", Polarity.NPN, "c1", CircuitBuilder.GROUND, "tail", TRANSISTOR, ROOM);
    return SolvedCircuit.of(builder);
  }

  @Test
  void wellItSharesTheCurrent() {
    SolvedCircuit pair = whole(1e3, 1e3);
    assertThat(pair.collectorCurrent("q1")).isCloseTo(4.7e-3, within(5e-5));
    assertThat(pair.voltage("c1")).isCloseTo(10.3, within(0.05));
  }

  @Test
  void aShortedLoadShowsAsTheFullSupply() {
    SolvedCircuit pair = whole(0, 1e3);
    assertThat(pair.voltage("c1")).isEqualTo(15);
    assertThat(pair.collectorCurrent("q1")).isCloseTo(4.87e-3, within(1e-2 * 4.87e-3));
    assertThat(pair.collectorCurrent("q2")).isCloseTo(4.61e-3, within(1e-2 * 4.61e-3));
    assertThat(pair.voltage("c2")).isCloseTo(10.4, within(0.05));
  }

  @Test
  void anOpenLoadLetsTheBaseFeedTheEmitter() {
    SolvedCircuit pair = whole(1e3, OPEN);
    assertThat(pair.collectorCurrent("q1")).isCloseTo(7.49e-3, within(1e-2 * 7.49e-3));
    assertThat(pair.voltage("c1")).isCloseTo(7.51, within(0.05));
    assertThat(pair.collectorCurrent("q2")).isCloseTo(0, within(1e-9));
    assertThat(pair.voltage("c2")).isCloseTo(-0.695, within(0.02));
  }

  @Test
  void anOpenJunctionLeavesAllCurrentToTheOther() {
    CircuitBuilder builder = pair(1e3, 1e3);
    SolvedCircuit pair = SolvedCircuit.of(builder);
    assertThat(pair.voltage("c1")).isCloseTo(15, within(5e-4));
    assertThat(pair.collectorCurrent("q2")).isCloseTo(9.46e-3, within(1e-2 * 9.46e-3));
    assertThat(pair.voltage("c2")).isCloseTo(5.54, within(0.05));
  }
}
