package loopwright.check;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.predict.Predictor;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Each check finds what it is for, and nothing in a sound design. */
class FindingsTest {
  private static final String SOUND =
      """
      {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
       "parts": {
         "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80, "baseEmitterCapacitance": "8p", "baseCollectorCapacitance": "3p",
               "transitTime": "0.5n"}, "limits": {"emitterBaseVoltage": 6}},
         "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80, "baseEmitterCapacitance": "8p", "baseCollectorCapacitance": "3p",
               "transitTime": "0.5n"}, "limits": {"emitterBaseVoltage": 6}}},
       "amplifier": {"kind": "stages",
         "inputPair": {"transistor": "n", "emitterResistance": 100,
           "tail": {"kind": "resistor", "resistance": "12k"},
           "load": {"kind": "resistors", "output": "1k5", "other": "1k5"}},
         "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "8k2"},
           "compensation": {"capacitance": "150p", "resistance": 100}},
         "outputStage": {"kind": "none"}},
       "hookups": [{"name": "divider",
         "source": {"resistance": 600, "amplitude": 0.1},
         "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"},
         "load": {"resistance": "10k"}}]}
      """;

  private static List<Finding> findings(String json) {
    Design design = DesignText.read(json);
    return Findings.of(Predictor.predict(design, List.of(), new double[] {1e3}, Progress.none()));
  }

  @Test
  void nothingIsFoundInASoundDesign() {
    assertThat(findings(SOUND)).isEmpty();
  }

  @Test
  void anOscillationAtRestIsFound() {
    String fast =
        SOUND
            .replace("\"capacitance\": \"150p\", \"resistance\": 100", "\"capacitance\": \"3p\"")
            .replace(
                "\"inputPair\": {\"transistor\": \"n\", \"emitterResistance\": 100,",
                "\"inputPair\": {\"transistor\": \"n\",")
            .replace("\"upper\": \"10k\", \"lower\": \"1k\"", "\"upper\": 0")
            .replace(
                "\"resistance\": \"10k\"}", "\"resistance\": \"10k\", \"capacitance\": \"2n\"}");
    assertThat(findings(fast))
        .anySatisfy(
            finding -> {
              assertThat(finding.severity()).isEqualTo(Finding.Severity.FAILS);
              assertThat(finding.where()).isEqualTo("hookups.divider");
              assertThat(finding.says()).contains("Oscillates at rest").contains("MHz");
            });
  }

  @Test
  void anIdealCurrentThatPullsANodeBeyondItsRailIsFound() {
    String strong =
        SOUND.replace(
            "{\"kind\": \"resistor\", \"resistance\": \"8k2\"}",
            "{\"kind\": \"ideal\", \"current\": \"20m\"}");
    String weak = strong.replace("\"output\": \"1k5\"", "\"output\": \"100\"");
    assertThat(findings(weak))
        .anySatisfy(
            finding -> {
              assertThat(finding.where()).isEqualTo("gainOut");
              assertThat(finding.says()).contains("below its rail");
            });
  }

  @Test
  void aBaseReversedBeyondItsLimitIsFound() {
    String reversed =
        SOUND
            .replace("\"amplitude\": 0.1", "\"dc\": 10")
            .replace(
                "\"kind\": \"nonInverting\", \"upper\": \"10k\", \"lower\": \"1k\"",
                "\"kind\": \"open\"");
    assertThat(findings(reversed))
        .anySatisfy(
            finding -> {
              assertThat(finding.where()).isEqualTo("pair.q2");
              assertThat(finding.says()).contains("reversed by").contains("limit of 6 V");
            });
  }

  @Test
  void aSlowCouplingCapacitorIsFound() {
    String blocked =
        SOUND.replace(
            "\"amplitude\": 0.1",
            "\"amplitude\": 0.1, \"couplingCapacitance\": \"10n\", \"biasResistance\": \"47k\"");
    assertThat(findings(blocked))
        .anySatisfy(
            finding -> {
              assertThat(finding.where()).endsWith("source.couplingCapacitance");
              assertThat(finding.says()).contains("above a tenth of the signal frequency");
            });
  }
}
