package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.design.Hookup;
import loopwright.predict.LoopPlane;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.sizing.StabilitySweep;
import loopwright.view.chart.LoopPlanePlots;
import loopwright.view.chart.ResultPlot;
import loopwright.view.chart.StabilityPlots;
import loopwright.view.theme.Theme;

/** Worst margin and growth of the whole swing against one value after the other. */
public final class StabilityStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Varied value", "Value", "Verdict", "Margin", "Growth", "Frequency");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;
  private final ResultTabs results;

  /**
   * @param desk the window's session
   */
  public StabilityStudy(Desk desk) {
    super("Stability");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Vary values", 'V', this::find);
    table = new ProposalTable("Stability", COLUMNS, proposal -> {}).withoutApply();
    where.setName("where");
    add(where);
    add(bar);
    results = new ResultTabs("Table", table);
    add(results, "hmin 240");
    table.show(
        List.of(),
        "Load capacitance, compensation, stray capacitance, supply lead inductance, the divider's upper"
            + " resistor and a probe's capacitance at each node are varied one after the other; each row is the worst of the whole"
            + " swing, and the present value is marked.");
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
    Hookup hookup = now.design().hookup(now.hookup()).orElseThrow();
    bar.run(
        progress ->
            new Found(
                LoopPlane.of(now.design(), hookup, progress),
                StabilitySweep.of(now.design(), now.hookup(), progress)),
        this::showFound);
  }

  /** The loop at the present values, and what varied values make of it. */
  private record Found(LoopPlane plane, List<StabilitySweep> sweeps) {}

  private void showFound(Found found) {
    List<StabilitySweep> sweeps = found.sweeps();
    List<Proposal> rows = new ArrayList<>();
    String says = String.join(".\n", sweeps.stream().map(StabilitySweep::says).toList()) + ".";
    for (StabilitySweep sweep : sweeps) {
      sweep.points().forEach(point -> rows.add(row(sweep, point, says)));
    }
    table.show(rows, says);
    List<ResultPlot> plots = new ArrayList<>(LoopPlanePlots.of(found.plane()));
    sweeps.forEach(sweep -> plots.add(StabilityPlots.of(sweep)));
    results.show(plots);
  }

  private static Proposal row(StabilitySweep sweep, StabilitySweep.Point point, String says) {
    return new Proposal(
        List.of(
            sweep.what() + (point.present() ? ", present" : ""),
            Numbers.text(point.value(), sweep.unit()),
            point.stable() ? "stable" : "grows",
            Numbers.text(point.phaseMargin(), Unit.DEGREE),
            Numbers.text(point.growth(), Unit.PER_SECOND),
            Numbers.text(point.frequency(), Unit.HERTZ)),
        says,
        List.of());
  }
}
