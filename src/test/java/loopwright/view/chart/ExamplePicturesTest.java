package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.BorderLayout;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import javax.swing.JPanel;
import javax.swing.JTabbedPane;
import loopwright.check.Findings;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.path.SignalPathPanel;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The examples as they are solved, in every picture. */
@ExtendWith(OnEventThread.class)
class ExamplePicturesTest {
  private static final Map<String, Unit> FIGURE_UNITS =
      Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit));

  private static final List<PlotSubject> SUBJECTS =
      List.of(
          new ResponsePlot(),
          new LoopGainPlot(),
          new WaveformPlot(),
          new SwingPlot(),
          new OffsetPlot(),
          new NyquistPlot(),
          new RootsPlot());

  @ParameterizedTest
  @ValueSource(
      strings = {
        "seismometer-coil",
        "hydrophone-follower",
        "measured-amplifier",
        "nine-volt-preamplifier",
        "everything-fitted"
      })
  void everyHookupHasItsPictures(String example) {
    Theme.LIGHT.apply();
    Design design =
        new DesignFile(new ShelfFile().shipped(), FIGURE_UNITS)
            .read(Path.of("examples", example + ".json"))
            .design();
    Prediction prediction = Predictor.predict(design, List.of(), new double[0], Progress.none());
    for (HookupPrediction hookup : prediction.hookups()) {
      String name = "example-" + example + "-" + hookup.hookup().name().replace(' ', '-');
      for (PlotSubject subject : SUBJECTS) {
        Picture picture = subject.picture(hookup, PlotTheme.current());
        boolean isOpen = hookup.hookup().feedback() instanceof Feedback.Open;
        boolean needsLoop =
            subject instanceof LoopGainPlot
                || subject instanceof OffsetPlot
                || subject instanceof NyquistPlot;
        assertThat(picture.chart().isPresent())
            .as(name + " " + subject.tab() + ": " + picture.sentence())
            .isEqualTo(!(isOpen && needsLoop || subject instanceof RootsPlot && !rings(hookup)));
        assertThat(picture.title() + picture.sentence()).doesNotContain("NaN", "null", "  ");
      }
      paintDeck(hookup, name);
      SignalPathPanel path = new SignalPathPanel();
      path.show(design, hookup.hookup(), Optional.of(hookup));
      path.mark(Findings.of(prediction));
      JPanel card = new JPanel(new BorderLayout());
      card.setBackground(Palette.card());
      card.add(path);
      Painting painting = Painting.of(card, 1000, 180).save(name + "-path");
      assertThat(painting.count(Palette.wire())).isGreaterThan(100);
    }
  }

  private static boolean rings(HookupPrediction hookup) {
    return hookup.overSwing().stream()
        .anyMatch(level -> level.growth().isPresent() && level.frequency().isPresent());
  }

  private static void paintDeck(HookupPrediction hookup, String name) {
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(hookup), true, "");
    JTabbedPane tabs = (JTabbedPane) deck.getComponent(0);
    for (int tab = 0; tab < tabs.getTabCount(); tab++) {
      tabs.setSelectedIndex(tab);
      Painting.of(deck, 480, 380).save(name + "-" + tab);
    }
  }
}
