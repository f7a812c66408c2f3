package loopwright.spread;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.predict.Catalogue;
import loopwright.predict.CostClass;
import loopwright.predict.Figure;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
import loopwright.task.Progress;

/**
 * Propagates the tolerances of a design to its nodes and figures by Monte Carlo sampling (JCGM
 * 101:2008): every toleranced part is drawn from its own distribution, independent of the others,
 * and each build is solved in full. Equal seeds give equal results, on any number of cores.
 */
public final class Spread {
  private static final String ON_REQUEST = "figures of the time domain are not sampled";

  private final Design design;
  private final String hookup;
  private final List<TolerancedPart> parts;
  private final double[][] deviations;
  private final Sampling sampling;
  private final Map<String, Samples> nodes = new LinkedHashMap<>();
  private final Map<String, Samples> figures = new LinkedHashMap<>();
  private final AtomicInteger unsolved = new AtomicInteger();

  private Spread(Design design, String hookup, List<TolerancedPart> parts, Sampling sampling) {
    this.design = design;
    this.hookup = hookup;
    this.parts = parts;
    this.sampling = sampling;
    this.deviations = new double[sampling.samples()][];
    for (Figure figure : Catalogue.figures()) {
      if (figure.cost() != CostClass.TIME) {
        boolean full = figure.cost() == CostClass.WAVEFORM;
        figures.put(
            figure.key(), new Samples(full ? sampling.waveformSamples() : sampling.samples()));
      }
    }
  }

  /**
   * Samples every hookup of a design.
   *
   * @see #of(Design, List, Sampling, Progress)
   */
  public static List<HookupSpread> of(Design design, Sampling sampling, Progress progress) {
    return of(
        design, design.hookups().stream().map(each -> each.name()).toList(), sampling, progress);
  }

  /**
   * Samples hookups of a design.
   *
   * @param design a valid design, every part it names among its own
   * @param names of the hookups
   * @param progress reported to, and asked whether the result is still wanted
   * @return one entry for each hookup
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public static List<HookupSpread> of(
      Design design, List<String> names, Sampling sampling, Progress progress) {
    HookupFigures first = HookupFigures.of(design, names.get(0));
    List<TolerancedPart> parts = TolerancedParts.of(first);
    Counter counter = new Counter(progress, names.size() * sampling.samples());
    List<HookupSpread> spreads = new ArrayList<>();
    for (String name : names) {
      Spread spread = new Spread(design, name, TolerancedParts.in(parts, name), sampling);
      spreads.add(spread.sampled(spread.indices(parts), counter));
    }
    return List.copyOf(spreads);
  }

  /** Counts builds for the progress. */
  private static final class Counter {
    private final Progress progress;
    private final int all;
    private final AtomicInteger done = new AtomicInteger();

    Counter(Progress progress, int all) {
      this.progress = progress;
      this.all = all;
    }

    void solved(String hookup) {
      progress.check();
      int count = done.incrementAndGet();
      progress.report((double) count / all, "sampling " + hookup);
    }
  }

  /** Where each part of this hookup stands among those of the design. */
  private int[] indices(List<TolerancedPart> all) {
    return parts.stream().mapToInt(all::indexOf).toArray();
  }

  private HookupSpread sampled(int[] indices, Counter counter) {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    nominal.nodes().keySet().forEach(name -> nodes.put(name, new Samples(sampling.samples())));
    int lanes = Runtime.getRuntime().availableProcessors();
    IntStream.range(0, lanes)
        .parallel()
        .forEach(
            lane -> {
              // What is solved of a hookup serves one thread, so each lane has its own nominal.
              HookupFigures own = HookupFigures.of(design, hookup);
              if (own.failure().isEmpty()) {
                solveLinear(own);
              }
              for (int build = lane; build < sampling.samples(); build += lanes) {
                counter.solved(hookup);
                deviations[build] = draw(build, indices);
                solve(own, build);
              }
            });
    Yield yield =
        Yield.of(
            design.limits().stream().filter(limit -> limit.hookup().equals(hookup)).toList(),
            nodes,
            figures);
    return new HookupSpread(
        hookup,
        nodeBands(nominal),
        figureBands(nominal),
        yield.share(),
        yield.says(),
        unsolved.get());
  }

  /** Solves what the builds start from. */
  private static void solveLinear(HookupFigures figures) {
    Catalogue.figures().stream()
        .filter(figure -> figure.cost() == CostClass.LINEAR)
        .forEach(figures::solved);
  }

  /** The deviations of a build: those of a part do not depend on the hookup. */
  private double[] draw(int build, int[] indices) {
    double[] drawn = new double[indices.length];
    for (int i = 0; i < indices.length; i++) {
      TolerancedPart part = parts.get(i);
      SplittableRandom random =
          new SplittableRandom(
              sampling.seed() * 0x9E3779B97F4A7C15L + build * 1_000_003L + indices[i]);
      drawn[i] = part.low() + (part.high() - part.low()) * random.nextDouble();
    }
    return drawn;
  }

  private void solve(HookupFigures nominal, int build) {
    HookupFigures built = nominal.of(TolerancedParts.build(design, parts, deviations[build]));
    if (built.failure().isPresent()) {
      unsolved.incrementAndGet();
      return;
    }
    Map<String, Double> voltages = built.nodes();
    nodes.forEach(
        (name, samples) ->
            samples.set(build, FigureValue.of(voltages.getOrDefault(name, Double.NaN))));
    figures.forEach(
        (key, samples) -> {
          if (build < samples.count()) {
            samples.set(build, built.solved(Catalogue.find(key).orElseThrow()));
          }
        });
  }

  private Map<String, Band> nodeBands(HookupFigures nominal) {
    Map<String, Band> bands = new LinkedHashMap<>();
    nodes.forEach(
        (name, samples) -> bands.put(name, samples.band(nominal.node(name), parts, deviations)));
    return bands;
  }

  private Map<String, Band> figureBands(HookupFigures nominal) {
    Map<String, Band> bands = new LinkedHashMap<>();
    for (Figure figure : Catalogue.figures()) {
      Samples samples = figures.get(figure.key());
      bands.put(
          figure.key(),
          samples == null
              ? new Samples(0).band(FigureValue.none(ON_REQUEST), parts, deviations)
              : samples.band(nominal.solved(figure), parts, deviations));
    }
    return bands;
  }
}
