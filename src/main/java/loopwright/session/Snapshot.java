package loopwright.session;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.predict.HookupPrediction;

/**
 * Everything a view may show, at one moment. Whether results belong to the present edit is derived
 * from the design that they hold.
 *
 * @param path the file; empty for a design that has none yet
 * @param design the present design
 * @param unsaved whether it differs from what the file holds
 * @param hookup name of the chosen hookup
 * @param solved newest result of each hookup that was solved
 * @param newestFailure the newest design that could not be solved
 * @param solving whether work is under way
 * @param doing what the work has reported; empty when nothing
 * @param undoable what would be undone
 * @param redoable what would be done again
 */
public record Snapshot(
    Optional<Path> path,
    Design design,
    boolean unsaved,
    String hookup,
    Map<String, Solved> solved,
    Optional<Failure> newestFailure,
    boolean solving,
    String doing,
    Optional<String> undoable,
    Optional<String> redoable) {
  /** Keeps its own copy of the results. */
  public Snapshot {
    solved = Map.copyOf(solved);
  }

  /** The chosen hookup. */
  public Hookup chosen() {
    return design
        .hookup(hookup)
        .orElseThrow(() -> new IllegalStateException("no hookup is called " + hookup));
  }

  /** The newest result of the chosen hookup, of whatever edit. */
  public Optional<Solved> newest() {
    return Optional.ofNullable(solved.get(hookup));
  }

  /** The newest prediction of the chosen hookup, of whatever edit. */
  public Optional<HookupPrediction> prediction() {
    return newest().flatMap(result -> result.of(hookup));
  }

  /** The findings that came with it. */
  public List<Finding> findings() {
    return newest().map(result -> result.assessment().findings()).orElse(List.of());
  }

  /** Whether the newest result of the chosen hookup is of the present edit. */
  public boolean current() {
    return newest().filter(result -> result.design().equals(design)).isPresent();
  }

  /** Why the present edit could not be solved in the chosen hookup, if so. */
  public Optional<Failure> failure() {
    return newestFailure.filter(
        failure -> failure.hookup().equals(hookup) && failure.design().equals(design));
  }

  /**
   * Why the present edit has no figures in the chosen hookup: the design stands for no circuit, or
   * its circuit found no rest. Empty while nobody knows, and when it has figures.
   */
  public Optional<String> unsolved() {
    return failure()
        .map(Failure::says)
        .or(
            () ->
                prediction()
                    .filter(prediction -> current() && prediction.rest().isEmpty())
                    .map(HookupPrediction::failure)
                    .filter(says -> !says.isEmpty()));
  }
}
