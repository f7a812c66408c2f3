package loopwright.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.file.DesignText;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Predictor;
import loopwright.predict.SwingLevel;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** A follower that oscillates, and what cures it. */
class CureSearchTest {
  private static final double WANTED = 55;

  private static final String FOLLOWER =
      """
      {"loopwright": 1, "name": "line driver", "rails": {"positive": 12, "negative": -12},
       "surroundings": {"strayCapacitance": "2p"},
       "tolerances": {"capacitor": "10%"},
       "parts": {
         "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80, "baseEmitterCapacitance": "8p", "baseCollectorCapacitance": "3p",
               "transitTime": "0.5n"}},
         "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80, "baseEmitterCapacitance": "8p", "baseCollectorCapacitance": "3p",
               "transitTime": "0.5n"}}},
       "amplifier": {"kind": "stages",
         "inputPair": {"transistor": "n",
           "tail": {"kind": "resistor", "resistance": "12k"},
           "load": {"kind": "resistors", "output": "1k5", "other": "1k5"}},
         "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "8k2"}},
         "outputStage": {"kind": "none"}},
       "hookups": [
        {"name": "line", "source": {"resistance": 50, "amplitude": 0.5},
         "feedback": {"kind": "nonInverting", "upper": 0},
         "load": {"resistance": "10k", "capacitance": "47p"}},
        {"name": "open", "feedback": {"kind": "open"}}]}
      """;

  private final Design design = DesignText.read(FOLLOWER);

  private static HookupPrediction predicted(Design design) {
    return Predictor.predict(design, List.of("line"), new double[] {1e3}, Progress.none())
        .hookups()
        .get(0);
  }

  @Test
  void everyCureHoldsTheMarginAtEveryLevelAndItsFiguresAreThoseOfTheChangedDesign() {
    assertThat(predicted(design).overSwing()).anyMatch(level -> !level.stable());

    Cures cures = CureSearch.of(design, "line", WANTED, Progress.none());

    assertThat(cures.needed()).isTrue();
    assertThat(cures.cures()).isNotEmpty();
    for (Cure cure : cures.cures()) {
      HookupPrediction cured = predicted(Change.applyAll(design, cure.changes()));
      assertThat(cured.overSwing())
          .as(cure.says())
          .allMatch(SwingLevel::stable)
          .allMatch(level -> level.phaseMargin().orElse(180) >= WANTED);
      Map<String, FigureResult> figures = cured.figures();
      double worst = figures.get("worstPhaseMargin").solved().number().orElseThrow();
      assertThat(cure.worstPhaseMargin().orElseThrow()).isEqualTo(worst, within(1e-3));
      assertThat(cure.cornerPhaseMargin().orElseThrow()).isBetween(WANTED, worst + 1e-3);
      assertThat(cure.figures().get("loopGainAtSignal").number().orElseThrow())
          .isEqualTo(figures.get("loopGainAtSignal").solved().number().orElseThrow(), within(1e-3));
    }
    assertThat(cures.cures()).isSortedAccordingTo((a, b) -> Double.compare(a.cost(), b.cost()));
  }

  @Test
  void theSmallestMillerCapacitorIsTheOneThatAnExhaustiveSearchFinds() {
    Cures cures = CureSearch.of(design, "line", WANTED, Progress.none());
    Cure miller =
        cures.cures().stream()
            .filter(cure -> cure.kind().equals("Miller capacitor"))
            .findFirst()
            .orElseThrow();
    String path = "amplifier.gainStage.compensation.capacitance";
    assertThat(miller.changes()).singleElement().extracting(Change::path).isEqualTo(path);
    double found = value(miller.changes().get(0));
    for (double smaller : Stock.capacitors(design, found / 11, found * 0.99)) {
      double least = smaller * 0.9;
      Design corner = new Change(path, Double.toString(least)).applyTo(design);
      assertThat(predicted(corner).overSwing())
          .as("%s F at the low end of its tolerance", smaller)
          .anyMatch(level -> !level.stable() || level.phaseMargin().orElse(180) < WANTED);
    }
  }

  @Test
  void whatIsNotOpenSaysWhy() {
    Cures cures = CureSearch.of(design, "line", WANTED, Progress.none());
    assertThat(cures.cannot())
        .anySatisfy(
            cannot -> {
              assertThat(cannot.kind()).isEqualTo("lead capacitor");
              assertThat(cannot.says()).contains("no resistor between output and inverting input");
            })
        .allSatisfy(cannot -> assertThat(cannot.says()).isNotBlank());
  }

  @Test
  void anOpenHookupIsRefused() {
    assertThatThrownBy(() -> CureSearch.of(design, "open", WANTED, Progress.none()))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("hookups.open.feedback")
        .hasMessageContaining("expected one with feedback");
  }

  private static double value(Change change) {
    return loopwright.quantity.Quantity.parse(change.value(), loopwright.quantity.Unit.FARAD)
        .value();
  }
}
