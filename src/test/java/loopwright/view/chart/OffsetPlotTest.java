package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.jfree.chart.plot.CategoryPlot;
import org.jfree.data.category.CategoryDataset;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class OffsetPlotTest {
  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
  }

  private static Picture picture(HookupPrediction prediction) {
    return new OffsetPlot().picture(prediction, PlotTheme.current());
  }

  private static CategoryDataset bars(Picture picture) {
    return ((CategoryPlot) picture.chart().orElseThrow().getPlot()).getDataset();
  }

  private static String cause(CategoryDataset bars, int bar) {
    return bars.getColumnKey(bar).toString();
  }

  private static double sumBeforeTotal(CategoryDataset bars) {
    double sum = 0;
    for (int i = 0; i < bars.getColumnCount() - 1; i++) {
      sum += bars.getValue(0, i).doubleValue();
    }
    return sum;
  }

  @Test
  void barsAreTheContributionsAndTheirSum() {
    HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
    CategoryDataset bars = bars(picture(prediction));
    List<OffsetShare> shares = prediction.offsetContributions();
    assertThat(bars.getColumnCount()).isEqualTo(shares.size() + 1);
    for (int i = 0; i < shares.size(); i++) {
      assertThat(cause(bars, i)).isEqualTo(shares.get(i).cause());
      assertThat(bars.getValue(0, i)).isEqualTo(shares.get(i).output());
    }
    assertThat(cause(bars, shares.size())).isEqualTo("output offset, solved");
    assertThat(bars.getValue(0, shares.size())).isEqualTo(-0.0598);
    assertThat(sumBeforeTotal(bars)).isCloseTo(-0.0598, within(1e-12));
  }

  @Test
  void whatNoCauseExplainsIsABarOfItsOwn() {
    HookupPrediction whole = SamplePredictions.stable(SampleDesigns.divider(0.2));
    CategoryDataset bars = bars(picture(with(whole, whole.offsetContributions().subList(0, 3))));
    assertThat(cause(bars, 3)).isEqualTo("remainder");
    assertThat(bars.getValue(0, 3).doubleValue()).isCloseTo(0.0042, within(1e-12));
    assertThat(sumBeforeTotal(bars)).isCloseTo(-0.0598, within(1e-12));
  }

  @Test
  void aCauseThatTheDesignLacksHasNoBar() {
    HookupPrediction whole = SamplePredictions.stable(SampleDesigns.divider(0.2));
    List<OffsetShare> shares = new ArrayList<>(whole.offsetContributions());
    shares.add(2, new OffsetShare("base-emitter mismatch", 0));
    CategoryDataset bars = bars(picture(with(whole, shares)));
    assertThat(bars.getColumnCount()).isEqualTo(whole.offsetContributions().size() + 1);
  }

  @Test
  void anOpenHookupTeaches() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.open(1)));
    assertThat(picture.chart()).isEmpty();
    assertThat(picture.sentence()).contains("Choose a hookup with feedback");
  }

  @Test
  void twoCausesOfOneNameStayTwoBars() {
    HookupPrediction whole = SamplePredictions.stable(SampleDesigns.divider(0.2));
    List<OffsetShare> twice = new ArrayList<>();
    twice.add(new OffsetShare("leakage", -0.0300));
    twice.add(new OffsetShare("leakage", -0.0298));
    assertThat(bars(picture(with(whole, twice))).getColumnCount()).isEqualTo(3);
  }

  @Test
  void wordsNameTheOffsetAndItsLargestPart() {
    Picture picture = picture(SamplePredictions.stable(SampleDesigns.divider(0.2)));
    assertThat(picture.title()).isEqualTo("Output rests −59.8 mV from its reference");
    assertThat(picture.sentence())
        .contains("The largest part is input offset of the pair × noise gain with −67.1 mV");
  }

  @Test
  void withoutAnOffsetItSaysWhy() {
    Picture picture = picture(SamplePredictions.failed(SampleDesigns.divider(0.2)));
    assertThat(picture.chart()).isEmpty();
    assertThat(picture.sentence()).isEqualTo("No rest state.");
  }

  private static HookupPrediction with(HookupPrediction whole, List<OffsetShare> shares) {
    return new HookupPrediction(
        whole.hookup(),
        whole.rest(),
        "",
        whole.figures(),
        whole.response(),
        whole.loopGain(),
        whole.unstablePoles(),
        whole.overSwing(),
        "",
        shares,
        whole.harmonics(),
        whole.waveform(),
        List.of());
  }
}
