package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class RootSearchTest {
  /** The fixed point of the cosine, 0.739085133215160641655… (well known, from memory). */
  @Test
  void findsTheFixedPointOfTheCosine() {
    double root = RootSearch.find(x -> Math.cos(x) - x, 0, 1, 1e-15);
    assertThat(root).isCloseTo(0.739085133215160641655, within(1e-15));
  }

  @Test
  void findsACornerAndAJump() {
    assertThat(RootSearch.find(x -> x < 0.3 ? -1 : x, -1, 1, 1e-12)).isCloseTo(0.3, within(1e-12));
    assertThat(RootSearch.find(x -> Math.cbrt(x - 0.2), 1, -1, 1e-12))
        .isCloseTo(0.2, within(1e-12));
  }

  @Test
  void aRootAtABoundIsTheBound() {
    assertThat(RootSearch.find(x -> x - 1, 1, 2, 1e-12)).isEqualTo(1);
    assertThat(RootSearch.find(x -> x - 2, 1, 2, 1e-12)).isEqualTo(2);
  }

  @Test
  void withoutAChangeOfSignThereIsNothingToFind() {
    assertThatThrownBy(() -> RootSearch.find(x -> x * x + 1, -1, 1, 1e-12))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("change of sign");
  }

  @Test
  void whatCannotBeWorkedOutOnTheWayIsNotANumber() {
    double root = RootSearch.find(x -> Math.abs(x) < 0.9 ? Double.NaN : x, -1, 1, 1e-12);
    assertThat(root).isNaN();
  }
}
