package loopwright.view.chart;

import java.util.List;
import loopwright.design.Feedback;
import loopwright.predict.ComplexPoint;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Unit;

/**
 * Loop gain on the plane of its real and imaginary part, near the point −1 that it must not turn
 * about (Nyquist 1932).
 */
final class NyquistPlot implements PlotSubject {
  /** What is shown of the plane: the loop gain is decided where it is of the order of 1. */
  private static final Span REAL = new Span(-3.2, 1.8);

  private static final Span IMAGINARY = new Span(-2.2, 2.2);
  private static final int CIRCLE = 180;

  @Override
  public String tab() {
    return "Nyquist";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    if (prediction.hookup().feedback() instanceof Feedback.Open) {
      return Picture.none(
          "No loop",
          "With an open hookup nothing comes back. Choose a hookup with feedback to see its loop.");
    }
    List<ComplexPoint> points = prediction.loopGain();
    if (points.size() < 2) {
      return Picture.none(
          "No loop gain",
          Words.sentences("The loop gain could not be solved", prediction.failure()));
    }
    Strip strip =
        new Strip(Unit.ONE, IMAGINARY, Unit.ONE, theme)
            .level(0, theme.quiet())
            .place(0, theme.quiet())
            .curve(locus("loop gain", points, 1), 0, 0.5)
            .curve(locus("negative frequencies", points, -1), 1, 0.5)
            .curve(circle(), 2, 0.12)
            .distance(-1, -0.06, 0.06, theme.fails())
            .labelFirst(PlotLabel.at(-1, 0, "\u22121", theme.fails()));
    mark(strip, points, theme);
    strip.plane(
        (series, item) ->
            series < 2 && item < points.size() ? Words.hertz(points.get(item).frequency()) : "");
    int turns = turns(points);
    int growing = (int) prediction.unstablePoles().stream().filter(root -> root.im() > 0).count();
    return Picture.of(
        turns == 0
            ? "The loop gain does not turn about \u22121 at rest"
            : "The loop gain turns about \u22121 " + times(turns) + " at rest",
        Words.sentences(
            "Imaginary part over real part; clockwise turns about \u22121 are growing frequencies that"
                + " the loop makes of an amplifier that is stable without it",
            growing == 0
                ? "Nothing grows at rest"
                : growing + (growing == 1 ? " pair grows" : " pairs grow") + " at rest",
            "Other output levels: see Over swing"),
        ChartStyle.stack(
            new EngineeringAxis(Unit.ONE, REAL), List.of(strip.plot()), List.of(1), theme));
  }

  /** Frequencies at which it passes through the shown part of the plane. */
  private static void mark(Strip strip, List<ComplexPoint> points, PlotTheme theme) {
    double before = Double.NEGATIVE_INFINITY;
    for (ComplexPoint point : points) {
      double decade = Math.log10(point.frequency());
      if (inside(point) && Math.hypot(point.re(), point.im()) > 0.15 && decade - before > 0.29) {
        strip.label(
            PlotLabel.at(point.re(), point.im(), Words.hertz(point.frequency()), theme.text())
                .orNone());
        before = decade;
      }
    }
  }

  private static boolean inside(ComplexPoint point) {
    return point.re() > REAL.lower()
        && point.re() < REAL.upper()
        && Math.abs(point.im()) < IMAGINARY.upper();
  }

  private static Curve locus(String name, List<ComplexPoint> points, int sign) {
    return new Curve(
        name,
        points.stream().mapToDouble(ComplexPoint::re).toArray(),
        points.stream().mapToDouble(point -> sign * point.im()).toArray());
  }

  private static Curve circle() {
    double[] x = new double[CIRCLE + 1];
    double[] y = new double[CIRCLE + 1];
    for (int k = 0; k <= CIRCLE; k++) {
      x[k] = Math.cos(2 * Math.PI * k / CIRCLE);
      y[k] = Math.sin(2 * Math.PI * k / CIRCLE);
    }
    return new Curve("|T| = 1", x, y);
  }

  /** Clockwise turns about −1 from the negative to the positive frequencies. */
  static int turns(List<ComplexPoint> points) {
    double turned = 0;
    for (int k = 1; k < points.size(); k++) {
      ComplexPoint a = points.get(k - 1);
      ComplexPoint b = points.get(k);
      double ar = a.re() + 1;
      double br = b.re() + 1;
      turned += Math.atan2(ar * b.im() - a.im() * br, ar * br + a.im() * b.im());
    }
    // Both signs of frequency; the ends lie on the real axis but for a remainder that rounds away.
    return (int) Math.round(-2 * turned / (2 * Math.PI));
  }

  private static String times(int turns) {
    int count = Math.abs(turns);
    String way = turns > 0 ? " clockwise" : " against the clock";
    return (count == 1 ? "once" : count == 2 ? "twice" : count + " times") + way;
  }
}
