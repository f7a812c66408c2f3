package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.predict.ComplexPoint;
import loopwright.predict.NoiseDensity;
import loopwright.predict.NoiseShare;
import loopwright.predict.Spectra;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Noise density and impedances against frequency. */
public final class SpectrumPlots {
  private static final int CONTRIBUTORS = 3;

  private SpectrumPlots() {}

  /** All plots of a hookup's spectra. */
  public static List<ResultPlot> of(Spectra spectra) {
    return List.of(
        new ResultPlot("Noise", theme -> noise(spectra, theme)),
        new ResultPlot(
            "Output impedance",
            theme -> impedance(spectra.outputImpedance(), spectra, true, theme)),
        new ResultPlot(
            "Input impedance", theme -> impedance(spectra.inputImpedance(), spectra, false, theme)),
        new ResultPlot("Supply rejection", theme -> SupplyRejectionPlot.picture(spectra, theme)));
  }

  private static Picture noise(Spectra spectra, PlotTheme theme) {
    List<NoiseDensity> densities = spectra.noise();
    if (densities.size() < 2) {
      return Picture.none("No noise to show", Words.sentences(spectra.noiseReason()));
    }
    double[] hertz = densities.stream().mapToDouble(NoiseDensity::frequency).toArray();
    NoiseDensity middle = densities.get(densities.size() / 2);
    List<Curve> curves = new ArrayList<>();
    curves.add(
        new Curve("output", hertz, densities.stream().mapToDouble(NoiseDensity::output).toArray()));
    for (NoiseShare share : middle.shares().stream().limit(CONTRIBUTORS).toList()) {
      curves.add(
          new Curve(
              share.name() + ", " + share.cause(),
              hertz,
              densities.stream().mapToDouble(density -> of(density, share)).toArray()));
    }
    double high = curves.stream().flatMapToDouble(c -> DoubleStream.of(c.y())).max().orElse(1);
    double low =
        curves.stream()
            .flatMapToDouble(c -> DoubleStream.of(c.y()))
            .filter(value -> value > high / 1e4)
            .min()
            .orElse(high / 10);
    Strip strip =
        new Strip(
            Unit.VOLT_PER_ROOT_HERTZ,
            new DecadeAxis(Unit.VOLT_PER_ROOT_HERTZ, low / 1.5, high * 2),
            Unit.HERTZ,
            theme);
    for (int k = 0; k < curves.size(); k++) {
      strip.curve(curves.get(k), k, 0.25 + 0.15 * k);
    }
    return Picture.of(
        EngineeringFormat.format(middle.output(), Unit.VOLT_PER_ROOT_HERTZ, 3)
            + " at the output at "
            + Words.hertz(middle.frequency()),
        Words.sentences(
            "Density at the output and the loudest contributors, at rest",
            "Referred to the generator "
                + EngineeringFormat.format(middle.input(), Unit.VOLT_PER_ROOT_HERTZ, 3),
            spectra.noiseReason()),
        ChartStyle.stack(
            new DecadeAxis(Unit.HERTZ, hertz[0], hertz[hertz.length - 1]),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }

  private static double of(NoiseDensity density, NoiseShare wanted) {
    return density.shares().stream()
        .filter(s -> s.name().equals(wanted.name()) && s.cause().equals(wanted.cause()))
        .mapToDouble(NoiseShare::output)
        .findAny()
        .orElse(Double.NaN);
  }

  private static Picture impedance(
      List<ComplexPoint> points, Spectra spectra, boolean output, PlotTheme theme) {
    List<ComplexPoint> finite =
        points.stream()
            .filter(p -> Double.isFinite(p.re()) && Math.hypot(p.re(), p.im()) > 0)
            .toList();
    if (finite.size() < 2) {
      return Picture.none(
          "No impedance to show",
          Words.sentences(
              spectra.impedanceReason().isEmpty()
                  ? "Nothing flows there: the impedance is infinite"
                  : spectra.impedanceReason()));
    }
    double[] hertz = finite.stream().mapToDouble(ComplexPoint::frequency).toArray();
    double[] ohms = finite.stream().mapToDouble(p -> Math.hypot(p.re(), p.im())).toArray();
    double[] degrees =
        finite.stream().mapToDouble(p -> Math.toDegrees(Math.atan2(p.im(), p.re()))).toArray();
    double low = DoubleStream.of(ohms).min().orElseThrow() / 1.5;
    double high = Math.max(4 * low, DoubleStream.of(ohms).max().orElseThrow() * 1.5);
    Strip magnitude =
        new Strip(Unit.OHM, new DecadeAxis(Unit.OHM, low, high), Unit.HERTZ, theme)
            .curve(new Curve("magnitude", hertz, ohms), 0, 0.4);
    Strip phase =
        new Strip(
                Unit.DEGREE,
                Span.of(DoubleStream.of(degrees)).with(0).padded(0.12),
                Unit.HERTZ,
                theme)
            .level(0, theme.quiet())
            .curve(new Curve("phase", hertz, degrees), 1, 0.4);
    return Picture.of(
        EngineeringFormat.format(ohms[0], Unit.OHM, 3)
            + " at "
            + Words.hertz(hertz[0])
            + ", "
            + EngineeringFormat.format(ohms[ohms.length - 1], Unit.OHM, 3)
            + " at "
            + Words.hertz(hertz[hertz.length - 1]),
        output
            ? "Into the output, or behind isolation and coupling at the load, with the load removed, at"
                + " rest. Where its phase passes \u221290\u00B0 or 90\u00B0 a load can make it ring."
            : "Into the driven terminal with the source removed, at rest.",
        ChartStyle.stack(
            new DecadeAxis(Unit.HERTZ, hertz[0], hertz[hertz.length - 1]),
            List.of(magnitude.plot(), phase.plot()),
            List.of(3, 2),
            theme));
  }
}
