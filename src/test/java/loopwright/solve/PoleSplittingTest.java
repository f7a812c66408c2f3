package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Comparator;
import java.util.List;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.Physics;
import loopwright.circuit.VoltageSource;
import loopwright.part.Polarity;
import loopwright.solve.NaturalFrequencies.Pole;
import org.junit.jupiter.api.Test;

/**
 * A gain stage with a Miller capacitor (Solomon, IEEE Journal of Solid-State Circuits 9, 1974,
 * 314–332): D(s) = 1 + s[R₁(C₁ + C_c) + R₂(C₂ + C_c) + g_m R₁ R₂ C_c] + s² R₁ R₂ [C₁ C₂ + C_c (C₁ +
 * C₂)], zero at +g_m/C_c. R₁ 50 kΩ, C₁ 10 pF, R₂ 100 kΩ, C₂ 20 pF, g_m 20 mS, C_c 47 pF; roots
 * worked out from this polynomial.
 *
 * <p>The transistor's shunt conductance of 1e-13 S from collector to base, times the stage's gain
 * of 2000, stands across R₁ and moves the low poles by 1e-5 of their value.
 */
class PoleSplittingTest {
  private static final double ROOM = 298.15;
  private static final double TRANSCONDUCTANCE = 20e-3;
  private static final double MILLER = 47e-12;
  private static final String GROUND = CircuitBuilder.GROUND;

  /** A transistor of the wanted transconductance without base current, fed by a current source. */
  private static SolvedCircuit stage(double miller, double nullingResistance) {
    double current = TRANSCONDUCTANCE * Physics.thermalVoltage(ROOM);
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("input", "source", 0.65);
    builder.resistor("R1", "source", "base", 50e3);
    builder.capacitor("C1", "base", GROUND, 10e-12);
    builder.transistor(
        "q1",
        Polarity.NPN,
        "collector",
        "base",
        GROUND,
        IdealParts.carrying(current, 0.65, 1e12, ROOM),
        ROOM);
    builder.currentSource("bias", GROUND, "collector", current);
    builder.supply("return", "return", 0.8);
    builder.resistor("R2", "collector", "return", 100e3);
    builder.capacitor("C2", "collector", GROUND, 20e-12);
    builder.resistor("nulling", "base", "middle", nullingResistance);
    builder.capacitor("miller", "middle", "collector", miller);
    return SolvedCircuit.of(builder);
  }

  private static List<Double> polesInHertz(SolvedCircuit stage) {
    List<Pole> poles = new NaturalFrequencies(stage.smallSignal()).of(stage.smallSignal());
    assertThat(poles).allMatch(pole -> pole.im() == 0);
    return poles.stream()
        .map(pole -> -pole.re() / (2 * Math.PI))
        .sorted(Comparator.naturalOrder())
        .toList();
  }

  @Test
  void withoutTheCapacitorThePolesAreThoseOfTheNodes() {
    List<Double> poles = polesInHertz(stage(0, 0));
    assertThat(poles).hasSize(2);
    assertThat(poles.get(0)).isCloseTo(79.577472e3, within(2e-5 * 79.577472e3));
    assertThat(poles.get(1)).isCloseTo(318.309886e3, within(2e-5 * 318.309886e3));
  }

  @Test
  void theCapacitorSplitsThePoles() {
    List<Double> poles = polesInHertz(stage(MILLER, 0));
    assertThat(poles).hasSize(2);
    assertThat(poles.get(0)).isCloseTo(33.7940994, within(2e-5 * 33.7940994));
    assertThat(poles.get(1)).isCloseTo(93.1115392e6, within(2e-7 * 93.1115392e6));
  }

  /** g_m/(2π C_c) = 67.7255077 MHz in the right half-plane: the response changes its sign there. */
  @Test
  void theCapacitorBringsAZeroInTheRightHalfPlane() {
    SolvedCircuit stage = stage(MILLER, 0);
    double zero = 2 * Math.PI * 67.7255077e6;
    assertThat(along(stage, zero * (1 - 1e-7))).isNegative();
    assertThat(along(stage, zero * (1 + 1e-7))).isPositive();
    assertThat(along(stage, zero / 1000)).isNegative();
  }

  /** R_z = 1/g_m = 50 Ω moves the zero to infinity. */
  @Test
  void aResistorOfOneOverTransconductanceMovesTheZeroToInfinity() {
    SolvedCircuit stage = stage(MILLER, 1 / TRANSCONDUCTANCE);
    double zero = 2 * Math.PI * 67.7255077e6;
    for (double factor = 1e-3; factor < 1e6; factor *= 2) {
      assertThat(along(stage, factor * zero)).isNegative();
    }
  }

  /** Gain from source to collector on the positive real axis of complex frequency. */
  private static double along(SolvedCircuit stage, double growth) {
    int source = stage.circuit().element("input", VoltageSource.class).branch();
    return stage.smallSignal().responseAt(growth, 0, source, stage.circuit().node("collector"))[0];
  }
}
