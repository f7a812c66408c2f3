package loopwright.view.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.predict.SwingLevel;

/**
 * The output levels at which the circuit grows, as regions from one level to another.
 *
 * @param regions ascending, V
 */
record SwingRegions(List<Region> regions) {
  /**
   * Neighbouring levels that all grow.
   *
   * @param from lowest output of them, V
   * @param to highest output of them, V
   * @param shade where its shade begins and ends: half-way to the neighbours that do not grow
   */
  record Region(double from, double to, Span shade) {}

  static SwingRegions of(List<SwingLevel> levels) {
    List<SwingLevel> ascending =
        levels.stream().sorted(Comparator.comparingDouble(SwingLevel::output)).toList();
    List<Region> regions = new ArrayList<>();
    int begin = -1;
    for (int i = 0; i < ascending.size(); i++) {
      boolean grows = !ascending.get(i).stable();
      if (grows && begin < 0) {
        begin = i;
      }
      boolean isLast = i == ascending.size() - 1;
      if (begin >= 0 && (!grows || isLast)) {
        regions.add(region(ascending, begin, grows ? i : i - 1));
        begin = -1;
      }
    }
    return new SwingRegions(regions);
  }

  private static Region region(List<SwingLevel> ascending, int first, int last) {
    double from = ascending.get(first).output();
    double to = ascending.get(last).output();
    double lower = first == 0 ? from : (from + ascending.get(first - 1).output()) / 2;
    double upper = last == ascending.size() - 1 ? to : (to + ascending.get(last + 1).output()) / 2;
    // A lone level at the end of the swing still needs a shade to be seen.
    double least = 1e-6 + 1e-3 * Math.abs(to);
    return new Region(
        from,
        to,
        upper - lower > least ? new Span(lower, upper) : new Span(lower - least, upper + least));
  }

  boolean isEmpty() {
    return regions.isEmpty();
  }

  /** The regions in words: from −2 V to −0.4 V and from 0.4 V to 2 V. */
  String says() {
    return regions.stream().map(SwingRegions::says).collect(Collectors.joining(" and "));
  }

  private static String says(Region region) {
    return region.from() == region.to()
        ? "at " + Words.volts(region.from())
        : "from " + Words.volts(region.from()) + " to " + Words.volts(region.to());
  }
}
