package loopwright.view.chart;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.StabilitySweep;

/** The worst of the whole swing against one value. */
public final class StabilityPlots {
  /** A phase margin below this deserves a look; common practice, no source. */
  private static final double COMFORTABLE = 45;

  private StabilityPlots() {}

  /** The plot of a sweep. */
  public static ResultPlot of(StabilitySweep sweep) {
    return new ResultPlot(sweep.what(), theme -> picture(sweep, theme));
  }

  private static Picture picture(StabilitySweep sweep, PlotTheme theme) {
    List<StabilitySweep.Point> points = sweep.points();
    double[] values = points.stream().mapToDouble(StabilitySweep.Point::value).toArray();
    Curve margin =
        new Curve(
            "worst phase margin",
            values,
            points.stream().mapToDouble(point -> point.phaseMargin().orElse(Double.NaN)).toArray());
    Curve damping =
        new Curve(
            "least damping",
            values,
            points.stream().mapToDouble(StabilityPlots::damping).toArray());
    Span margins = Span.of(DoubleStream.of(margin.y())).with(0).with(COMFORTABLE).padded(0.1, 0.2);
    Strip upper =
        new Strip(Unit.DEGREE, margins, sweep.unit(), theme)
            .level(0, theme.fails())
            .level(COMFORTABLE, theme.quiet())
            .curve(margin, 0, 0.5)
            .dots(stable(points));
    Span dampings = Span.of(DoubleStream.of(damping.y())).with(0).padded(0.12, 0.25);
    Strip lower =
        new Strip(Unit.ONE, dampings, sweep.unit(), theme)
            .level(0, theme.fails())
            .curve(damping, 1, 0.5)
            .dots(stable(points));
    if (dampings.lower() < 0) {
      lower.shadeValues(new Span(dampings.lower(), 0), theme.fails());
      lower.label(
          PlotLabel.at(values[values.length - 1], dampings.lower(), "grows", theme.fails())
              .orNone());
    }
    points.stream()
        .filter(StabilitySweep.Point::present)
        .findAny()
        .ifPresent(
            present -> {
              upper.place(present.value(), theme.accent());
              lower.place(present.value(), theme.accent());
              upper.labelFirst(
                  PlotLabel.along(
                      present.value(),
                      List.of(margins.upper(), 0.0),
                      "present " + EngineeringFormat.format(present.value(), sweep.unit(), 3),
                      theme.accent()));
            });
    lowestStable(points)
        .ifPresent(
            value -> {
              String says = EngineeringFormat.format(value, sweep.unit(), 3);
              upper.place(value, theme.risky());
              upper.label(
                  PlotLabel.along(
                      value, List.of(margins.upper(), 0.0), "stable from " + says, theme.risky()));
            });
    return Picture.of(
        sweep.says(),
        "The worst of the whole swing at each value; full dots are stable. Damping is that of the"
            + " least damped pair: 0 rings for ever, below it grows.",
        ChartStyle.stack(
            new DecadeAxis(sweep.unit(), values[0] / 1.1, values[values.length - 1] * 1.1),
            List.of(upper.plot(), lower.plot()),
            List.of(3, 3),
            theme));
  }

  /** From which value on nothing grows, if there is one at which something does. */
  private static OptionalDouble lowestStable(List<StabilitySweep.Point> points) {
    int from = points.size();
    while (from > 0 && points.get(from - 1).stable()) {
      from--;
    }
    return from == 0 || from == points.size()
        ? OptionalDouble.empty()
        : OptionalDouble.of(points.get(from).value());
  }

  /** Damping ratio of the leading pair: −σ/|s|. */
  private static double damping(StabilitySweep.Point point) {
    OptionalDouble growth = point.growth();
    OptionalDouble frequency = point.frequency();
    if (growth.isEmpty() || frequency.isEmpty()) {
      return Double.NaN;
    }
    double omega = 2 * Math.PI * frequency.getAsDouble();
    return -growth.getAsDouble() / Math.hypot(growth.getAsDouble(), omega);
  }

  private static boolean[] stable(List<StabilitySweep.Point> points) {
    boolean[] stable = new boolean[points.size()];
    for (int k = 0; k < stable.length; k++) {
      stable[k] = points.get(k).stable();
    }
    return stable;
  }
}
