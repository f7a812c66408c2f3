package loopwright.spread;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.task.CancelledException;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Bands against distributions that can be worked out by hand. */
class SpreadTest {
  /** So much gain that the divider alone decides. */
  private static final String DIVIDER =
      """
      {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "1%"},
       "limits": [{"hookup": "gain", "figure": "closedLoopGainAtRest",
                   "minimum": 10.9, "maximum": 11.1}],
       "amplifier": {"kind": "figures", "gain": 1e7},
       "hookups": [{"name": "gain", "source": {"amplitude": 0.1},
         "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"}}]}
      """;

  private static final int BUILDS = 4000;

  private static HookupSpread spread(String json, int builds, long seed) {
    Design design = DesignText.read(json);
    return Spread.of(design, new Sampling(builds, 40, seed), Progress.none()).get(0);
  }

  @Test
  void theBandOfADividersGain() {
    // The ratio of two values, each uniform within 1 %, spreads as their difference to first order:
    // a triangle from −2 % to 2 % that leaves 5 % beyond 2 % (1 − √0.05) = 1.5528 %. At the end the
    // density is 11.2 per unit, hence a standard error of √(0.025 · 0.975/4000)/11.2 = 2.2e-4.
    Band band = spread(DIVIDER, BUILDS, 1).figures().get("closedLoopGainAtRest");
    double width = 10 * 0.015528;
    double slack = 10 * 3 * 2.2e-4;
    assertThat(band.nominal().orElseThrow()).isEqualTo(11, within(1e-4));
    assertThat(band.low().orElseThrow()).isEqualTo(11 - width, within(slack));
    assertThat(band.high().orElseThrow()).isEqualTo(11 + width, within(slack));
    assertThat(band.samples()).isEqualTo(BUILDS);
  }

  @Test
  void bothResistorsMatterAlike() {
    Band band = spread(DIVIDER, BUILDS, 1).figures().get("closedLoopGainAtRest");
    assertThat(band.matters())
        .extracting(Band.Matter::part)
        .containsExactlyInAnyOrder("hookups.gain.feedback.upper", "hookups.gain.feedback.lower");
    // A squared correlation of 0.5 has a standard error of 2 √0.5 (1 − 0.5)/√4000 = 0.011.
    assertThat(band.matters())
        .allSatisfy(matter -> assertThat(matter.share()).isEqualTo(0.5, within(0.034)));
  }

  @Test
  void theYieldOfADivider() {
    // Within 1 % of ratio: 1 − (1 − 1/2)² = 0.75; standard error √(0.75 · 0.25/4000) = 0.0068.
    assertThat(spread(DIVIDER, BUILDS, 2).yield().orElseThrow()).isEqualTo(0.75, within(0.021));
    assertThat(
            spread(
                    DIVIDER
                        .replace("\"limits\"", "\"notes\": \"\", \"limits\"")
                        .replaceAll("\\[\\{\"hookup\": \"gain\", \"figure\"[^\\]]*\\]", "[]"),
                    40,
                    2)
                .yield())
        .isEmpty();
  }

  @Test
  void equalSeedsGiveEqualBands() {
    assertThat(spread(DIVIDER, 100, 5)).isEqualTo(spread(DIVIDER, 100, 5));
    assertThat(spread(DIVIDER, 100, 5)).isNotEqualTo(spread(DIVIDER, 100, 6));
  }

  @Test
  void withoutTolerancesABandIsAPoint() {
    String exact = DIVIDER.replace("\"tolerances\": {\"resistor\": \"1%\"},", "");
    Band band = spread(exact, 40, 1).figures().get("closedLoopGainAtRest");
    assertThat(band.low()).isEqualTo(band.nominal());
    assertThat(band.high()).isEqualTo(band.nominal());
    assertThat(band.matters()).isEmpty();
  }

  @Test
  void figuresThatAreMissingSayWhy() {
    Band band = spread(DIVIDER, 40, 1).figures().get("oscillationFrequency");
    assertThat(band.samples()).isZero();
    assertThat(band.low()).isEmpty();
    assertThat(band.reason()).contains("nothing oscillates");
  }

  @Test
  void canBeCancelled() {
    Progress cancelled =
        new Progress() {
          @Override
          public void report(double share, String says) {
            assertThat(share).isBetween(0.0, 1.0);
          }

          @Override
          public boolean cancelled() {
            return true;
          }
        };
    Design design = DesignText.read(DIVIDER);
    assertThatThrownBy(() -> Spread.of(design, Sampling.of(100, 1), cancelled))
        .isInstanceOf(CancelledException.class);
  }

  @Test
  void samplesOfTheUsualCount() {
    assertThat(List.of(Sampling.usual().samples(), Sampling.usual().waveformSamples()))
        .containsExactly(1000, 100);
  }
}
