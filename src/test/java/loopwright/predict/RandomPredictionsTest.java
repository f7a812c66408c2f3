package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Whole predictions of random designs: every figure has a value, or one of these good reasons. */
class RandomPredictionsTest {
  private static final int DESIGNS = 60;

  /** Why a figure may have no value although the circuit is solved, whatever the design. */
  private static final List<String> BY_ITS_NATURE =
      List.of(
          "the hookup is open: there is no loop",
          "the hookup does not move both inputs together",
          "something grows at rest",
          "nothing oscillates at any level",
          "no fall toward dc",
          "no fall below 3 dB",
          "the loop gain never passes",
          "no complex natural frequency",
          "no part record states a thermal resistance",
          "without limit",
          "not solved by this version",
          "not solved yet: it takes longer");

  /** Why it has none in a design whose stages are biased into a corner. */
  private static final List<String> CORNERED =
      List.of(
          "the output does not move to either side of its reference",
          "the generator cannot bring the output to its reference",
          "the open-loop gain is missing");

  @Test
  void everyFigureHasAValueOrAReason() {
    int cornered = 0;
    int jumping = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      HookupPrediction prediction =
          Predictor.predict(
                  design, List.of(), new double[] {1e3}, CostClass.WAVEFORM, Progress.none())
              .hookups()
              .get(0);
      assertThat(prediction.rest()).as("%s: %s", design.name(), prediction.failure()).isPresent();
      boolean inACorner = false;
      for (Map.Entry<String, FigureResult> figure : prediction.figures().entrySet()) {
        FigureValue solved = figure.getValue().solved();
        if (solved.number().isEmpty()) {
          assertThat(Stream.concat(BY_ITS_NATURE.stream(), CORNERED.stream()))
              .as("%s, %s: %s", design.name(), figure.getKey(), solved.says())
              .anyMatch(solved.says()::startsWith);
          inACorner |= CORNERED.stream().anyMatch(solved.says()::startsWith);
        }
      }
      assertThat(prediction.response()).hasSize(1);
      assertThat(prediction.harmonics()).hasSize(StaticWaveform.HARMONICS + 1);
      assertThat(prediction.overSwing()).hasSizeGreaterThanOrEqualTo(SwingStability.LEVELS);
      cornered += inACorner ? 1 : 0;
      jumping +=
          prediction.notes().stream().anyMatch(note -> note.says().contains("jumps")) ? 1 : 0;
    }
    // Few designs of a first hand calculation are dead; hardly any latches on its way up.
    assertThat(cornered).isLessThanOrEqualTo(DESIGNS / 20);
    assertThat(jumping).isLessThanOrEqualTo(1);
  }
}
