package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.CircuitState;
import loopwright.circuit.FigureAmplifier;
import loopwright.part.DiodeParameters;
import loopwright.solve.Transient.Accuracy;
import loopwright.task.CancelledException;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

class TransientTest {
  private static final String GROUND = CircuitBuilder.GROUND;
  private static final Transient.Sink NOBODY = (time, state) -> {};

  private static CircuitState rest(CircuitBuilder builder) {
    OperatingPoint point = OperatingPointSolver.solve(builder.build(0));
    assertThat(point).isInstanceOf(OperatingPoint.Found.class);
    return ((OperatingPoint.Found) point).state();
  }

  private static CircuitBuilder lowPass() {
    CircuitBuilder builder = new CircuitBuilder(298.15);
    builder.generator("generator", "in", 0);
    builder.resistor("R", "in", "out", 1e3);
    builder.capacitor("C", "out", GROUND, 1e-9);
    return builder;
  }

  /** 1 − e^(−t/τ) at 1, 2, 3 and 5 time constants of 1 µs, ten digits. */
  @Test
  void chargesACapacitorFromAStep() {
    double[] exact = {0.6321205588, 0.8646647168, 0.9502129316, 0, 0.9932620531};
    Transient run = new Transient(rest(lowPass()), GeneratorSignal.step(0, 1, 2e-7), Accuracy.FINE);
    run.advance(2e-7, NOBODY, Progress.none());
    assertThat(run.state().voltage("out")).isCloseTo(0, within(1e-8));
    for (int k : new int[] {1, 2, 3, 5}) {
      run.advance(2e-7 + k * 1e-6, NOBODY, Progress.none());
      assertThat(run.state().voltage("out")).isCloseTo(exact[k - 1], within(2e-5));
    }
  }

  /** A sine through a low pass at its corner: 1/√2 of the amplitude, 45° late. */
  @Test
  void followsASine() {
    double frequency = 1 / (2 * Math.PI * 1e-6);
    Transient run =
        new Transient(rest(lowPass()), GeneratorSignal.sine(0, 2, frequency), Accuracy.FINE);
    for (double periods : new double[] {10.125, 10.375}) {
      run.advance(periods / frequency, NOBODY, Progress.none());
      double expected = 2 / Math.sqrt(2) * Math.sin(2 * Math.PI * (periods - 0.125));
      assertThat(run.state().voltage("out")).isCloseTo(expected, within(5e-5));
    }
  }

  @Test
  void hitsEveryCorner() {
    GeneratorSignal pulse = GeneratorSignal.pulse(0, 1, 1e-7, 2e-8, 3e-7, 1e-8);
    List<Double> times = new ArrayList<>();
    Transient run = new Transient(rest(lowPass()), pulse, Accuracy.USUAL);
    run.advance(1e-6, (time, state) -> times.add(time), Progress.none());
    assertThat(times)
        .contains(0.0, 1e-7, 1e-7 + 2e-8, 1e-7 + 2e-8 + 3e-7, 1e-7 + 2e-8 + 3e-7 + 1e-8, 1e-6);
  }

  /** A blocking capacitor charges in time, from the voltage that it held. */
  @Test
  void blockingCapacitorsCount() {
    CircuitBuilder builder = new CircuitBuilder(298.15);
    builder.generator("generator", "in", 0);
    builder.blockingCapacitor("C", "in", "out", 1e-6);
    builder.resistor("R", "out", GROUND, 1e3);
    CircuitState start = rest(builder);
    start.holdBlockingCapacitors();
    Transient run = new Transient(start, GeneratorSignal.constant(1), Accuracy.FINE);
    run.advance(1e-3, NOBODY, Progress.none());
    assertThat(run.state().voltage("out")).isCloseTo(Math.exp(-1), within(3e-5));
  }

