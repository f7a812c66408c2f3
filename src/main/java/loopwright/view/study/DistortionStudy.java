package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.design.Hookup;
import loopwright.predict.DistortionSweep;
import loopwright.predict.SteadyDistortion;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.view.chart.DistortionPlots;
import loopwright.view.theme.Theme;

/** Distortion in a steady state, against level and against frequency. */
public final class DistortionStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Varied", "Peak", "Frequency", "Distortion", "Without capacitances");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;
  private final ResultTabs results;

  /**
   * @param desk the window's session
   */
  public DistortionStudy(Desk desk) {
    super("Distortion");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Run sines", 'R', this::find);
    table = new ProposalTable("Distortion", COLUMNS, proposal -> {}).withoutApply();
    results = new ResultTabs("Table", table);
    where.setName("where");
    add(where);
    add(bar);
    add(results, "hmin 240");
    table.show(
        List.of(),
        "The full circuit runs in time until two periods are alike, at the hookup's own level and"
            + " frequency and around them; beside it stands what the circuit without its capacitances"
            + " shows.");
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
    bar.run(progress -> DistortionSweep.of(now.design(), hookup, progress), this::showSweep);
  }

  private void showSweep(DistortionSweep sweep) {
    List<Proposal> rows = new ArrayList<>();
    rows.add(row("present", sweep.present()));
    sweep.byAmplitude().forEach(result -> rows.add(row("level", result)));
    sweep.byFrequency().forEach(result -> rows.add(row("frequency", result)));
    table.show(rows, sweep.present().says());
    results.show(DistortionPlots.of(sweep));
  }

  private static Proposal row(String what, SteadyDistortion result) {
    String says =
        result.says().isEmpty()
            ? result.periods()
                + " periods were run; the last two differ by "
                + Numbers.text(result.change(), Unit.ONE)
                + " of the fundamental."
            : result.says() + ".";
    return new Proposal(
        List.of(
            what,
            Numbers.text(result.amplitude(), Unit.VOLT),
            Numbers.text(result.frequency(), Unit.HERTZ),
            percent(result.thd()),
            percent(result.staticThd().number())),
        says,
        List.of());
  }

  private static String percent(OptionalDouble share) {
    return share.isPresent() ? EngineeringFormat.percent(share.getAsDouble()) : "\u2014";
  }
}
