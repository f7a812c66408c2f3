package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.design.Hookup;
import loopwright.predict.FigureResult;
import loopwright.predict.StepResponses;
import loopwright.session.Snapshot;
import loopwright.view.chart.TimePlots;
import loopwright.view.theme.Theme;

/** Steps of the generator in time, and the oscillation where something grows. */
public final class TimeStudy extends Study {
  private static final List<String> COLUMNS = List.of("Figure", "formula", "solved");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;
  private final ResultTabs results;

  /**
   * @param desk the window's session
   */
  public TimeStudy(Desk desk) {
    super("Steps and oscillation");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Run in time", 'R', this::find);
    table = new ProposalTable("Steps and oscillation", COLUMNS, proposal -> {}).withoutApply();
    results = new ResultTabs("Table", table);
    where.setName("where");
    add(where);
    add(bar);
    add(results, "hmin 240");
    table.show(
        List.of(),
        "The full circuit runs in time: a small step from rest, a large one each way, and, where"
            + " something grows at some output level, the oscillation until its cycles are alike.");
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
    bar.run(progress -> StepResponses.of(now.design(), hookup, progress), this::showRun);
  }

  private void showRun(StepResponses run) {
    List<Proposal> rows = new ArrayList<>();
    run.figures()
        .values()
        .forEach(
            result ->
                rows.add(
                    new Proposal(
                        List.of(
                            result.figure().label(),
                            Numbers.text(result.formula().number(), result.figure().unit()),
                            Numbers.text(result.solved().number(), result.figure().unit())),
                        says(result),
                        List.of())));
    table.show(rows, run.says());
    results.show(TimePlots.of(run));
  }

  private static String says(FigureResult result) {
    return result.figure().definition()
        + (result.solved().says().isEmpty() ? "" : "\nSolved: " + result.solved().says() + ".");
  }
}
