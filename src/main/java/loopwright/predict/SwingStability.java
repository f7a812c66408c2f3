package loopwright.predict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.Predicate;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.solve.GeneratorWalk;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.solve.RootCount;
import loopwright.solve.RootFollower;

/**
 * The linear circuit at every level that the output passes: generator at 41 equally spaced values
 * from dc − amplitude to dc + amplitude, and between neighbours that differ in the number of
 * growing frequencies by bisection. Without amplitude only the level at rest.
 */
final class SwingStability {
  static final int LEVELS = 41;
  private static final int BISECTIONS = 6;

  /**
   * A level with its roots.
   *
   * @param level what the prediction says of it
   * @param growing its growing natural frequencies
   * @param state the solved circuit
   */
  record Solved(SwingLevel level, List<Pole> growing, CircuitState state) {}

  private final AssembledHookup hookup;
  private final LinearNetwork network;
  private final int half;
  private final Predicate<SwingLevel> goOn;
  private final List<Solved> levels = new ArrayList<>();
  private RootFollower roots;
  private String remark = "";

  /**
   * Walks the levels.
   *
   * @param rest at rest, blocking capacitors held
   */
  SwingStability(AssembledHookup hookup, CircuitState rest) {
    this(hookup, rest, LEVELS, level -> true);
  }

  /**
   * Walks so many levels, as long as each is one to go on from.
   *
   * @param rest at rest, blocking capacitors held
   * @param count odd
   * @param goOn asked at each level
   */
  SwingStability(AssembledHookup hookup, CircuitState rest, int count, Predicate<SwingLevel> goOn) {
    this.hookup = hookup;
    this.half = (count - 1) / 2;
    this.goOn = goOn;
    this.network = new LinearNetwork(hookup);
    double amplitude = hookup.hookup().source().amplitude().value();
    GeneratorWalk start = new GeneratorWalk(hookup, rest, Math.max(amplitude / 8, 1e-6));
    Solved first = solve(start);
    levels.add(first);
    if (amplitude > 0
        && goOn.test(first.level())
        && walk(rest, amplitude, 1)
        && walk(rest, amplitude, -1)) {
      levels.sort(Comparator.comparingDouble(solved -> solved.level().generator()));
      refine();
    }
  }

  /** Levels in the order of the generator's voltage. */
  List<Solved> levels() {
    return levels;
  }

  /** What is to be said about the levels, or empty: where the output jumps. */
  String remark() {
    return remark;
  }

  /**
   * The level whose complex pair grows fastest or dies slowest; empty when there is no pair at all.
   */
  Optional<Solved> worstByGrowth() {
    return levels.stream()
        .filter(solved -> solved.level().growth().isPresent())
        .max(Comparator.comparingDouble(solved -> solved.level().growth().getAsDouble()));
  }

  /** The level with the smallest phase margin; empty when the loop gain never passes 1. */
  Optional<Solved> worstByMargin() {
    return levels.stream()
        .filter(solved -> solved.level().phaseMargin().isPresent())
        .min(Comparator.comparingDouble(solved -> solved.level().phaseMargin().getAsDouble()));
  }

  /**
   * In words: over which outputs something grows and at what frequency; empty when nothing does.
   */
  String says() {
    List<Solved> growing = levels.stream().filter(solved -> !solved.level().stable()).toList();
    if (growing.isEmpty()) {
      return "";
    }
    double low =
        growing.stream().mapToDouble(solved -> solved.level().output()).min().orElseThrow();
    double high =
        growing.stream().mapToDouble(solved -> solved.level().output()).max().orElseThrow();
    boolean oscillates =
        growing.stream().anyMatch(s -> s.growing().stream().anyMatch(pole -> pole.im() > 0));
    String verb = oscillates ? "grows" : "latches";
    String at =
        oscillates
            ? " at " + Text.hertz(worstByGrowth().orElseThrow().level().frequency().orElse(0))
            : "";
    return verb + " from " + Text.volts(low) + " to " + Text.volts(high) + at;
  }

  /** Walks one way; false when there is no need to go on. */
  private boolean walk(CircuitState rest, double amplitude, int direction) {
    GeneratorWalk walk = new GeneratorWalk(hookup, rest, amplitude / half);
    for (int k = 1; k <= half; k++) {
      if (!walk.advance(rest.generator() + direction * amplitude * k / half)) {
        remark += (remark.isEmpty() ? "" : "; ") + "jumps at " + Text.volts(walk.output());
        return true;
      }
      Solved solved = solve(walk);
      levels.add(solved);
      if (!goOn.test(solved.level())) {
        return false;
      }
    }
    return true;
  }

  private void refine() {
    for (int i = levels.size() - 1; i > 0; i--) {
      Solved low = levels.get(i - 1);
      Solved high = levels.get(i);
      for (int k = 0; k < BISECTIONS && low.growing().size() != high.growing().size(); k++) {
        double middle = (low.level().generator() + high.level().generator()) / 2;
        GeneratorWalk walk =
            new GeneratorWalk(
                hookup, low.state(), high.level().generator() - low.level().generator());
        if (!walk.advance(middle)) {
          break;
        }
        Solved between = solve(walk);
        levels.add(levels.indexOf(high), between);
        if (between.growing().size() == low.growing().size()) {
          low = between;
        } else {
          high = between;
        }
      }
    }
  }

  private Solved solve(GeneratorWalk walk) {
    CircuitState state = walk.state().copy();
    network.linearise(state);
    if (roots == null) {
      roots = new RootFollower(network);
    }
    List<Pole> poles = roots.follow(network);
    Traced traced = poles.isEmpty() ? null : trace(poles);
    if (traced == null || !roots.confirms(poles, traced.samples())) {
      poles = roots.solveAll(network);
      traced = trace(poles);
    }
    List<Pole> growing = poles.stream().filter(Pole::grows).toList();
    Optional<Pole> leading =
        poles.stream().filter(pole -> pole.im() > 0).max(Comparator.comparingDouble(Pole::re));
    SwingLevel level =
        new SwingLevel(
            walk.generator(),
            walk.output(),
            growing.isEmpty(),
            leading
                .map(p -> OptionalDouble.of(p.im() / (2 * Math.PI)))
                .orElse(OptionalDouble.empty()),
            leading.map(p -> OptionalDouble.of(p.re())).orElse(OptionalDouble.empty()),
            traced.margin(),
            walk.gain());
    return new Solved(level, growing, state);
  }

  /** The margin at a level, and the determinant at every frequency that was solved for it. */
  private record Traced(OptionalDouble margin, List<RootCount.Sample> samples) {}

  private Traced trace(List<Pole> poles) {
    List<RootCount.Sample> samples = new ArrayList<>();
    double[] grid = LoopMargins.grid(poles);
    DoubleFunction<double[]> loopGain =
        frequency -> {
          double[] value = network.loopGain(frequency);
          samples.add(new RootCount.Sample(2 * Math.PI * frequency, network.determinantArgument()));
          return value;
        };
    if (hookup.isOpen()) {
      for (double frequency : grid) {
        loopGain.apply(frequency);
      }
      return new Traced(OptionalDouble.empty(), samples);
    }
    OptionalDouble margin =
        LoopMargins.crossing(loopGain, grid)
            .map(crossing -> OptionalDouble.of(crossing.phaseMargin()))
            .orElse(OptionalDouble.empty());
    return new Traced(margin, samples);
  }
}
