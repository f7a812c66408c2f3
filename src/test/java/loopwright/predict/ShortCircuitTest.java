package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.file.DesignText;
import org.junit.jupiter.api.Test;

/** What an output delivers into a short circuit. */
class ShortCircuitTest {
  private static final Figure CURRENT = Catalogue.find("shortCircuitCurrent").orElseThrow();

  private static FigureValue current(String json) {
    return HookupFigures.of(DesignText.read(json), "gain").solved(CURRENT);
  }

  /** Its clamped voltage behind its output resistance: Ohm's law. */
  @Test
  void anAmplifierKnownByItsFiguresDeliversItsLimitOverItsOutputResistance() {
    FigureValue value =
        current(
            """
            {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
             "amplifier": {"kind": "figures", "gain": 1e4, "outputHigh": 10, "outputLow": -8,
                           "outputResistance": 50},
             "hookups": [{"name": "gain", "source": {"amplitude": 0.5},
               "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}]}
            """);
    assertThat(value.number().orElseThrow()).isEqualTo(10.0 / 50, within(1e-6));
    assertThat(value.says()).contains("200 mA out of the output, 160 mA into it");
  }

  /**
   * A common-emitter stage with a resistor for its load sinks no more than the resistor carries:
   * the rail over the load resistor, by Ohm's law; base currents of a few µA stay within 1 %.
   */
  @Test
  void aStageWithoutFollowerSinksWhatItsLoadResistorCarries() {
    FigureValue value =
        current(
            """
            {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
             "parts": {
               "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200}},
               "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200}}},
             "amplifier": {"kind": "stages",
               "inputPair": {"transistor": "n",
                 "tail": {"kind": "resistor", "resistance": "12k"},
                 "load": {"kind": "resistors", "output": "1k5", "other": "1k5"}},
               "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "8k2"}},
               "outputStage": {"kind": "none"}},
             "hookups": [{"name": "gain", "source": {"amplitude": 0.5},
               "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"}}]}
            """);
    assertThat(value.says()).contains("1.464 mA into it");
    assertThat(12 / 8200.0).isEqualTo(1.464e-3, within(1e-5));
    assertThat(value.number().orElseThrow()).isGreaterThan(12 / 8200.0);
  }

  /** Blocking capacitors keep what they hold at rest. */
  @Test
  void aSingleSupplyIsHeldAtItsMidRail() {
    FigureValue value =
        current(
            """
            {"loopwright": 1, "name": "bench",
             "rails": {"positive": 9, "negative": 0,
                       "midRail": {"upper": "10k", "lower": "10k", "capacitance": "100u"}},
             "parts": {
               "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200}},
               "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200}}},
             "amplifier": {"kind": "stages",
               "inputPair": {"transistor": "n",
                 "tail": {"kind": "resistor", "resistance": "6k8"},
                 "load": {"kind": "resistors", "output": "2k2"}},
               "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "4k7"}},
               "outputStage": {"kind": "none"}},
             "hookups": [{"name": "gain",
               "source": {"amplitude": 0.05, "couplingCapacitance": "1u", "biasResistance": "100k",
                          "biasTo": "midRail"},
               "feedback": {"kind": "nonInverting", "upper": "22k", "lower": "2k2",
                            "lowerCapacitance": "47u"},
               "load": {"resistance": "10k", "couplingCapacitance": "10u"}}]}
            """);
    assertThat(value.number()).as(value.says()).isPresent();
    // Into the output: the mid-rail over the gain stage's load resistor, 4.5 V/4.7 kΩ, by Ohm's
    // law; base currents load the mid-rail by less than 2 %.
    assertThat(value.number().orElseThrow()).isGreaterThan(0.98 * 4.5 / 4700);
  }
}
