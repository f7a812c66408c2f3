package loopwright.view.study;

import java.util.List;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JCheckBox;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JTextField;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.sizing.DividerProposal;
import loopwright.sizing.DividerSizing;
import loopwright.view.theme.Theme;

/** Ranked feedback dividers for a wanted gain. */
public final class DividerStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Divider", "Gain", "Low", "High", "Offset", "Noise", "Current", "Margin", "Score");

  private final transient Desk desk;
  private final JTextField gain = new JTextField("10");
  private final JComboBox<String> series =
      new JComboBox<>(new String[] {"E12", "E24", "E96", "drawer"});
  private final JCheckBox twoParts = new JCheckBox("two parts for one resistor");
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;

  /**
   * @param desk the window's session
   */
  public DividerStudy(Desk desk) {
    super("Size a divider");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Rank dividers", 'R', this::find);
    table = new ProposalTable("Ranked dividers", COLUMNS, this::apply);
    gain.setName("gain");
    series.setName("series");
    series.setSelectedItem("E24");
    twoParts.setName("twoParts");
    twoParts.setMnemonic('T');
    twoParts.setOpaque(false);
    where.setName("where");
    add(
        new Inputs()
            .field("Wanted gain", 'W', gain, 90)
            .field("Values from", 'V', series, 100)
            .own(twoParts)
            .own(where));
    add(bar);
    add(table, "hmin 220");
    table.show(
        List.of(),
        "Type the gain from generator to output that is wanted and let the dividers be ranked: by gain"
            + " error after finite gain, tolerance band, load on the output, offset by the bias"
            + " current, noise, and the phase that the input capacitance takes.");
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
    Design design = now.design();
    String hookup = now.hookup();
    String from = (String) series.getSelectedItem();
    boolean two = twoParts.isSelected();
    double wanted;
    try {
      wanted = Numbers.read("Wanted gain", gain.getText(), Unit.ONE);
    } catch (QuantityException e) {
      bar.complain(e.getMessage());
      return;
    }
    bar.run(
        progress -> DividerSizing.of(design, hookup, wanted, from, two, progress),
        this::showRanked);
  }

  private void showRanked(List<DividerProposal> dividers) {
    table.show(dividers.stream().map(DividerStudy::row).toList(), "");
  }

  private static Proposal row(DividerProposal divider) {
    return new Proposal(
        List.of(
            divider.changes().stream()
                .map(Change::value)
                .filter(value -> !value.isBlank())
                .map(value -> Numbers.text(ohms(value), Unit.OHM))
                .collect(Collectors.joining(" / ")),
            Numbers.text(divider.gain().number(), Unit.ONE),
            Numbers.text(divider.gainLow().number(), Unit.ONE),
            Numbers.text(divider.gainHigh().number(), Unit.ONE),
            Numbers.text(divider.outputOffset().number(), Unit.VOLT),
            Numbers.text(divider.inputNoise().number(), Unit.VOLT_PER_ROOT_HERTZ),
            Numbers.text(divider.dividerCurrent(), Unit.AMPERE),
            Numbers.text(divider.phaseMargin().number(), Unit.DEGREE),
            Numbers.text(divider.score(), Unit.ONE)),
        divider.says(),
        divider.changes());
  }

  private static double ohms(String value) {
    return Numbers.read("resistor", value, Unit.OHM);
  }

  private void apply(Proposal proposal) {
    Design design = desk.now().get().design();
    desk.edit()
        .accept(
            Edit.of(
                "Set the divider " + proposal.cells().get(0),
                Change.applyAll(design, proposal.changes())));
  }
}
