package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.file.ExampleDesigns;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Distortion in a steady state, of amplifiers whose answers are known. */
class SteadyDistortionTest {
  private static SteadyDistortion of(String amplifier, String hookup) {
    Design design =
        DesignText.read(
            """
            {"loopwright": 1, "name": "by its figures", "rails": {"positive": 12, "negative": -12},
             "amplifier": {"kind": "figures", %s}, "hookups": [{"name": "main", %s}]}
            """
                .formatted(amplifier, hookup));
    return SteadyDistortion.of(design, design.hookups().get(0), Progress.none());
  }

  /**
   * A dead zone of a tenth of the peak, in the open loop: harmonics 2 to 50 are 0.0626646212 of the
   * fundamental (worked out from the exact series, Gelb and Vander Velde 1968); 1024 points alias a
   * corner by 5e-4 of it.
   */
  @Test
  void aDeadZoneGivesItsSeries() {
    SteadyDistortion distortion =
        of(
            "\"gain\": 1, \"deadZone\": 0.5",
            "\"source\": {\"amplitude\": 5}, \"feedback\": {\"kind\": \"open\"}");
    assertThat(distortion.says()).isEmpty();
    assertThat(distortion.thd().orElseThrow()).isCloseTo(0.0626646212, within(1e-4));
    assertThat(distortion.change().orElseThrow()).isLessThan(SteadyDistortion.ALIKE);
    assertThat(distortion.periods()).isLessThanOrEqualTo(3);
    assertThat(distortion.staticThd().number().orElseThrow())
        .isCloseTo(distortion.thd().orElseThrow(), within(1e-6));
  }

  /**
   * Feedback divides the crossover by 1 + loop gain, and the loop gain of one pole falls with
   * frequency: ten times the frequency, about ten times the distortion; at low frequency what the
   * static waveform shows.
   */
  @Test
  void growsWithFrequencyAsTheLoopGainFalls() {
    String amplifier = "\"gain\": 1e4, \"poles\": [1000], \"deadZone\": 0.5";
    String hookup =
        "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": 0},"
            + " \"source\": {\"amplitude\": 5, \"frequency\": %s}";
    SteadyDistortion slow = of(amplifier, hookup.formatted("0.1"));
    SteadyDistortion quick = of(amplifier, hookup.formatted("1e4"));
    SteadyDistortion quicker = of(amplifier, hookup.formatted("1e5"));

    double still = slow.staticThd().number().orElseThrow();
    assertThat(slow.thd().orElseThrow()).isCloseTo(still, within(0.02 * still));
    assertThat(quick.thd().orElseThrow()).isGreaterThan(3 * still);
    assertThat(quicker.thd().orElseThrow() / quick.thd().orElseThrow()).isBetween(4.0, 12.0);
  }

  @Test
  void saysWhyThereIsNone() {
    SteadyDistortion none = of("\"gain\": 1", "\"feedback\": {\"kind\": \"open\"}");
    assertThat(none.thd()).isEmpty();
    assertThat(none.says()).isEqualTo("the source has no amplitude");
  }

  /** Quiet at rest, but not over its swing: what looks steady in long steps would be none. */
  @Test
  void anOscillationHasNoSteadyState() {
    Design design = ExampleDesigns.read("hydrophone-follower.json");
    SteadyDistortion none =
        SteadyDistortion.of(design, design.hookup("line").orElseThrow(), Progress.none());
    assertThat(none.thd()).isEmpty();
    assertThat(none.says()).startsWith("no steady state: something grows from");
    assertThat(none.staticThd().number()).isPresent();
  }
}
