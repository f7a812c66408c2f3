package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.MouseEvent;
import java.util.Set;
import java.util.TreeSet;
import loopwright.predict.HookupPrediction;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** Values under the mouse. */
@ExtendWith(OnEventThread.class)
class ChartCanvasTest {
  private final HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));

  private static Set<String> tips(PlotSubject subject, HookupPrediction prediction) {
    Theme.LIGHT.apply();
    ChartCanvas canvas = new ChartCanvas();
    canvas.show(subject.picture(prediction, PlotTheme.current()).chart(), false);
    Painting.of(canvas, 400, 260);
    Set<String> tips = new TreeSet<>();
    for (int y = 0; y < 260; y += 2) {
      for (int x = 0; x < 400; x += 2) {
        String tip =
            canvas.getToolTipText(
                new MouseEvent(canvas, MouseEvent.MOUSE_MOVED, 0, 0, x, y, 0, false));
        if (tip != null) {
          tips.add(tip);
        }
      }
    }
    return tips;
  }

  @Test
  void aCurveTellsItsPoints() {
    assertThat(tips(new ResponsePlot(), prediction))
        .anyMatch(tip -> tip.matches("magnitude 20\\.\\d+ dB at 1(\\.\\d+)? kHz"))
        .anyMatch(tip -> tip.startsWith("phase −"));
  }

  @Test
  void aDotTellsItsLevel() {
    assertThat(tips(new SwingPlot(), prediction))
        .anyMatch(tip -> tip.matches("phase margin \\d+(\\.\\d+)?° at −?[\\d.]+ (m?V)"));
  }

  @Test
  void aBarTellsItsWholeCause() {
    assertThat(tips(new OffsetPlot(), prediction))
        .contains("input offset of the pair × noise gain: −67.1 mV");
  }

  @Test
  void nothingIsDrawnWhereThereIsNothing() {
    assertThat(tips(new WaveformPlot(), SamplePredictions.stable(SampleDesigns.divider(0))))
        .isEmpty();
  }
}
