package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Readings beside predictions that can be worked out by hand. */
class BenchComparisonTest {
  private static Comparison compare(String bench) {
    return compare(
        """
        "amplifier": {"kind": "figures", "gain": 500, "inputOffset": "6.1m"},
        "hookups": [{"name": "divider", "source": {"resistance": 50, "amplitude": 0.1},
          "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}],
        """,
        bench);
  }

  private static Comparison compare(String circuit, String bench) {
    Design design =
        DesignText.read(
            "{\"loopwright\": 1, \"name\": \"bench\","
                + " \"rails\": {\"positive\": 12, \"negative\": -12},"
                + " \"tolerances\": {\"resistor\": \"1%\"},"
                + circuit
                + "\"bench\": "
                + bench
                + "}");
    return BenchComparison.of(design, Progress.none());
  }

  /** ISO/IEC 17043: 5.030 ± 0.025 against 5.000 ± 0.020 gives 0.937043, worked out by hand. */
  @Test
  void theNormalisedError() {
    assertThat(BenchComparison.normalised(5.030, 0.025, 5.000, 0.020).orElseThrow())
        .isEqualTo(0.937043, within(5e-7));
    assertThat(BenchComparison.normalised(5, 0, 5, 0).orElseThrow()).isZero();
    assertThat(BenchComparison.normalised(5, 0, 6, 0)).isEmpty();
  }

  /**
   * 500/(1 + 500/10) = 9.804 (Black 1934); the divider's two resistors, each uniform within 1 %,
   * move it by (9/10) 1 % √(2/3) (1 − 9.804/500), hence ± 2 × 0.0707 = 0.1413.
   */
  @Test
  void aClosedLoopGainBesideItsBand() {
    ReadingVerdict verdict =
        compare(
                """
                {"readings": [{"hookup": "divider", "quantity": "gain", "value": 9.7,
                               "uncertainty": 0.1}]}
                """)
            .readings()
            .get(0);
    assertThat(verdict.predicted().number().orElseThrow()).isEqualTo(9.8039, within(1e-4));
    assertThat(verdict.predictedUncertainty().orElseThrow()).isEqualTo(0.1413, within(3e-4));
    assertThat(verdict.measuredUncertainty()).isEqualTo(0.1, within(1e-12));
    double expected = (9.7 - 9.8039) / Math.hypot(0.1, 0.1413);
    assertThat(verdict.en().orElseThrow()).isEqualTo(expected, within(2e-3));
    assertThat(verdict.agrees()).contains(true);
    assertThat(verdict.says()).startsWith("Agrees: 0.1039 below the prediction");
  }

  /** Behind the ratio of ten the output of that amplifier rests near −60 mV (common practice). */
  @Test
  void anOutputOffsetOfTheWrongSignDoesNotAgree() {
    Comparison comparison =
        compare(
            """
            {"instruments": {"meter": {"kind": "voltmeter", "percentOfReading": "0.5%", "digits": 2,
                             "resolution": "0.1m", "inputResistance": "10M"}},
             "readings": [{"hookup": "divider", "quantity": "outputOffset", "value": "58mV",
                           "instrument": "meter"}]}
            """);
    ReadingVerdict verdict = comparison.readings().get(0);
    assertThat(verdict.predicted().number().orElseThrow()).isEqualTo(-0.0598, within(1e-4));
    // ± (0.5 % of 58 mV + 2 × 0.1 mV) = ± 0.49 mV, rectangular: U = 1.65 × 0.49/√3.
    assertThat(verdict.measuredUncertainty())
        .isEqualTo(1.65 * 0.49e-3 / Math.sqrt(3), within(1e-6));
    assertThat(verdict.agrees()).contains(false);
    assertThat(verdict.says()).startsWith("Does not agree");
    assertThat(comparison.set().agrees()).isFalse();
    assertThat(comparison.implied())
        .singleElement()
        .asString()
        .contains("Input offset implied by the output offsets: −");
  }

  /** A divider of 2 MΩ and 2 MΩ shows 1 MΩ: a meter of 10 MΩ reads 10/11 of it, by Ohm's law. */
  @Test
  void theMeterLoadsANodeOfHighResistance() {
    String circuit =
        """
        "extras": [{"name": "upper", "kind": "resistor", "from": "positive", "to": "base1", "value": "2M"},
                   {"name": "lower", "kind": "resistor", "from": "base1", "to": "ground", "value": "2M"}],
        "parts": {"n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 1e9}},
                  "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 1e9}}},
        "amplifier": {"kind": "stages",
          "inputPair": {"transistor": "n", "baseResistance": "1T",
            "tail": {"kind": "resistor", "resistance": "12k"},
            "load": {"kind": "resistors", "output": "1k5"}},
          "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "8k2"}},
          "outputStage": {"kind": "none"}},
        "hookups": [{"name": "divider", "feedback": {"kind": "nonInverting", "upper": 0}}],
        """
            .replace("1T", "1000000M");
    String bench =
        """
        {"instruments": {"meter": {"kind": "voltmeter", "percentOfReading": "0.5%",
                         "inputResistance": "10M"}},
         "readings": [
          {"hookup": "divider", "quantity": "nodeVoltage", "node": "base1", "value": 5.45,
           "instrument": "meter"},
          {"hookup": "divider", "quantity": "nodeVoltage", "node": "base1", "value": 5.45,
           "uncertainty": 0.01}]}
        """;
    Comparison comparison = compare(circuit, bench);
    assertThat(comparison.readings().get(0).predicted().number().orElseThrow())
        .isEqualTo(6.0 * 10 / 11, within(2e-3));
    assertThat(comparison.readings().get(1).predicted().number().orElseThrow())
        .isEqualTo(6.0, within(2e-3));
  }

