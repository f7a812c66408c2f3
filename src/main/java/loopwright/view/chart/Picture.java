package loopwright.view.chart;

import java.util.Optional;
import org.jfree.chart.JFreeChart;

/**
 * A plot with the words that say what it means.
 *
 * @param title what is to be seen, with its numbers
 * @param sentence how to read it
 * @param chart the plot; empty where there is nothing to draw, and then the words say why
 */
record Picture(String title, String sentence, Optional<JFreeChart> chart) {
  static Picture of(String title, String sentence, JFreeChart chart) {
    return new Picture(title, sentence, Optional.of(chart));
  }

  /** Nothing to draw. */
  static Picture none(String title, String sentence) {
    return new Picture(title, sentence, Optional.empty());
  }
}
