package loopwright.benchmark;

import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import loopwright.file.DesignText;
import loopwright.predict.FigureValue;
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
 * One tolerance sample, see {@link ToleranceSamples}, on one core; and ten thousand of them on two,
 * which prints how many had every figure and what the others said.
 */
@State(Scope.Thread)
@Fork(1)
public class ToleranceBenchmark {
  private static final int SAMPLES = 10_000;
  private static final int CORES = 2;

  /** An example by its name. */
  @Param({"everything-fitted", "seismometer-coil"})
  private String example;

  private ToleranceSamples samples;
  private long seed;

  /** Solves the nominal build. */
  @Setup
  public void solveNominal() {
    samples = new ToleranceSamples(DesignText.example(example));
  }

  /** One sample after another. */
  @Benchmark
  @BenchmarkMode(Mode.AverageTime)
  @OutputTimeUnit(TimeUnit.MICROSECONDS)
  @Warmup(iterations = 5, time = 2)
  @Measurement(iterations = 5, time = 2)
  public FigureValue[] oneSample() {
    return samples.solve(seed++);
  }

  /** Ten thousand samples, each core its own half with its own nominal build. */
  @Benchmark
  @BenchmarkMode(Mode.SingleShotTime)
  @OutputTimeUnit(TimeUnit.SECONDS)
  @Warmup(iterations = 1)
  @Measurement(iterations = 3)
  public int tenThousandOnTwoCores() {
    List<ToleranceSamples> lanes =
        IntStream.range(0, CORES)
            .parallel()
            .mapToObj(
                lane -> {
                  ToleranceSamples own = new ToleranceSamples(DesignText.example(example));
                  for (long at = lane; at < SAMPLES; at += CORES) {
                    own.solve(at);
                  }
                  return own;
                })
            .toList();
    int solved = lanes.stream().mapToInt(ToleranceSamples::solved).sum();
    System.out.println(solved + " of " + SAMPLES + " with every figure");
    lanes.forEach(
        lane -> lane.reasons().forEach((why, count) -> System.out.println(count + ": " + why)));
    return solved;
  }
}
