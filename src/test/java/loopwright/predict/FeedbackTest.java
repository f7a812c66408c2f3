package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** What feedback makes of an amplifier that is known by its figures. */
class FeedbackTest {
  private static final String TENFOLD =
      "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": \"9k\", \"lower\": \"1k\"}";

  /**
   * Black (Bell System Technical Journal 13, 1934, 1–18): G = A/(1 + AB) = 9.990009990 for A = 1e4,
   * B = 0.1; with A 10 % less G falls by 1.10987791e-4 of itself.
   */
  @Test
  void gainIsHeldByTheDivider() {
    double gain = Predicted.figures("\"gain\": 1e4", TENFOLD).solved("closedLoopGain");
    double less = Predicted.figures("\"gain\": 9e3", TENFOLD).solved("closedLoopGain");
    assertThat(gain).isCloseTo(9.990009990, within(5e-10));
    assertThat(1 - gain / 10).isCloseTo(9.990010e-4, within(5e-11));
    assertThat(less / gain - 1).isCloseTo(-1.10987791e-4, within(5e-13));
  }

  /**
   * Blackman (Bell System Technical Journal 22, 1943, 269–277): A = 1000, R_o = 100 Ω, divider 9 kΩ
   * and 1 kΩ: Z = 99.0099010 Ω/(1 + 99.0099010) = 0.9900009900 Ω.
   */
  @Test
  void outputResistanceIsDividedByTheLoop() {
    Predicted loop = Predicted.figures("\"gain\": 1000, \"outputResistance\": 100", TENFOLD);
    assertThat(loop.solved("outputResistance")).isCloseTo(0.9900009900, within(5e-11));
    assertThat(loop.solved("loopGainDc")).isCloseTo(99.0099010, within(5e-8));
  }

  /** A load stands at the output, yet does not count in its resistance. */
  @Test
  void theLoadIsRemovedFromTheOutputResistance() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1000, \"outputResistance\": 100",
            TENFOLD + ", \"load\": {\"resistance\": 50}");
    assertThat(loop.solved("outputResistance")).isCloseTo(0.9900009900, within(1e-9));
  }
}
