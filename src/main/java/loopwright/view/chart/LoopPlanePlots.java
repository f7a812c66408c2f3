package loopwright.view.chart;

import java.awt.Color;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.function.BiFunction;
import loopwright.predict.ComplexPoint;
import loopwright.predict.LoopPlane;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** The loop gain about −1 at rest and at the worst level, and all roots over the swing. */
public final class LoopPlanePlots {
  /** What is shown of the plane: the loop gain is decided where it is of the order of 1. */
  private static final Span REAL = new Span(-3.2, 1.8);

  private static final Span IMAGINARY = new Span(-2.2, 2.2);
  private static final int CIRCLE = 181;

  /** How far the shown part of the roots' plane reaches, in sizes of the pair that matters. */
  private static final double REACH = 2.2;

  private LoopPlanePlots() {}

  /** Both plots of a hookup's loop. */
  public static List<ResultPlot> of(LoopPlane plane) {
    return List.of(
        new ResultPlot("Nyquist, worst level", theme -> nyquist(plane, theme)),
        new ResultPlot("Roots over the swing", theme -> roots(plane, theme)));
  }

  static Picture nyquist(LoopPlane plane, PlotTheme theme) {
    if (plane.rest().isEmpty()) {
      return Picture.none(
          "No loop",
          "With an open hookup nothing comes back. Choose a hookup with feedback to see its loop.");
    }
    LoopPlane.Turning rest = plane.rest().get();
    Optional<LoopPlane.Turning> worst =
        plane.worst().filter(level -> level.output() != rest.output());
    List<List<ComplexPoint>> shown = new ArrayList<>();
    Strip strip =
        new Strip(Unit.ONE, IMAGINARY, Unit.ONE, theme)
            .level(0, theme.rule())
            .place(0, theme.rule());
    shown.add(near(rest.points()));
    strip.curve(curve("at rest", shown.get(0)), 0, 0.5);
    worst.ifPresent(
        level -> {
          shown.add(near(level.points()));
          strip.curve(curve("out at " + Words.volts(level.output()), shown.get(1)), 1, 0.5);
        });
    strip.curve(circle(), 3, 0.12);
    strip.distance(-1, -0.08, 0.08, theme.fails());
    strip.labelFirst(PlotLabel.at(-1, 0, "\u22121", theme.fails()));
    BiFunction<Integer, Integer, String> says =
        (series, item) ->
            series < shown.size() ? Words.hertz(shown.get(series).get(item).frequency()) : "";
    strip.plane(says);
    markFrequencies(strip, shown.get(shown.size() - 1), theme);
    String restSays = "At rest it " + rest.says();
    return Picture.of(
        worst
            .map(
                level ->
                    "With out at " + Words.volts(level.output()) + " the loop gain " + level.says())
            .orElse("At rest the loop gain " + rest.says()),
        Words.sentences(
            worst.isPresent() ? restSays : "At rest is the worst level of the swing",
            "Imaginary over real part for positive frequencies, near \u22121; turns are counted with"
                + " negative frequencies too"),
        ChartStyle.stack(
            new EngineeringAxis(Unit.ONE, REAL), List.of(strip.plot()), List.of(1), theme));
  }

  /** What lies within some sizes of the shown part; farther off is no use to the eye. */
  private static List<ComplexPoint> near(List<ComplexPoint> points) {
    List<ComplexPoint> near =
        points.stream()
            .filter(point -> point.magnitude() < 30 && point.magnitude() > 1e-4)
            .toList();
    return near.size() < 2 ? points : near;
  }

  private static Curve curve(String name, List<ComplexPoint> points) {
    return new Curve(
        name,
        points.stream().mapToDouble(ComplexPoint::re).toArray(),
        points.stream().mapToDouble(ComplexPoint::im).toArray());
  }

  private static Curve circle() {
    double[] re = new double[CIRCLE];
    double[] im = new double[CIRCLE];
    for (int k = 0; k < CIRCLE; k++) {
      re[k] = Math.cos(2 * Math.PI * k / (CIRCLE - 1));
      im[k] = Math.sin(2 * Math.PI * k / (CIRCLE - 1));
    }
    return new Curve("unit circle", re, im);
  }

  /** Frequencies at which the curve passes through the shown part, some steps apart. */
  private static void markFrequencies(Strip strip, List<ComplexPoint> points, PlotTheme theme) {
    double before = Double.NEGATIVE_INFINITY;
    for (ComplexPoint point : points) {
      double decade = Math.log10(point.frequency());
      boolean isInside =
          point.re() > REAL.lower()
              && point.re() < REAL.upper()
              && Math.abs(point.im()) < IMAGINARY.upper();
      if (isInside && point.magnitude() > 0.2 && decade - before > 0.2) {
        strip.label(
            PlotLabel.at(point.re(), point.im(), Words.hertz(point.frequency()), theme.text())
                .orNone());
        before = decade;
      }
    }
  }