  @Test
  void aGeneratorSetForFiftyOhmsIsSuspected() {
    assertThat(
            compare(
                    """
                    {"instruments": {"generator": {"kind": "generator", "displayLoad": 50}},
                     "readings": [{"hookup": "divider", "quantity": "gain", "value": 19.5,
                                   "uncertainty": 0.2}]}
                    """)
                .suspects())
        .singleElement()
        .asString()
        .contains("near two")
        .contains("set for 50 Ω");
    assertThat(
            compare(
                    """
                    {"readings": [{"hookup": "divider", "quantity": "gain", "value": 9.8,
                                   "uncertainty": 0.2}]}
                    """)
                .suspects())
        .isEmpty();
  }

  /** From a gain of 9.80 and 1 % resistors A is hardly observable. */
  @Test
  void anOpenLoopGainThatClosedLoopsDoNotTell() {
    assertThat(
            compare(
                    """
                    {"readings": [{"hookup": "divider", "quantity": "gain", "value": 9.80,
                                   "uncertainty": 0.02}]}
                    """)
                .implied())
        .singleElement()
        .asString()
        .contains("not determined")
        .contains("v(in+) − v(in−)");
  }

  /**
   * A measured inverting amplifier (a published build log): ×10 read as 9.2, where ideal/(1 + 11/A)
   * gives 9.01 for the open-loop gain of 100 that was measured apart. With exact resistors and a
   * reading good to 0.3 the interval implied holds it.
   */
  @Test
  void anOpenLoopGainThatAClosedLoopTells() {
    String says =
        compare(
                """
                "amplifier": {"kind": "figures", "gain": 100},
                "hookups": [{"name": "divider", "feedback": {"kind": "inverting",
                  "upper": {"value": "10k", "measured": "10k"},
                  "inputResistor": {"value": "1k", "measured": "1k"}}}],
                """,
                """
                {"readings": [{"hookup": "divider", "quantity": "gain", "value": 9.2,
                               "uncertainty": 0.3}]}
                """)
            .implied()
            .get(0);
    // 11/(10/8.9 − 1) = 89; 11/(10/9.5 − 1) = 209; the general 1 % of resistors widens both.
    assertThat(says).startsWith("Open-loop gain implied by the closed-loop gains: 8");
  }

  @Test
  void peakToPeakAndRmsAreUnderstood() {
    String residual =
        """
        {"readings": [
          {"hookup": "divider", "quantity": "deadZone", "value": 1.2, "expression": "peakToPeak",
           "uncertainty": 0.1},
          {"hookup": "divider", "quantity": "outputNoise", "value": "1m", "expression": "rms",
           "uncertainty": "0.1m"}]}
        """;
    Comparison comparison = compare(residual);
    assertThat(comparison.readings().get(0).measured()).isEqualTo(0.6, within(1e-12));
    assertThat(comparison.readings().get(0).measuredUncertainty()).isEqualTo(0.05, within(1e-12));
    assertThat(comparison.readings().get(1).measured()).isEqualTo(1e-3, within(1e-15));
  }

  @Test
  void aReadingWithoutInstrumentIsKnownToItsLastDigit() {
    ReadingVerdict verdict =
        compare(
                "{\"readings\": [{\"hookup\": \"divider\", \"quantity\": \"gain\", \"value\": \"9.80\"}]}")
            .readings()
            .get(0);
    assertThat(verdict.measuredUncertainty()).isEqualTo(1.65 * 0.005 / Math.sqrt(3), within(1e-9));
    assertThat(verdict.says()).contains("last digit as written");
  }

  @Test
  void aLooseResistorIsHeldAgainstItsTolerance() {
    ReadingVerdict verdict =
        compare(
                """
                {"readings": [{"quantity": "resistance", "part": "hookups.divider.feedback.upper",
                               "value": "9.2k", "uncertainty": 10}]}
                """)
            .readings()
            .get(0);
    assertThat(verdict.predicted().number().orElseThrow()).isEqualTo(9000);
    assertThat(verdict.predictedUncertainty().orElseThrow())
        .isEqualTo(2 * 90 / Math.sqrt(3), within(1e-6));
    assertThat(verdict.agrees()).contains(false);
  }

  /** Two readings of one thing share its parts: together they say no more than one. */
  @Test
  void sharedPartsAreCountedOnce() {
    String one =
        "{\"hookup\": \"divider\", \"quantity\": \"gain\", \"value\": 9.9, \"uncertainty\": 0.001}";
    double alone = compare("{\"readings\": [" + one + "]}").set().chiSquared().orElseThrow();
    double twice =
        compare("{\"readings\": [" + one + ", " + one + "]}").set().chiSquared().orElseThrow();
    assertThat(twice).isEqualTo(alone, within(0.01 * alone));
  }

  @Test
  void withoutReadingsNothingIsJudged() {
    Comparison comparison = compare("{}");
    assertThat(comparison.readings()).isEmpty();
    assertThat(comparison.set().probability()).isEmpty();
    assertThat(comparison.set().says()).isEqualTo("No reading can be judged.");
  }
}
