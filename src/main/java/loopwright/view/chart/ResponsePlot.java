package loopwright.view.chart;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Unit;

/** Closed-loop response: magnitude above, phase below. */
final class ResponsePlot implements PlotSubject {
  /** Levels so far below the highest are not drawn. */
  private static final double DEPTH = 100;

  private static final double LEAST_PEAK = 0.05;

  @Override
  public String tab() {
    return "Response";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    if (prediction.response().size() < 2) {
      return Picture.none(
          "No response",
          Words.sentences(
              "out over generator could not be solved at any frequency", prediction.failure()));
    }
    Bode bode = Bode.of(prediction.response());
    Figures figures = new Figures(prediction);
    double floor = bode.peak() - DEPTH;
    Strip phase =
        new Strip(Unit.DEGREE, bode.angles(floor).padded(0.08), Unit.HERTZ, theme)
            .curve(bode.phase("phase"), 1, 0.4);
    return Picture.of(
        title(prediction, figures),
        sentence(prediction, figures, bode),
        ChartStyle.stack(
            bode.axis(floor),
            List.of(magnitude(bode, figures, floor, theme).plot(), phase.plot()),
            List.of(3, 2),
            theme));
  }

  private static Strip magnitude(Bode bode, Figures figures, double floor, PlotTheme theme) {
    OptionalDouble ideal = figures.formula("idealGain");
    Span span = bode.levels(floor);
    if (ideal.isPresent() && ideal.getAsDouble() != 0) {
      span = span.with(idealLevel(ideal));
    }
    Strip strip =
        new Strip(Unit.DECIBEL, span.padded(0.08, 0.16), Unit.HERTZ, theme)
            .curve(bode.magnitude("magnitude"), 0, 0.3);
    double lowest = bode.frequencies()[0];
    if (ideal.isPresent() && ideal.getAsDouble() != 0) {
      strip.level(idealLevel(ideal), theme.quiet());
      strip.label(
          PlotLabel.at(lowest, idealLevel(ideal), "ideal " + ideal(ideal), theme.quiet()).orNone());
    }
    corner(strip, bode, figures.solved("bandwidth"), theme);
    corner(strip, bode, figures.solved("lowCorner"), theme);
    return strip;
  }

  private static double idealLevel(OptionalDouble ideal) {
    return Bode.decibels(Math.abs(ideal.getAsDouble()));
  }

  private static String ideal(OptionalDouble ideal) {
    return Words.gain(ideal.getAsDouble());
  }

  private static void corner(Strip strip, Bode bode, OptionalDouble frequency, PlotTheme theme) {
    if (frequency.isPresent()) {
      double corner = frequency.getAsDouble();
      strip.place(corner, theme.accent());
      strip.labelFirst(
          PlotLabel.at(
              corner,
              bode.magnitude("").at(corner),
              "\u22123 dB at " + Words.hertz(corner),
              theme.accent()));
    }
  }

  private static String title(HookupPrediction prediction, Figures figures) {
    if (!prediction.unstablePoles().isEmpty()) {
      return "Grows at rest: no steady response";
    }
    OptionalDouble gain = figures.solved("closedLoopGainAtRest");
    OptionalDouble upper = figures.solved("bandwidth");
    OptionalDouble lower = figures.solved("lowCorner");
    String says = gain.isPresent() ? "Gain " + Words.gain(gain.getAsDouble()) : "Response";
    if (lower.isPresent()) {
      says += " from " + Words.hertz(lower.getAsDouble());
    }
    return upper.isPresent() ? says + " up to " + Words.hertz(upper.getAsDouble()) : says;
  }

  private static String sentence(HookupPrediction prediction, Figures figures, Bode bode) {
    String unstable =
        prediction.unstablePoles().isEmpty()
            ? ""
            : "The curves are those of the linear circuit; a scope would show the oscillation";
    return Words.sentences(
        unstable, atSignal(prediction, bode), peak(figures), noBandwidth(figures));
  }

  private static String atSignal(HookupPrediction prediction, Bode bode) {
    double signal = prediction.hookup().source().frequency().value();
    double level = bode.magnitude("").at(signal);
    if (!Double.isFinite(level)) {
      return "out over generator, at rest";
    }
    return "out over generator, at rest; at "
        + Words.hertz(signal)
        + " "
        + Words.decibels(level)
        + " and "
        + Words.degrees(bode.phase("").at(signal));
  }

  private static String peak(Figures figures) {
    OptionalDouble peaking = figures.solved("peaking");
    if (peaking.isEmpty()) {
      return "";
    }
    return peaking.getAsDouble() < LEAST_PEAK
        ? "It nowhere rises above its midband gain"
        : "It peaks " + Words.decibels(peaking.getAsDouble()) + " above its midband gain";
  }

  private static String noBandwidth(Figures figures) {
    return figures.solved("bandwidth").isPresent() || figures.says("bandwidth").isBlank()
        ? ""
        : "No bandwidth: " + figures.says("bandwidth");
  }
}
