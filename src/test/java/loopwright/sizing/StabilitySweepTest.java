package loopwright.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Predictor;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** A sweep says what a prediction of each of its designs says. */
class StabilitySweepTest {
  private static final String FOLLOWER =
      """
      {"loopwright": 1, "name": "line driver", "rails": {"positive": 12, "negative": -12},
       "surroundings": {"strayCapacitance": "2p"},
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
         "load": {"resistance": "10k", "capacitance": "47p"}}]}
      """;

  private final Design design = DesignText.read(FOLLOWER);
  private final List<StabilitySweep> sweeps = StabilitySweep.of(design, "line", Progress.none());

  private static HookupPrediction predicted(Design design) {
    return Predictor.predict(design, List.of("line"), new double[] {1e3}, Progress.none())
        .hookups()
        .get(0);
  }

  @Test
  void everyPointIsWhatAPredictionOfThatDesignSays() {
    StabilitySweep compensation = sweeps.get(1);
    assertThat(compensation.path()).isEqualTo("amplifier.gainStage.compensation.capacitance");
    for (StabilitySweep.Point point : compensation.points()) {
      HookupPrediction prediction =
          predicted(
              new Change(compensation.path(), Double.toString(point.value())).applyTo(design));
      assertThat(point.stable())
          .isEqualTo(prediction.overSwing().stream().allMatch(level -> level.stable()));
      double worst =
          prediction.figures().get("worstPhaseMargin").solved().number().orElse(Double.NaN);
      assertThat(point.phaseMargin().orElse(Double.NaN)).isEqualTo(worst, within(1e-3));
    }
  }

  @Test
  void thePresentValueIsMarkedOnce() {
    assertThat(sweeps.get(0).points().stream().filter(StabilitySweep.Point::present)).hasSize(1);
    assertThat(sweeps.get(1).points()).noneMatch(StabilitySweep.Point::present);
  }

  @Test
  void saysWhereItGrows() {
    assertThat(sweeps.get(0).says())
        .startsWith("Load capacitance: ")
        .contains("grows")
        .contains("stable from");
    assertThat(sweeps).noneMatch(sweep -> sweep.path().endsWith("feedback.upper"));
  }
}
