package loopwright.benchmark;

import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import loopwright.circuit.Circuit;
import loopwright.circuit.FollowerChain;
import loopwright.numeric.ComplexSystem;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import loopwright.solve.SmallSignalCircuit;
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
 * How one complex factorisation and solution grows with the length of a chain of sections; with the
 * gc profiler, what it allocates.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class ChainBenchmark {
  private static final double OMEGA = 2 * Math.PI * 1e6;

  /** How many unknowns at the most. */
  @Param({"30", "100", "300", "1000"})
  private int unknowns;

  private SmallSignalCircuit network;
  private ComplexSystem system;
  private double[] vector;

  /** Solves the chain at rest and analyses it. */
  @Setup
  public void linearise() {
    Circuit circuit = FollowerChain.ofUnknowns(unknowns);
    OperatingPoint rest = OperatingPointSolver.solve(circuit);
    if (!(rest instanceof OperatingPoint.Found found)) {
      throw new IllegalStateException("the chain has no operating point: " + rest);
    }
    network = new SmallSignalCircuit(circuit);
    network.linearise(found.state());
    system = circuit.systems().complex();
    vector = new double[2 * circuit.unknowns()];
  }

  /** Refactor and solve, every row excited. */
  @Benchmark
  public double refactorAndSolve() {
    if (!system.factor(network.g(), network.c(), 0, OMEGA)) {
      throw new IllegalStateException("the chain is singular");
    }
    Arrays.fill(vector, 1);
    system.solve(vector);
    return vector[0];
  }
}
