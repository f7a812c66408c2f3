package loopwright.view.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import loopwright.check.Findings;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** From a specification to a design, and from a design to its trims, as a person goes. */
@ExtendWith(OnEventThread.class)
class FirstDesignStudyTest {
  private static final Shelf SHELF = new ShelfFile().shipped();

  private final List<Design> opened = new ArrayList<>();
  private final Session session =
      new Session(
          new DesignFile(
              SHELF,
              Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit))),
          (design, hookups, progress) -> {
            Prediction prediction =
                Predictor.predict(design, hookups, new double[] {1e3}, progress);
            return new Assessment(prediction, Findings.of(prediction));
          },
          new SameThreadRunner(),
          Path.of("examples", "seismometer-coil.json"));
  private final Desk desk = new Desk(session::snapshot, session::edit, SameThreadRunner::new);

  private static void type(Study study, String field, String text) {
    Lookup.named(study, field, JTextField.class).setText(text);
  }

  private static JButton button(Study study, String name) {
    return Lookup.named(study, name, JButton.class);
  }

  @Test
  void aSpecificationBecomesADesign() {
    FirstDesignStudy study = new FirstDesignStudy(desk, SHELF, opened::add);
    type(study, "gain", "1");
    type(study, "load", "2k");
    button(study, "start").doClick();

    JTable table = Lookup.named(study, "proposals", JTable.class);
    assertThat(Lookup.named(study, "words", JTextArea.class).getText())
        .startsWith("Every demand is met");
    assertThat(table.getRowCount()).isGreaterThan(20);
    assertThat(table.getValueAt(1, 0)).isEqualTo("Gain");
    assertThat(table.getValueAt(1, 3)).isEqualTo("met");
    assertThat(button(study, "open").isEnabled()).isTrue();
    button(study, "open").doClick();
    assertThat(opened).hasSize(1);
  }

  @Test
  void whatCannotBeIsSaidAndNothingOpens() {
    FirstDesignStudy study = new FirstDesignStudy(desk, SHELF, opened::add);
    type(study, "swing", "14");
    button(study, "start").doClick();
    assertThat(Lookup.named(study, "words", JTextArea.class).getText())
        .contains("No design is offered", "3 V too little");
    assertThat(button(study, "open").isEnabled()).isFalse();

    type(study, "swing", "much");
    button(study, "start").doClick();
    assertThat(Lookup.named(study, "says", JLabel.class).getText())
        .startsWith("Swing, peak: found \"much\"");
    type(study, "swing", "5");
    type(study, "parts", "BC547B, nothing");
    button(study, "start").doClick();
    assertThat(Lookup.named(study, "says", JLabel.class).getText())
        .contains("found \"nothing\", expected a name from the shelf");
    assertThat(opened).isEmpty();
  }

  @Test
  void theBestTrimIsAppliedAndUndone() {
    TrimStudy study = new TrimStudy(desk);
    button(study, "start").doClick();
    assertThat(Lookup.named(study, "proposals", JTable.class).getRowCount()).isGreaterThan(5);
    assertThat(Lookup.named(study, "words", JTextArea.class).getText())
        .startsWith("Best single change: ");
    button(study, "apply").doClick();
    assertThat(session.snapshot().undoable().orElseThrow()).startsWith("Trim amplifier.");
    session.undo();
    assertThat(session.snapshot().unsaved()).isFalse();
  }
}
