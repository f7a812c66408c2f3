package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Arrays;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Exact on clean samples, and as scattered as it says on noisy ones: Cramér and Rao's bound of a
 * sine in white noise (Kay, Fundamentals of Statistical Signal Processing, vol. 1, example 3.14,
 * from memory) is var A = 2σ²/N, var offset = σ²/N, var phase = 2σ²/(A²N) at the middle, var f =
 * 6σ²/(π²A²Δt²N(N² − 1)).
 */
class SineFitTest {
  private static final int COUNT = 500;
  private static final double SPACING = 1e-5;
  private static final double NOISE = 0.05;

  private static double[] times() {
    double[] times = new double[COUNT];
    Arrays.setAll(times, i -> 2e-3 + i * SPACING);
    return times;
  }

  private static double[] values(DoubleUnaryOperator law) {
    return Arrays.stream(times()).map(law).toArray();
  }

  @ParameterizedTest
  @ValueSource(doubles = {250, 1000, 1234.5, 20_000})
  void aCleanSineIsFoundToRounding(double frequency) {
    double[] values =
        values(t -> 0.3 + 2 * Math.cos(2 * Math.PI * frequency * (t - 4.495e-3) + 0.7));
    SineFit four = SineFit.ofFour(times(), values);
    assertThat(four.frequency()).isCloseTo(frequency, withinPercentage(1e-9));
    assertThat(four.amplitude()).isCloseTo(2, within(1e-10));
    assertThat(four.offset()).isCloseTo(0.3, within(1e-10));
    assertThat(four.phase()).isCloseTo(0.7, within(1e-9));
    SineFit three = SineFit.ofThree(times(), values, frequency);
    assertThat(three.amplitude()).isCloseTo(2, within(1e-12));
    assertThat(three.at(times()[7])).isCloseTo(values[7], within(1e-12));
  }

  @Test
  void theScatterOfNoisySinesIsThatOfTheBoundAndOfItsOwnStatement() {
    Random random = new Random(20260101);
    int trials = 200;
    double[][] found = new double[4][trials];
    double[] stated = new double[4];
    for (int trial = 0; trial < trials; trial++) {
      double[] noisy =
          values(t -> 2 * Math.cos(2 * Math.PI * 12_345 * t) + NOISE * random.nextGaussian());
      SineFit fit = SineFit.ofFour(times(), noisy);
      found[0][trial] = fit.amplitude();
      found[1][trial] = fit.offset();
      found[2][trial] = fit.phase();
      found[3][trial] = fit.frequency();
      stated[0] += fit.amplitudeStandard() / trials;
      stated[1] += fit.offsetStandard() / trials;
      stated[2] += fit.phaseStandard() / trials;
      stated[3] += fit.frequencyStandard() / trials;
    }
    double n = COUNT;
    double variance = NOISE * NOISE;
    double[] bound = {
      Math.sqrt(2 * variance / n),
      Math.sqrt(variance / n),
      Math.sqrt(2 * variance / (4 * n)),
      Math.sqrt(6 * variance / (4 * n * (n * n - 1))) / (Math.PI * SPACING)
    };
    for (int i = 0; i < 4; i++) {
      double mean = Arrays.stream(found[i]).average().orElseThrow();
      double square = Arrays.stream(found[i]).map(x -> (x - mean) * (x - mean)).sum();
      // A standard deviation of 200 is itself known to 5 %; four of those.
      assertThat(Math.sqrt(square / (trials - 1))).isCloseTo(bound[i], withinPercentage(20));
      assertThat(stated[i]).isCloseTo(bound[i], withinPercentage(2));
    }
  }

  @Test
  void lessThanAPeriodIsRefused() {
    assertThatThrownBy(() -> SineFit.ofFour(times(), values(t -> t)))
        .isInstanceOf(ArithmeticException.class)
        .hasMessageContaining("less than one period");
  }
}
