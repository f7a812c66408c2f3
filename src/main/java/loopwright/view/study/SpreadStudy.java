package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JTextField;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.spread.Band;
import loopwright.spread.HookupSpread;
import loopwright.spread.Sampling;
import loopwright.spread.Spread;
import loopwright.view.theme.Theme;

/** Bands of all figures and nodes for the tolerances, which part matters, and the yield. */
public final class SpreadStudy extends Study {
  private static final List<String> COLUMNS =
      List.of("Figure or node", "Nominal", "Low", "High", "Builds", "Matters most");

  private static final int MOST = 100_000;

  private final transient Desk desk;
  private final JTextField samples = new JTextField(Integer.toString(Sampling.usual().samples()));
  private final JTextField seed = new JTextField(Long.toString(Sampling.usual().seed()));
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;

  /**
   * @param desk the window's session
   */
  public SpreadStudy(Desk desk) {
    super("Spread");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Sample builds", 'B', this::find);
    table = new ProposalTable("Bands", COLUMNS, proposal -> {}).withoutApply();
    samples.setName("samples");
    seed.setName("seed");
    where.setName("where");
    add(new Inputs().field("Builds", 'U', samples, 80).field("Seed", 'E', seed, 70).own(where));
    add(bar);
    add(table, "hmin 240");
    table.show(
        List.of(),
        "Builds are drawn from the design's tolerances and solved in full; the band holds 95 % of them."
            + " Figures of waveform and swing take a tenth of the builds.");
    show(desk.now().get());
  }

  @Override
  public void show(Snapshot snapshot) {
    where.setText("hookup " + snapshot.hookup());
  }

  @Override
  public JButton defaultButton() {
    return bar.startButton();
  }

  private void find() {
    Snapshot now = desk.now().get();
    Sampling sampling;
    try {
      int builds = (int) Numbers.read("Builds", samples.getText(), Unit.ONE);
      if (builds < 1 || builds > MOST) {
        throw new QuantityException(
            "Builds: found " + samples.getText() + ", expected 1 to " + MOST);
      }
      sampling = Sampling.of(builds, (long) Numbers.read("Seed", seed.getText(), Unit.ONE));
    } catch (QuantityException e) {
      bar.complain(e.getMessage());
      return;
    }
    String hookup = now.hookup();
    bar.run(
        progress -> Spread.of(now.design(), List.of(hookup), sampling, progress).get(0),
        this::showBands);
  }

  private void showBands(HookupSpread spread) {
    List<Proposal> rows = new ArrayList<>();
    String yield =
        spread.yield().isPresent()
            ? "Yield "
                + EngineeringFormat.percent(spread.yield().getAsDouble())
                + ": "
                + spread.yieldSays()
                + "."
            : "Yield: none, " + spread.yieldSays() + ".";
    spread
        .figures()
        .forEach(
            (key, band) -> {
              Figure figure = Catalogue.find(key).orElseThrow();
              if (band.samples() > 0) {
                rows.add(row(figure.label(), band, figure.unit(), yield));
              }
            });
    spread.nodes().forEach((name, band) -> rows.add(row("node " + name, band, Unit.VOLT, yield)));
    table.show(rows, yield);
  }

  private static Proposal row(String name, Band band, Unit unit, String yield) {
    String matters =
        band.matters().stream()
            .map(matter -> matter.part() + " " + EngineeringFormat.percent(matter.share()))
            .collect(Collectors.joining(", "));
    return new Proposal(
        List.of(
            name,
            Numbers.text(band.nominal(), unit),
            Numbers.text(band.low(), unit),
            Numbers.text(band.high(), unit),
            Integer.toString(band.samples()),
            band.matters().isEmpty() ? "—" : band.matters().get(0).part()),
        (matters.isEmpty() ? "" : name + " depends on " + matters + ".\n")
            + (band.reason().isEmpty() ? "" : band.reason() + ".\n")
            + yield,
        List.of());
  }
}
