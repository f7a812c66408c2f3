package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Objects;
import loopwright.predict.HookupPrediction;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.jfree.chart.annotations.XYLineAnnotation;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class LoopGainPlotTest {
  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
  }

  private static Picture picture(HookupPrediction prediction) {
    return new LoopGainPlot().picture(prediction, PlotTheme.current());
  }

  private static double solved(HookupPrediction prediction, String key) {
    return prediction.figures().get(key).solved().number().orElseThrow();
  }

  @Test
  void marksStandAtTheSolvedFigures() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    XYPlot phase = Drawn.strips(picture(prediction)).get(1);
    double unity = solved(prediction, "unityFrequency");
    assertThat(Drawn.marks(phase.getDomainMarkers(Layer.BACKGROUND)))
        .extracting(marker -> ((ValueMarker) marker).getValue())
        .contains(unity);
    XYLineAnnotation margin = lines(phase).get(0);
    assertThat(margin.getX1()).isEqualTo(unity);
    assertThat(margin.getY1()).isEqualTo(-180);
    assertThat(margin.getY2() - margin.getY1())
        .isCloseTo(solved(prediction, "phaseMargin"), within(1e-9));
  }

  @Test
  void gainMarginStandsWhereThePhaseReverses() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    List<XYPlot> strips = Drawn.strips(picture(prediction));
    XYLineAnnotation margin = lines(strips.get(0)).get(0);
    assertThat(margin.getY2())
        .isCloseTo(-20 * Math.log10(solved(prediction, "gainMargin")), within(1e-9));
    Bode bode = Bode.of(prediction.loopGain());
    assertThat(bode.phase("").at(margin.getX1())).isCloseTo(-180, within(0.5));
    assertThat(bode.magnitude("").at(margin.getX1())).isCloseTo(margin.getY2(), within(0.1));
  }

  @Test
  void wordsCarryTheMargins() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(picture.title()).isEqualTo("Phase margin 67° at 9.48 MHz");
    assertThat(picture.sentence())
        .contains("midband loop gain 100")
        .contains("Gain margin 12.1 (21.6 dB)");
    assertThat(Drawn.words(Drawn.strips(picture).get(0)))
        .containsExactlyInAnyOrder("gain margin 12.1 (21.6 dB)", "unity at 9.48 MHz", "loop gain");
    assertThat(Drawn.words(Drawn.strips(picture).get(1)))
        .containsExactlyInAnyOrder("phase margin 67°", "phase");
  }

  @Test
  void aThinMarginIsColouredByItsVerdict() {
    PlotTheme theme = PlotTheme.current();
    Picture thin = picture(SamplePredictions.growing(SampleDesigns.divider(0.2)));
    assertThat(Drawn.colour(Drawn.strips(thin).get(1), "phase margin 41°"))
        .isEqualTo(theme.risky());
    Picture ample = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(Drawn.colour(Drawn.strips(ample).get(1), "phase margin 67°"))
        .isEqualTo(theme.accent());
  }

  @Test
  void anOpenHookupTeaches() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.open(1)));
    assertThat(picture.chart()).isEmpty();
    assertThat(picture.title()).isEqualTo("No loop");
    assertThat(picture.sentence()).contains("Choose a hookup with feedback");
  }

  private static List<XYLineAnnotation> lines(XYPlot strip) {
    return strip.getAnnotations().stream()
        .map(each -> each instanceof XYLineAnnotation line ? line : null)
        .filter(Objects::nonNull)
        .toList();
  }
}
