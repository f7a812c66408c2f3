package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import java.util.List;
import loopwright.quantity.Unit;
import org.jfree.chart.axis.Tick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.ui.RectangleEdge;
import org.junit.jupiter.api.Test;

class DecadeAxisTest {
  private static DecadeAxis axis(double lowest, double highest) {
    DecadeAxis axis = new DecadeAxis(Unit.HERTZ, lowest, highest);
    axis.setTickLabelFont(new Font(Font.SANS_SERIF, Font.PLAIN, 11));
    return axis;
  }

  @Test
  void everyDecadeIsNamedWhereThereIsRoom() {
    assertThat(Drawn.labels(axis(10, 1e9), RectangleEdge.BOTTOM, 1000))
        .containsExactly(
            "10 Hz", "100 Hz", "1 kHz", "10 kHz", "100 kHz", "1 MHz", "10 MHz", "100 MHz", "1 GHz");
  }

  @Test
  void everySecondDecadeIsNamedWhereThereIsLess() {
    assertThat(Drawn.labels(axis(10, 1e9), RectangleEdge.BOTTOM, 400))
        .containsExactly("10 Hz", "1 kHz", "100 kHz", "10 MHz", "1 GHz");
  }

  @Test
  void everyThirdDecadeIsNamedWhereThereIsLittle() {
    assertThat(Drawn.labels(axis(1, 1e9), RectangleEdge.BOTTOM, 220))
        .containsExactly("1 Hz", "1 kHz", "1 MHz", "1 GHz");
  }

  @Test
  void withinADecadeTwosAndFivesAreNamedToo() {
    assertThat(Drawn.labels(axis(150, 2500), RectangleEdge.BOTTOM, 400))
        .containsExactly("200 Hz", "500 Hz", "1 kHz", "2 kHz");
  }

  @Test
  void decadesAreMajorAndTheRestMinor() {
    List<Tick> ticks = Drawn.ticks(axis(10, 1000), RectangleEdge.BOTTOM, 300);
    assertThat(ticks).hasSize(19);
    assertThat(ticks)
        .filteredOn(tick -> ((ValueTick) tick).getTickType() == TickType.MAJOR)
        .extracting(tick -> Math.rint(((ValueTick) tick).getValue()))
        .containsExactly(10.0, 100.0, 1000.0);
  }
}
