package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loopwright.predict.ComplexPoint;
import org.junit.jupiter.api.Test;

class BodeTest {
  @Test
  void decibelsByTheirDefinition() {
    Bode bode = Bode.of(List.of(new ComplexPoint(1, 10, 0), new ComplexPoint(2, 0, -0.5)));
    assertThat(bode.decibels()[0]).isEqualTo(20);
    // 20 log 0.5 = −6.0206
    assertThat(bode.decibels()[1]).isCloseTo(-6.0206, within(5e-5));
    assertThat(bode.peak()).isEqualTo(20);
  }

  @Test
  void theAngleGoesOnPastHalfATurn() {
    Bode bode =
        Bode.of(
            List.of(
                new ComplexPoint(1, 1, 0),
                new ComplexPoint(2, 0, -1),
                new ComplexPoint(3, -1, -0.1),
                new ComplexPoint(4, -1, 0.1),
                new ComplexPoint(5, 0, 1),
                new ComplexPoint(6, 1, 0)));
    assertThat(bode.degrees()[2]).isCloseTo(-174.3, within(0.05));
    assertThat(bode.degrees()[3]).isCloseTo(-185.7, within(0.05));
    assertThat(bode.degrees()[4]).isCloseTo(-270, within(1e-9));
    assertThat(bode.degrees()[5]).isCloseTo(-360, within(1e-9));
  }

  @Test
  void noughtLeavesAGap() {
    Bode bode = Bode.of(List.of(new ComplexPoint(1, 0, 0), new ComplexPoint(2, 1, 0)));
    assertThat(bode.decibels()[0]).isNaN();
    assertThat(bode.magnitude("m").series().getY(0)).isNull();
  }

  @Test
  void theAxisEndsWhereNothingIsLeft() {
    List<ComplexPoint> falling =
        List.of(
            new ComplexPoint(10, 1, 0),
            new ComplexPoint(100, 0.1, 0),
            new ComplexPoint(1000, 1e-4, 0),
            new ComplexPoint(10_000, 1e-8, 0));
    assertThat(Bode.of(falling).axis(-60).getUpperBound()).isEqualTo(1000);
    assertThat(Bode.of(falling).axis(-200).getUpperBound()).isEqualTo(10_000);
  }
}
