package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Waveform;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class WaveformPlotTest {
  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
  }

  private static Picture picture(HookupPrediction prediction) {
    return new WaveformPlot().picture(prediction, PlotTheme.current());
  }

  @Test
  void tracesAreThoseOfThePrediction() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    Waveform waveform = prediction.waveform().orElseThrow();
    List<XYPlot> strips = Drawn.strips(picture(prediction));
    assertThat(Drawn.y(strips.get(0), 0)).containsExactly(waveform.out());
    assertThat(Drawn.y(strips.get(0), 1)).containsExactly(waveform.gainOut());
    assertThat(Drawn.y(strips.get(1), 0)).containsExactly(waveform.error());
    assertThat(Drawn.words(strips.get(0))).containsExactly("out", "gainOut");
    assertThat(Drawn.words(strips.get(1))).containsExactly("error at out");
  }

  @Test
  void timeRunsOverOnePeriodOfTheSource() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    double[] time = Drawn.x(Drawn.strips(picture(prediction)).get(0), 0);
    assertThat(time[0]).isZero();
    assertThat(time[512]).isCloseTo(0.5e-3, within(1e-12));
  }

  @Test
  void theErrorHasAScaleOfItsOwn() {
    List<XYPlot> strips =
        Drawn.strips(picture(SamplePredictions.stable(SampleDesigns.divider(0.2))));
    EngineeringAxis signal = (EngineeringAxis) strips.get(0).getRangeAxis();
    EngineeringAxis error = (EngineeringAxis) strips.get(1).getRangeAxis();
    assertThat(signal.scale().onTicks()).isEqualTo(" V");
    assertThat(error.scale().onTicks()).isEqualTo(" mV");
  }

  @Test
  void wordsSayWhatTheLoopDoes() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(picture.title())
        .isEqualTo("gainOut steps over ±540 mV of dead zone; out keeps ±5.2 mV of it");
    assertThat(picture.sentence())
        .contains("One period at 1 kHz with 200 mV peak")
        .contains("Harmonic distortion 0.123 %");
  }

  @Test
  void withoutAFollowerThereIsOneTrace() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    Waveform waveform = prediction.waveform().orElseThrow();
    HookupPrediction same =
        new HookupPrediction(
            prediction.hookup(),
            prediction.rest(),
            "",
            prediction.figures(),
            prediction.response(),
            prediction.loopGain(),
            List.of(),
            prediction.overSwing(),
            "",
            prediction.offsetContributions(),
            prediction.harmonics(),
            Optional.of(
                new Waveform(
                    waveform.generator(),
                    waveform.out(),
                    waveform.out(),
                    waveform.error(),
                    Map.of(),
                    Map.of())),
            List.of());
    assertThat(Drawn.strips(picture(same)).get(0).getSeriesCount()).isEqualTo(1);
  }

  @Test
  void withoutAnAmplitudeItTeaches() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0)));
    assertThat(picture.chart()).isEmpty();
    assertThat(picture.sentence()).startsWith("Give the source an amplitude to see the waveform");
  }
}
