package loopwright.view.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.Rectangle;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import javax.swing.UIManager;
import loopwright.check.Findings;
import loopwright.design.Reading;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupFigures;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The studies work something out, show it, and make the edit that is chosen. */
@ExtendWith(OnEventThread.class)
class StudyTest {
  private static Session session(String example) {
    DesignFile files =
        new DesignFile(
            new ShelfFile().shipped(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    return new Session(
        files,
        (design, hookups, progress) -> {
          Prediction prediction = Predictor.predict(design, hookups, new double[0], progress);
          return new Assessment(prediction, Findings.of(prediction));
        },
        new SameThreadRunner(),
        Path.of("examples", example + ".json"));
  }

  private static Desk desk(Session session) {
    return new Desk(session::snapshot, session::edit, SameThreadRunner::new);
  }

  private static void click(Study study, String name) {
    Lookup.named(study, name, JButton.class).doClick();
  }

  private static JTable table(Study study) {
    return Lookup.named(study, "proposals", JTable.class);
  }

  private static String words(Study study) {
    return Lookup.named(study, "words", JTextArea.class).getText();
  }

  @Test
  void aDividerIsRankedAndApplied() {
    Session session = session("measured-amplifier");
    DividerStudy study = new DividerStudy(desk(session));
    Lookup.named(study, "gain", JTextField.class).setText("22");
    click(study, "start");

    assertThat(table(study).getRowCount()).isGreaterThan(10);
    assertThat(words(study)).contains("Score: ", "Gives up ");
    click(study, "apply");

    assertThat(session.snapshot().undoable().orElseThrow()).startsWith("Set the divider");
    double gain =
        HookupFigures.of(session.snapshot().design(), session.snapshot().hookup())
            .solved(Catalogue.find("closedLoopGain").orElseThrow())
            .number()
            .orElseThrow();
    assertThat(gain).isEqualTo(22, within(1.0));
    session.undo();
    assertThat(session.snapshot().unsaved()).isFalse();
  }

  @Test
  void aGainThatIsNoNumberIsSaidInWords() {
    DividerStudy study = new DividerStudy(desk(session("measured-amplifier")));
    Lookup.named(study, "gain", JTextField.class).setText("lots");
    click(study, "start");
    assertThat(Lookup.named(study, "says", JLabel.class).getText())
        .startsWith("Wanted gain: found \"lots\"");
    assertThat(table(study).getRowCount()).isZero();
  }

  @Test
  void aDrawerThatIsEmptyIsSaidInWords() {
    DividerStudy study = new DividerStudy(desk(session("hydrophone-follower")));
    Lookup.named(study, "gain", JTextField.class).setText("11");
    Lookup.named(study, "series", JComboBox.class).setSelectedItem("drawer");
    click(study, "start");
    assertThat(Lookup.named(study, "says", JLabel.class).getText())
        .contains("drawer.resistors: found no resistors");
  }

  @Test
  void aReadingIsAddedComparedAndRemoved() {
    Session session = session("measured-amplifier");
    int before = session.snapshot().design().bench().readings().size();
    BenchStudy study = new BenchStudy(desk(session));
    session.onChange(study::show);
    JComboBox<?> quantity = Lookup.named(study, "quantity", JComboBox.class);
    quantity.setSelectedIndex(1);
    Lookup.named(study, "value", JTextField.class).setText("21,5");
    click(study, "add");

    Reading added = session.snapshot().design().bench().readings().get(before);
    assertThat(added.quantity()).isEqualTo("gain");
    assertThat(added.value().value()).isEqualTo(21.5);
    click(study, "start");
    assertThat(table(study).getRowCount()).isEqualTo(before + 1);
    assertThat((String) table(study).getValueAt(before, 7))
        .containsAnyOf("agrees", "does not agree");
    assertThat(Lookup.named(study, "set", JTextArea.class).getText())
        .contains("with the prediction");

    table(study).setRowSelectionInterval(before, before);
    click(study, "remove");
    assertThat(session.snapshot().design().bench().readings()).hasSize(before);
  }

  @Test
  void aReadingThatIsNoNumberIsSaidInWords() {
    BenchStudy study = new BenchStudy(desk(session("measured-amplifier")));
    Lookup.named(study, "value", JTextField.class).setText("about three");
    click(study, "add");
    assertThat(Lookup.named(study, "complaint", JLabel.class).getText())
        .startsWith("Node voltage: found \"about three\"");
  }

  @Test
  void stabilityIsShownAgainstOneValueAfterTheOther() {
    StabilityStudy study = new StabilityStudy(desk(session("measured-amplifier")));
    click(study, "start");
    assertThat(table(study).getRowCount()).isGreaterThan(30);
    assertThat(words(study)).contains("Load capacitance: ");
    Painting.of(study, 980, 560).save("study.stability-light");
  }

  @Test
  void bandsAreSampled() {
    SpreadStudy study = new SpreadStudy(desk(session("measured-amplifier")));
    Lookup.named(study, "samples", JTextField.class).setText("60");
    click(study, "start");
    assertThat(table(study).getRowCount()).isGreaterThan(8);
    assertThat(words(study)).contains("Yield");
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void everyStudyIsPainted(Theme theme) throws Exception {
    theme.apply();
    Session session = session("seismometer-coil");
    Desk desk = desk(session);
    Painting.of(new WholeStudy(desk, new ShelfFile().shipped()), 980, 560)
        .save("study.whole-design-" + theme.name().toLowerCase(Locale.ROOT));
    Study[] studies = {
      new DividerStudy(desk),
      new CureStudy(desk),
      new SpreadStudy(desk),
      new BenchStudy(desk),
      new HeatStudy(desk)
    };
    Lookup.named(studies[2], "samples", JTextField.class).setText("40");
    Lookup.named(studies[1], "margin", JTextField.class).setText("80");
    for (Study study : studies) {
      click(study, "start");
      Painting painting =
          Painting.of(study, 980, 560)
              .save(study.getName() + "-" + theme.name().toLowerCase(Locale.ROOT));
      Color ground = UIManager.getColor("Panel.background");
      assertThat(painting.countOther(ground, new Rectangle(0, 0, 980, 560)))
          .as(study.title())
          .isGreaterThan(5000);
      assertThat(table(study).getRowCount()).as(study.title()).isPositive();
    }
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void theSchematicIsDrawnAndWalked(Theme theme) throws Exception {
    theme.apply();
    SchematicStudy study = new SchematicStudy(desk(session("hydrophone-follower")));
    Painting painting =
        Painting.of(study, 980, 560)
            .save("study.schematic-" + theme.name().toLowerCase(Locale.ROOT));
    assertThat(painting.countOther(Palette.card(), new Rectangle(20, 90, 940, 450)))
        .isGreaterThan(4000);
    click(study, "next");
    String first = Lookup.named(study, "where", JLabel.class).getText();
    click(study, "next");
    assertThat(Lookup.named(study, "where", JLabel.class).getText()).isNotEqualTo(first);
  }
}
