package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.file.ExampleDesigns;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/**
 * Two roads to one oscillation: the roots of the small-signal circuit, and the full circuit in time
 * while the oscillation is small.
 */
class OscillationTest {
  /** Quiet at rest, and yet it oscillates at half swing. */
  @Test
  void theExampleGrowsInTimeAsItsRootsForetell() {
    Design design = ExampleDesigns.read("hydrophone-follower.json");
    Oscillation oscillation =
        Oscillation.of(design, design.hookup("line").orElseThrow(), Progress.none()).orElseThrow();

    assertThat(oscillation.early().cycles()).isGreaterThan(3);
    assertThat(oscillation.early().frequency())
        .isCloseTo(oscillation.forecastFrequency(), within(0.01 * oscillation.forecastFrequency()));
    assertThat(oscillation.early().growth())
        .isCloseTo(oscillation.forecastGrowth(), within(0.05 * oscillation.forecastGrowth()));
    assertThat(oscillation.settled()).as(oscillation.says()).isPresent();
    Oscillation.Settled settled = oscillation.settled().orElseThrow();
    assertThat(settled.amplitude()).isBetween(0.01, 9.0);
    assertThat(settled.low()).isLessThan(oscillation.output());
    assertThat(settled.high()).isGreaterThan(oscillation.output());
    // Quiet at rest: one stretch below, one above.
    assertThat(oscillation.rides()).hasSize(2);
    assertThat(oscillation.rides().get(0).highOutput()).isNegative();
    assertThat(oscillation.rides().get(1).lowOutput()).isPositive();
    assertThat(oscillation.times()).hasSameSizeAs(oscillation.volts()).hasSizeBetween(1000, 4000);
  }

  @Test
  void whatIsStableDoesNotOscillate() {
    Design design =
        DesignText.read(
            """
            {"loopwright": 1, "name": "stable", "rails": {"positive": 12, "negative": -12},
             "amplifier": {"kind": "figures", "gain": 1e5, "poles": [100]},
             "hookups": [{"name": "main", "source": {"amplitude": 1},
               "feedback": {"kind": "nonInverting", "upper": 0}}]}
            """);
    assertThat(Oscillation.of(design, design.hookups().get(0), Progress.none())).isEmpty();
  }
}
