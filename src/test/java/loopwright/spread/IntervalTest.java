package loopwright.spread;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class IntervalTest {
  @Test
  void countsAsTheStandardDoes() {
    // JCGM 101:2008, 7.7.2: M = 200, q = 190, r = 5: the 5th and the 195th in order.
    double[] values = IntStream.rangeClosed(1, 200).mapToDouble(i -> 201 - i).toArray();
    assertThat(Interval.of(values)).containsExactly(5, 195);
  }

  @Test
  void fewSamplesGiveAllOfThem() {
    assertThat(Interval.of(new double[] {3, 1, 2})).containsExactly(1, 3);
  }

  @Test
  void theSumOfFourRectangularDistributions() {
    // JCGM 101:2008, 9.2.3: four rectangular distributions of mean 0 and standard deviation 1; the
    // exact end is 2√3 (2 − 0.6^¼) = 3.8794067. Density there about 0.024, so that the standard
    // error of the end is √(0.025 · 0.975/M)/0.024 = 0.0103 for 400 000 samples.
    SplittableRandom random = new SplittableRandom(7);
    double[] sums = new double[400_000];
    for (int i = 0; i < sums.length; i++) {
      for (int k = 0; k < 4; k++) {
        sums[i] += Math.sqrt(3) * (2 * random.nextDouble() - 1);
      }
    }
    double[] interval = Interval.of(sums);
    assertThat(interval[1]).isEqualTo(3.8794067, within(3 * 0.0103));
    assertThat(interval[0]).isEqualTo(-3.8794067, within(3 * 0.0103));
  }
}
