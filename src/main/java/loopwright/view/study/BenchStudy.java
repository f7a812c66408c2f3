package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import loopwright.bench.BenchComparison;
import loopwright.bench.Comparison;
import loopwright.bench.Explanation;
import loopwright.bench.Explanations;
import loopwright.bench.FaultSearch;
import loopwright.bench.ReadingUnit;
import loopwright.bench.ReadingVerdict;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Reading;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** The readings beside their prediction, verdicts, and what explains them. */
public final class BenchStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Reading", "Measured", "±", "Predicted", "Low", "High", "E_n", "Verdict");

  private final transient Desk desk;
  private final WorkBar bar;
  private final ProposalTable table;
  private final ReadingEntry entry;
  private final JTextArea set = Theme.style(new JTextArea(), "says");
  private transient Design compared;

  /**
   * @param desk the window's session
   */
  public BenchStudy(Desk desk) {
    super("Bench");
    this.desk = desk;
    entry = new ReadingEntry(desk.now(), this::add);
    bar = new WorkBar(desk.runners().get(), "Compare", 'C', this::compare);
    table = new ProposalTable("Readings", COLUMNS, proposal -> {}).withoutApply();
    set.setName("set");
    set.setEditable(false);
    set.setLineWrap(true);
    set.setWrapStyleWord(true);
    set.setRows(5);
    add(entry);
    add(buttons());
    add(table, "hmin 200");
    add(new JScrollPane(set), "growx, h 110!");
    show(desk.now().get());
  }

  private JPanel buttons() {
    JPanel buttons =
        Theme.style(new JPanel(new MigLayout("insets 0, fillx", "[grow,fill][][]")), "plain");
    JButton explain = Theme.style(new JButton("Explain"), "pill");
    explain.setName("explain");
    explain.setMnemonic('X');
    explain.setToolTipText("What would make all these readings what they are");
    explain.addActionListener(event -> explain());
    JButton remove = Theme.style(new JButton("Remove reading"), "pill");
    remove.setName("remove");
    remove.setMnemonic('R');
    remove.addActionListener(event -> remove());
    buttons.add(bar, "wmin 0");
    buttons.add(explain);
    buttons.add(remove);
    return buttons;
  }

  @Override
  public void show(Snapshot snapshot) {
    entry.show(snapshot);
    if (compared == null || !compared.equals(snapshot.design())) {
      compared = null;
      table.show(
          snapshot.design().bench().readings().stream().map(BenchStudy::unjudged).toList(),
          "Type what meter and scope show: quantity, place, value, instrument. Readings are kept in the"
              + " design file.");
      set.setText("");
    }
  }

  @Override
  public JButton defaultButton() {
    return bar.startButton();
  }

  private void compare() {
    Design design = desk.now().get().design();
    bar.run(
        progress -> BenchComparison.of(design, progress),
        comparison -> {
          compared = design;
          showCompared(comparison);
        });
  }

  private void showCompared(Comparison comparison) {
    table.show(
        comparison.readings().stream().map(BenchStudy::row).toList(),
        "There are no readings to compare.");
    List<String> says = new ArrayList<>();
    says.add(comparison.set().says());
    says.addAll(comparison.implied());
    says.addAll(comparison.suspects());
    tell(String.join("\n", says));
  }

  private void explain() {
    Design design = desk.now().get().design();
    bar.run(progress -> FaultSearch.of(design, progress), this::showExplained);
  }

  private void showExplained(Explanations explanations) {
    List<String> says = new ArrayList<>();
    for (Explanation explanation : explanations.explanations()) {
      says.add(
          EngineeringFormat.percent(Math.rint(1e4 * explanation.probability()) / 1e4)
              + "  "
              + explanation.says()
              + (explanation.alike().isEmpty()
                  ? ""
                  : " (or " + String.join(", ", explanation.alike()) + ")"));
    }
    explanations.next().ifPresent(next -> says.add(next.says()));
    if (says.isEmpty()) {
      says.add(explanations.says());
    }
    tell(String.join("\n", says));
  }

  private void tell(String text) {
    set.setText(text);
    set.setCaretPosition(0);
  }

  private static Proposal row(ReadingVerdict verdict) {
    Unit unit = ReadingUnit.of(verdict.reading());
    return new Proposal(
        List.of(
            ReadingWords.of(verdict.reading()),
            Numbers.text(verdict.measured(), unit),
            EngineeringFormat.format(verdict.measuredUncertainty(), unit, 2),
            Numbers.text(verdict.predicted().number(), unit),
            Numbers.text(verdict.predictedLow(), unit),
            Numbers.text(verdict.predictedHigh(), unit),
            Numbers.text(verdict.en(), Unit.ONE),
            verdict
                .agrees()
                .map(agrees -> agrees ? "agrees" : "does not agree")
                .orElse("not judged")),
        verdict.says(),
        List.of());
  }

  private static Proposal unjudged(Reading reading) {
    return new Proposal(
        List.of(
            ReadingWords.of(reading),
            Numbers.text(reading.value().value(), ReadingUnit.of(reading)),
            "—",
            "—",
            "—",
            "—",
            "—",
            "not compared yet"),
        reading.note().orElse(""),
        List.of());
  }

  private void add(Reading reading) {
    Design design = desk.now().get().design();
    List<Reading> readings = new ArrayList<>(design.bench().readings());
    readings.add(reading);
    edit("Add the reading " + ReadingWords.of(reading), readings);
  }

  private void remove() {
    List<Reading> readings = new ArrayList<>(desk.now().get().design().bench().readings());
    int row = table.chosenRow();
    if (row < 0 || row >= readings.size()) {
      bar.complain("Choose the reading that is to be removed.");
      return;
    }
    Reading removed = readings.remove(row);
    edit("Remove the reading " + ReadingWords.of(removed), readings);
  }

  private void edit(String what, List<Reading> readings) {
    Design design = desk.now().get().design();
    desk.edit().accept(Edit.of(what, DesignPath.set(design, "bench.readings", readings)));
  }
}
