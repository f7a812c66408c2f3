package loopwright.view.form;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Container;
import java.awt.event.ActionEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JTextArea;
import loopwright.assembly.Assembler;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.design.Shape;
import loopwright.file.DesignFile;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.RecordShelf;
import loopwright.part.Shelf;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Predictor;
import loopwright.quantity.Quantity;
import loopwright.session.Assessment;
import loopwright.session.Edit;
import loopwright.session.PredictionSource;
import loopwright.session.SampleDesigns;
import loopwright.session.Session;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import loopwright.task.Progress;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** The forms, driven without a display. */
@ExtendWith(OnEventThread.class)
class FormPanelTest {
  private static final String LOAD = "amplifier.gainStage.load.resistance";

  private Session session;
  private FormPanel form;
  private final List<Edit> edits = new ArrayList<>();

  @BeforeAll
  static void dress() {
    Theme.LIGHT.apply();
  }

  @BeforeEach
  void open() {
    show(SampleDesigns.coilAmplifier(), Shelf.empty(), FormPanelTest::unsolved);
  }

  private static Assessment unsolved(Design design, List<String> hookups, Progress progress) {
    throw new IllegalStateException("nobody asks for figures here");
  }

  private static Assessment solved(Design design, List<String> hookups, Progress progress) {
    return new Assessment(
        Predictor.predict(design, hookups, new double[] {1000}, progress), List.of());
  }

  private void show(Design design, Shelf shelf, PredictionSource source) {
    session = new Session(new DesignFile(shelf, Map.of()), source, new SameThreadRunner(), design);
    form =
        new FormPanel(
            shelf,
            edit -> {
              edits.add(edit);
              session.edit(edit);
            });
    form.show(session.snapshot());
    session.onChange(form::show);
    form.select("amplifier.gainStage");
  }

  @Test
  void aValueTypedAsPeopleWriteItBecomesAnEdit() {
    QuantityField field = find(LOAD, QuantityField.class);
    assertThat(field.getText()).isEqualTo("8k2");
    type(field, "9k1");
    assertThat(value(LOAD)).isEqualTo(9100);
    assertThat(field.getText()).isEqualTo("9k1");
    assertThat(edits).extracting(Edit::what).containsExactly("Resistor 9k1");
    session.undo();
    assertThat(field.getText()).isEqualTo("8k2");
    assertThat(find(LOAD, QuantityField.class)).isSameAs(field);
  }

  @Test
  void aTextThatIsNoValueStaysWithItsReasonAndEscapeBringsBackWhatCounts() {
    QuantityField field = find(LOAD, QuantityField.class);
    type(field, "8 volts");
    assertThat(edits).isEmpty();
    assertThat(field.getText()).isEqualTo("8 volts");
    JTextArea complaint = find(LOAD + ".complaint", JTextArea.class);
    assertThat(complaint.isVisible()).isTrue();
    assertThat(complaint.getText())
        .contains("found \"8 volts\"")
        .contains("expected a resistance in Ω");
    field.getActionMap().get("revert").actionPerformed(key(field));
    assertThat(field.getText()).isEqualTo("8k2");
    assertThat(complaint.isVisible()).isFalse();
  }

  @Test
  void zeroIsRefusedWhereAPartMustStand() {
    type(find(LOAD, QuantityField.class), "0");
    assertThat(edits).isEmpty();
    assertThat(find(LOAD + ".complaint", JTextArea.class).getText()).contains("more than zero");
  }

  @Test
  void arrowKeysStepThroughPreferredValuesAsOneGesture() {
    QuantityField field = find(LOAD, QuantityField.class);
    press(field, "UP");
    assertThat(value(LOAD)).isEqualTo(9100);
    press(field, "UP");
    assertThat(value(LOAD)).isEqualTo(10_000);
    press(field, "DOWN");
    press(field, "DOWN");
    press(field, "DOWN");
    assertThat(value(LOAD)).isEqualTo(7500);
    session.undo();
    assertThat(value(LOAD)).isEqualTo(8200);

    String capacitance = "amplifier.gainStage.compensation.capacitance";
    press(find(capacitance, QuantityField.class), "UP");
    assertThat(value(capacitance)).isEqualTo(39e-12);
  }

  @Test
  void anEmptyTextTakesSomethingOptionalAway() {
    form.select("feedback");
    String lower = "hookups.divider.feedback.lower";
    type(find(lower, QuantityField.class), "");
    assertThat(DesignPath.find(session.snapshot().design(), lower)).isEmpty();
    assertThat(find(lower, QuantityField.class).getText()).isEmpty();
  }

  @Test
  void anotherKindBringsItsOwnFieldsAndTheDesignStillSolves() {
    show(SampleDesigns.coilAmplifier(), Shelf.empty(), FormPanelTest::solved);
    choose(find("amplifier.gainStage.load", JComboBox.class), "two transistors");
    assertThat(find("amplifier.gainStage.load.senseResistance", QuantityField.class).getText())
        .isEqualTo("620");
    JComboBox<?> part = find("amplifier.gainStage.load.transistor", JComboBox.class);
    assertThat(choices(part)).containsExactly("npn small-signal");
    assertThat(session.snapshot().prediction().flatMap(HookupPrediction::rest)).isPresent();
    assertThat(edits).extracting(Edit::what).containsExactly("Load two transistors");
  }

