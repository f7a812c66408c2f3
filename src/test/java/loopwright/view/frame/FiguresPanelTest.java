package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.util.List;
import java.util.Optional;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.session.Edit;
import loopwright.session.Predictions;
import loopwright.session.SampleDesigns;
import loopwright.session.Session;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.frame.FigureCell.Tone;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** The figures in three columns. */
@ExtendWith(OnEventThread.class)
class FiguresPanelTest {
  private FiguresPanel panel;
  private JTable table;

  @BeforeAll
  static void dress() {
    Theme.LIGHT.apply();
  }

  private Session show(Session session) {
    panel = new FiguresPanel(session::measure);
    panel.show(session.snapshot());
    session.onChange(panel::show);
    table = Lookup.named(panel, "figures", JTable.class);
    return session;
  }

  @Test
  void everyFigureOfTheCatalogueHasItsRow() {
    show(SampleSessions.quick());
    assertThat(table.getRowCount()).isEqualTo(Catalogue.figures().size());
    for (int row = 0; row < table.getRowCount(); row++) {
      assertThat(cell(row, FiguresModel.NAME).text()).isNotBlank();
      assertThat(cell(row, FiguresModel.NAME).hover()).contains("<p>");
    }
    assertThat(cell(0, FiguresModel.NAME).text()).isEqualTo("Closed-loop gain");
  }

  @Test
  void figuresFollowTheEdit() {
    Session session = show(SampleSessions.quick());
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("8.2");
    assertThat(cell(0, FiguresModel.SOLVED).tone()).isEqualTo(Tone.STRONG);
    session.edit(
        Edit.of("Load 10k", SampleDesigns.withGainLoad(session.snapshot().design(), "10k")));
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("10");
    session.undo();
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("8.2");
  }

  @Test
  void aMeasuredValueIsTypedIntoTheThirdColumn() {
    Session session = show(SampleSessions.quick());
    type(0, "8,1");
    List<Reading> readings = session.snapshot().design().bench().readings();
    assertThat(readings).hasSize(1);
    assertThat(readings.get(0).quantity()).isEqualTo("closedLoopGain");
    assertThat(readings.get(0).hookup()).contains("divider");
    assertThat(readings.get(0).value().value()).isEqualTo(8.1);
    assertThat(cell(0, FiguresModel.MEASURED).text()).isEqualTo("8.1");
    assertThat(cell(0, FiguresModel.MEASURED).hover()).contains("1.2 % below the solution");

    type(0, "");
    assertThat(session.snapshot().design().bench().readings()).isEmpty();
    assertThat(cell(0, FiguresModel.MEASURED).text()).isEqualTo("—");
  }

  @Test
  void aReadingBelongsToItsHookup() {
    Session session = show(SampleSessions.quick());
    type(0, "8.1");
    session.choose("follower");
    assertThat(cell(0, FiguresModel.MEASURED).text()).isEqualTo("—");
    session.choose("divider");
    assertThat(cell(0, FiguresModel.MEASURED).text()).isEqualTo("8.1");
  }

  @Test
  void whatIsNoValueOfTheFigureIsRefusedWithTheReason() {
    Session session = show(SampleSessions.quick());
    int offset = row("outputOffset");
    table.editCellAt(offset, FiguresModel.MEASURED);
    JTextField field = (JTextField) table.getEditorComponent();
    field.setText("12 Hz");
    assertThat(table.getCellEditor().stopCellEditing()).isFalse();
    JTextArea complaint = Lookup.named(panel, "figures.complaint", JTextArea.class);
    assertThat(complaint.isVisible()).isTrue();
    assertThat(complaint.getText())
        .startsWith("Output offset: found \"12 Hz\", expected a voltage");
    table.getCellEditor().cancelCellEditing();
    assertThat(complaint.isVisible()).isFalse();
    assertThat(session.snapshot().design().bench().readings()).isEmpty();
  }

  @Test
  void onlyTheThirdColumnTakesValues() {
    show(SampleSessions.quick());
    assertThat(table.isCellEditable(0, FiguresModel.MEASURED)).isTrue();
    assertThat(table.isCellEditable(0, FiguresModel.SOLVED)).isFalse();
    assertThat(table.isCellEditable(0, FiguresModel.FORMULA)).isFalse();
    assertThat(table.isCellEditable(0, FiguresModel.NAME)).isFalse();
  }

