package loopwright.view.chart;

import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.predict.StepResponses;
import loopwright.quantity.Unit;

/** Clipping and the way back from it. */
final class RecoveryPlot {
  /** So many times the longer of overload's end and recovery are shown after the overload. */
  private static final double SHOWN = 3;

  /** And of the overload so much of that stretch before its end. */
  private static final double BEFORE = 0.5;

  private RecoveryPlot() {}

  static ResultPlot of(StepResponses.Recovery run) {
    return new ResultPlot(
        run.isAbove() ? "Clipping above" : "Clipping below", theme -> picture(run, theme));
  }

  private static Picture picture(StepResponses.Recovery run, PlotTheme theme) {
    if (run.times().size() < 2) {
      return Picture.none("Not run", Words.sentences(run.says()));
    }
    double[] times = run.times().stream().mapToDouble(Double::doubleValue).toArray();
    double[] volts = run.output().stream().mapToDouble(Double::doubleValue).toArray();
    double after = Math.min(times[times.length - 1] - run.width(), SHOWN * run.recovery());
    double from = Math.max(0, run.width() - BEFORE * after);
    Span span = Span.of(DoubleStream.of(volts)).with(run.rest()).padded(0.12, 0.2);
    double held = new Curve("out", times, volts).at(run.width());
    double back = run.width() + run.recovery();
    Strip strip =
        new Strip(Unit.VOLT, span, Unit.SECOND, theme)
            .level(run.rest(), theme.quiet())
            .shadePlaces(new Span(from, run.width()), theme.risky())
            .place(back, theme.accent())
            .curve(new Curve("out", times, volts), 0, 0.2);
    strip.labelFirst(
        PlotLabel.along(
            back,
            List.of((span.lower() + span.upper()) / 2, span.upper()),
            "back after " + Words.seconds(run.recovery()),
            theme.accent()));
    strip.label(
        PlotLabel.at(from, run.isAbove() ? span.lower() : span.upper(), "overload", theme.risky())
            .orNone());
    return Picture.of(
        "Held at "
            + Words.volts(held)
            + " by the overload, and back "
            + Words.seconds(run.recovery())
            + " after it",
        Words.sentences(
            held > run.rest() == run.isAbove()
                ? ""
                : "The output goes the wrong way: driven so far, the amplifier turns the phase round",
            "The generator goes half as far again as clips the output, stays, and returns at once; back"
                + " is within 1 % of how far the output went"),
        ChartStyle.stack(
            new EngineeringAxis(Unit.SECOND, new Span(from, run.width() + after)),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }
}
