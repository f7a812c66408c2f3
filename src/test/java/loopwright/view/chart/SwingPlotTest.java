package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.predict.HookupPrediction;
import loopwright.predict.SwingLevel;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class SwingPlotTest {
  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
  }

  private static Picture picture(HookupPrediction prediction) {
    return new SwingPlot().picture(prediction, PlotTheme.current());
  }

  @Test
  void curvesAreThoseOfThePrediction() {
    HookupPrediction prediction = SamplePredictions.growing(SampleDesigns.divider(0.5));
    List<SwingLevel> levels = prediction.overSwing();
    List<XYPlot> strips = Drawn.strips(picture(prediction));
    assertThat(strips).hasSize(3);
    double[] outputs = levels.stream().mapToDouble(SwingLevel::output).toArray();
    assertThat(Drawn.x(strips.get(0), 0)).containsExactly(outputs);
    assertThat(Drawn.y(strips.get(0), 0))
        .containsExactly(levels.stream().mapToDouble(l -> l.growth().orElseThrow()).toArray());
    assertThat(Drawn.y(strips.get(1), 0))
        .containsExactly(levels.stream().mapToDouble(l -> l.phaseMargin().orElseThrow()).toArray());
    assertThat(Drawn.y(strips.get(2), 0))
        .containsExactly(levels.stream().mapToDouble(SwingLevel::gain).toArray());
  }

  @Test
  void whatGrowsIsShadedAndItsDotsAreFull() {
    HookupPrediction prediction = SamplePredictions.growing(SampleDesigns.divider(0.5));
    List<XYPlot> strips = Drawn.strips(picture(prediction));
    assertThat(Drawn.marks(strips.get(1).getDomainMarkers(Layer.BACKGROUND))).hasSize(2);
    IntervalMarker shade =
        (IntervalMarker)
            Drawn.marks(strips.get(0).getRangeMarkers(Layer.BACKGROUND)).stream()
                .filter(IntervalMarker.class::isInstance)
                .findFirst()
                .orElseThrow();
    assertThat(shade.getStartValue()).isZero();
    XYLineAndShapeRenderer dots = (XYLineAndShapeRenderer) strips.get(0).getRenderer();
    for (int i = 0; i < prediction.overSwing().size(); i++) {
      assertThat(dots.getItemShapeFilled(0, i)).isEqualTo(!prediction.overSwing().get(i).stable());
    }
  }

  @Test
  void frequenciesStandAtTheEndsAndWhereGrowingBegins() {
    Picture picture = picture(SamplePredictions.growing(SampleDesigns.divider(0.5)));
    assertThat(Drawn.words(Drawn.strips(picture).get(0)))
        .containsExactly(
            "grows",
            "growth",
            "dies away",
            "14.5 MHz",
            "10.5 MHz",
            "10.5 MHz",
            "13.9 MHz",
            "8.2 MHz");
  }

  @Test
  void wordsSayFromWhereToWhere() {
    Picture picture = picture(SamplePredictions.growing(SampleDesigns.divider(0.5)));
    assertThat(picture.title())
        .isEqualTo("Grows from −2 V to −300 mV and from 300 mV to 2 V, fastest at 14.5 MHz");
    // ln 2 over the growth of 21.5·10⁶/s at the upper end
    assertThat(picture.sentence()).contains("At 2 V the oscillation doubles every 32.2 ns");
  }

  @Test
  void aStableSwingSaysItsLeastMargin() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(picture.title()).isEqualTo("Stable at every level from −2.2 V to 2.2 V");
    assertThat(picture.sentence()).contains("Phase margin nowhere under 25°");
  }

  @Test
  void anOpenHookupHasNoMarginStrip() {
    List<XYPlot> strips = Drawn.strips(picture(SamplePredictions.stable(SampleDesigns.open(0.2))));
    assertThat(strips).hasSize(2);
    assertThat(Drawn.words(strips.get(1))).containsExactly("gain");
  }

  @Test
  void atRestAloneItTeaches() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0)));
    assertThat(picture.chart()).isEmpty();
    assertThat(picture.title()).isEqualTo("Stable at rest");
    assertThat(picture.sentence()).startsWith("Give the source an amplitude");
  }

  @Test
  void aGainThatHardlyChangesIsDrawnFlat() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    HookupPrediction flat =
        new HookupPrediction(
            prediction.hookup(),
            prediction.rest(),
            "",
            prediction.figures(),
            List.of(),
            List.of(),
            List.of(),
            List.of(level(-1, 10), level(0, 10.000001), level(1, 10.000002)),
            "jumps at 1 V",
            List.of(),
            List.of(),
            Optional.empty(),
            List.of());
    Picture picture = picture(flat);
    List<XYPlot> strips = Drawn.strips(picture);
    assertThat(strips.get(strips.size() - 1).getRangeAxis().getRange().getLength())
        .isGreaterThan(0.01);
    assertThat(picture.sentence()).endsWith("Jumps at 1 V.");
  }

  @Test
  void whatIsDampedOutAtOnceHasNoFrequencyToName() {
    List<SwingLevel> levels =
        List.of(
            new SwingLevel(
                -1,
                -1,
                true,
                OptionalDouble.of(0.3),
                OptionalDouble.of(-2e5),
                OptionalDouble.empty(),
                1),
            new SwingLevel(
                1,
                1,
                true,
                OptionalDouble.of(240e3),
                OptionalDouble.of(-1.8e6),
                OptionalDouble.empty(),
                1));
    XYPlot strip = new GrowthStrip(levels, SwingRegions.of(levels), PlotTheme.current()).plot();
    assertThat(Drawn.words(strip)).contains("240 kHz").doesNotContain("300 mHz");
  }

  @Test
  void regionsReachHalfWayToWhatDoesNotGrow() {
    SwingRegions regions =
        SwingRegions.of(List.of(level(0, true), level(1, false), level(2, false), level(4, true)));
    assertThat(regions.says()).isEqualTo("from 1 V to 2 V");
    assertThat(regions.regions().get(0).shade().lower()).isCloseTo(0.5, within(1e-12));
    assertThat(regions.regions().get(0).shade().upper()).isCloseTo(3, within(1e-12));
  }

  @Test
  void levelsThatComeDownwardMakeTheSameRegions() {
    SwingRegions regions =
        SwingRegions.of(List.of(level(2, false), level(1, false), level(0, true)));
    assertThat(regions.says()).isEqualTo("from 1 V to 2 V");
    assertThat(SwingRegions.of(List.of(level(3, false))).says()).isEqualTo("at 3 V");
  }

  private static SwingLevel level(double output, double gain) {
    return new SwingLevel(
        output,
        output,
        true,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.of(60),
        gain);
  }

  private static SwingLevel level(double output, boolean stable) {
    return new SwingLevel(
        output,
        output,
        stable,
        OptionalDouble.of(1e6),
        OptionalDouble.of(stable ? -1 : 1),
        OptionalDouble.empty(),
        1);
  }
}
