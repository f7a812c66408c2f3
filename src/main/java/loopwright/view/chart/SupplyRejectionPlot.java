package loopwright.view.chart;

import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.predict.ComplexPoint;
import loopwright.predict.Spectra;
import loopwright.quantity.Unit;

/** How far the amplifier keeps a supply's ripple from its output, against frequency. */
final class SupplyRejectionPlot {
  private SupplyRejectionPlot() {}

  static Picture picture(Spectra spectra, PlotTheme theme) {
    if (spectra.positiveRejection().size() < 2) {
      return Picture.none(
          "No rejection to show",
          Words.sentences(
              spectra.impedanceReason().isEmpty()
                  ? "With an open hookup there is no noise gain to refer it to; choose one with feedback"
                  : spectra.impedanceReason()));
    }
    Curve positive = curve("positive supply", spectra.positiveRejection());
    Curve negative = curve("negative supply", spectra.negativeRejection());
    double[] hertz = positive.x();
    Span span =
        Span.of(DoubleStream.concat(DoubleStream.of(positive.y()), DoubleStream.of(negative.y())))
            .with(0)
            .padded(0.08, 0.12);
    Strip strip =
        new Strip(Unit.DECIBEL, span, Unit.HERTZ, theme)
            .level(0, theme.quiet())
            .curve(positive, 0, 0.3)
            .curve(negative, 1, 0.5);
    boolean isPositiveWorse = at(positive) < at(negative);
    return Picture.of(
        "At 1 kHz the "
            + (isPositiveWorse ? "positive" : "negative")
            + " supply is kept out least, by "
            + Words.decibels(Math.min(at(positive), at(negative))),
        "Change of a supply, behind its resistance, over that of the output divided by the noise gain,"
            + " at rest. Below 0 dB ripple is amplified.",
        ChartStyle.stack(
            new DecadeAxis(Unit.HERTZ, hertz[0], hertz[hertz.length - 1]),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }

  private static double at(Curve curve) {
    return curve.at(1e3);
  }

  private static Curve curve(String name, List<ComplexPoint> points) {
    return new Curve(
        name,
        points.stream().mapToDouble(ComplexPoint::frequency).toArray(),
        points.stream().mapToDouble(point -> Bode.decibels(point.magnitude())).toArray());
  }
}
