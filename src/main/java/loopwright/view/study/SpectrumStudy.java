package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JLabel;
import loopwright.predict.NoiseDensity;
import loopwright.predict.NoiseShare;
import loopwright.predict.Spectra;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.view.chart.SpectrumPlots;
import loopwright.view.theme.Theme;

/** Noise and impedances against frequency. */
public final class SpectrumStudy extends Study {
  private static final List<String> COLUMNS = List.of("Contributor", "Noise", "Of the power");

  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final WorkBar bar;
  private final ProposalTable table;
  private final ResultTabs results;

  /**
   * @param desk the window's session
   */
  public SpectrumStudy(Desk desk) {
    super("Noise and impedance");
    this.desk = desk;
    bar = new WorkBar(desk.runners().get(), "Work out spectra", 'R', this::find);
    table = new ProposalTable("Noise and impedance", COLUMNS, proposal -> {}).withoutApply();
    results = new ResultTabs("Table", table);
    where.setName("where");
    add(where);
    add(bar);
    add(results, "hmin 240");
    table.show(
        List.of(),
        "Noise at the output and what makes it, from 1 Hz to 1 MHz; impedances of input and output from"
            + " 10 Hz to 100 MHz; all at rest.");
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
    bar.run(progress -> Spectra.of(now.design(), now.hookup(), progress), this::showSpectra);
  }

  private void showSpectra(Spectra spectra) {
    List<Proposal> rows = new ArrayList<>();
    if (!spectra.noise().isEmpty()) {
      NoiseDensity middle = spectra.noise().get(spectra.noise().size() / 2);
      String says =
          "At "
              + Numbers.text(middle.frequency(), Unit.HERTZ)
              + ": "
              + Numbers.text(middle.output(), Unit.VOLT_PER_ROOT_HERTZ)
              + " at the output, "
              + Numbers.text(middle.input(), Unit.VOLT_PER_ROOT_HERTZ)
              + " referred to the generator.";
      for (NoiseShare share : middle.shares()) {
        rows.add(
            new Proposal(
                List.of(
                    share.name() + ", " + share.cause(),
                    Numbers.text(share.output(), Unit.VOLT_PER_ROOT_HERTZ),
                    EngineeringFormat.percent(share.share())),
                says,
                List.of()));
      }
    }
    table.show(rows, spectra.noiseReason());
    results.show(SpectrumPlots.of(spectra));
  }
}
