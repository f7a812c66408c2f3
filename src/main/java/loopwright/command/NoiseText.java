package loopwright.command;

import java.util.List;
import java.util.Optional;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.predict.NoiseBand;
import loopwright.predict.NoiseDensity;
import loopwright.predict.NoiseShare;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Noise as text for a person. */
final class NoiseText {
  private static final int SHOWN = 10;

  private NoiseText() {}

  static String of(HookupFigures figures, double[] frequencies) {
    TextPage page =
        new TextPage()
            .title(figures.design().name() + ", hookup '" + figures.hookup().name() + "', noise");
    for (double frequency : frequencies) {
      Optional<NoiseDensity> density = figures.noiseDensity(frequency);
      page.heading("At " + EngineeringFormat.format(frequency, Unit.HERTZ));
      if (density.isEmpty()) {
        page.paragraph(reason(figures, "inputNoise"));
      } else {
        page.paragraph(
            density(density.get().input())
                + " referred to the generator, "
                + density(density.get().output())
                + " at the output.");
        page.table(shares(density.get().shares(), Unit.VOLT_PER_ROOT_HERTZ));
      }
    }
    Optional<NoiseBand> band = figures.noiseBand();
    page.heading("From 10 Hz to 100 kHz");
    page.paragraph(
        band.map(b -> EngineeringFormat.format(b.output(), Unit.VOLT) + " rms at the output.")
            .orElseGet(() -> reason(figures, "outputNoise")));
    band.ifPresent(b -> page.table(shares(b.shares(), Unit.VOLT)));
    return page.toString();
  }

  private static String reason(HookupFigures figures, String key) {
    return "Not solved: " + figures.solved(Catalogue.find(key).orElseThrow()).says() + ".";
  }

  private static String density(double value) {
    return EngineeringFormat.format(value, Unit.VOLT_PER_ROOT_HERTZ);
  }

  private static TextTable shares(List<NoiseShare> shares, Unit unit) {
    TextTable table = new TextTable().row("contributor", "alone", "of the power");
    shares.stream()
        .limit(SHOWN)
        .forEach(
            share ->
                table.row(
                    share.name() + ", " + share.cause(),
                    EngineeringFormat.format(share.output(), unit),
                    EngineeringFormat.percent(share.share())));
    return table;
  }
}
