package loopwright.check;

import java.util.Comparator;
import java.util.List;
import loopwright.predict.Prediction;

/** Everything that the checks find in a prediction. */
public final class Findings {
  private static final List<Check> CHECKS =
      List.of(
          new FailureCheck(),
          new StabilityCheck(),
          new OutputRestCheck(),
          new GainStageCheck(),
          new SaturationCheck(),
          new SwingRoomCheck(),
          new DcPathCheck(),
          new RecordLimitsCheck(),
          new HotJunctionCheck(),
          new RunawayCheck(),
          new RailsCheck(),
          new ReverseJunctionCheck(),
          new BuildLimitsCheck(),
          new PairBalanceCheck(),
          new DividerLoadCheck(),
          new LoopGainCheck(),
          new SlewCheck(),
          new SolveNoteCheck());

  private Findings() {}

  /** The findings of all hookups, worst first, each once. */
  public static List<Finding> of(Prediction prediction) {
    return prediction.hookups().stream()
        .flatMap(
            hookup ->
                CHECKS.stream().flatMap(check -> check.check(prediction.design(), hookup).stream()))
        .distinct()
        .sorted(Comparator.comparing(Finding::severity))
        .toList();
  }
}
