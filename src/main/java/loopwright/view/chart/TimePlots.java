package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import loopwright.predict.FigureResult;
import loopwright.predict.Oscillation;
import loopwright.predict.StepResponses;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import org.jfree.chart.JFreeChart;

/** What a hookup does in time: steps, and the oscillation where something grows. */
public final class TimePlots {
  private static final double SETTLED = 0.01;
  private static final int CYCLES = 8;

  private TimePlots() {}

  /** All plots of a run. */
  public static List<ResultPlot> of(StepResponses run) {
    List<ResultPlot> plots = new ArrayList<>();
    run.oscillation()
        .ifPresent(
            oscillation -> {
              plots.add(new ResultPlot("Oscillation", theme -> settled(oscillation, theme)));
              plots.add(new ResultPlot("Its beginning", theme -> beginning(oscillation, theme)));
            });
    for (StepResponses.Curve curve : run.curves()) {
      plots.add(new ResultPlot(tab(curve.kind()), theme -> step(run, curve, theme)));
    }
    run.overloads().forEach(overload -> plots.add(RecoveryPlot.of(overload)));
    return plots;
  }

  private static String tab(String kind) {
    return switch (kind) {
      case "small" -> "Small step";
      case "rising" -> "Slewing up";
      default -> "Slewing down";
    };
  }

  private static Picture step(StepResponses run, StepResponses.Curve step, PlotTheme theme) {
    if (step.times().size() < 2) {
      return Picture.none("Not run", Words.sentences(step.says()));
    }
    double[] times = array(step.times());
    double[] volts = array(step.output());
    Span span = Span.of(DoubleStream.of(volts)).with(step.to()).padded(0.12, 0.2);
    Strip strip =
        new Strip(Unit.VOLT, span, Unit.SECOND, theme)
            .level(step.to(), theme.quiet())
            .curve(new Curve("out", times, volts), 0, 0.6);
    boolean small = step.kind().equals("small");
    if (small) {
      double band = SETTLED * Math.abs(step.to() - step.from());
      strip.shadeValues(new Span(step.to() - band, step.to() + band), theme.accent());
      solved(run, "settlingTime")
          .ifPresent(
              time -> {
                strip.place(time, theme.accent());
                strip.labelFirst(
                    PlotLabel.along(
                        time,
                        List.of(span.lower(), (span.lower() + span.upper()) / 2),
                        "settled to 1 % after " + Words.seconds(time),
                        theme.accent()));
              });
    } else {
      for (double share : new double[] {0.1, 0.9}) {
        double level = step.from() + share * (step.to() - step.from());
        strip.level(level, theme.rule());
        strip.label(
            PlotLabel.at(
                    times[times.length - 1], level, EngineeringFormat.percent(share), theme.quiet())
                .orNone());
      }
    }
    return Picture.of(
        small ? smallTitle(run) : slewTitle(run, step.kind()),
        small
            ? "A tenth of the hookup's peak, upward from rest, every capacitance in place; the band is"
                + " 1 % of the step."
            : "A step over most of the swing; the rate is taken between 10 % and 90 % of the way.",
        ChartStyle.stack(
            new EngineeringAxis(Unit.SECOND, new Span(0, shown(run, step, times))),
            List.of(strip.plot()),
            List.of(1),
            theme));
  }

  /** The end of what is worth seeing: some times the settling or the slewing. */
  private static double shown(StepResponses run, StepResponses.Curve step, double[] times) {
    double last = times[times.length - 1];
    if (step.kind().equals("small")) {
      OptionalDouble settling = number(run, "settlingTime");
      return settling.isPresent() ? Math.min(last, 3 * settling.getAsDouble()) : last;
    }
    OptionalDouble slew = number(run, step.kind().equals("rising") ? "slewRising" : "slewFalling");
    return slew.isPresent()
        ? Math.min(last, 2.5 * Math.abs(step.to() - step.from()) / slew.getAsDouble())
        : last;
  }

