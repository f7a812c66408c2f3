package loopwright.benchmark;

import java.util.List;
import java.util.concurrent.TimeUnit;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.design.Design;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import loopwright.task.Progress;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * How long the reference example takes: {@code examples/everything-fitted.json}, which has one of
 * everything that the stage library offers. Figures and how to run it: docs/performance.md.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(2)
public class ReferenceExampleBenchmark {
  private static final int POINTS = 400;
  private static final double LOWEST = 1;
  private static final double HIGHEST = 1e9;

  private Design design;
  private AssembledHookup hookup;
  private LinearNetwork network;
  private NaturalFrequencies frequencies;
  private double[] grid;

  /** Solves once what the single steps start from. */
  @Setup
  public void solveOnce() {
    design = BenchmarkDesigns.referenceExample();
    hookup = Assembler.assemble(design, design.hookups().get(0));
    OperatingPoint rest = OperatingPointSolver.solve(hookup.circuit());
    if (!(rest instanceof OperatingPoint.Found found)) {
      throw new IllegalStateException("the reference example has no operating point: " + rest);
    }
    network = new LinearNetwork(hookup);
    network.linearise(found.state());
    frequencies = new NaturalFrequencies(network);
    grid = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      grid[i] = LOWEST * Math.pow(HIGHEST / LOWEST, (double) i / (POINTS - 1));
    }
  }

  /** From a design to its circuit. */
  @Benchmark
  public AssembledHookup assembly() {
    return Assembler.assemble(design, design.hookups().get(0));
  }

  /** The operating point, from all sources at zero. */
  @Benchmark
  public OperatingPoint operatingPoint() {
    return OperatingPointSolver.solve(hookup.circuit());
  }

  /** One complex factorisation and solution. */
  @Benchmark
  public double[] oneFrequency() {
    return network.response(1e6);
  }

  /** The response at 400 frequencies from 1 Hz to 1 GHz. */
  @Benchmark
  public double response400() {
    double sum = 0;
    for (double frequency : grid) {
      sum += network.response(frequency)[0];
    }
    return sum;
  }

  /** All natural frequencies. */
  @Benchmark
  public List<NaturalFrequencies.Pole> naturalFrequencies() {
    return frequencies.of(network);
  }

  /** Every figure of the catalogue in one hookup, on one core. */
  @Benchmark
  @OutputTimeUnit(TimeUnit.MILLISECONDS)
  public Prediction oneHookup() {
    return Predictor.predict(
        design, List.of(hookup.hookup().name()), new double[0], Progress.none());
  }

  /** Every figure of the catalogue in all hookups, each on a core of its own while there are. */
  @Benchmark
  @OutputTimeUnit(TimeUnit.MILLISECONDS)
  public Prediction wholePrediction() {
    return Predictor.predict(design, List.of(), new double[0], Progress.none());
  }
}
