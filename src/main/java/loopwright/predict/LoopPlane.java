package loopwright.predict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import loopwright.assembly.DeviceModels;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.task.Progress;

/**
 * The loop of a hookup on the plane: its loop gain at rest and at the worst level, and where its
 * natural frequencies wander over the swing.
 *
 * @param levels in the order of the generator's voltage
 * @param rest the loop gain at rest; empty with an open hookup
 * @param worst the loop gain where the fastest pair grows most or dies slowest; empty likewise
 * @param loci natural frequencies followed from level to level
 */
public record LoopPlane(
    List<SwingLevel> levels, Optional<Turning> rest, Optional<Turning> worst, List<Locus> loci) {
  /** A curve is followed in steps that turn no more about −1. */
  private static final double LARGEST_TURN = Math.toRadians(8);

  /** Nor go further than this where it is nearer to 0 than {@link #NEAR}, to be drawn smooth. */
  private static final double LONGEST_STEP = 0.15;

  private static final double NEAR = 5;
  private static final int MOST_HALVINGS = 14;

  /**
   * A loop gain and how it turns about −1 (Nyquist, Bell System Technical Journal 11, 1932,
   * 126–147).
   *
   * @param output level of the output, V
   * @param points from low to high frequency
   * @param clockwise turns about −1 of the whole curve, negative frequencies included
   * @param growing natural frequencies that grow there, each of a pair counted
   */
  public record Turning(double output, List<ComplexPoint> points, int clockwise, int growing) {
    /** Keeps its own copy. */
    public Turning {
      points = List.copyOf(points);
    }

    /** In words. */
    public String says() {
      String turns =
          clockwise == 0
              ? "does not turn about \u22121"
              : "turns about \u22121 "
                  + times(Math.abs(clockwise))
                  + (clockwise > 0 ? " clockwise" : " counter-clockwise");
      String grows =
          growing == 0 ? "nothing grows" : growing + (growing == 1 ? " root grows" : " roots grow");
      return turns + ": " + grows;
    }

    private static String times(int turns) {
      return turns == 1 ? "once" : turns == 2 ? "twice" : turns + " times";
    }
  }

  /**
   * One natural frequency over the swing, one of each conjugate pair.
   *
   * @param first the level at which it begins, an index of the levels
   * @param roots at that level and those after it
   */
  public record Locus(int first, List<Root> roots) {
    /** Keeps its own copy. */
    public Locus {
      roots = List.copyOf(roots);
    }
  }

  /** Keeps its own copies. */
  public LoopPlane {
    levels = List.copyOf(levels);
    loci = List.copyOf(loci);
  }

  /**
   * Solves a hookup at rest and over its swing.
   *
   * @param design a valid design, every part it names among its own
   * @param progress asked whether the result is still wanted
   * @throws ArithmeticException when the swing cannot be solved; the message says why
   * @throws loopwright.task.CancelledException when it is not wanted any more
   */
  public static LoopPlane of(Design design, Hookup hookup, Progress progress) {
    HookupSolution solution =
        new HookupSolution(design, hookup, new DeviceModels(design), Optional.empty(), progress);
    Outcome<SwingStability> swing = solution.swingOutcome();
    if (!swing.isPresent()) {
      throw new ArithmeticException(swing.reason());
    }
    List<SwingStability.Solved> solved = swing.value().levels();
    LinearNetwork network = new LinearNetwork(solution.assembled());
    NaturalFrequencies frequencies = null;
    List<List<Root>> roots = new ArrayList<>();
    for (SwingStability.Solved level : solved) {
      progress.check();
      network.linearise(level.state());
      if (frequencies == null) {
        frequencies = new NaturalFrequencies(network);
      }
      roots.add(
          frequencies.of(network).stream().map(pole -> new Root(pole.re(), pole.im())).toList());
    }
    double centre = hookup.source().dc().value();
    SwingStability.Solved rest =
        solved.stream()
            .min(Comparator.comparingDouble(level -> Math.abs(level.level().generator() - centre)))
            .orElseThrow();
    boolean isOpen = solution.assembled().isOpen();
    return new LoopPlane(
        solved.stream().map(SwingStability.Solved::level).toList(),
        isOpen ? Optional.empty() : Optional.of(turning(network, rest)),
        isOpen
            ? Optional.empty()
            : swing.value().worstByGrowth().map(worst -> turning(network, worst)),
        RootLoci.of(roots));
  }

  private static Turning turning(LinearNetwork network, SwingStability.Solved level) {
    network.linearise(level.state());
    List<Pole> poles = new NaturalFrequencies(network).of(network);
    List<ComplexPoint> points = new ArrayList<>();
    double turned = 0;
    for (double frequency : LoopMargins.grid(poles)) {
      turned += extend(network, points, frequency, MOST_HALVINGS);
    }
    int growing = poles.stream().filter(Pole::grows).mapToInt(pole -> pole.im() > 0 ? 2 : 1).sum();
    // The half for negative frequencies is the mirror image and turns as much again.
    return new Turning(level.level().output(), points, (int) Math.rint(-turned / Math.PI), growing);
  }

  /** Adds a point, and points before it where the curve turns about −1; how far it turned, rad. */
  private static double extend(
      LinearNetwork network, List<ComplexPoint> points, double frequency, int halvings) {
    double[] value = network.loopGain(frequency);
    ComplexPoint next = new ComplexPoint(frequency, value[0], value[1]);
    if (points.isEmpty()) {
      points.add(next);
      return 0;
    }
    ComplexPoint last = points.get(points.size() - 1);
    double re = (1 + last.re()) * (1 + next.re()) + last.im() * next.im();
    double im = (1 + last.re()) * next.im() - last.im() * (1 + next.re());
    double turned = Math.atan2(im, re);
    double moved = Math.hypot(next.re() - last.re(), next.im() - last.im());
    boolean isCoarse = moved > LONGEST_STEP && Math.min(last.magnitude(), next.magnitude()) < NEAR;
    if ((Math.abs(turned) > LARGEST_TURN || isCoarse) && halvings > 0) {
      double middle = Math.sqrt(last.frequency() * frequency);
      return extend(network, points, middle, halvings - 1)
          + extend(network, points, frequency, halvings - 1);
    }
    points.add(next);
    return turned;
  }
}