  private static String smallTitle(StepResponses run) {
    OptionalDouble overshoot = number(run, "overshoot");
    return overshoot.isPresent()
        ? "Overshoots by " + EngineeringFormat.percent(overshoot.getAsDouble())
        : "A small step";
  }

  private static String slewTitle(StepResponses run, String kind) {
    String key = kind.equals("rising") ? "slewRising" : "slewFalling";
    OptionalDouble slew = number(run, key);
    OptionalDouble formula = run.figures().get(key).formula().number();
    if (slew.isEmpty()) {
      return "The slew rate is not known";
    }
    return "Slews at "
        + rate(slew.getAsDouble())
        + (formula.isPresent() && Double.isFinite(formula.getAsDouble())
            ? "; by hand " + rate(formula.getAsDouble())
            : "");
  }

  private static Picture settled(Oscillation oscillation, PlotTheme theme) {
    if (oscillation.settled().isEmpty()) {
      return Picture.none("It has not settled", Words.sentences(oscillation.says()));
    }
    Oscillation.Settled settled = oscillation.settled().get();
    double[] times = array(oscillation.times());
    double last = times[times.length - 1];
    double from = Math.max(times[0], last - CYCLES / settled.frequency());
    return Picture.of(
        "Oscillates at "
            + Words.hertz(settled.frequency())
            + " with "
            + Words.volts(settled.amplitude())
            + " peak",
        Words.sentences(
            "The generator held where the output would rest at "
                + Words.volts(oscillation.output()),
            "Small-signal forecast "
                + Words.hertz(oscillation.forecastFrequency())
                + "; while small it ran at "
                + Words.hertz(oscillation.early().frequency()),
            rides(oscillation)),
        wave(oscillation, new Span(from, last), theme));
  }

  private static Picture beginning(Oscillation oscillation, PlotTheme theme) {
    double[] times = array(oscillation.times());
    return Picture.of(
        "Grows by e every " + Words.seconds(1 / oscillation.early().growth()),
        Words.sentences(
            "From a nudge of a microvolt",
            "The small-signal circuit forecasts a factor e every "
                + Words.seconds(1 / oscillation.forecastGrowth())),
        wave(oscillation, new Span(times[0], times[times.length - 1]), theme));
  }

  private static String rides(Oscillation oscillation) {
    List<String> stretches =
        oscillation.rides().stream()
            .map(ride -> Words.volts(ride.lowOutput()) + " to " + Words.volts(ride.highOutput()))
            .toList();
    return "It rides on the waveform from " + String.join(", and from ", stretches);
  }

  private static JFreeChart wave(Oscillation oscillation, Span shown, PlotTheme theme) {
    double[] times = array(oscillation.times());
    double[] volts = array(oscillation.volts());
    for (int k = 0; k < times.length; k++) {
      if (times[k] < shown.lower()) {
        volts[k] = Double.NaN;
      }
    }
    Span span = Span.of(DoubleStream.of(volts)).padded(0.12, 0.2);
    return ChartStyle.stack(
        new EngineeringAxis(Unit.SECOND, shown),
        List.of(
            new Strip(Unit.VOLT, span, Unit.SECOND, theme)
                .level(oscillation.output(), theme.quiet())
                .curve(new Curve("out", times, volts), 0, 0.5)
                .plot()),
        List.of(1),
        theme);
  }

  private static Optional<Double> solved(StepResponses run, String key) {
    OptionalDouble number = number(run, key);
    return number.isPresent() ? Optional.of(number.getAsDouble()) : Optional.empty();
  }

  private static OptionalDouble number(StepResponses run, String key) {
    FigureResult result = run.figures().get(key);
    return result == null ? OptionalDouble.empty() : result.solved().number();
  }

  private static String rate(double value) {
    return EngineeringFormat.format(value, Unit.VOLT_PER_SECOND, 3);
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
