package loopwright.view.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Consumer;
import javax.swing.JButton;
import javax.swing.JCheckBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Drawer;
import loopwright.design.Problem;
import loopwright.part.Shelf;
import loopwright.propose.Demand;
import loopwright.propose.FirstDesign;
import loopwright.propose.FirstDesigns;
import loopwright.propose.Preference;
import loopwright.propose.Reason;
import loopwright.propose.Specification;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** A first design from a specification: its demands, the reason of every value, and the design. */
public final class FirstDesignStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Demand or choice", "Wanted", "Predicted or chosen", "Met");

  private final transient Shelf shelf;
  private final JTextField positive = new JTextField("12 V");
  private final JTextField negative = new JTextField("-12 V");
  private final JTextField gain = new JTextField("10");
  private final JTextField swing = new JTextField("5 V");
  private final JTextField load = new JTextField("600 Ω");
  private final JTextField loadCapacitance = new JTextField("100 pF");
  private final JTextField bandwidth = new JTextField("100 kHz");
  private final JTextField source = new JTextField("50 Ω");
  private final JTextField frequency = new JTextField("1 kHz");
  private final JTextField margin = new JTextField("60");
  private final JTextField resistors = new JTextField("E24");
  private final JTextField capacitors = new JTextField("E6");
  private final JTextField parts = new JTextField();
  private final JCheckBox quiet = box("quiet", 'Q');
  private final JCheckBox cool = box("cool", 'O');
  private final JCheckBox simple = box("simple", 'E');
  private final JButton open = Theme.style(new JButton("Open this design"), "pill");
  private final WorkBar bar;
  private final ProposalTable table;
  private transient Optional<Design> offered = Optional.empty();

  /**
   * @param desk the window's session
   * @param shelf records of the parts at hand
   * @param onOpen takes the design in place of the present one
   */
  public FirstDesignStudy(Desk desk, Shelf shelf, Consumer<Design> onOpen) {
    super("New from specification");
    this.shelf = shelf;
    bar = new WorkBar(desk.runners().get(), "Make a design", 'D', this::make);
    table = new ProposalTable("Demands and reasons", COLUMNS, proposal -> {}).withoutApply();
    open.setName("open");
    open.setMnemonic('H');
    open.setEnabled(false);
    open.addActionListener(event -> offered.ifPresent(onOpen));
    add(form());
    add(bar, "split 2, pushx");
    add(open, "growx 0");
    add(table, "hmin 200");
    table.show(
        List.of(),
        "Say what the amplifier is to do. Every value is then chosen with its reason, the whole is"
            + " solved, and it is offered only where its own prediction meets every demand; else it"
            + " is said which fails, by how much, and what would have to give. A gain below zero"
            + " inverts; a negative rail of 0 is one supply.");
  }

  private JPanel form() {
    JPanel form =
        Theme.style(
            new JPanel(
                new MigLayout(
                    "insets 0, gapx 6, wrap 8, fillx",
                    "[][36:100,grow 50,fill]10[][36:100,grow 50,fill]10[][36:100,grow 50,fill]"
                        + "10[][36:100,grow 50,fill]")),
            "plain");
    field(form, "Positive rail", 'P', positive, "positive");
    field(form, "Gain", 'G', gain, "gain");
    field(form, "Load", 'L', load, "load");
    field(form, "Bandwidth", 'B', bandwidth, "bandwidth");
    field(form, "Negative rail", 'N', negative, "negative");
    field(form, "Swing, peak", 'W', swing, "swing");
    field(form, "Load capacitance", 'C', loadCapacitance, "loadCapacitance");
    field(form, "Phase margin", 'M', margin, "margin");
    field(form, "Source resistance", 'R', source, "source");
    field(form, "Signal frequency", 'F', frequency, "frequency");
    field(form, "Resistors from", 'T', resistors, "resistors");
    field(form, "Capacitors from", 'I', capacitors, "capacitors");
    label(form, "Parts at hand", 'A', parts, "parts");
    form.add(parts, "span 3, growx");
    parts.setToolTipText("Names of transistors and diodes, by comma; blank for the whole shelf");
    resistors.setToolTipText("A series such as E24, or the values in the drawer, by semicolon");
    capacitors.setToolTipText("A series such as E6, or the values in stock, by semicolon");
    load.setToolTipText("Blank for none");
    margin.setToolTipText("Degrees, at every level of the swing");
    form.add(new JLabel("Rather"), "split 4, span 4");
    form.add(quiet);
    form.add(cool);
    form.add(simple);
    return form;
  }

  private static void field(
      JPanel form, String label, char mnemonic, JTextField field, String name) {
    label(form, label, mnemonic, field, name);
    form.add(field);
  }

  private static void label(
      JPanel form, String label, char mnemonic, JComponent field, String name) {
    JLabel before = new JLabel(label);
    before.setDisplayedMnemonic(mnemonic);
    before.setLabelFor(field);
    field.setName(name);
    field.getAccessibleContext().setAccessibleName(label);
    form.add(before);
  }

  private static JCheckBox box(String label, char mnemonic) {
    JCheckBox box = new JCheckBox(label);
    box.setName(label);
    box.setMnemonic(mnemonic);
    box.setOpaque(false);
    return box;
  }

  @Override
  public void show(Snapshot snapshot) {
    // A specification stands for itself, whatever design is open.
  }

  @Override
  public JButton defaultButton() {
    return bar.startButton();
  }

  private void make() {
    Specification wanted;
    try {
      wanted = specification();
    } catch (QuantityException e) {
      bar.complain(e.getMessage());
      return;
    } catch (DesignException e) {
      bar.complain(e.problems().stream().map(Problem::message).findFirst().orElse(""));
      return;
    }
    offered = Optional.empty();
    open.setEnabled(false);
    bar.run(progress -> FirstDesigns.of(wanted, shelf, progress), this::showResult);
  }

  private Specification specification() {
    double signed = Numbers.read("Gain", gain.getText(), Unit.ONE);
    return new Specification(
        Numbers.read("Positive rail", positive.getText(), Unit.VOLT),
        Numbers.read("Negative rail", negative.getText(), Unit.VOLT),
        Math.abs(signed),
        signed < 0,
        load.getText().isBlank()
            ? OptionalDouble.empty()
            : OptionalDouble.of(Numbers.read("Load", load.getText(), Unit.OHM)),
        Numbers.read("Load capacitance", loadCapacitance.getText(), Unit.FARAD),
        Numbers.read("Swing, peak", swing.getText(), Unit.VOLT),
        Numbers.read("Bandwidth", bandwidth.getText(), Unit.HERTZ),
        Numbers.read("Source resistance", source.getText(), Unit.OHM),
        Numbers.read("Signal frequency", frequency.getText(), Unit.HERTZ),
        Arrays.stream(parts.getText().split(","))
            .map(String::strip)
            .filter(name -> !name.isEmpty())
            .toList(),
        stock("Resistors from", resistors.getText(), Unit.OHM),
        stock("Capacitors from", capacitors.getText(), Unit.FARAD),
        Numbers.read("Phase margin", margin.getText(), Unit.DEGREE),
        Specification.USUAL_GAIN_TOLERANCE,
        preferences());
  }

  private Set<Preference> preferences() {
    Set<Preference> chosen = EnumSet.noneOf(Preference.class);
    if (quiet.isSelected()) {
      chosen.add(Preference.QUIET);
    }
    if (cool.isSelected()) {
      chosen.add(Preference.COOL);
    }
    if (simple.isSelected()) {
      chosen.add(Preference.SIMPLE);
    }
    return chosen;
  }

  private static Drawer.Stock stock(String field, String text, Unit unit) {
    String series = text.strip();
    if (PreferredValues.named(series).isPresent()) {
      return new Drawer.Stock.Series(series);
    }
    List<Quantity> values = new ArrayList<>();
    for (String one : series.split(";")) {
      if (!(Numbers.read(field, one, unit) > 0)) {
        throw new QuantityException(
            field + ": found \"" + one.strip() + "\", expected a value above zero");
      }
      values.add(Quantity.parse(one.strip(), unit));
    }
    return new Drawer.Stock.Values(values);
  }

  private void showResult(FirstDesign first) {
    offered = first.design();
    open.setEnabled(offered.isPresent());
    List<Proposal> rows = new ArrayList<>();
    rows.add(
        new Proposal(
            List.of("Outcome", "", offered.isPresent() ? "a design" : "none", ""),
            first.says(),
            List.of()));
    first.demands().forEach(demand -> rows.add(row(demand)));
    first.findings().stream()
        .filter(finding -> finding.severity() != Finding.Severity.REMARK)
        .forEach(finding -> rows.add(row(finding)));
    first.reasons().forEach(reason -> rows.add(row(reason)));
    table.show(rows, "");
  }

  private static Proposal row(Demand demand) {
    return new Proposal(
        List.of(
            demand.name(),
            Numbers.text(demand.wanted(), demand.unit()),
            Numbers.text(demand.predicted(), demand.unit()),
            demand.met() ? "met" : "not met"),
        demand.says().isEmpty() ? demand.name() + ": met, as solved in full." : demand.says(),
        List.of());
  }

  private static Proposal row(Finding finding) {
    return new Proposal(
        List.of(finding.where(), "", "finding", ""),
        finding.says() + " " + finding.remedy(),
        List.of());
  }

  private static Proposal row(Reason reason) {
    return new Proposal(
        List.of(reason.path(), "", reason.value(), ""),
        reason.path() + " = " + reason.value() + "\n" + reason.says(),
        List.of());
  }
}
