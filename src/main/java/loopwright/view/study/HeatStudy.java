package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.predict.AmbientHeat;
import loopwright.predict.HeatReport;
import loopwright.predict.HeatSolver;
import loopwright.predict.RunawayEstimate;
import loopwright.predict.SwingHeat;
import loopwright.quantity.Unit;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.chart.HeatPlots;
import loopwright.view.theme.Theme;

/** Idle current and runaway against ambient temperature, and dissipation over the swing. */
public final class HeatStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Ambient or device", "Idle", "Loop", "At rest", "Worst mean", "Junction");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;
  private final ResultTabs results;

  /**
   * @param desk the window's session
   */
  public HeatStudy(Desk desk) {
    super("Heat");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Work out heat", 'H', this::find);
    table = new ProposalTable("Heat", COLUMNS, this::apply);
    where.setName("where");
    add(where);
    add(bar);
    results = new ResultTabs("Table", table);
    add(results, "hmin 240");
    table.show(
        List.of(),
        "The amplifier is solved at rest from a cold to a hot ambient with every junction at the"
            + " temperature that its dissipation gives it, and then over the whole swing.\n"
            + HeatReport.CAUTIONS.get(1));
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
    bar.run(
        progress -> HeatSolver.solve(now.design(), now.hookup(), progress),
        report -> showReport(now.design(), report));
  }

  private void apply(Proposal proposal) {
    desk.edit()
        .accept(
            Edit.of(
                "fit emitter resistors",
                Change.applyAll(desk.now().get().design(), proposal.changes())));
  }

  private void showReport(Design design, HeatReport report) {
    List<Change> changes = HeatSolver.changes(design, report.leastResistance());
    String cautions = String.join("\n", HeatReport.CAUTIONS);
    List<Proposal> rows = new ArrayList<>();
    for (AmbientHeat ambient : report.ambients()) {
      rows.add(ambient(report, ambient, changes, cautions));
    }
    for (SwingHeat device : report.devices()) {
      rows.add(device(report, device, changes, cautions));
    }
    table.show(rows, report.swingReason());
    results.show(HeatPlots.of(report));
  }

  private static Proposal ambient(
      HeatReport report, AmbientHeat ambient, List<Change> changes, String cautions) {
    StringBuilder says = new StringBuilder();
    if (!ambient.reason().isEmpty()) {
      says.append(ambient.reason()).append(".\n");
    }
    says.append("Idle: collector current of ").append(report.idleDevice());
    says.append("; with junctions at ambient it would be ");
    says.append(Numbers.text(ambient.idleUnheated(), Unit.AMPERE));
    says.append(". The loop is how much more heat a first bit of heat brings: from 1 on it runs");
    says.append(" away. Emitter resistors: ").append(report.resistanceSays()).append(".\n");
    return new Proposal(
        List.of(
            Numbers.text(ambient.ambient(), Unit.CELSIUS) + " ambient",
            Numbers.text(ambient.idle(), Unit.AMPERE),
            Numbers.text(ambient.loop(), Unit.ONE),
            "",
            "",
            Numbers.text(ambient.celsius(), Unit.CELSIUS)),
        says + cautions,
        changes);
  }

  private static Proposal device(
      HeatReport report, SwingHeat device, List<Change> changes, String cautions) {
    StringBuilder says = new StringBuilder(device.role());
    says.append(" dissipates most, ").append(Numbers.text(device.most(), Unit.WATT));
    says.append(", with the output at ").append(Numbers.text(device.at(), Unit.VOLT));
    if (device.amplitude() > 0) {
      says.append("; a sine of ").append(Numbers.text(device.amplitude(), Unit.VOLT));
      says.append(" peak heats it most");
    }
    if (device.classB().isPresent()) {
      says.append("; V²/(π²R) by hand: ").append(Numbers.text(device.classB(), Unit.WATT));
    }
    says.append(".\nShort-circuited: ").append(report.shortCircuit()).append(".\n");
    return new Proposal(
        List.of(
            device.role(),
            "",
            loop(report, device.role()),
            Numbers.text(device.rest(), Unit.WATT),
            Numbers.text(device.mean(), Unit.WATT),
            Numbers.text(device.celsius(), Unit.CELSIUS)),
        says + cautions,
        changes);
  }

  /** By hand, of an output device. */
  private static String loop(HeatReport report, String role) {
    return report.estimates().stream()
        .filter(estimate -> estimate.role().equals(role))
        .findAny()
        .map(RunawayEstimate::formula)
        .map(loop -> Numbers.text(loop, Unit.ONE))
        .orElse("");
  }
}
