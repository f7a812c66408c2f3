package loopwright.predict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.solve.GeneratorSignal;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.solve.SmallSignalCircuit;
import loopwright.solve.TimeRecord;
import loopwright.solve.Transient;
import loopwright.task.Progress;

/** Runs an oscillation from a nudge that only its own pair of roots answers to. */
final class OscillationRun {
  /** The nudge at the node that moves most, V: far below V_T, far above rounding. */
  private static final double NUDGE = 1e-6;

  /** How far it may grow and still count as small. */
  private static final double SMALL = 1000;

  private static final int MOST_SMALL_CYCLES = 300;
  private static final int MOST_CYCLES = 600;
  private static final int RECORDED = 4000;
  private static final Transient.Accuracy WHILE_SMALL = new Transient.Accuracy(1e-5, 1e-10, 1e-13);

  private final HookupSolution solution;
  private final SwingStability.Solved level;
  private final Pole pole;
  private final Progress progress;
  private final int out;

  OscillationRun(HookupSolution solution, SwingStability.Solved level, Progress progress) {
    this.solution = solution;
    this.level = level;
    this.pole = fastest(level).orElseThrow();
    this.progress = progress;
    this.out = solution.assembled().out();
  }

  /** The level where a pair of roots grows fastest; empty where none grows. */
  static Optional<SwingStability.Solved> worst(SwingStability swing) {
    return swing.levels().stream()
        .filter(solved -> fastest(solved).isPresent())
        .max(Comparator.comparingDouble(solved -> fastest(solved).orElseThrow().re()));
  }

  private static Optional<Pole> fastest(SwingStability.Solved level) {
    return level.growing().stream()
        .filter(pole -> pole.im() > 0)
        .max(Comparator.comparingDouble(Pole::re));
  }

  Oscillation run() {
    double forecast = pole.im() / (2 * Math.PI);
    GeneratorSignal held = GeneratorSignal.constant(level.state().generator());
    TimeRecord record = new TimeRecord(RECORDED, out);
    double window = Math.min(Math.log(SMALL) / pole.re(), MOST_SMALL_CYCLES / forecast);
    Transient small = new Transient(nudged(), held, WHILE_SMALL);
    CycleCount early = new CycleCount(out, level.state().voltage(out));
    small.advance(
        window,
        (time, state) -> {
          early.point(time, state);
          record.point(time, state);
        },
        progress);
    Transient large = new Transient(small.state(), held, Transient.Accuracy.USUAL);
    CycleCount cycles = new CycleCount(out);
    while (!cycles.isSettled()
        && cycles.count() < MOST_CYCLES
        && large.time() < MOST_CYCLES / forecast) {
      large.advance(
          large.time() + 5 / forecast,
          (time, state) -> {
            cycles.point(time, state);
            record.point(window + time, state);
          },
          progress);
    }
    return new Oscillation(
        solution.hookup().name(),
        level.level().generator(),
        level.level().output(),
        forecast,
        pole.re(),
        new Oscillation.Early(early.frequency(), early.growth(), early.count()),
        cycles.isSettled()
            ? Optional.of(cycles.settled(early.count() + cycles.count()))
            : Optional.empty(),
        rides(),
        boxed(record.times()),
        boxed(record.volts(0)),
        cycles.isSettled()
            ? ""
            : "its cycles are not alike after " + (early.count() + cycles.count()) + " of them");
  }

  /**
   * The level, moved along the pair's own pattern: what a source very near its root gives
   * everywhere.
   */
  private CircuitState nudged() {
    CircuitState state = level.state().copy();
    Circuit circuit = state.circuit();
    SmallSignalCircuit network = new SmallSignalCircuit(circuit);
    network.linearise(state);
    int row = solution.assembled().generator().branch();
    double near = 1 + 1e-7;
    double[] pattern = new double[circuit.unknowns()];
    double most = 0;
    for (int k = 0; k < pattern.length; k++) {
      pattern[k] = network.responseAt(near * pole.re(), near * pole.im(), row, k)[0];
      most = k < circuit.nodes() ? Math.max(most, Math.abs(pattern[k])) : most;
    }
    for (int k = 0; k < pattern.length; k++) {
      state.unknowns()[k] += NUDGE * pattern[k] / most;
    }
    return state;
  }

  private List<Oscillation.Rides> rides() {
    List<Oscillation.Rides> rides = new ArrayList<>();
    List<SwingLevel> stretch = new ArrayList<>();
    for (SwingStability.Solved solved : solution.swing().levels()) {
      if (fastest(solved).isPresent()) {
        stretch.add(solved.level());
      } else if (!stretch.isEmpty()) {
        rides.add(ride(stretch));
        stretch.clear();
      }
    }
    if (!stretch.isEmpty()) {
      rides.add(ride(stretch));
    }
    rides.sort(Comparator.comparingDouble(Oscillation.Rides::lowOutput));
    return rides;
  }

  private Oscillation.Rides ride(List<SwingLevel> stretch) {
    double amplitude = solution.hookup().source().amplitude().value();
    double centre = solution.hookup().source().dc().value();
    SwingLevel low =
        stretch.stream().min(Comparator.comparingDouble(SwingLevel::output)).orElseThrow();
    SwingLevel high =
        stretch.stream().max(Comparator.comparingDouble(SwingLevel::output)).orElseThrow();
    return new Oscillation.Rides(
        low.output(),
        high.output(),
        phase(low.generator() - centre, amplitude),
        phase(high.generator() - centre, amplitude));
  }

  private static OptionalDouble phase(double above, double amplitude) {
    return amplitude == 0
        ? OptionalDouble.empty()
        : OptionalDouble.of(
            Math.toDegrees(Math.asin(Math.max(-1, Math.min(1, above / amplitude)))));
  }

  private static List<Double> boxed(double[] values) {
    List<Double> list = new ArrayList<>(values.length);
    for (double value : values) {
      list.add(value);
    }
    return list;
  }
}
