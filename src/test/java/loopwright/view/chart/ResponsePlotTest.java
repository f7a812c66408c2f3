package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loopwright.predict.ComplexPoint;
import loopwright.predict.HookupPrediction;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class ResponsePlotTest {
  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
  }

  private static Picture picture(HookupPrediction prediction) {
    return new ResponsePlot().picture(prediction, PlotTheme.current());
  }

  @Test
  void magnitudeAndPhaseAreThoseOfThePrediction() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    List<XYPlot> strips = Drawn.strips(picture(prediction));
    assertThat(strips).hasSize(2);
    List<ComplexPoint> response = prediction.response();
    assertThat(Drawn.x(strips.get(0), 0))
        .containsExactly(response.stream().mapToDouble(ComplexPoint::frequency).toArray());
    assertThat(Drawn.y(strips.get(0), 0))
        .containsExactly(
            response.stream().mapToDouble(p -> 20 * Math.log10(p.magnitude())).toArray());
    assertThat(Drawn.y(strips.get(1), 0)[0]).isEqualTo(response.get(0).degrees());
  }

  @Test
  void bandwidthAndIdealGainAreMarked() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(Drawn.words(Drawn.strips(picture).get(0)))
        .containsExactlyInAnyOrder("magnitude", "ideal 11", "−3 dB at 4 MHz");
    assertThat(picture.title()).isEqualTo("Gain 10.9 up to 4 MHz");
    assertThat(picture.sentence()).contains("at 1 kHz 20.7 dB").contains("It peaks 1.7 dB");
  }

  @Test
  void aBandwidthThatIsMissingIsExplained() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.open(1)));
    assertThat(picture.title()).isEqualTo("Gain 10.9");
    assertThat(picture.sentence()).contains("No bandwidth: undefined here");
  }

  @Test
  void aGrowingCircuitHasNoSteadyResponse() {
    Picture picture = picture(SamplePredictions.growingAtRest(SampleDesigns.follower(2)));
    assertThat(picture.title()).isEqualTo("Grows at rest: no steady response");
    assertThat(picture.sentence()).contains("a scope would show the oscillation");
    assertThat(picture.chart()).isPresent();
  }
}
