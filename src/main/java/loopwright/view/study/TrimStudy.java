package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.propose.Trim;
import loopwright.propose.TrimAdvice;
import loopwright.quantity.Unit;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;

/** Which resistor trims output offset and gain, which way and how much. */
public final class TrimStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Resistor", "Present", "Offset per %", "Gain per %", "For no offset");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;

  /**
   * @param desk the window's session
   */
  public TrimStudy(Desk desk) {
    super("Trim offset and gain");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Work out trims", 'W', this::find);
    table = new ProposalTable("Trims", COLUMNS, this::apply);
    where.setName("where");
    add(where);
    add(bar);
    add(table, "hmin 220");
    table.show(
        List.of(),
        "What one per cent more of each resistor does to the output offset and to the gain, signed,"
            + " the strongest on the offset first; and the single change in values of the drawer,"
            + " else of E24, that leaves the least offset, ready to apply.");
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
    bar.run(progress -> TrimAdvice.of(now.design(), now.hookup(), progress), this::showAdvice);
  }

  private void showAdvice(TrimAdvice advice) {
    Map<String, Trim> gains =
        advice.gainTrims().stream().collect(Collectors.toMap(Trim::path, Function.identity()));
    List<Proposal> rows = new ArrayList<>();
    advice.best().ifPresent(best -> rows.add(row(best)));
    advice.offsetTrims().forEach(trim -> rows.add(row(trim, gains.get(trim.path()))));
    table.show(rows, advice.offset().says() + " No resistor moves the offset.");
  }

  private static Proposal row(TrimAdvice.Best best) {
    return new Proposal(
        List.of(
            "Best: " + best.change().path(),
            Numbers.text(Numbers.read("Resistor", best.change().value(), Unit.OHM), Unit.OHM),
            "—",
            "—",
            "—"),
        "Best single change: " + best.says(),
        List.of(best.change()));
  }

  private static Proposal row(Trim trim, Trim gain) {
    return new Proposal(
        List.of(
            trim.path(),
            Numbers.text(trim.present(), Unit.OHM),
            Numbers.text(trim.perCent(), Unit.VOLT),
            gain == null ? "—" : Numbers.text(100 * gain.perCent(), Unit.ONE) + " %",
            Double.isFinite(trim.needed()) && Math.abs(trim.needed()) < 2
                ? Numbers.text(100 * trim.needed(), Unit.ONE) + " %"
                : "—"),
        trim.says() + (gain == null ? "" : "\n" + gain.says()),
        List.of());
  }

  private void apply(Proposal proposal) {
    Design design = desk.now().get().design();
    desk.edit()
        .accept(
            Edit.of(
                "Trim " + proposal.changes().get(0).path(),
                Change.applyAll(design, proposal.changes())));
  }
}
