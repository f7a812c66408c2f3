package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.function.Predicate;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.IdealParts;
import loopwright.circuit.NoiseSource;
import loopwright.circuit.NoiseSource.Cause;
import loopwright.circuit.Physics;
import loopwright.part.DiodeParameters;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Noise of small circuits through the circuit solver. Numbers are worked out from the formulas of
 * Gray, Hurst, Lewis and Meyer, Analysis and Design of Analog Integrated Circuits, chapter 11 (from
 * memory), at 298.15 K; all printed digits hold.
 */
class NoiseTest {
  private static final double ROOM = 298.15;
  private static final String GROUND = CircuitBuilder.GROUND;

  /** Ten printed digits. */
  private static final double PRINTED = 1e-9;

  private static NoiseSolver noise(SolvedCircuit circuit, String node) {
    return new NoiseSolver(circuit.smallSignal(), circuit.state(), circuit.circuit().node(node));
  }

  /** Density of chosen sources at a node, V/√Hz. */
  private static double density(
      SolvedCircuit circuit, String node, double frequency, Predicate<NoiseSource> chosen) {
    NoiseSolver noise = noise(circuit, node);
    double[] all = noise.densities(frequency);
    double sum = 0;
    for (int i = 0; i < all.length; i++) {
      sum += chosen.test(noise.sources().get(i)) ? all[i] : 0;
    }
    return Math.sqrt(sum);
  }

  private static void assertPrinted(double found, double printed) {
    assertThat(found).isCloseTo(printed, within(PRINTED * printed));
  }

  private static SolvedCircuit resistor(double ohms, double farads) {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.resistor("R", "node", GROUND, ohms);
    builder.capacitor("C", "node", GROUND, farads);
    return SolvedCircuit.of(builder);
  }

  @ParameterizedTest
  @CsvSource({"1e3, 4.057785107e-9", "10e3, 12.83184319e-9"})
  void aResistorMakesItsThermalNoise(double ohms, double printed) {
    assertPrinted(density(resistor(ohms, 0), "node", 1e3, source -> true), printed);
  }

  @Test
  void whiteNoiseGrowsWithTheRootOfTheBand() {
    double[] powers = noise(resistor(100e3, 0), "node").powers(1, 20001, new double[0]);
    assertPrinted(Math.sqrt(powers[0]), 5.738574731e-6);
  }

  /**
   * √(kT/C) whatever the resistance, 2.028892553 µV for 1 nF; the band leaves out a share of
   * (2/π)(atan) at either end.
   */
  @ParameterizedTest
  @ValueSource(doubles = {50, 1e3, 33e3, 4.7e6})
  void anyResistanceAtACapacitorMakesTheRootOfKTOverC(double ohms) {
    double corner = 1 / (2 * Math.PI * ohms * 1e-9);
    double[] powers =
        noise(resistor(ohms, 1e-9), "node").powers(1e-5 * corner, 1e5 * corner, new double[0]);
    double inBand = 2 / Math.PI * (Math.atan(1e5) - Math.atan(1e-5));
    assertPrinted(Math.sqrt(powers[0] / inBand), 2.028892553e-6);
  }

  /** 10 nV/√Hz behind a single pole at 100 kHz: noise bandwidth π/2 times the corner. */
  @Test
  void theNoiseBandwidthOfASinglePoleIsHalfPiTimesItsCorner() {
    double ohms = 1e-16 / (4 * Physics.BOLTZMANN * ROOM);
    SolvedCircuit circuit = resistor(ohms, 1 / (2 * Math.PI * ohms * 100e3));
    double[] powers = noise(circuit, "node").powers(1, 1e10, new double[0]);
    double inBand = 2 / Math.PI * (Math.atan(1e5) - Math.atan(1e-5));
    assertPrinted(Math.sqrt(powers[0] / inBand), 3.963327298e-6);
  }

  /** A transistor with its base behind a resistance and its collector at a resistor. */
  private static SolvedCircuit stage(
      TransistorParameters parameters, double base, double sourceResistance, double junction) {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("bias", "source", base);
    builder.resistor("source", "source", "base", sourceResistance);
    builder.supply("positive", "positive", 10);
    builder.resistor("load", "positive", "collector", 1e3);
    builder.transistor("q1", Polarity.NPN, "collector", "base", GROUND, parameters, junction);
    return SolvedCircuit.of(builder);
  }

  @Test
  void aCollectorCurrentMakesShotNoise() {
    SolvedCircuit stage = stage(IdealParts.carrying(1e-3, 0.65, 1e12, ROOM), 0.65, 0, ROOM);
    double volts = density(stage, "collector", 1e3, s -> s.cause() == Cause.COLLECTOR_SHOT);
    assertPrinted(volts / 1e3, 17.90070744e-12);
  }

  @Test
  void aDiodeMakesShotNoiseIntoItsOwnConductance() {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.currentSource("bias", GROUND, "anode", 1e-6);
    builder.diode("d1", "anode", GROUND, new DiodeParameters(1e-15, 1, 0, 0, 0), ROOM);
    SolvedCircuit diode = SolvedCircuit.of(builder);
    double current = density(diode, "anode", 1e3, source -> true) / diode.resistanceAt("anode");
    assertThat(current).isCloseTo(0.566070072e-12, within(1e-9 * 0.566e-12));
  }

