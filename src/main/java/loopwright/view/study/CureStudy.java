package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JTextField;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.predict.FigureValue;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.sizing.Cure;
import loopwright.sizing.CureSearch;
import loopwright.sizing.Cures;
import loopwright.view.theme.Theme;

/** What cures an oscillation, way by way, and what each costs. */
public final class CureStudy extends Study {
  private static final List<String> COLUMNS =
      List.of(
          "Cure", "Margin", "At corners", "Slew up", "Slew down", "Noise", "Offset", "Loop gain");

  private static final double MOST = 90;

  private final transient Desk desk;
  private final JTextField margin = new JTextField("60");
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;

  /**
   * @param desk the window's session
   */
  public CureStudy(Desk desk) {
    super("Cure an oscillation");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Search cures", 'C', this::find);
    table = new ProposalTable("Cures", COLUMNS, this::apply);
    margin.setName("margin");
    where.setName("where");
    add(new Inputs().field("Phase margin at every level, degrees", 'P', margin, 70).own(where));
    add(bar);
    add(table, "hmin 220");
    table.show(
        List.of(),
        "Every way that the trade knows is tried from its gentlest value up, until the margin holds at"
            + " every level of the swing, with nominal parts and at the tolerance corners.");
    show(desk.now().get());
  }

  @Override
  public void show(Snapshot snapshot) {
    where.setText("in hookup " + snapshot.hookup());
  }

  @Override
  public JButton defaultButton() {
    return bar.startButton();
  }

  private void find() {
    Snapshot now = desk.now().get();
    double wanted;
    try {
      wanted = Numbers.read("Phase margin", margin.getText(), Unit.DEGREE);
    } catch (QuantityException e) {
      bar.complain(e.getMessage());
      return;
    }
    if (!(wanted > 0 && wanted <= MOST)) {
      bar.complain("Phase margin: found " + margin.getText() + ", expected above 0 and at most 90");
      return;
    }
    bar.run(
        progress -> CureSearch.of(now.design(), now.hookup(), wanted, progress), this::showCures);
  }

  private void showCures(Cures cures) {
    List<Proposal> rows = new ArrayList<>();
    cures.cures().forEach(cure -> rows.add(row(cure)));
    cures.cannot().forEach(cannot -> rows.add(row(cannot)));
    table.show(rows, "No way is open here.");
  }

  private static Proposal row(Cure cure) {
    String changes =
        cure.changes().stream()
            .map(change -> change.path() + " = " + change.value())
            .collect(Collectors.joining(", "));
    return new Proposal(
        List.of(
            cure.kind(),
            Numbers.text(cure.worstPhaseMargin(), Unit.DEGREE),
            Numbers.text(cure.cornerPhaseMargin(), Unit.DEGREE),
            figure(cure, "slewRising", Unit.VOLT_PER_SECOND),
            figure(cure, "slewFalling", Unit.VOLT_PER_SECOND),
            figure(cure, "inputNoise", Unit.VOLT_PER_ROOT_HERTZ),
            figure(cure, "outputOffset", Unit.VOLT),
            figure(cure, "loopGainAtSignal", Unit.ONE)),
        cure.says() + "\n" + changes,
        cure.changes());
  }

  private static Proposal row(Cures.Cannot cannot) {
    List<String> cells = new ArrayList<>();
    cells.add(cannot.kind());
    while (cells.size() < COLUMNS.size()) {
      cells.add("—");
    }
    return new Proposal(cells, "Does not lead there: " + cannot.says() + ".", List.of());
  }

  private static String figure(Cure cure, String key, Unit unit) {
    FigureValue value = cure.figures().get(key);
    return Numbers.text(value == null ? OptionalDouble.empty() : value.number(), unit);
  }

  private void apply(Proposal proposal) {
    Design design = desk.now().get().design();
    desk.edit()
        .accept(
            Edit.of(
                "Cure by " + proposal.cells().get(0), Change.applyAll(design, proposal.changes())));
  }
}
