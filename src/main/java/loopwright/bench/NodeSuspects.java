package loopwright.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.predict.HookupFigures;
import loopwright.spread.Band;
import loopwright.task.Progress;

/**
 * What to suspect when a node reads high or low, before anything is read: every single fault of the
 * catalogue is solved in the full circuit, and a node names those that it shows best.
 *
 * @param nodes in the order in which to measure them: each next one shows most of the faults that
 *     those before it do not show
 * @param faults how many faults were solved
 * @param shown how many of them some node shows
 */
public record NodeSuspects(List<Node> nodes, int faults, int shown) {
  /** A hand-held meter: 0.5 % of the reading and 3 mV; common practice, no source. */
  private static final double SHARE = 0.005;

  private static final double VOLTS = 3e-3;

  /** A node names faults whose effect on it is at least this share of their largest effect. */
  private static final double BEST_SHARE = 0.4;

  private static final int MOST_NAMED = 3;
  private static final double TENTHS = 10;
  private static final double RARER = 0.3;

  /** What all else hangs on comes first (common practice, no source). */
  private static final Set<String> SUPPLIES = Set.of("positive", "negative", "midRail");

  /** Keeps its own copy. */
  public NodeSuspects {
    nodes = List.copyOf(nodes);
  }

  /**
   * A node and what moves it out of its band.
   *
   * @param name of the node
   * @param ifHigh faults that raise it, those first that it shows best
   * @param ifLow faults that lower it
   */
  public record Node(String name, List<Suspect> ifHigh, List<Suspect> ifLow) {
    /** Keeps its own copies. */
    public Node {
      ifHigh = List.copyOf(ifHigh);
      ifLow = List.copyOf(ifLow);
    }
  }

  /**
   * A fault.
   *
   * @param part path of a part with what tells it from its twin, role of a device, or a rail
   * @param says the part and what is wrong with it
   */
  public record Suspect(String part, String says) {}

  /** What a fault does to the nodes asked for, V; NaN where its circuit finds no rest. */
  private record Effect(Candidate fault, double[] by) {
    double largest() {
      return Arrays.stream(by).filter(Double::isFinite).map(Math::abs).max().orElse(0);
    }
  }

  /**
   * Searches.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @param names of the nodes that can be measured
   * @param bands of their voltages for the tolerances; a node without one has the meter's
   *     uncertainty alone
   * @param progress reported to, and asked whether the result is still wanted
   * @return without nodes where the circuit finds no rest
   * @throws loopwright.task.CancelledException when it is not
   */
  public static NodeSuspects of(
      Design design,
      String hookup,
      List<String> names,
      Map<String, Band> bands,
      Progress progress) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    if (nominal.failure().isPresent()) {
      return new NodeSuspects(List.of(), 0, 0);
    }
    List<Candidate> faults =
        FaultCatalogue.of(nominal).stream().filter(fault -> fault.factors().isEmpty()).toList();
    double[] volts = volts(nominal, names);
    List<Effect> effects = effects(design, hookup, names, volts, faults, progress);
    double[] above = new double[volts.length];
    double[] below = new double[volts.length];
    for (int i = 0; i < volts.length; i++) {
      double meter = VOLTS + SHARE * Math.abs(volts[i]);
      Band band = bands.get(names.get(i));
      above[i] = meter + (band == null ? 0 : band.high().orElse(volts[i]) - volts[i]);
      below[i] = -meter + (band == null ? 0 : band.low().orElse(volts[i]) - volts[i]);
    }
    List<Set<Candidate>> shows = new ArrayList<>();
    List<Node> nodes = new ArrayList<>();
    for (int i = 0; i < volts.length; i++) {
      int node = i;
      double high = above[i];
      double low = below[i];
      List<Effect> raising = effects.stream().filter(each -> each.by()[node] > high).toList();
      List<Effect> lowering = effects.stream().filter(each -> each.by()[node] < low).toList();
      nodes.add(new Node(names.get(i), best(raising, i), best(lowering, i)));
      Set<Candidate> shown = new HashSet<>();
      raising.forEach(each -> shown.add(each.fault()));
      lowering.forEach(each -> shown.add(each.fault()));
      shows.add(shown);
    }
    Set<Candidate> all = new HashSet<>();
    shows.forEach(all::addAll);
    return new NodeSuspects(inOrder(nodes, shows), faults.size(), all.size());
  }

  private static double[] volts(HookupFigures figures, List<String> names) {
    Map<String, Double> nodes = figures.nodes();
    return names.stream().mapToDouble(name -> nodes.getOrDefault(name, Double.NaN)).toArray();
  }

  private static List<Effect> effects(
      Design design,
      String hookup,
      List<String> names,
      double[] volts,
      List<Candidate> faults,
      Progress progress) {
    Effect[] effects = new Effect[faults.size()];
    AtomicInteger done = new AtomicInteger();
    int lanes = Runtime.getRuntime().availableProcessors();
    IntStream.range(0, lanes)
        .parallel()
        .forEach(
            lane -> {
              // What is solved of a hookup serves one thread, so each lane has its own.
              HookupFigures own = HookupFigures.of(design, hookup);
              for (int i = lane; i < effects.length; i += lanes) {
                progress.check();
                double[] by = volts(own.of(faults.get(i).build(design)), names);
                for (int node = 0; node < by.length; node++) {
                  by[node] -= volts[node];
                }
                effects[i] = new Effect(faults.get(i), by);
                progress.report((double) done.incrementAndGet() / effects.length, "trying faults");
              }
            });
    return List.of(effects);
  }

  /**
   * Those that this node shows as well as any other, and each part once; where there is none, the
   * one that it shows best.
   */
  private static List<Suspect> best(List<Effect> effects, int node) {
    Set<String> parts = new HashSet<>();
    boolean any = effects.stream().anyMatch(each -> share(each, node) >= BEST_SHARE);
    return effects.stream()
        .filter(each -> !any || share(each, node) >= BEST_SHARE)
        .sorted(Comparator.comparingDouble(each -> -Math.rint(TENTHS * rank(each, node))))
        .limit(any ? effects.size() : 1)
        .filter(each -> parts.add(each.fault().part()))
        .limit(MOST_NAMED)
        .map(each -> new Suspect(each.fault().part(), each.fault().says()))
        .toList();
  }

  /** A part of another value is a rarer slip than a dry joint or a bridge (an assumption). */
  private static double rank(Effect effect, int node) {
    boolean otherValue = effect.fault().says().contains("a decade wrong");
    return share(effect, node) - (otherValue ? RARER : 0);
  }

  private static double share(Effect effect, int node) {
    return Math.abs(effect.by()[node]) / effect.largest();
  }

  private static List<Node> inOrder(List<Node> nodes, List<Set<Candidate>> shows) {
    List<Node> ordered = new ArrayList<>();
    Set<Candidate> seen = new HashSet<>();
    List<Integer> left = new ArrayList<>(IntStream.range(0, nodes.size()).boxed().toList());
    while (!left.isEmpty()) {
      Integer next =
          left.stream()
              .max(
                  Comparator.<Integer, Boolean>comparing(
                          i -> SUPPLIES.contains(nodes.get(i).name()))
                      .thenComparingLong(
                          i -> shows.get(i).stream().filter(f -> !seen.contains(f)).count())
                      .thenComparing(Comparator.reverseOrder()))
              .orElseThrow();
      left.remove(next);
      seen.addAll(shows.get(next));
      ordered.add(nodes.get(next));
    }
    return ordered;
  }
}