  /** e_n² = 4kT(r_B + 1/(2g_m)): half a milliampere, 50 Ω. */
  @Test
  void aTransistorHasTheNoiseVoltageOfItsBaseResistanceAndHalfAnEmitterResistance() {
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.carrying(0.5e-3, 0.65, 1e12, ROOM), 50, 0);
    SolvedCircuit stage = stage(parameters, 0.65, 0, ROOM);
    double output = density(stage, "collector", 1e3, source -> !source.element().equals("load"));
    assertPrinted(output / Math.abs(stage.gain("bias", "collector")), 1.116389378e-9);
  }

  @Test
  void aPairHasRootTwoTimesTheNoiseVoltageOfItsHalves() {
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.carrying(0.5e-3, 0.65, 1e12, ROOM), 50, 0);
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.supply("positive", "positive", 10);
    builder.supply("one", "base1", 0);
    builder.supply("two", "base2", 0);
    for (String half : new String[] {"1", "2"}) {
      builder.resistor("load" + half, "positive", "collector" + half, 4.7e3);
      builder.transistor(
          "q" + half, Polarity.NPN, "collector" + half, "base" + half, "tail", parameters, ROOM);
    }
    builder.currentSource("tail", "tail", GROUND, 1e-3);
    SolvedCircuit pair = SolvedCircuit.of(builder);
    double output =
        density(pair, "collector1", 1e3, source -> !source.element().startsWith("load"));
    double gain = Math.abs(pair.gain("one", "collector1"));
    assertThat(output / gain).isCloseTo(1.578812999e-9, within(PRINTED * 1.578812999e-9));
  }

  /**
   * I_B = 2.5 µA from a source of 1 kΩ: with every term in place F = 1.134849803. The shunt of
   * 1e-13 S across the collector junction takes 4e-7 of the base current along.
   */
  @Test
  void aStageHasTheNoiseFigureOfItsVoltageAndCurrentNoise() {
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.carrying(0.5e-3, 0.65, 200, ROOM), 50, 0);
    SolvedCircuit stage = stage(parameters, 0.65 + 2.5e-6 * 1050, 1e3, ROOM);
    double all = density(stage, "collector", 1e3, source -> !source.element().equals("load"));
    double own = density(stage, "collector", 1e3, source -> source.element().equals("source"));
    assertThat(all * all / (own * own)).isCloseTo(1.134849803, within(3e-8));
    NoiseSource base =
        noise(stage, "collector").sources().stream()
            .filter(source -> source.cause() == Cause.BASE_SHOT)
            .findFirst()
            .orElseThrow();
    assertThat(Math.sqrt(base.density(1e3)))
        .isCloseTo(0.8950353719e-12, within(3e-7 * 0.8950353719e-12));
  }

  /** At its corner flicker is as strong as the base current's shot noise, and falls as 1/f. */
  @Test
  void flickerPassesShotNoiseAtItsCorner() {
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.carrying(0.5e-3, 0.65, 200, ROOM), 50, 700);
    SolvedCircuit stage = stage(parameters, 0.65 + 2.5e-6 * 1050, 1e3, ROOM);
    for (double frequency : new double[] {7, 700, 70e3}) {
      double flicker = density(stage, "collector", frequency, s -> s.cause() == Cause.FLICKER);
      double shot = density(stage, "collector", frequency, s -> s.cause() == Cause.BASE_SHOT);
      assertThat(flicker / shot).isCloseTo(Math.sqrt(700 / frequency), within(1e-12));
    }
  }

  @Test
  void resistancesInsideADeviceAreAsWarmAsItsJunction() {
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.carrying(0.5e-3, 0.55, 200, 380), 50, 0);
    SolvedCircuit stage = stage(parameters, 0.55 + 2.5e-6 * 1050, 1e3, 380);
    for (NoiseSource source : noise(stage, "collector").sources()) {
      if (source.cause() == Cause.THERMAL) {
        boolean inside = source.element().equals("q1.baseResistance");
        double ohms = inside ? 50 : 1e3;
        assertThat(source.level())
            .as(source.element())
            .isCloseTo(
                4 * Physics.BOLTZMANN * (inside ? 380 : ROOM) / ohms,
                within(1e-12 * source.level()));
      }
    }
  }

  /** A lead's resistance makes noise in series with its inductance. */
  @Test
  void theResistanceOfAnInductorMakesNoise() {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.inductor("lead", "node", GROUND, 100, 1e-3);
    builder.noiselessResistor("quiet", "node", GROUND, 300);
    SolvedCircuit circuit = SolvedCircuit.of(builder);
    for (double frequency : new double[] {10, 1e5, 1e6}) {
      double square = 4 * Physics.BOLTZMANN * ROOM * 100;
      double divider = 300 / Math.hypot(400, 2 * Math.PI * frequency * 1e-3);
      assertThat(density(circuit, "node", frequency, source -> true))
          .isCloseTo(Math.sqrt(square) * divider, within(1e-12 * Math.sqrt(square)));
    }
  }

  /** A passive network at one temperature has the density 4kT Re Z (Nyquist 1928). */
  @Test
  void aPassiveNetworkHasTheNoiseOfTheRealPartOfItsImpedance() {
    CircuitBuilder builder = new CircuitBuilder(ROOM);
    builder.resistor("R1", "a", "b", 1e3);
    builder.resistor("R2", "b", "c", 2.2e3);
    builder.resistor("R3", "c", GROUND, 470);
    builder.resistor("R4", "a", "c", 10e3);
    builder.capacitor("C1", "b", GROUND, 10e-9);
    builder.capacitor("C2", "a", "c", 1e-9);
    builder.inductor("L", "b", GROUND, 33, 10e-6);
    SolvedCircuit circuit = SolvedCircuit.of(builder);
    int node = circuit.circuit().node("a");
    for (double frequency = 1; frequency < 1e9; frequency *= 7) {
      double total = Arrays.stream(noise(circuit, "a").densities(frequency)).sum();
      double real = circuit.smallSignal().response(frequency, node, node)[0];
      double expected = 4 * Physics.BOLTZMANN * ROOM * real;
      assertThat(total).isCloseTo(expected, within(1e-11 * expected));
    }
  }
}