  static Picture roots(LoopPlane plane, PlotTheme theme) {
    Optional<Root> leading = leading(plane);
    if (leading.isEmpty()) {
      return Picture.none(
          "No pair of roots", "At no output level has the circuit a pair of roots that rings.");
    }
    double size = REACH * Math.hypot(leading.get().re(), leading.get().im());
    Span across = new Span(-size, Math.max(0.25 * size, 1.4 * leading.get().re()));
    List<LoopPlane.Locus> shown =
        plane.loci().stream()
            .filter(
                locus ->
                    locus.roots().stream().anyMatch(root -> root.re() > -size && root.im() < size))
            .sorted(
                Comparator.comparing(
                        (LoopPlane.Locus locus) -> !locus.roots().contains(leading.get()))
                    .thenComparing(
                        locus -> -locus.roots().stream().mapToDouble(Root::re).max().orElse(0)))
            .toList();
    double highest =
        shown.stream()
            .flatMap(locus -> locus.roots().stream())
            .mapToDouble(Root::im)
            .filter(im -> im < size)
            .max()
            .orElse(size);
    Span up = new Span(-0.05 * highest / (2 * Math.PI), 1.25 * highest / (2 * Math.PI));
    Strip strip =
        new Strip(Unit.HERTZ, up, Unit.PER_SECOND, theme)
            .place(0, theme.quiet())
            .shadePlaces(new Span(0, across.upper()), theme.fails());
    int rings = 0;
    int real = 0;
    for (LoopPlane.Locus locus : shown) {
      boolean isPair = locus.roots().stream().anyMatch(root -> root.im() > 0);
      rings += isPair ? 1 : 0;
      real += isPair ? 0 : 1;
      strip.locus(
          new Curve(
              isPair ? "pair " + rings : "real root " + real,
              locus.roots().stream().mapToDouble(Root::re).toArray(),
              locus.roots().stream().mapToDouble(root -> root.im() / (2 * Math.PI)).toArray()),
          isPair ? rings - 1 : 3,
          isPair);
    }
    strip.plane(
        (series, item) ->
            "out at " + Words.volts(plane.levels().get(shown.get(series).first() + item).output()));
    strip.label(PlotLabel.at(across.upper(), up.upper(), "grows", theme.fails()).orNone());
    strip.label(PlotLabel.at(across.lower(), up.upper(), "dies away", theme.quiet()).orNone());
    ends(strip, plane, shown, leading.get(), theme.text());
    EngineeringAxis axis = new EngineeringAxis(Unit.PER_SECOND, across);
    axis.setLabel(axis.scale().onAxis());
    return Picture.of(
        title(plane, leading.get()),
        Words.sentences(
            "Frequency of every root over its growth, a dot for each output level; in the shade it"
                + " grows. Roots that die away much faster are left out"),
        ChartStyle.stack(axis, List.of(strip.plot()), List.of(1), theme));
  }

  /** Of what grows the fastest, otherwise what rings longest for its frequency. */
  private static Optional<Root> leading(LoopPlane plane) {
    List<Root> pairs =
        plane.loci().stream()
            .flatMap(locus -> locus.roots().stream())
            .filter(root -> root.im() > 0)
            .toList();
    Optional<Root> fastest = pairs.stream().max(Comparator.comparingDouble(Root::re));
    return fastest.filter(root -> root.re() > 0).isPresent()
        ? fastest
        : pairs.stream()
            .max(Comparator.comparingDouble(root -> root.re() / Math.hypot(root.re(), root.im())));
  }

  private static String title(LoopPlane plane, Root leading) {
    long growing = plane.levels().stream().filter(level -> !level.stable()).count();
    String where = Words.hertz(leading.im() / (2 * Math.PI));
    return growing == 0
        ? "No root grows at any level; what rings longest rings at " + where
        : "Roots grow at "
            + growing
            + " of "
            + plane.levels().size()
            + " levels, fastest "
            + EngineeringFormat.format(leading.re(), Unit.PER_SECOND, 3)
            + " at "
            + where;
  }

  /** The output levels at both ends of the locus that matters most, and at its worst. */
  private static void ends(
      Strip strip, LoopPlane plane, List<LoopPlane.Locus> shown, Root worst, Color colour) {
    LoopPlane.Locus leading =
        shown.stream().filter(locus -> locus.roots().contains(worst)).findFirst().orElseThrow();
    List<Root> roots = leading.roots();
    for (int k : new TreeSet<>(List.of(roots.indexOf(worst), 0, roots.size() - 1))) {
      SwingLevel level = plane.levels().get(leading.first() + k);
      Root root = roots.get(k);
      strip.label(
          PlotLabel.at(
                  root.re(),
                  root.im() / (2 * Math.PI),
                  "out at " + Words.volts(level.output()),
                  colour)
              .orNone());
    }
  }
}
