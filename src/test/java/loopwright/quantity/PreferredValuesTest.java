package loopwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The decade values are those printed in IEC 60063. */
class PreferredValuesTest {
  @Test
  void holdsTheShortSeries() {
    assertThat(PreferredValues.E3.decade()).containsExactly(10, 22, 47);
    assertThat(PreferredValues.E6.decade()).containsExactly(10, 15, 22, 33, 47, 68);
    assertThat(PreferredValues.E12.decade())
        .containsExactly(10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82);
    assertThat(PreferredValues.E24.decade())
        .containsExactly(
            10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75,
            82, 91);
  }

  @Test
  void holdsTheLongSeries() {
    List<Integer> e48 =
        List.of(
            100, 105, 110, 115, 121, 127, 133, 140, 147, 154, 162, 169, 178, 187, 196, 205, 215,
            226, 237, 249, 261, 274, 287, 301, 316, 332, 348, 365, 383, 402, 422, 442, 464, 487,
            511, 536, 562, 590, 619, 649, 681, 715, 750, 787, 825, 866, 909, 953);
    List<Integer> between =
        List.of(
            102, 107, 113, 118, 124, 130, 137, 143, 150, 158, 165, 174, 182, 191, 200, 210, 221,
            232, 243, 255, 267, 280, 294, 309, 324, 340, 357, 374, 392, 412, 432, 453, 475, 499,
            523, 549, 576, 604, 634, 665, 698, 732, 768, 806, 845, 887, 931, 976);
    List<Integer> e96 = new ArrayList<>();
    for (int i = 0; i < 48; i++) {
      e96.add(e48.get(i));
      e96.add(between.get(i));
    }
    assertThat(PreferredValues.E48.decade()).isEqualTo(e48);
    assertThat(PreferredValues.E96.decade()).isEqualTo(e96);
  }

  /** Eight values of E24 are not what rounding 10^(i/24) gives, and no others. */
  @Test
  void keepsTheIrregularValuesOfE24() {
    List<Integer> irregular = new ArrayList<>();
    List<Integer> rounded = new ArrayList<>();
    for (int i = 0; i < 24; i++) {
      int value = (int) Math.round(10 * Math.pow(10, i / 24.0));
      if (value != PreferredValues.E24.decade().get(i)) {
        irregular.add(PreferredValues.E24.decade().get(i));
        rounded.add(value);
      }
    }
    assertThat(irregular).containsExactly(27, 30, 33, 36, 39, 43, 47, 82);
    assertThat(rounded).containsExactly(26, 29, 32, 35, 38, 42, 46, 83);
  }

  /** Only these six values of E24 are in E96 as well. */
  @Test
  void doesNotTakeE24ForAPartOfE96() {
    assertThat(PreferredValues.E24.decade().stream().filter(v -> PreferredValues.E96.contains(v)))
        .containsExactly(10, 11, 13, 15, 20, 75);
  }

  @Test
  void listsTheValuesBetweenTwoBounds() {
    assertThat(PreferredValues.E6.between(1000, 10e3))
        .containsExactly(1000.0, 1500.0, 2200.0, 3300.0, 4700.0, 6800.0, 10e3);
    assertThat(PreferredValues.E3.between(1e-12, 3e-12)).containsExactly(1e-12, 2.2e-12);
    assertThat(PreferredValues.E12.between(830, 990)).isEmpty();
    assertThat(PreferredValues.E96.between(1, 9.99)).hasSize(96);
  }

  @Test
  void findsTheNearestByRatio() {
    assertThat(PreferredValues.E24.nearest(4683)).isEqualTo(4700);
    assertThat(PreferredValues.E12.nearest(4700)).isEqualTo(4700);
    assertThat(PreferredValues.E12.nearest(91e3)).isEqualTo(100e3);
    assertThat(PreferredValues.E12.nearest(90e3)).isEqualTo(82e3);
    assertThat(PreferredValues.E3.nearest(1e-9)).isEqualTo(1e-9);
  }

  @Test
  void stepsUpAndDown() {
    assertThat(PreferredValues.E24.next(4700)).isEqualTo(5100);
    assertThat(PreferredValues.E24.previous(4700)).isEqualTo(4300);
    assertThat(PreferredValues.E24.next(4800)).isEqualTo(5100);
    assertThat(PreferredValues.E24.next(91)).isEqualTo(100);
    assertThat(PreferredValues.E24.previous(100)).isEqualTo(91);
    assertThat(PreferredValues.E6.next(6.8e-12)).isEqualTo(10e-12);
  }

  @ParameterizedTest
  @EnumSource(PreferredValues.class)
  void climbsThroughEveryValueAndComesBack(PreferredValues series) {
    List<Double> values = series.between(1e-12, 1e-9);
    for (int i = 1; i < values.size(); i++) {
      assertThat(series.next(values.get(i - 1))).isEqualTo(values.get(i));
      assertThat(series.previous(values.get(i))).isEqualTo(values.get(i - 1));
      assertThat(series.nearest(values.get(i))).isEqualTo(values.get(i));
    }
    assertThat(values).hasSize(3 * series.decade().size() + 1);
    assertThat(PreferredValues.named(series.name())).contains(series);
  }

  @Test
  void refusesWhatHasNoNeighbours() {
    assertThatThrownBy(() -> PreferredValues.E12.next(0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("found 0.0");
    assertThat(PreferredValues.named("E7")).isEmpty();
    assertThat(PreferredValues.E12.contains(-10)).isFalse();
  }
}
