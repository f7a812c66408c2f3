package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import loopwright.predict.DistortionSweep;
import loopwright.predict.SteadyDistortion;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * Distortion in a steady state: its residual, its harmonics, and how it goes with level and
 * frequency.
 */
public final class DistortionPlots {
  private static final int SHOWN = 12;

  /** A hand estimate beyond so many heights of the residual would only flatten it. */
  private static final double COMPARABLE = 2;

  private static final double FLOOR = -140;

  private DistortionPlots() {}

  /** All plots of a sweep. */
  public static List<ResultPlot> of(DistortionSweep sweep) {
    List<ResultPlot> plots = new ArrayList<>();
    plots.add(new ResultPlot("Residual", theme -> residual(sweep, theme)));
    plots.add(new ResultPlot("Harmonics", theme -> harmonics(sweep.present(), theme)));
    plots.add(
        new ResultPlot(
            "Against level",
            theme ->
                against(
                    sweep.byAmplitude(),
                    SteadyDistortion::amplitude,
                    Unit.VOLT,
                    "generator's peak voltage",
                    theme)));
    plots.add(
        new ResultPlot(
            "Against frequency",
            theme ->
                against(
                    sweep.byFrequency(),
                    SteadyDistortion::frequency,
                    Unit.HERTZ,
                    "frequency",
                    theme)));
    return plots;
  }

  private static Picture residual(DistortionSweep sweep, PlotTheme theme) {
    SteadyDistortion result = sweep.present();
    if (result.output().isEmpty()) {
      return Picture.none("No steady state", Words.sentences(result.says()));
    }
    double[] output = array(result.output());
    double[] residual = array(result.residual());
    double[] time = new double[output.length];
    for (int k = 0; k < time.length; k++) {
      time[k] = k / (time.length * result.frequency());
    }
    Strip upper =
        new Strip(Unit.VOLT, Span.of(DoubleStream.of(output)).padded(0.12), Unit.SECOND, theme)
            .curve(new Curve("out", time, output), 0, 0.75);
    OptionalDouble crossover = sweep.crossover().number();
    Span wide = Span.of(DoubleStream.of(residual)).with(0);
    boolean isComparable =
        crossover.isPresent() && crossover.getAsDouble() < COMPARABLE * wide.length();
    Span residuals =
        (isComparable ? wide.with(crossover.getAsDouble()).with(-crossover.getAsDouble()) : wide)
            .padded(0.12);
    Strip lower =
        new Strip(Unit.VOLT, residuals, Unit.SECOND, theme)
            .level(0, theme.quiet())
            .curve(new Curve("residual", time, residual), 1, 0.6);
    if (isComparable) {
      lower.level(crossover.getAsDouble(), theme.accent());
      lower.level(-crossover.getAsDouble(), theme.accent());
      lower.label(
          PlotLabel.at(0, crossover.getAsDouble(), "dead zone/(1 + loop gain)", theme.accent())
              .orNone());
    }
    return Picture.of(
        "Distortion " + EngineeringFormat.percent(result.thd().getAsDouble()),
        Words.sentences(
            "One period in a steady state, every capacitance in place; the residual is the output less"
                + " its mean and its fundamental",
            "Without capacitances "
                + (result.staticThd().number().isPresent()
                    ? EngineeringFormat.percent(result.staticThd().number().getAsDouble())
                    : result.staticThd().says()),
            crossover.isPresent()
                ? "The dead zone divided by 1 + loop gain is "
                    + Words.volts(crossover.getAsDouble())
                    + " by hand"
                : "No dead zone by hand: " + sweep.crossover().says()),
        ChartStyle.stack(
            new EngineeringAxis(Unit.SECOND, new Span(0, 1 / result.frequency())),
            List.of(upper.plot(), lower.plot()),
            List.of(3, 3),
            theme));
  }

  private static Picture harmonics(SteadyDistortion result, PlotTheme theme) {
    if (result.harmonics().isEmpty()) {
      return Picture.none("No steady state", Words.sentences(result.says()));
    }
    double fundamental = result.harmonics().get(1);
    double[] level = new double[SHOWN - 1];
    double[] number = new double[SHOWN - 1];
    int loudest = 0;
    for (int k = 0; k < level.length; k++) {
      number[k] = k + 2;
      level[k] = Math.max(FLOOR, 20 * Math.log10(result.harmonics().get(k + 2) / fundamental));
      loudest = level[k] > level[loudest] ? k : loudest;
    }
    Span span = new Span(FLOOR, Math.max(level[loudest], FLOOR + 20)).padded(0, 0.15);
    Strip strip = new Strip(Unit.DECIBEL, span, Unit.ONE, theme);
    for (int k = 0; k < level.length; k++) {
      strip.distance(number[k], FLOOR, level[k], theme.curves().get(0));
      strip.label(
          PlotLabel.at(number[k], level[k], Words.decibels(level[k]), theme.text()).orNone());
    }
    return Picture.of(
        "Harmonic " + (loudest + 2) + " is the largest, " + Words.decibels(level[loudest]),
        "Each harmonic's peak value against the fundamental's, in the steady state.",
        ChartStyle.stack(
            new EngineeringAxis(Unit.ONE, new Span(1.4, SHOWN + 0.6)),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }

  private static Picture against(
      List<SteadyDistortion> results,
      ToDoubleFunction<SteadyDistortion> place,
      Unit unit,
      String what,
      PlotTheme theme) {
    List<SteadyDistortion> solved =
        results.stream().filter(result -> result.thd().isPresent()).toList();
    if (solved.size() < 2) {
      String why = results.isEmpty() ? "nothing was run" : results.get(0).says();
      return Picture.none("No distortion to show", Words.sentences(why));
    }
    double[] places = solved.stream().mapToDouble(place).toArray();
    Curve curve =
        new Curve(
            "steady state",
            places,
            solved.stream().mapToDouble(result -> 100 * result.thd().getAsDouble()).toArray());
    Curve still =
        new Curve(
            "without capacitances",
            places,
            solved.stream()
                .mapToDouble(result -> 100 * result.staticThd().number().orElse(Double.NaN))
                .toArray());
    Span span =
        Span.of(DoubleStream.concat(DoubleStream.of(curve.y()), DoubleStream.of(still.y())));
    double low = Math.max(1e-9, span.lower()) / 1.6;
    DecadeAxis axis = new DecadeAxis(Unit.ONE, low, Math.max(1.2 * span.upper(), 4 * low));
    axis.setLabel("%");
    Strip strip = new Strip(Unit.ONE, axis, unit, theme).curve(curve, 0, 0.6).curve(still, 1, 0.3);
    double first = curve.y()[0];
    double last = curve.y()[curve.y().length - 1];
    List<String> missing =
        results.stream()
            .filter(result -> result.thd().isEmpty())
            .map(SteadyDistortion::says)
            .distinct()
            .toList();
    return Picture.of(
        "From "
            + EngineeringFormat.percent(first / 100)
            + " to "
            + EngineeringFormat.percent(last / 100)
            + " as the "
            + what
            + " rises",
        Words.sentences(
            "Harmonics 2 to 50 over the fundamental, in per cent", String.join("; ", missing)),
        ChartStyle.stack(
            new DecadeAxis(unit, places[0] / 1.1, places[places.length - 1] * 1.1),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
