package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loopwright.check.Finding;
import loopwright.predict.SampleDesigns;
import loopwright.predict.SamplePredictions;
import org.junit.jupiter.api.Test;

class PredictionTextTest {
  private static final Finding FINDING =
      new Finding(
          Finding.Severity.FAILS,
          "follower",
          "It oscillates at 13 MHz when the output passes 0.5 V.",
          "Use 100 pF in series with 220 Ω.");

  private final String text =
      PredictionText.of(SamplePredictions.solved(SampleDesigns.figures()), List.of(FINDING), false);

  @Test
  void staysWithin100Columns() {
    assertThat(text.lines()).hasSizeGreaterThan(40).allMatch(line -> line.length() <= 100);
  }

  @Test
  void setsFormulaAndSolvedSideBySide() {
    assertThat(text)
        .containsPattern("Open-loop gain A +1104 +1064\n")
        .containsPattern("Output offset +7.5 mV +\\(1\\) +5.7 mV\n")
        .containsPattern("Phase margin, worst +−20°\n");
  }

  @Test
  void explainsEveryMarkBelowTheTable() {
    assertThat(text)
        .contains("  (1) with A and the input offset as solved\n")
        .contains("something grows");
  }

  @Test
  void addsUpTheOffset() {
    assertThat(text)
        .containsPattern("input offset +−6.7 mV\n")
        .containsPattern("base current +700 µV\n")
        .containsPattern("together +−6 mV\n");
  }

  @Test
  void showsTheAmplifierAtRest() {
    assertThat(text)
        .containsPattern("out +5.7 mV")
        .containsPattern("pair.q1 +500 µA +2 µA +620 mV +11.2 V +5.6 mW +26.1 °C\n")
        .containsPattern("bias.d1 +1.5 mA +650 mV +980 µW +–\n")
        .contains("positive 5.3 mA, negative 5.2 mA");
  }

  @Test
  void putsFindingsLastWithTheirRemedy() {
    assertThat(text)
        .endsWith(
            """
            Findings
            ========
              fails: follower: It oscillates at 13 MHz when the output passes 0.5 V. Remedy: Use 100 pF in
                     series with 220 Ω.
            """);
  }

  @Test
  void showsTheResponseOnlyWhereFrequenciesWereAskedFor() {
    assertThat(text).doesNotContain("Response");
    assertThat(
            PredictionText.of(SamplePredictions.solved(SampleDesigns.figures()), List.of(), true))
        .containsPattern("1 kHz +9.801 +19.82 +−0.6° +50.09 +34.00 +−3.4°\n");
  }

  @Test
  void saysWhyNothingWasSolved() {
    assertThat(
            PredictionText.of(SamplePredictions.failed(SampleDesigns.figures()), List.of(), false))
        .contains("Not solved\n  no operating point: gainOut stands at 31 V\n")
        .endsWith("Findings\n========\n  None.\n");
  }
}
