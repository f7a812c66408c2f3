package loopwright.check;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loopwright.design.Change;
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

  private static Finding at(String json, String where, String says) {
    return findings(json).stream()
        .filter(finding -> finding.where().equals(where) && finding.says().contains(says))
        .findFirst()
        .orElseThrow(() -> new AssertionError("not found at " + where + ": " + findings(json)));
  }

  /** Making the changes of a remedy leaves no finding of that kind. */
  private static void cures(String json, Finding finding) {
    assertThat(finding.changes()).isNotEmpty();
    Design cured = Change.applyAll(DesignText.read(json), finding.changes());
    List<Finding> left =
        Findings.of(Predictor.predict(cured, List.of(), new double[] {1e3}, Progress.none()));
    String kind = finding.says().substring(0, Math.min(16, finding.says().length()));
    assertThat(left)
        .noneMatch(other -> other.where().equals(finding.where()) && other.says().startsWith(kind));
  }

  @Test
  void theCompensationThatCuresAnOscillationIsProposed() {
    String fast =
        SOUND
            .replace("\"capacitance\": \"150p\", \"resistance\": 100", "\"capacitance\": \"3p\"")
            .replace("\"emitterResistance\": 100,", "")
            .replace("\"upper\": \"10k\", \"lower\": \"1k\"", "\"upper\": 0")
            .replace(
                "\"resistance\": \"10k\"}", "\"resistance\": \"10k\", \"capacitance\": \"2n\"}");
    Finding finding = at(fast, "hookups.divider", "Oscillates");
    assertThat(finding.remedy()).contains("compensation capacitor");
    cures(fast, finding);
  }

  @Test
  void aPairOutOfBalanceIsFoundWithTheResistorThatCentresIt() {
    String apart = SOUND.replace("\"output\": \"1k5\"", "\"output\": \"1k\"");
    Finding finding = at(apart, "amplifier.inputPair", "out of balance");
    assertThat(finding.severity()).isEqualTo(Finding.Severity.RISKY);
    assertThat(finding.remedy()).contains("centres the output").contains("leaves");
    cures(apart, finding);
  }

  @Test
  void aGainStageThatIsCutOffIsFound() {
    String cut = SOUND.replace("\"output\": \"1k5\"", "\"output\": \"150\"");
    Finding finding = at(cut, "gain.q1", "cut off");
    assertThat(finding.remedy()).contains("load resistor");
    cures(cut, finding);
  }

  @Test
  void aSaturatedGainStageAndAnOutputAtTheRailAreFound() {
    String saturated =
        SOUND
            .replace("\"amplitude\": 0.1", "\"dc\": 2")
            .replace("\"upper\": \"10k\"", "\"upper\": \"47k\"");
    assertThat(at(saturated, "gain.q1", "saturated").severity()).isEqualTo(Finding.Severity.FAILS);
    assertThat(at(saturated, "out", "rests at").says()).contains("positive rail");
  }

  @Test
  void anOutputThatClipsBelowItsPeakIsFound() {
    String large = SOUND.replace("\"amplitude\": 0.1", "\"amplitude\": 1.5");
    Finding finding = at(large, "hookups.divider", "clips at");
    assertThat(finding.remedy()).contains("An amplitude of");
  }

  @Test
  void aDeviceBeyondItsRecordIsFound() {
    String weak =
        SOUND.replace(
            "\"limits\": {\"emitterBaseVoltage\": 6}}",
            "\"limits\": {\"emitterBaseVoltage\": 6, \"collectorEmitterVoltage\": 10,"
                + " \"collectorCurrent\": \"1m\", \"power\": \"10m\"}}");
    assertThat(at(weak, "gain.q1", "collector-emitter voltage").says()).contains("limit of 10 V");
    assertThat(at(weak, "gain.q1", "collector current").says()).contains("limit of 1 mA");
    assertThat(at(weak, "gain.q1", "dissipation").severity()).isEqualTo(Finding.Severity.FAILS);
  }

  @Test
  void aHotJunctionIsFound() {
    String hot =
        SOUND.replace(
            "\"limits\": {\"emitterBaseVoltage\": 6}}",
            "\"limits\": {\"emitterBaseVoltage\": 6, \"thermalResistance\": 9000,"
                + " \"junctionTemperature\": 150}}");
    assertThat(at(hot, "gain.q1", "junction would reach").remedy()).contains("heat sink");
    assertThat(at(hot, "gain.q1", "The junction of gain.q1").says()).contains("150 °C");
  }

  @Test
  void aBaseWithoutDcPathIsFound() {
    String blocked =
        SOUND.replace("\"amplitude\": 0.1", "\"amplitude\": 0.1, \"couplingCapacitance\": \"10u\"");
    Finding finding = at(blocked, "hookups.divider.source", "no dc path");
    cures(blocked, finding);
    String fed =
        SOUND.replace(
            "\"amplitude\": 0.1",
            "\"amplitude\": 0.1, \"couplingCapacitance\": \"10u\", \"biasResistance\": \"10k\"");
    assertThat(findings(fed)).noneMatch(other -> other.says().contains("no dc path"));
  }

  @Test
  void aHeavyDividerIsFound() {
    String heavy =
        SOUND.replace("\"upper\": \"10k\", \"lower\": \"1k\"", "\"upper\": 1000, \"lower\": 100");
    Finding finding = at(heavy, "hookups.divider.feedback", "divider is heavy");
    cures(heavy, finding);
  }

  @Test
  void aLoopGainTooLowForTheLimitsIsFound() {
    String accurate =
        SOUND.replace(
            "\"hookups\":",
            "\"limits\": [{\"hookup\": \"divider\", \"figure\": \"closedLoopGain\","
                + " \"minimum\": 10.99, \"maximum\": 11.01}], \"hookups\":");
    Finding finding = at(accurate, "hookups.divider.feedback", "finite gain alone takes");
    assertThat(finding.changes())
        .singleElement()
        .satisfies(change -> assertThat(change.path()).isEqualTo("hookups.divider.feedback.upper"));
    assertThat(at(accurate, "limits.0", "Closed-loop gain is").says())
        .contains("below the limit of 10.99");
  }

  @Test
  void aBuildWithinItsLimitsIsNotFound() {
    String wide =
        SOUND.replace(
            "\"hookups\":",
            "\"limits\": [{\"hookup\": \"divider\", \"figure\": \"closedLoopGain\","
                + " \"minimum\": 9, \"maximum\": 12}], \"hookups\":");
    assertThat(findings(wide)).isEmpty();
  }

  /** Joined by two diodes on a stiff bias, no emitter resistors, 200 K/W: it cannot hold. */
  @Test
  void thermalRunawayIsFoundAndItsRemedyHolds() {
    String warm =
        SOUND
            .replace(
                "\"emitterBaseVoltage\": 6}",
                "\"emitterBaseVoltage\": 6, \"thermalResistance\": 200}")
            .replace(
                "\"parts\": {",
                "\"parts\": {\"d\": {\"kind\": \"diode\", \"model\": {\"saturationCurrent\": 1.4e-14,"
                    + " \"ideality\": 1}},")
            .replace(
                "\"load\": {\"kind\": \"resistor\", \"resistance\": \"8k2\"}",
                "\"load\": {\"kind\": \"resistor\", \"resistance\": \"1k\"}")
            .replace("\"output\": \"1k5\"", "\"output\": \"1k8\"")
            .replace(
                "{\"kind\": \"none\"}",
                "{\"kind\": \"pushPull\", \"upper\": \"n\", \"lower\": \"p\","
                    + " \"bias\": {\"kind\": \"diodes\", \"diode\": \"d\"}}");
    Finding runaway =
        findings(warm).stream()
            .filter(finding -> finding.where().equals("amplifier.outputStage"))
            .findAny()
            .orElseThrow();
    assertThat(runaway.severity()).isNotEqualTo(Finding.Severity.REMARK);
    assertThat(runaway.where()).isEqualTo("amplifier.outputStage");
    assertThat(runaway.changes()).hasSize(1);
    Design cured = Change.applyAll(DesignText.read(warm), runaway.changes());
    assertThat(
            Findings.of(Predictor.predict(cured, List.of(), new double[] {1e3}, Progress.none())))
        .noneMatch(finding -> finding.where().equals("amplifier.outputStage"));
  }

  @Test
  void aJunctionIsHeldAgainstItsOwnPartsLimit() {
    String hot =
        SOUND.replace(
            "\"emitterBaseVoltage\": 6}",
            "\"emitterBaseVoltage\": 6, \"thermalResistance\": 2000, \"junctionTemperature\": 60}");
    assertThat(findings(hot))
        .anySatisfy(
            finding -> {
              assertThat(finding.severity()).isEqualTo(Finding.Severity.FAILS);
              assertThat(finding.says()).contains("beyond its part's limit of 60 °C");
            });
  }

  @Test
  void whatSaturatesOnlyAtTheEndsOfTheSignalIsFound() {
    String loud = SOUND.replace("\"amplitude\": 0.1", "\"amplitude\": 2");
    assertThat(findings(loud))
        .anySatisfy(
            finding -> {
              assertThat(finding.where()).isEqualTo("gain.q1");
              assertThat(finding.says()).contains("It saturates with the output at ");
            });
  }

  @Test
  void aSlewRateThatTheFormulaDoesNotTellIsExplained() {
    String degenerated =
        SOUND
            .replace("\"output\": \"1k5\", \"other\": \"1k5\"", "\"output\": \"4k7\"")
            .replace(
                "\"gainStage\": {\"transistor\": \"p\",",
                "\"gainStage\": {\"transistor\": \"p\", \"emitterResistance\": \"1k\",");
    assertThat(findings(degenerated))
        .anySatisfy(
            finding -> {
              assertThat(finding.severity()).isEqualTo(Finding.Severity.REMARK);
              assertThat(finding.says())
                  .contains("The output slews ", "of the hand formula", "emitter resistor");
            });
  }
}
