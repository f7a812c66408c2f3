package loopwright.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.HookupFigures;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** What a divider may take, by amplifier. */
class OutputCurrentTest {
  private static final double BETA_GAIN = 200;
  private static final double BETA_FOLLOWER = 100;

  private static Design stages(String tail, String output) {
    return DesignText.read(
        """
        {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
         "parts": {
           "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 250}},
           "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": %s}},
           "on": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": %s}},
           "op": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 150}}},
         "amplifier": {"kind": "stages",
           "inputPair": {"transistor": "n",
             "tail": {"kind": "ideal", "current": "%s"},
             "load": {"kind": "mirror", "transistor": "p"}},
           "gainStage": {"transistor": "p", "load": {"kind": "ideal", "current": "2m"},
             "compensation": {"capacitance": "220p"}},
           "outputStage": %s},
         "hookups": [{"name": "main", "source": {"amplitude": 0.1, "resistance": 50},
           "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"}}]}
        """
            .formatted(BETA_GAIN, BETA_FOLLOWER, tail, output));
  }

  private static final String NONE = "{\"kind\": \"none\"}";
  private static final String FOLLOWER =
      """
      {"kind": "pushPull", "upper": "on", "lower": "op", "bias": {"kind": "joined"}}
      """;

  @Test
  void withoutAFollowerItIsWhatTheGainStageCarries() {
    HookupFigures figures = HookupFigures.of(stages("1m", NONE), "main");
    TransistorState gain = (TransistorState) figures.devices().get("gain.q1");
    assertThat(gain.collectorCurrent()).isEqualTo(2e-3, within(0.2e-3));
    assertThat(OutputCurrent.of(figures, 1.1)).isEqualTo(gain.collectorCurrent(), within(1e-9));
  }

  /** Half a tail of 15 µA times a current gain of 200 is 1.5 mA, less than the stage carries. */
  @Test
  void aSmallTailLeavesLess() {
    HookupFigures figures = HookupFigures.of(stages("15u", NONE), "main");
    assertThat(OutputCurrent.of(figures, 1.1))
        .isEqualTo(7.5e-6 * BETA_GAIN, within(0.02 * 7.5e-6 * BETA_GAIN));
  }

  /** A follower gives a hundred times as much, 200 mA: then the load decides, or 10 mA. */
  @Test
  void behindAFollowerTheLoadDecides() {
    Design design = stages("1m", FOLLOWER);
    assertThat(OutputCurrent.of(HookupFigures.of(design, "main"), 1.1)).isEqualTo(10e-3);
    Design loaded = new Change("hookups.main.load.resistance", "11k").applyTo(design);
    assertThat(OutputCurrent.of(HookupFigures.of(loaded, "main"), 1.1))
        .isEqualTo(10 * 1.1 / 11e3, within(1e-9));
  }

  /** Without a follower a heavy divider is punished by the gain stage's own current. */
  @Test
  void aWeakOutputAsksForALighterDivider() {
    double strong = taken(stages("1m", FOLLOWER));
    double weak = taken(stages("15u", NONE));
    assertThat(weak).isLessThan(strong);
  }

  private static double taken(Design design) {
    return DividerSizing.of(design, "main", 11, "E24", false, Progress.none())
        .get(0)
        .dividerCurrent();
  }
}
