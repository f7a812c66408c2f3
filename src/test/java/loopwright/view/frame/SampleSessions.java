package loopwright.view.frame;

import java.util.stream.Collectors;
import loopwright.file.DesignFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.session.PredictionSource;
import loopwright.session.Predictions;
import loopwright.session.SampleDesigns;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;

/** Sessions on the sample amplifier whose work is done at once. */
final class SampleSessions {
  private SampleSessions() {}

  /** Design files that know every figure, and an empty shelf. */
  static DesignFile files() {
    return new DesignFile(
        Shelf.empty(),
        Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
  }

  /** A session whose one figure follows the load of the gain stage. */
  static Session quick() {
    return with((design, hookups, progress) -> Predictions.assess(design, hookups));
  }

  /** A session that solves in its own way. */
  static Session with(PredictionSource source) {
    return new Session(files(), source, new SameThreadRunner(), SampleDesigns.coilAmplifier());
  }
}
