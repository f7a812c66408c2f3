package loopwright.solve;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalInt;
import loopwright.solve.NaturalFrequencies.Pole;

/**
 * Follows the roots that matter from one network to the next of the same pattern: those that grow,
 * and the complex pairs that die away slowest. What it follows is believed only when the count of
 * growing roots by {@link RootCount} agrees, and for a limited number of steps; else all roots are
 * solved anew.
 */
public final class RootFollower {
  /** Complex pairs that are followed beyond the growing ones. */
  private static final int FOLLOWED_PAIRS = 6;

  /**
   * After so many steps all roots are solved again, since one that is not followed may overtake.
   */
  private static final int MOST_STEPS = 8;

  private final NaturalFrequencies solver;
  private List<Pole> model = List.of();
  private List<Pole> followed = List.of();
  private int steps;
  private int fullSolutions;

  /** For networks of the pattern of this one. */
  public RootFollower(SmallSignalCircuit network) {
    this.solver = new NaturalFrequencies(network);
  }

  /** How often all roots were solved. */
  public int fullSolutions() {
    return fullSolutions;
  }

  /** Solves all roots of a network and follows the leading ones from here. */
  public List<Pole> solveAll(SmallSignalCircuit network) {
    fullSolutions++;
    steps = 0;
    model = solver.of(network);
    followed = leading(model);
    return followed;
  }

  /**
   * The followed roots in the next network, not yet believed; empty when some could not be
   * followed.
   */
  public List<Pole> follow(SmallSignalCircuit network) {
    if (model.isEmpty() || ++steps > MOST_STEPS) {
      return List.of();
    }
    List<Pole> next = new ArrayList<>();
    for (Pole pole : followed) {
      Pole moved = solver.refine(network, pole);
      if (moved == null || isKnown(next, moved)) {
        return List.of();
      }
      next.add(moved);
    }
    return next;
  }

  /**
   * Whether the roots that were followed are all that grow; if so, they are followed from here.
   *
   * @param roots from {@link #follow}
   * @param samples of the network's determinant along the imaginary axis
   */
  public boolean confirms(List<Pole> roots, List<RootCount.Sample> samples) {
    OptionalInt count = RootCount.growing(samples, model);
    if (roots.isEmpty() || count.isEmpty() || count.getAsInt() != RootCount.growing(roots)) {
      return false;
    }
    followed = roots;
    return true;
  }

  private static boolean isKnown(List<Pole> roots, Pole pole) {
    return roots.stream()
        .anyMatch(
            root ->
                Math.hypot(root.re() - pole.re(), root.im() - pole.im()) < 1e-6 * pole.magnitude());
  }

  private static List<Pole> leading(List<Pole> all) {
    List<Pole> leading = new ArrayList<>(all.stream().filter(Pole::grows).toList());
    all.stream()
        .filter(pole -> !pole.grows() && pole.im() > 0)
        .sorted(Comparator.comparingDouble(Pole::re).reversed())
        .limit(FOLLOWED_PAIRS)
        .forEach(leading::add);
    return List.copyOf(leading);
  }
}
