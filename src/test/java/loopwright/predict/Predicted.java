package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.task.Progress;

/** A predicted hookup with the questions that tests put to it. */
final class Predicted {
  private final HookupPrediction hookup;

  private Predicted(HookupPrediction hookup) {
    this.hookup = hookup;
  }

  /** The first hookup of a design, solved, with responses at some frequencies in Hz. */
  static Predicted of(Design design, double... frequencies) {
    double[] grid = frequencies.length == 0 ? new double[] {1e3} : frequencies;
    HookupPrediction first =
        Predictor.predict(design, List.of(), grid, Progress.none()).hookups().get(0);
    assertThat(first.rest()).as(first.failure()).isPresent();
    return new Predicted(first);
  }

  /**
   * An amplifier by its figures on ±12 V in one hookup.
   *
   * @param amplifier members of the amplifier's block beside its kind
   * @param hookup members of the hookup's block beside its name
   */
  static Predicted figures(String amplifier, String hookup) {
    return of(
        DesignText.read(
            """
            {"loopwright": 1, "name": "by its figures", "rails": {"positive": 12, "negative": -12},
             "amplifier": {"kind": "figures", %s},
             "hookups": [{"name": "main", %s}]}
            """
                .formatted(amplifier, hookup)));
  }

  HookupPrediction hookup() {
    return hookup;
  }

  /** Solved value of a figure; a missing one fails the test with its reason. */
  double solved(String key) {
    FigureValue value = hookup.figures().get(key).solved();
    assertThat(value.number()).as("%s: %s", key, value.says()).isPresent();
    return value.number().orElseThrow();
  }

  /** Solved value of a figure, or nothing. */
  OptionalDouble solvedOrNone(String key) {
    return hookup.figures().get(key).solved().number();
  }

  /** Value of a figure's hand formula. */
  double formula(String key) {
    FigureValue value = hookup.figures().get(key).formula();
    assertThat(value.number()).as("%s: %s", key, value.says()).isPresent();
    return value.number().orElseThrow();
  }
}
