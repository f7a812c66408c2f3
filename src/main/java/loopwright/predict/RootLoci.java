package loopwright.predict;

import java.util.ArrayList;
import java.util.List;

/** Follows natural frequencies from level to level: each goes on as the nearest of the next. */
final class RootLoci {
  /** A root does not move further between neighbours, as a share of its size. */
  private static final double FURTHEST = 0.5;

  private RootLoci() {}

  /**
   * The loci.
   *
   * @param levels the roots of each level, one of each conjugate pair
   */
  static List<LoopPlane.Locus> of(List<List<Root>> levels) {
    List<Building> all = new ArrayList<>();
    List<Building> open = new ArrayList<>();
    for (int level = 0; level < levels.size(); level++) {
      List<Root> free = new ArrayList<>(levels.get(level));
      List<Building> continued = new ArrayList<>();
      for (Building locus : open) {
        Root next = nearest(locus.last(), free);
        if (next != null) {
          free.remove(next);
          locus.roots.add(next);
          continued.add(locus);
        }
      }
      for (Root root : free) {
        Building begun = new Building(level);
        begun.roots.add(root);
        all.add(begun);
        continued.add(begun);
      }
      open = continued;
    }
    return all.stream().map(locus -> new LoopPlane.Locus(locus.first, locus.roots)).toList();
  }

  private static Root nearest(Root from, List<Root> among) {
    Root best = null;
    double least = FURTHEST * Math.hypot(from.re(), from.im());
    for (Root root : among) {
      double distance = Math.hypot(root.re() - from.re(), root.im() - from.im());
      if (distance <= least) {
        least = distance;
        best = root;
      }
    }
    return best;
  }

  /** A locus that is still followed. */
  private static final class Building {
    private final int first;
    private final List<Root> roots = new ArrayList<>();

    Building(int first) {
      this.first = first;
    }

    Root last() {
      return roots.get(roots.size() - 1);
    }
  }
}
