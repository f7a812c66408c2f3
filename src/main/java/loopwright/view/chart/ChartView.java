package loopwright.view.chart;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.JFreeChart;

/** The chart that is shown, what part of it, and the way back to the whole. */
final class ChartView {
  private final Deque<Zoom> before = new ArrayDeque<>();
  private Optional<JFreeChart> chart = Optional.empty();

  /** Shows another chart, the same part of it where it has the same axes. */
  void show(Optional<JFreeChart> next) {
    Optional<Zoom> present = chart.flatMap(Zoom::of);
    boolean keeps = !before.isEmpty() && isAlike(chart, next);
    chart = next;
    if (!keeps) {
      before.clear();
      return;
    }
    Optional<Zoom> whole = chart.flatMap(Zoom::of);
    before.clear();
    whole.ifPresent(before::push);
    present.ifPresent(zoom -> zoom.applyTo(chart.orElseThrow()));
  }

  Optional<JFreeChart> chart() {
    return chart;
  }

  boolean isZoomed() {
    return !before.isEmpty();
  }

  /** Shows a part. */
  void zoom(Zoom part) {
    Optional<Zoom> present = chart.flatMap(Zoom::of);
    if (present.isPresent() && !present.get().equals(part)) {
      before.push(present.get());
      part.applyTo(chart.orElseThrow());
    }
  }

  /** Shows what was shown before. */
  void back() {
    if (isZoomed()) {
      before.pop().applyTo(chart.orElseThrow());
    }
  }

  /** Shows all. */
  void whole() {
    while (isZoomed()) {
      back();
    }
  }

  private static boolean isAlike(Optional<JFreeChart> one, Optional<JFreeChart> other) {
    return one.isPresent()
        && other.isPresent()
        && kinds(one.get()).equals(kinds(other.get()))
        && !kinds(one.get()).isEmpty();
  }

  private static List<String> kinds(JFreeChart chart) {
    return DrawnStrip.plots(chart).stream()
        .map(plot -> plot.along() + " " + plot.unit() + " " + plot.isPlane())
        .toList();
  }
}
