package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import java.util.List;
import loopwright.quantity.Unit;
import org.jfree.chart.ui.RectangleEdge;
import org.junit.jupiter.api.Test;

class EngineeringAxisTest {
  private static EngineeringAxis axis(Unit unit, double lower, double upper) {
    EngineeringAxis axis = new EngineeringAxis(unit, new Span(lower, upper));
    axis.setTickLabelFont(new Font(Font.SANS_SERIF, Font.PLAIN, 11));
    return axis;
  }

  private static List<String> upright(Unit unit, double lower, double upper, int height) {
    return Drawn.labels(axis(unit, lower, upper), RectangleEdge.LEFT, height);
  }

  @Test
  void oneVoltPrefixForTheWholeAxis() {
    assertThat(upright(Unit.VOLT, -6e-3, 6e-3, 120)).containsExactly("−5 mV", "0 mV", "5 mV");
  }

  @Test
  void decimalsFollowTheStep() {
    assertThat(upright(Unit.VOLT, 0, 1.05, 140))
        .containsExactly("0 V", "0.2 V", "0.4 V", "0.6 V", "0.8 V", "1.0 V");
  }

  @Test
  void timesOfAPeriod() {
    assertThat(Drawn.labels(axis(Unit.SECOND, 0, 20e-6), RectangleEdge.BOTTOM, 300))
        .containsExactly("0 µs", "5 µs", "10 µs", "15 µs", "20 µs");
  }

  @Test
  void anglesStepByWholePartsOfACircle() {
    assertThat(upright(Unit.DEGREE, -200, 10, 60)).containsExactly("−180°", "−90°", "0°");
    assertThat(upright(Unit.DEGREE, -20, 50, 120))
        .containsExactly("−15°", "0°", "15°", "30°", "45°");
  }

  @Test
  void growthIsCountedInPowersOfTenThatTheAxisNames() {
    EngineeringAxis axis = axis(Unit.PER_SECOND, -12e6, 25e6);
    assertThat(axis.scale().onAxis()).isEqualTo("10⁶/s");
    assertThat(Drawn.labels(axis, RectangleEdge.LEFT, 100)).containsExactly("−10", "0", "10", "20");
  }

  @Test
  void smallGrowthNeedsNoPower() {
    assertThat(axis(Unit.PER_SECOND, 0, 50).scale().onAxis()).isEqualTo("1/s");
  }

  @Test
  void gainsCarryNoPrefix() {
    assertThat(upright(Unit.ONE, 3.93, 4.01, 100)).containsExactly("3.94", "3.96", "3.98", "4.00");
    assertThat(axis(Unit.ONE, 0, 250_000).scale().onAxis()).isEqualTo("×10³");
  }

  @Test
  void farFromNoughtTheNumbersStillDiffer() {
    List<String> labels = upright(Unit.VOLT, 4.4999, 4.5001, 150);
    assertThat(labels).doesNotHaveDuplicates().hasSizeGreaterThan(2).contains("4.50000 V");
  }

  @Test
  void aLowStripHasTwoNumbersAtLeast() {
    assertThat(upright(Unit.ONE, 0.9945, 0.9975, 60)).containsExactly("0.995", "0.996", "0.997");
  }

  @Test
  void aLargePlotIsNotCrowded() {
    assertThat(upright(Unit.DECIBEL, -80, 25, 900)).hasSizeBetween(4, 10);
  }
}
