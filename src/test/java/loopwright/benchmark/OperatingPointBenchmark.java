package loopwright.benchmark;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.assembly.DeviceModels;
import loopwright.assembly.Temperatures;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
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
 * The operating point of a build within its tolerances: from all sources at zero, and from the
 * nominal build's. Every junction is at ambient temperature.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class OperatingPointBenchmark {
  /** A reference design by its number; 0 is the reference example. */
  @Param({"5", "1", "6", "0"})
  private int design;

  private AssembledHookup build;
  private CircuitState nominal;

  /** Solves the nominal build and draws another. */
  @Setup
  public void draw() {
    Design chosen = BenchmarkDesigns.numbered(design);
    AssembledHookup hookup = Assembler.assemble(chosen, chosen.hookups().get(0));
    nominal = found(OperatingPointSolver.solve(hookup.circuit()));
    List<TolerancedPart> parts =
        TolerancedParts.of(HookupFigures.of(chosen, hookup.hookup().name()));
    Random random = new Random(1);
    double[] deviations =
        parts.stream()
            .mapToDouble(part -> part.low() + (part.high() - part.low()) * random.nextDouble())
            .toArray();
    Build drawn = TolerancedParts.build(chosen, parts, deviations);
    DeviceModels models = new DeviceModels(chosen).of(drawn.design(), drawn.deviations());
    build =
        Assembler.assemble(
            drawn.design(),
            drawn.design().hookups().get(0),
            models,
            Temperatures.ambient(drawn.design()),
            Optional.of(hookup));
  }

  /** From all sources at zero. */
  @Benchmark
  public CircuitState cold() {
    return found(OperatingPointSolver.solve(build.circuit()));
  }

  /** From the nominal build's operating point. */
  @Benchmark
  public CircuitState fromNeighbour() {
    return found(OperatingPointSolver.solveNear(build.circuit(), nominal));
  }

  private static CircuitState found(OperatingPoint point) {
    if (point instanceof OperatingPoint.Found found) {
      return found.state();
    }
    throw new IllegalStateException("no operating point: " + point);
  }
}
