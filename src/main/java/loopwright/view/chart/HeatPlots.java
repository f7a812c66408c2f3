package loopwright.view.chart;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import loopwright.predict.AmbientHeat;
import loopwright.predict.HeatReport;
import loopwright.predict.RunawayFormula;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Idle current, hottest junction and runaway against ambient temperature. */
public final class HeatPlots {
  private HeatPlots() {}

  /** All plots of a report. */
  public static List<ResultPlot> of(HeatReport report) {
    return List.of(new ResultPlot("Against ambient", theme -> ambient(report, theme)));
  }

  private static Picture ambient(HeatReport report, PlotTheme theme) {
    List<AmbientHeat> ambients = report.ambients();
    Curve heated = curve("idle, heated by itself", ambients, AmbientHeat::idle);
    Curve unheated = curve("junctions at ambient", ambients, AmbientHeat::idleUnheated);
    Curve junction = curve("hottest junction", ambients, AmbientHeat::celsius);
    Curve loop = curve("loop of heat", ambients, AmbientHeat::loop);
    Span currents =
        Span.of(DoubleStream.concat(DoubleStream.of(heated.y()), DoubleStream.of(unheated.y())))
            .padded(0.12, 0.2);
    Strip idle =
        new Strip(Unit.AMPERE, currents, Unit.CELSIUS, theme)
            .curve(heated, 0, 0.7)
            .curve(unheated, 1, 0.4);
    Strip hot =
        new Strip(
                Unit.CELSIUS,
                Span.of(DoubleStream.of(junction.y())).padded(0.12, 0.2),
                Unit.CELSIUS,
                theme)
            .curve(junction, 2, 0.5);
    Span loops = Span.of(DoubleStream.of(loop.y())).with(0).with(1.1);
    Strip runaway =
        new Strip(Unit.ONE, loops.padded(0, 0.1), Unit.CELSIUS, theme)
            .level(1, theme.fails())
            .level(RunawayFormula.WANTED, theme.quiet())
            .curve(loop, 3, 0.5)
            .shadeValues(new Span(1, loops.padded(0, 0.1).upper()), theme.fails());
    Span across = Span.of(ambients.stream().mapToDouble(AmbientHeat::ambient)).padded(0.02);
    runaway.label(PlotLabel.at(across.lower(), 1, "runs away", theme.fails()).orNone());
    return Picture.of(
        title(ambients),
        Words.sentences(
            "Idle current is the collector current of " + report.idleDevice(),
            "The loop is how much more heat a first bit of heat brings; it should stay below a half",
            "Emitter resistors: " + report.resistanceSays()),
        ChartStyle.stack(
            new EngineeringAxis(Unit.CELSIUS, across),
            List.of(idle.plot(), hot.plot(), runaway.plot()),
            List.of(4, 3, 3),
            theme));
  }

  private static String title(List<AmbientHeat> ambients) {
    AmbientHeat hottest = ambients.get(ambients.size() - 1);
    String at = EngineeringFormat.format(hottest.ambient(), Unit.CELSIUS, 3);
    if (hottest.loop().isEmpty()) {
      return "Not solved at " + at + ": " + hottest.reason();
    }
    double loop = hottest.loop().getAsDouble();
    return loop >= 1
        ? "Runs away with heat at " + at
        : "Heat feeds back " + Words.ratio(loop) + " of itself at " + at;
  }

  private static Curve curve(
      String name, List<AmbientHeat> ambients, Function<AmbientHeat, OptionalDouble> value) {
    return new Curve(
        name,
        ambients.stream().mapToDouble(AmbientHeat::ambient).toArray(),
        ambients.stream().mapToDouble(heat -> value.apply(heat).orElse(Double.NaN)).toArray());
  }
}