  /**
   * A diode driven through a capacitor and never turned on: its capacitance changes with every
   * swing of the generator, and yet the node between the two keeps its charge. Only the leakage
   * through 1e-13 S may take some: 1e-13 A · 2 V · 1 ms/1 nF at the most.
   */
  @Test
  void keepsChargeOnAFloatingNode() {
    CircuitBuilder builder = new CircuitBuilder(298.15);
    builder.generator("generator", "in", 0);
    builder.capacitor("C", "in", "node", 1e-9);
    builder.diode("d1", GROUND, "node", new DiodeParameters(1e-18, 1, 0, 2e-9, 0), 298.15);
    CircuitState start = rest(builder);
    double[] times = new double[401];
    double[] volts = new double[401];
    for (int i = 0; i < times.length; i++) {
      times[i] = i * 2.5e-6;
      volts[i] = i % 4 == 1 ? 3 : i % 4 == 3 ? 0.2 : 1;
    }
    volts[0] = 0;
    volts[400] = 0;
    Transient run = new Transient(start, GeneratorSignal.recorded(times, volts), Accuracy.USUAL);
    run.advance(5e-6, NOBODY, Progress.none());
    assertThat(run.state().voltage("node")).isGreaterThan(0.1);
    run.advance(1e-3, NOBODY, Progress.none());
    assertThat(run.state().voltage("node")).isCloseTo(start.voltage("node"), within(3e-7 + 1e-6));
  }

  /** An amplifier by its figures slews at its limit exactly, whatever its poles. */
  @Test
  void slewsAtTheStatedRate() {
    for (double[] poles : new double[][] {{}, {1e3}, {5e6, 100}}) {
      CircuitBuilder builder = new CircuitBuilder(298.15);
      builder.generator("generator", "in", 0);
      double[] rates = java.util.Arrays.stream(poles).map(f -> 2 * Math.PI * f).toArray();
      builder.figureAmplifier(
          new FigureAmplifier.Figures(1e5, 0, Double.POSITIVE_INFINITY, 0, -10, 10, 0, 2e6, rates),
          "in",
          "out",
          "gainOut",
          "out");
      Transient run = new Transient(rest(builder), GeneratorSignal.step(0, 8, 0), Accuracy.FINE);
      run.advance(1e-6, NOBODY, Progress.none());
      double early = run.state().voltage("out");
      run.advance(3e-6, NOBODY, Progress.none());
      double late = run.state().voltage("out");
      assertThat((late - early) / 2e-6).isCloseTo(2e6, within(2e3));
      run.advance(20e-6, NOBODY, Progress.none());
      assertThat(run.state().voltage("out")).isCloseTo(8, within(1e-3));
    }
  }

  @Test
  void remembersInBoundedMemory() {
    CircuitState start = rest(lowPass());
    Circuit circuit = start.circuit();
    TimeRecord record = new TimeRecord(64, circuit.node("in"), circuit.node("out"));
    Transient run = new Transient(start, GeneratorSignal.sine(0, 1, 1e5), Accuracy.USUAL);
    run.advance(1e-3, record, Progress.none());

    assertThat(run.steps()).isGreaterThan(6400);
    assertThat(record.count()).isBetween(32, 64);
    double[] times = record.times();
    double[] in = record.volts(0);
    assertThat(times[0]).isZero();
    assertThat(times[times.length - 1]).isGreaterThan(0.9e-3);
    for (int k = 0; k < times.length; k++) {
      assertThat(in[k]).isCloseTo(Math.sin(2 * Math.PI * 1e5 * times[k]), within(1e-9));
    }
  }

  @Test
  void canBeCancelled() {
    Transient run = new Transient(rest(lowPass()), GeneratorSignal.sine(0, 1, 1e6), Accuracy.USUAL);
    Progress impatient =
        new Progress() {
          private int reports;

          @Override
          public void report(double share, String says) {
            reports++;
          }

          @Override
          public boolean cancelled() {
            return reports > 3;
          }
        };
    assertThatThrownBy(() -> run.advance(1, NOBODY, impatient))
        .isInstanceOf(CancelledException.class);
    assertThat(run.time()).isBetween(1e-7, 1e-3);
  }
}
