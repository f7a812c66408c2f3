package loopwright.design;

import java.util.List;

/** Limits: of a known hookup, for one figure or node, with at least one bound. */
final class LimitCheck {
  private LimitCheck() {}

  static void check(Design design, Problems problems) {
    List<Limit> limits = design.limits();
    for (int i = 0; i < limits.size(); i++) {
      Limit limit = limits.get(i);
      String path = "limits." + i;
      BenchCheck.hookup(design, problems, path + ".hookup", limit.hookup());
      if (limit.figure().isPresent() == limit.node().isPresent()) {
        problems.add(
            path,
            limit.figure().isPresent() ? "figure and node" : "neither figure nor node",
            "one of the two");
      }
      if (limit.minimum().isEmpty() && limit.maximum().isEmpty()) {
        problems.add(path, "neither minimum nor maximum", "at least one of the two");
      }
      problems.checkOrder(path, limit.minimum(), limit.maximum());
      if (limit.guard().value() < 0) {
        problems.add(path + ".guard", limit.guard().spelling(), "a guard of zero or more");
      }
    }
  }
}