  @Test
  void aFailedSolveIsShownInPlaceAndNeverLooksFresh() {
    Session session =
        show(
            SampleSessions.with(
                (design, hookups, progress) -> {
                  if (design.equals(SampleDesigns.coilAmplifier())) {
                    return Predictions.assess(design, hookups);
                  }
                  throw new IllegalStateException("no operating point was found");
                }));
    session.edit(
        Edit.of("Load 10k", SampleDesigns.withGainLoad(session.snapshot().design(), "10k")));
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("—");
    assertThat(cell(0, FiguresModel.SOLVED).hover()).contains("no operating point was found");
    assertThat(cell(0, FiguresModel.SOLVED).tone()).isEqualTo(Tone.QUIET);
    JTextArea note = Lookup.named(panel, "figures.note", JTextArea.class);
    assertThat(note.isVisible()).isTrue();
    assertThat(note.getText()).isEqualTo("Not solved: no operating point was found");
  }

  @Test
  void whileItSolvesOldFiguresAreGreyAndSayTheirAge() {
    WaitingRunner runner = new WaitingRunner();
    Session session =
        show(
            new Session(
                SampleSessions.files(),
                (design, hookups, progress) -> Predictions.assess(design, hookups),
                runner,
                SampleDesigns.coilAmplifier()));
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("—");
    runner.finish();
    assertThat(cell(0, FiguresModel.SOLVED).tone()).isEqualTo(Tone.STRONG);
    session.edit(
        Edit.of("Load 10k", SampleDesigns.withGainLoad(session.snapshot().design(), "10k")));
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("8.2");
    assertThat(cell(0, FiguresModel.SOLVED).tone()).isEqualTo(Tone.QUIET);
    JTextArea note = Lookup.named(panel, "figures.note", JTextArea.class);
    assertThat(note.isVisible()).isTrue();
    assertThat(note.getText()).contains("earlier edit");
    runner.finish();
    assertThat(cell(0, FiguresModel.SOLVED).text()).isEqualTo("10");
    assertThat(cell(0, FiguresModel.SOLVED).tone()).isEqualTo(Tone.STRONG);
    assertThat(note.isVisible()).isFalse();
  }

  @Test
  void formulaAndSolutionThatPartAreMarkedNotByColourAlone() {
    show(
        SampleSessions.with(
            (design, hookups, progress) ->
                Predictions.assess(design, hookups, formula -> formula * 1.25)));
    FigureCell formula = cell(0, FiguresModel.FORMULA);
    assertThat(formula.tone()).isEqualTo(Tone.RISKY);
    assertThat(formula.text()).isEqualTo("≠ 10.25");
    assertThat(formula.hover()).contains("25 % above the solution");
    Component painted =
        table
            .getCellRenderer(0, FiguresModel.FORMULA)
            .getTableCellRendererComponent(table, formula, false, false, 0, FiguresModel.FORMULA);
    assertThat(painted.getForeground()).isEqualTo(Palette.risky());
  }

  @Test
  void distortionReadsInPerCent() {
    assertThat(FigureText.shortly(Catalogue.find("thd").orElseThrow(), 0.00163))
        .isEqualTo("0.163 %");
    assertThat(FigureText.shortly(Catalogue.find("outputOffset").orElseThrow(), -0.0598123))
        .isEqualTo("−59.81 mV");
    assertThat(FigureText.fully(Catalogue.find("outputOffset").orElseThrow(), -0.0598123))
        .isEqualTo("−59.8123 mV");
  }

  private FigureCell cell(int row, int column) {
    return (FigureCell) table.getValueAt(row, column);
  }

  private int row(String key) {
    for (int row = 0; row < table.getRowCount(); row++) {
      if (((FiguresModel) table.getModel()).figure(row).key().equals(key)) {
        return row;
      }
    }
    throw new AssertionError("no row for " + key);
  }

  private void type(int row, String text) {
    assertThat(table.editCellAt(row, FiguresModel.MEASURED)).isTrue();
    ((JTextField) table.getEditorComponent()).setText(text);
    assertThat(Optional.of(table.getCellEditor().stopCellEditing())).contains(true);
  }
}