  @Test
  void whatIsFittedCanBeTakenOutAndPutBack() {
    String compensation = "amplifier.gainStage.compensation";
    JCheckBox fitted = find(compensation, JCheckBox.class);
    assertThat(fitted.isSelected()).isTrue();
    fitted.doClick();
    assertThat(DesignPath.find(session.snapshot().design(), compensation)).isEmpty();
    find(compensation, JCheckBox.class).doClick();
    assertThat(value(compensation + ".capacitance")).isEqualTo(33e-12);
    assertThat(edits)
        .extracting(Edit::what)
        .containsExactly("Take out compensation", "Fit compensation");
  }

  @Test
  void everyVariantAndEveryBlockCanBeChosenAndComesToRest() {
    Design opened = session.snapshot().design();
    RowEdits maker = new RowEdits(() -> opened, shelfWithDiode(), new Labels(), edits::add);
    int tried = 0;
    for (Block block : Block.of(opened, "divider")) {
      for (Row row : Row.of(opened, block.path())) {
        if (row.field().shape() == Shape.FAMILY) {
          for (Class<?> variant : row.field().variants()) {
            assertThat(maker.chosen(row, variant)).isEmpty();
            tried++;
          }
        } else if (row.field().shape() == Shape.BLOCK) {
          assertThat(maker.fitted(row, true)).isEmpty();
          tried++;
        }
      }
    }
    assertThat(edits).hasSize(tried).hasSizeGreaterThan(20);
    for (Edit edit : edits) {
      Hookup hookup = edit.after().hookup("divider").orElseThrow();
      assertThat(OperatingPointSolver.solve(Assembler.assemble(edit.after(), hookup).circuit()))
          .as(edit.what())
          .isInstanceOf(OperatingPoint.Found.class);
    }
  }

  @Test
  void aPartFromTheShelfComesIntoTheDesign() {
    Design design = SampleDesigns.coilAmplifier();
    show(
        design,
        new RecordShelf(
            Map.of(
                "other pnp",
                design.parts().get("pnp small-signal"),
                "other npn",
                design.parts().get("npn small-signal"))),
        FormPanelTest::unsolved);
    JComboBox<?> part = find("amplifier.gainStage.transistor", JComboBox.class);
    assertThat(choices(part)).containsExactly("pnp small-signal", "other pnp");
    choose(part, "other pnp");
    assertThat(session.snapshot().design().parts()).containsKey("other pnp");
  }

  @Test
  void theDevicesOfTheStageAreShownAtRest() {
    show(SampleDesigns.coilAmplifier(), Shelf.empty(), FormPanelTest::solved);
    List<String> texts = texts(find("atRest", Container.class));
    assertThat(texts)
        .contains("At rest", "gain stage", "Collector current", "1.54 mA", "Collector–emitter");
    form.select("source");
    assertThat(texts(find("atRest", Container.class))).isEmpty();
  }

  @Test
  void everyBlockOfTheDesignCanBeChosen() {
    List<String> chosen = new ArrayList<>();
    form.onSelect(chosen::add);
    JComboBox<?> chooser = find("block", JComboBox.class);
    assertThat(choices(chooser))
        .containsExactly(
            "Source",
            "Input pair",
            "Tail",
            "Gain stage",
            "Gain-stage load",
            "Output stage",
            "Feedback",
            "Load",
            "Supply",
            "Surroundings");
    for (int i = 0; i < chooser.getItemCount(); i++) {
      chooser.setSelectedIndex(i);
    }
    assertThat(chosen).hasSize(chooser.getItemCount()).contains("amplifier.inputPair.tail");
  }

  private static Shelf shelfWithDiode() {
    return new RecordShelf(
        Map.of(
            "small diode",
            new DiodeRecord(
                Optional.of(
                    new DiodeModel(
                        Optional.of(Quantity.of(4e-9)),
                        Optional.of(Quantity.of(1.9)),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty())),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                List.of())));
  }

  private double value(String path) {
    return ((PartValue) DesignPath.get(session.snapshot().design(), path)).effective();
  }

  private static void type(QuantityField field, String text) {
    field.setText(text);
    field.postActionEvent();
  }

  private static void press(QuantityField field, String key) {
    field.getActionMap().get(key).actionPerformed(key(field));
  }

  private static ActionEvent key(Component source) {
    return new ActionEvent(source, ActionEvent.ACTION_PERFORMED, "key");
  }

  private static void choose(JComboBox<?> box, String says) {
    for (int i = 0; i < box.getItemCount(); i++) {
      if (box.getItemAt(i).toString().equals(says)) {
        box.setSelectedIndex(i);
        return;
      }
    }
    throw new AssertionError(says + " is not among " + choices(box));
  }

  private static List<String> choices(JComboBox<?> box) {
    List<String> choices = new ArrayList<>();
    for (int i = 0; i < box.getItemCount(); i++) {
      choices.add(box.getItemAt(i).toString());
    }
    return choices;
  }

  private static List<String> texts(Container container) {
    List<String> texts = new ArrayList<>();
    for (Component child : container.getComponents()) {
      if (child instanceof JLabel label && !label.getText().isEmpty()) {
        texts.add(label.getText());
      }
    }
    return texts;
  }

  private <C> C find(String name, Class<C> type) {
    return Lookup.named(form, name, type);
  }
}
