package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Waveform;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** One period at the output and at the gain stage, and the error on a scale of its own. */
final class WaveformPlot implements PlotSubject {
  /**
   * Half the difference of gainOut and out over a period from which on it is a step to speak of.
   */
  private static final double STEP = 0.05;

  /** Less is no more than rounding of the solution. */
  private static final double LEAST_DISTORTION = 1e-6;

  @Override
  public String tab() {
    return "Waveform";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    if (prediction.hookup().source().amplitude().value() == 0) {
      return Picture.none(
          "No signal",
          "Give the source an amplitude to see the waveform at out and at gainOut, and what is left"
              + " of the crossover.");
    }
    if (prediction.waveform().isEmpty()) {
      return Picture.none(
          "No waveform", Words.sentences(new Figures(prediction).says("closedLoopGain")));
    }
    Waveform waveform = prediction.waveform().get();
    double frequency = prediction.hookup().source().frequency().value();
    double[] time = time(waveform.out().length, frequency);
    Span errors = Span.of(DoubleStream.of(waveform.error())).with(0).padded(0.12);
    Strip error =
        new Strip(Unit.VOLT, errors, Unit.SECOND, theme)
            .curve(new Curve("error at out", time, waveform.error()), 1, 0.6);
    return Picture.of(
        title(prediction),
        sentence(prediction, frequency),
        ChartStyle.stack(
            new EngineeringAxis(Unit.SECOND, new Span(0, 1 / frequency)),
            List.of(signals(waveform, time, theme).plot(), error.plot()),
            List.of(3, 2),
            theme));
  }

  private static Strip signals(Waveform waveform, double[] time, PlotTheme theme) {
    List<Curve> curves = new ArrayList<>();
    curves.add(new Curve("out", time, waveform.out()));
    if (differ(waveform)) {
      curves.add(new Curve("gainOut", time, waveform.gainOut()));
    }
    Span span =
        Span.of(curves.stream().flatMapToDouble(curve -> DoubleStream.of(curve.y()))).padded(0.12);
    Strip strip = new Strip(Unit.VOLT, span, Unit.SECOND, theme);
    strip.curve(curves.get(0), 0, 0.78);
    if (curves.size() > 1) {
      strip.curve(curves.get(1), 2, 0.3);
    }
    return strip;
  }

  private static boolean differ(Waveform waveform) {
    for (int i = 0; i < waveform.out().length; i++) {
      if (Math.abs(waveform.out()[i] - waveform.gainOut()[i]) > 1e-9) {
        return true;
      }
    }
    return false;
  }

  private static double[] time(int points, double frequency) {
    double[] time = new double[points];
    for (int i = 0; i < points; i++) {
      time[i] = i / (points * frequency);
    }
    return time;
  }

  private static String title(HookupPrediction prediction) {
    Figures figures = new Figures(prediction);
    OptionalDouble zone = figures.solved("deadZone");
    OptionalDouble error = figures.solved("crossoverError");
    String left =
        error.isPresent() ? "\u00B1" + Words.volts(error.getAsDouble()) : "an unknown part";
    if (zone.isPresent() && zone.getAsDouble() >= STEP) {
      return "gainOut steps over \u00B1"
          + Words.volts(zone.getAsDouble())
          + " of dead zone; out keeps "
          + left
          + " of it";
    }
    return "out departs from a sine by " + left;
  }

  private static String sentence(HookupPrediction prediction, double frequency) {
    OptionalDouble thd = new Figures(prediction).solved("thd");
    return Words.sentences(
        "One period at "
            + Words.hertz(frequency)
            + " with "
            + Words.volts(prediction.hookup().source().amplitude().value())
            + " peak at the generator",
        "The error is out less its mean and its fundamental",
        thd.isPresent() ? "Harmonic distortion " + percent(thd.getAsDouble()) : "");
  }

  private static String percent(double share) {
    return share < LEAST_DISTORTION
        ? "under " + EngineeringFormat.percent(LEAST_DISTORTION)
        : EngineeringFormat.percent(round(share));
  }

  private static double round(double share) {
    double unit = Math.pow(10, Math.floor(Math.log10(share)) - 2);
    return Math.rint(share / unit) * unit;
  }
}
