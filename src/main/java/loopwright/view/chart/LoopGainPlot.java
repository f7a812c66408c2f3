package loopwright.view.chart;

import java.awt.Color;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Feedback;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Unit;

/** Loop gain: magnitude and phase, with unity frequency, phase margin and gain margin marked. */
final class LoopGainPlot implements PlotSubject {
  /** Levels below are not drawn: there the loop does nothing. */
  private static final double FLOOR = -60;

  /** A phase margin below this deserves a look; common practice, no source. */
  private static final double COMFORTABLE = 45;

  @Override
  public String tab() {
    return "Loop gain";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    if (prediction.hookup().feedback() instanceof Feedback.Open) {
      return Picture.none(
          "No loop",
          "With an open hookup nothing comes back. Choose a hookup with feedback, or give this one"
              + " a divider, to see loop gain and margins.");
    }
    if (prediction.loopGain().size() < 2) {
      return Picture.none(
          "No loop gain",
          Words.sentences("The loop gain could not be solved", prediction.failure()));
    }
    Bode bode = Bode.of(prediction.loopGain());
    Figures figures = new Figures(prediction);
    Margins margins = new Margins(bode, figures);
    double floor = Math.min(FLOOR, bode.peak() - 20);
    return Picture.of(
        title(prediction, margins),
        sentence(figures, margins),
        ChartStyle.stack(
            bode.axis(floor),
            List.of(
                magnitude(bode, margins, floor, theme).plot(),
                phase(bode, margins, floor, theme).plot()),
            List.of(3, 3),
            theme));
  }

  private static Strip magnitude(Bode bode, Margins margins, double floor, PlotTheme theme) {
    Strip strip =
        new Strip(Unit.DECIBEL, bode.levels(floor).with(0).padded(0.05, 0.12), Unit.HERTZ, theme)
            .level(0, theme.quiet())
            .curve(bode.magnitude("loop gain"), 0, 0.3);
    margins.unity.ifPresent(
        unity -> {
          strip.place(unity, theme.quiet());
          strip.labelFirst(
              PlotLabel.along(
                  unity,
                  List.of(0.0, bode.peak() / 4, bode.peak() / 2, bode.peak()),
                  "unity at " + Words.hertz(unity),
                  theme.text()));
        });
    if (margins.gain.isPresent() && margins.reversal.isPresent()) {
      double level = -Bode.decibels(margins.gain.getAsDouble());
      double place = margins.reversal.getAsDouble();
      Color colour = level > 0 ? theme.fails() : theme.accent();
      strip.distance(place, 0, level, colour);
      strip.labelFirst(
          PlotLabel.along(
              place,
              List.of(level / 2, level, 0.0, 2 * level),
              "gain margin " + margins.gainSays(),
              colour));
    }
    return strip;
  }

  private static Strip phase(Bode bode, Margins margins, double floor, PlotTheme theme) {
    Strip strip =
        new Strip(Unit.DEGREE, bode.angles(floor).with(-180).padded(0.1, 0.1), Unit.HERTZ, theme)
            .level(-180, theme.quiet())
            .curve(bode.phase("phase"), 1, 0.3);
    if (margins.unity.isPresent() && margins.phase.isPresent()) {
      double unity = margins.unity.getAsDouble();
      double margin = margins.phase.getAsDouble();
      Color colour = verdict(margin, theme);
      strip.place(unity, theme.quiet());
      strip.distance(unity, -180, margin - 180, colour);
      strip.labelFirst(
          PlotLabel.at(unity, margin / 2 - 180, "phase margin " + Words.degrees(margin), colour));
    }
    margins.reversal.ifPresent(place -> strip.place(place, theme.rule()));
    return strip;
  }

  private static Color verdict(double margin, PlotTheme theme) {
    if (margin <= 0) {
      return theme.fails();
    }
    return margin < COMFORTABLE ? theme.risky() : theme.accent();
  }

  private static String title(HookupPrediction prediction, Margins margins) {
    String begin = prediction.unstablePoles().isEmpty() ? "" : "Grows at rest: ";
    if (margins.unity.isEmpty() || margins.phase.isEmpty()) {
      return begin.isEmpty() ? "The loop gain passes 1 nowhere" : begin + "see the levels";
    }
    String says =
        "phase margin "
            + Words.degrees(margins.phase.getAsDouble())
            + " at "
            + Words.hertz(margins.unity.getAsDouble());
    return begin.isEmpty() ? "P" + says.substring(1) : begin + says;
  }

  private static String sentence(Figures figures, Margins margins) {
    OptionalDouble dc = figures.solved("loopGainDc");
    String gain =
        margins.gain.isPresent()
            ? "Gain margin " + margins.gainSays()
            : figures.says("gainMargin").isBlank()
                ? ""
                : "No gain margin: " + figures.says("gainMargin");
    return Words.sentences(
        dc.isPresent()
            ? "At rest; midband loop gain "
                + Words.ratio(dc.getAsDouble())
                + ", by which the loop divides the amplifier's errors"
            : "At rest",
        gain,
        margins.unity.isEmpty() ? figures.says("unityFrequency") : "",
        "Other output levels: see Over swing");
  }

  /** Where the margins are taken. */
  private static final class Margins {
    private final OptionalDouble unity;
    private final OptionalDouble phase;
    private final OptionalDouble gain;

    /** Hz, where the phase passes −180° and the gain margin is taken. */
    private final OptionalDouble reversal;

    Margins(Bode bode, Figures figures) {
      unity = figures.solved("unityFrequency");
      phase = figures.solved("phaseMargin");
      gain = figures.solved("gainMargin");
      reversal = gain.isPresent() ? reversal(bode, -Bode.decibels(gain.getAsDouble())) : gain;
    }

    String gainSays() {
      double margin = gain.getAsDouble();
      return Words.ratio(margin) + " (" + Words.decibels(Bode.decibels(margin)) + ")";
    }

    /** The passage of −180° at which the level is nearest to the one that the margin stands for. */
    private static OptionalDouble reversal(Bode bode, double level) {
      OptionalDouble best = OptionalDouble.empty();
      double least = Double.POSITIVE_INFINITY;
      for (int i = 1; i < bode.degrees().length; i++) {
        double before = turns(bode.degrees()[i - 1]);
        double after = turns(bode.degrees()[i]);
        double distance = Math.abs(bode.decibels()[i] - level);
        if (Math.floor(before) != Math.floor(after) && distance < least) {
          double passed = Math.max(Math.floor(before), Math.floor(after));
          double share = (passed - before) / (after - before);
          double ratio = bode.frequencies()[i] / bode.frequencies()[i - 1];
          least = distance;
          best = OptionalDouble.of(bode.frequencies()[i - 1] * Math.pow(ratio, share));
        }
      }
      return best;
    }

    /** Whole at every angle that reverses the sign: −180°, 180°, −540°. */
    private static double turns(double degrees) {
      return (degrees + 180) / 360;
    }
  }
}
