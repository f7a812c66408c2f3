package loopwright.benchmark;

import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.design.Design;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.DenseComplexSystem;
import loopwright.numeric.SystemFamily;
import loopwright.solve.LinearNetwork;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * One complex factorisation and solution of a circuit's G + jωC: by the sparse elimination that was
 * analysed once, and by EJML's dense complex LU in the same run.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class LinearSolveBenchmark {
  private static final double OMEGA = 2 * Math.PI * 1e6;

  /**
   * Reference designs 5, 1 and 6 have 33, 42 and 55 unknowns; 0 is the reference example with 89.
   */
  @Param({"5", "1", "6", "0"})
  private int design;

  private LinearNetwork network;
  private ComplexSystem sparse;
  private ComplexSystem dense;
  private double[] vector;
  private int excited;

  /** Solves the circuit at rest and analyses it. */
  @Setup
  public void linearise() {
    Design chosen = BenchmarkDesigns.numbered(design);
    AssembledHookup hookup = Assembler.assemble(chosen, chosen.hookups().get(0));
    OperatingPoint rest = OperatingPointSolver.solve(hookup.circuit());
    if (!(rest instanceof OperatingPoint.Found found)) {
      throw new IllegalStateException("the design has no operating point: " + rest);
    }
    network = new LinearNetwork(hookup);
    network.linearise(found.state());
    sparse = new SystemFamily(network.pattern()).complex();
    dense = new DenseComplexSystem(network.pattern());
    vector = new double[2 * network.pattern().size()];
    excited = 2 * hookup.generator().branch();
  }

  /** Refactor and solve by the sparse elimination. */
  @Benchmark
  public double sparse() {
    return solve(sparse);
  }

  /** Refactor, and both solutions that a loop gain takes, for the lead's unknowns alone. */
  @Benchmark
  public double[] loopGain() {
    return network.loopGain(1e6);
  }

  /** Factor and solve by EJML. */
  @Benchmark
  public double dense() {
    return solve(dense);
  }

  private double solve(ComplexSystem system) {
    if (!system.factor(network.g(), network.c(), 0, OMEGA)) {
      throw new IllegalStateException("the network is singular");
    }
    Arrays.fill(vector, 0);
    vector[excited] = 1;
    system.solve(vector);
    return vector[0];
  }
}
