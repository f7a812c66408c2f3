package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.predict.HookupPrediction;
import loopwright.predict.SwingLevel;
import loopwright.quantity.Unit;

/** The leading pair of natural frequencies as it wanders with the output level. */
final class RootsPlot implements PlotSubject {
  /** So far from one level to the next no pair wanders, as a share of the plot. */
  private static final double JUMP = 0.2;

  @Override
  public String tab() {
    return "Roots";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    List<SwingLevel> levels =
        prediction.overSwing().stream()
            .filter(level -> level.growth().isPresent() && level.frequency().isPresent())
            .toList();
    if (levels.isEmpty()) {
      return Picture.none(
          "No pair of roots",
          Words.sentences(
              "At no output level does the circuit have a pair of natural frequencies that rings",
              prediction.swingRemark()));
    }
    double[] growth = levels.stream().mapToDouble(level -> level.growth().getAsDouble()).toArray();
    double[] hertz =
        levels.stream().mapToDouble(level -> level.frequency().getAsDouble()).toArray();
    Span across = Span.of(DoubleStream.of(growth)).with(0).padded(0.12);
    Span up = Span.of(DoubleStream.of(hertz)).with(0).padded(0, 0.15);
    boolean[] growing = growing(growth, hertz, across, up);
    Strip strip =
        new Strip(Unit.HERTZ, up, Unit.PER_SECOND, theme)
            .place(0, theme.quiet())
            .curve(locus(growth, hertz, across, up), 0, 0.5)
            .dots(growing)
            .plane((series, item) -> "");
    if (across.upper() > 0) {
      strip.shadePlaces(new Span(0, across.upper()), theme.fails());
    }
    strip.label(PlotLabel.at(across.upper(), up.upper(), "grows", theme.fails()).orNone());
    strip.label(PlotLabel.at(across.lower(), up.upper(), "dies away", theme.quiet()).orNone());
    for (int k : ends(levels)) {
      strip.label(
          PlotLabel.at(
                  growth[k],
                  hertz[k],
                  "out at " + Words.volts(levels.get(k).output()),
                  theme.text())
              .orNone());
    }
    EngineeringAxis axis = new EngineeringAxis(Unit.PER_SECOND, across);
    axis.setLabel(axis.scale().onAxis());
    return Picture.of(
        title(levels),
        Words.sentences(
            "Frequency of the least damped pair over its growth, a point for each output level",
            "Right of the line it grows",
            prediction.swingRemark()),
        ChartStyle.stack(axis, List.of(strip.plot()), List.of(1), theme));
  }

  private static String title(List<SwingLevel> levels) {
    long unstable = levels.stream().filter(level -> level.growth().getAsDouble() > 0).count();
    if (unstable == 0) {
      return "The leading pair dies away at every level";
    }
    return unstable == levels.size()
        ? "The leading pair grows at every level"
        : "The leading pair grows at a part of the levels";
  }

  /** Where another pair leads from one level to the next, the line has a gap. */
  private static Curve locus(double[] growth, double[] hertz, Span across, Span up) {
    List<Double> x = new ArrayList<>();
    List<Double> y = new ArrayList<>();
    for (int k = 0; k < growth.length; k++) {
      if (k > 0 && jumps(growth, hertz, k, across, up)) {
        x.add(growth[k]);
        y.add(Double.NaN);
      }
      x.add(growth[k]);
      y.add(hertz[k]);
    }
    return new Curve("leading pair", array(x), array(y));
  }

  private static boolean[] growing(double[] growth, double[] hertz, Span across, Span up) {
    Curve locus = locus(growth, hertz, across, up);
    boolean[] growing = new boolean[locus.x().length];
    for (int k = 0; k < growing.length; k++) {
      growing[k] = locus.x()[k] > 0;
    }
    return growing;
  }

  private static boolean jumps(double[] growth, double[] hertz, int k, Span across, Span up) {
    return Math.abs(growth[k] - growth[k - 1]) > JUMP * across.length()
        || Math.abs(hertz[k] - hertz[k - 1]) > JUMP * up.length();
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** Both ends of the swing and its middle. */
  private static int[] ends(List<SwingLevel> levels) {
    int last = levels.size() - 1;
    return last == 0 ? new int[] {0} : new int[] {last / 2, last, 0};
  }
}
