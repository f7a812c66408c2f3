package loopwright.sheet;

import java.util.List;

/**
 * A test set-up to build.
 *
 * @param name of the hookup
 * @param build what is connected where
 * @param settings of generator and probe
 * @param shows what meter and scope should show
 * @param watch what to look for: oscillation, or none
 * @param further figures that need no reading of their own, each in a few words
 */
public record SheetHookup(
    String name,
    String build,
    List<String> settings,
    List<Look> shows,
    List<String> watch,
    List<String> further) {
  /** Keeps its own copies. */
  public SheetHookup {
    settings = List.copyOf(settings);
    shows = List.copyOf(shows);
    watch = List.copyOf(watch);
    further = List.copyOf(further);
  }

  /**
   * Something to look at.
   *
   * @param what where and how it is read
   * @param value what it should be
   */
  public record Look(String what, Expected value) {}
}
