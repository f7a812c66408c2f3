package loopwright;

import java.util.List;
import loopwright.check.Findings;
import loopwright.design.Design;
import loopwright.predict.CostClass;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.PredictionSource;
import loopwright.task.Progress;

/**
 * What the window shows: after an edit all figures that are solved at once, and when those are
 * there the ones that need a solution in time.
 */
final class WindowPredictions implements PredictionSource {
  private static final double[] OWN_GRID = {};

  @Override
  public Assessment assess(Design design, List<String> hookups, Progress progress) {
    return of(Predictor.predict(design, hookups, OWN_GRID, CostClass.WAVEFORM, progress));
  }

  @Override
  public boolean leavesOut(Assessment first) {
    return Predictor.leavesOut(first.prediction());
  }

  @Override
  public Assessment complete(Assessment first, Progress progress) {
    return of(Predictor.withFiguresInTime(first.prediction(), progress));
  }

  private static Assessment of(Prediction prediction) {
    return new Assessment(prediction, Findings.of(prediction));
  }
}
