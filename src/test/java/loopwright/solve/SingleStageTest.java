package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.Physics;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;

/**
 * Single stages in the full solver against their small-signal formulas (Gray, Hurst, Lewis and
 * Meyer, chapter 3, from memory; numbers worked out from the formulas).
 */
class SingleStageTest {
  private static final double ROOM = 298.15;
  private static final double THERMAL = Physics.thermalVoltage(ROOM);
  private static final String GROUND = CircuitBuilder.GROUND;
  private static final double NO_BASE_CURRENT = 1e9;

  /**
   * A common-emitter stage at 1 mA, collector at the base's voltage, the emitter resistor returned
   * so that it carries the whole emitter current.
   */
  private static SolvedCircuit commonEmitter(
      double beta, double earlyVoltage, double emitterResistance, double load) {
    TransistorParameters parameters =
        IdealParts.carrying(1e-3, 0.65, beta, ROOM).withEarlyVoltage(earlyVoltage);
    double emitter = 1e-3 * (1 + 1 / beta) * emitterResistance;
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("input", "base", emitter + 0.65);
    builder.supply("positive", "positive", emitter + 0.65 + 1e-3 * load);
    builder.resistor("load", "positive", "collector", load);
    builder.resistor("emitter", "emitter", GROUND, emitterResistance);
    builder.transistor("q1", Polarity.NPN, "collector", "base", "emitter", parameters, ROOM);
    return SolvedCircuit.of(builder);
  }

  private static double transconductance(SolvedCircuit stage, double load) {
    return -stage.gain("input", "collector") / load;
  }

  /** G_m = g_m/(1 + g_m R_E (1 + 1/β)) = 7.924396244 mS at 1 mA, 100 Ω, β 200. */
  @Test
  void degenerationLowersTheTransconductance() {
    double load = 4700;
    SolvedCircuit stage = commonEmitter(200, Double.POSITIVE_INFINITY, 100, load);
    assertThat(transconductance(stage, load)).isCloseTo(7.924396244e-3, within(2e-11));
    assertThat(stage.gain("input", "collector")).isCloseTo(-37.2446623, within(1e-7));
    SolvedCircuit without = commonEmitter(NO_BASE_CURRENT, Double.POSITIVE_INFINITY, 100, load);
    assertThat(transconductance(without, load)).isCloseTo(7.955919172e-3, within(2e-11));
  }

  /** R_in = r_π + (β + 1) R_E = 25238.5158 Ω. */
  @Test
  void degenerationRaisesTheInputResistance() {
    assertThat(commonEmitter(200, Double.POSITIVE_INFINITY, 100, 1).resistanceSeenBy("input"))
        .isCloseTo(25238.5158, within(2e-4));
  }

  /**
   * R_out = r_o + (1 + g_m r_o)(R_E ∥ r_π) = 481.885618 kΩ, base grounded, r_o 100 kΩ. The formula
   * takes g_m as I_C/V_T; where the Early effect goes with the collector-base voltage it is I_C
   * (1/V_T − 1/V_A), so that g_m r_o is less by one.
   */
  @Test
  void degenerationRaisesTheOutputResistance() {
    double load = 4700;
    SolvedCircuit stage = commonEmitter(200, 100, 100, load);
    double seen = 1 / (1 / stage.resistanceAt("collector") - 1 / load);
    double inEmitter = 1 / (1 / 100.0 + 1 / 5138.5158);
    assertThat(seen + inEmitter).isCloseTo(481.885618e3, within(0.1));
  }

  /** −g_m (R_C ∥ r_o) = −174.7203430 at 1 mA, 4.7 kΩ, r_o 100 kΩ; g_m as above. */
  @Test
  void withoutDegenerationTheOutputResistanceLoads() {
    double gain = commonEmitter(200, 100, 0, 4700).gain("input", "collector");
    assertThat(gain / (1 - THERMAL / 100)).isCloseTo(-174.7203430, within(1e-6));
  }

  /**
   * 10 mA, R_L 100 Ω, R_S 1 kΩ, β 200: R_in = r_π + (β + 1) R_L = 20613.8516 Ω, R_out = (r_π +
   * R_S)/(β + 1) = 7.531599913 Ω, gain from the source 0.9299591942.
   */
  @Test
  void aFollowerRaisesTheInputAndLowersTheOutputResistance() {
    TransistorParameters parameters = IdealParts.carrying(10e-3, 0.7, 200, ROOM);
    double baseCurrent = 10e-3 / 200;
    double emitter = (10e-3 + baseCurrent) * 100;
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("input", "source", emitter + 0.7 + 1000 * baseCurrent);
    builder.resistor("source", "source", "base", 1000);
    builder.supply("positive", "positive", emitter + 0.7);
    builder.resistor("load", "emitter", GROUND, 100);
    builder.transistor("q1", Polarity.NPN, "positive", "base", "emitter", parameters, ROOM);
    SolvedCircuit follower = SolvedCircuit.of(builder);
    assertThat(follower.resistanceSeenBy("input") - 1000).isCloseTo(20613.8516, within(1e-3));
    assertThat(1 / (1 / follower.resistanceAt("emitter") - 1 / 100.0))
        .isCloseTo(7.531599913, within(1e-7));
    assertThat(follower.gain("input", "emitter")).isCloseTo(0.9299591942, within(1e-9));
  }

  /**
   * A transistor on a current source of the other polarity: −(1/V_T) V_An V_Ap/(V_An + V_Ap) =
   * −1297.391483 for 100 V and 50 V, into 33.333 kΩ at 1 mA; g_m as above.
   */
  @Test
  void anActiveLoadLeavesOnlyTheEarlyEffect() {
    TransistorParameters npn = IdealParts.carrying(1e-3, 0.65, 200, ROOM).withEarlyVoltage(100);
    TransistorParameters pnp = IdealParts.carrying(1e-3, 0.7, 200, ROOM).withEarlyVoltage(50);
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("input", "base", 0.65);
    builder.supply("bias", "bias", 0.65);
    builder.supply("positive", "positive", 0.65 + 0.7);
    builder.transistor("q1", Polarity.NPN, "out", "base", GROUND, npn, ROOM);
    builder.transistor("q2", Polarity.PNP, "out", "bias", "positive", pnp, ROOM);
    SolvedCircuit stage = SolvedCircuit.of(builder);
    assertThat(stage.voltage("out")).isCloseTo(0.65, within(1e-6));
    assertThat(stage.gain("input", "out") / (1 - THERMAL / 100))
        .isCloseTo(-1297.391483, within(1e-4));
    assertThat(stage.resistanceAt("out")).isCloseTo(33.333e3, within(0.5));
  }
}
