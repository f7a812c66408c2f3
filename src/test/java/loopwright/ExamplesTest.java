package loopwright;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.file.DesignDocument;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every example opens, is whole, and solves; and each shows what its notes say. */
class ExamplesTest {
  private static final Map<String, Unit> FIGURE_UNITS =
      Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit));

  private static DesignDocument open(String name) {
    return new DesignFile(new ShelfFile().shipped(), FIGURE_UNITS)
        .read(Path.of("examples", name + ".json"));
  }

  private static Prediction predict(Design design) {
    return Predictor.predict(design, List.of(), new double[] {1e3}, Progress.none());
  }

  private static double solved(HookupPrediction hookup, String key) {
    return hookup.figures().get(key).solved().number().orElseThrow();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "seismometer-coil",
        "hydrophone-follower",
        "measured-amplifier",
        "nine-volt-preamplifier",
        "everything-fitted",
        "river-gauge-faulty"
      })
  void opensAndSolves(String name) {
    Prediction prediction = predict(open(name).design());
    assertThat(prediction.hookups()).isNotEmpty();
    for (HookupPrediction hookup : prediction.hookups()) {
      assertThat(hookup.rest()).as(hookup.failure()).isPresent();
      assertThat(hookup.figures().get("openLoopGain").solved().number()).isPresent();
      assertThat(hookup.overSwing()).hasSizeGreaterThanOrEqualTo(41);
      assertThat(hookup.harmonics()).hasSize(51);
      double sum = hookup.offsetContributions().stream().mapToDouble(share -> share.output()).sum();
      if (!hookup.offsetContributions().isEmpty()) {
        assertThat(sum).isCloseTo(solved(hookup, "outputOffset"), within(1e-12));
      }
    }
  }

  @Test
  void theHydrophoneFollowerIsQuietAtRestAndOscillatesWhenItSwings() {
    HookupPrediction line = predict(open("hydrophone-follower").design()).hookups().get(0);
    assertThat(line.unstablePoles()).isEmpty();
    assertThat(line.overSwing()).anyMatch(level -> !level.stable());
    assertThat(solved(line, "oscillationFrequency")).isBetween(1e6, 1e8);
  }

  @Test
  void theSeismometerHasThreeHookups() {
    Prediction prediction = predict(open("seismometer-coil").design());
    assertThat(prediction.hookups())
        .extracting(hookup -> hookup.hookup().name())
        .containsExactly("divider", "follower", "open");
    HookupPrediction open = prediction.hookups().get(2);
    assertThat(open.loopGain()).isEmpty();
    assertThat(open.figures().get("closedLoopGain").solved().says()).contains("open");
  }

  @Test
  void anUneditedExampleIsWrittenAsItWasRead() {
    DesignFile file = new DesignFile(new ShelfFile().shipped(), FIGURE_UNITS);
    DesignDocument document = open("everything-fitted");
    String written = file.write(document.design(), Optional.of(document));
    assertThat(file.read(written, "written").design()).isEqualTo(document.design());
  }
}
