package loopwright.view.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Container;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JTabbedPane;
import javax.swing.JTextArea;
import javax.swing.SwingUtilities;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** The studies draw what they worked out, a tab for each plot, in both themes. */
@ExtendWith(OnEventThread.class)
class ResultPicturesTest {
  private static Session session(String example) {
    DesignFile files =
        new DesignFile(
            new ShelfFile().shipped(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    return new Session(
        files,
        (design, hookups, progress) ->
            new Assessment(
                Predictor.predict(design, hookups, new double[] {1e3}, progress), List.of()),
        new SameThreadRunner(),
        Path.of("examples", example + ".json"));
  }

  private static Desk desk(String example) {
    Session session = session(example);
    return new Desk(session::snapshot, session::edit, SameThreadRunner::new);
  }

  /** Runs a study and paints each of its tabs; how many plots it has. */
  private static int painted(Study study, String name) throws Exception {
    Lookup.named(study, "start", JButton.class).doClick();
    JTabbedPane tabs = Lookup.named(study, "results", JTabbedPane.class);
    for (Theme theme : Theme.values()) {
      theme.apply();
      SwingUtilities.updateComponentTreeUI(study);
      String end = "-" + theme.name().toLowerCase(Locale.ROOT);
      for (int k = 0; k < tabs.getTabCount(); k++) {
        tabs.setSelectedIndex(k);
        Painting.of(study, 980, 560).save(name + end + "-" + k);
      }
    }
    return tabs.getTabCount() - 1;
  }

  @Test
  void anOscillatingFollowerIsDrawn() throws Exception {
    Theme.LIGHT.apply();
    assertThat(painted(new TimeStudy(desk("hydrophone-follower")), "result.time")).isEqualTo(7);
    assertThat(painted(new StabilityStudy(desk("hydrophone-follower")), "result.stability"))
        .isGreaterThan(5);
    assertThat(painted(new HeatStudy(desk("everything-fitted")), "result.heat")).isEqualTo(1);
  }

  @Test
  void aStableAmplifierIsDrawn() throws Exception {
    Theme.LIGHT.apply();
    assertThat(painted(new TimeStudy(desk("seismometer-coil")), "result.time-stable")).isEqualTo(5);
    assertThat(painted(new SpectrumStudy(desk("seismometer-coil")), "result.spectra-stable"))
        .isEqualTo(4);
    assertThat(painted(new DistortionStudy(desk("seismometer-coil")), "result.distortion-stable"))
        .isEqualTo(4);
  }

  /** The follower's input pair is driven so far that its output goes to the other rail. */
  @Test
  void anOverloadThatTurnsThePhaseRoundIsSaid() {
    Theme.LIGHT.apply();
    TimeStudy study = new TimeStudy(desk("hydrophone-follower"));
    Lookup.named(study, "start", JButton.class).doClick();
    JTabbedPane tabs = Lookup.named(study, "results", JTabbedPane.class);
    tabs.setSelectedIndex(tabs.indexOfTab("Clipping above"));
    Container front = (Container) tabs.getSelectedComponent();
    assertThat(Lookup.named(front, "title", JTextArea.class).getText())
        .startsWith("Held at \u2212");
    assertThat(Lookup.named(front, "sentence", JTextArea.class).getText())
        .startsWith("The output goes the wrong way");
  }

  /** Where something grows there is no steady state: the plots say so and show no curve. */
  @Test
  void withoutASteadyStateThePlotsSayWhy() throws Exception {
    Theme.LIGHT.apply();
    DistortionStudy study = new DistortionStudy(desk("hydrophone-follower"));
    painted(study, "result.distortion-none");
    JTabbedPane tabs = Lookup.named(study, "results", JTabbedPane.class);
    tabs.setSelectedIndex(0);
    Component front = tabs.getSelectedComponent();
    assertThat(Lookup.named((Container) front, "title", JTextArea.class).getText())
        .isEqualTo("No steady state");
  }
}
