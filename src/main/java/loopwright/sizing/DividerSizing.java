package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.task.Progress;

/**
 * Finds the two resistors of a feedback divider for a wanted gain. Every pair of the stock is
 * estimated by hand; the best are solved in the full circuit and ranked by what was solved.
 */
public final class DividerSizing {
  private static final int SOLVED = 24;

  private final Design design;
  private final String hookup;
  private final double wanted;
  private final ResistorStock stock;
  private final DividerPaths paths;
  private final AmplifierFacts facts;

  private DividerSizing(
      Design design, DividerPaths paths, double wanted, ResistorStock stock, HookupFigures first) {
    this.design = design;
    this.hookup = paths.hookup();
    this.wanted = wanted;
    this.stock = stock;
    this.paths = paths;
    this.facts = AmplifierFacts.of(first, wanted);
  }

  /**
   * Ranks dividers.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of a hookup with feedback
   * @param gain wanted, generator to output; with an inverting hookup its sign does not matter
   * @param series {@code E12}, {@code E24}, {@code E96} or {@code drawer}
   * @param twoParts whether one of the two resistors may be two parts in series or in parallel
   * @param progress reported to, and asked whether the result is still wanted
   * @return the best first, at least one; those that could not be solved last
   * @throws loopwright.task.CancelledException when it is not
   * @throws DesignException when this hookup cannot have that gain, with the place and what was
   *     expected
   */
  public static List<DividerProposal> of(
      Design design,
      String hookup,
      double gain,
      String series,
      boolean twoParts,
      Progress progress) {
    DividerPaths paths = DividerPaths.of(design, hookup);
    if (!(Math.abs(gain) > 0) || !Double.isFinite(gain) || (!paths.inverting() && gain < 0)) {
      throw new DesignException(
          paths.feedback(),
          "found a wanted gain of "
              + EngineeringFormat.format(gain, Unit.ONE)
              + ", expected "
              + (paths.inverting()
                  ? "one that is not zero"
                  : "one above zero: the feedback does not invert"));
    }
    double signed = paths.inverting() ? -Math.abs(gain) : gain;
    ResistorStock stock = ResistorStock.of(design, series, twoParts);
    HookupFigures first = FirstDivider.around(design, paths, signed);
    return new DividerSizing(design, paths, signed, stock, first).ranked(progress);
  }

  private List<DividerProposal> ranked(Progress progress) {
    progress.check();
    progress.report(0, "estimating every divider");
    List<DividerScreen.Ranked> best =
        new DividerScreen(facts, stock, wanted, tolerance()).best(SOLVED, paths.feedback());
    AtomicInteger done = new AtomicInteger();
    // Dividers share nothing, so that each may have a core of its own.
    List<Solved> solved =
        best.parallelStream()
            .map(
                ranked -> {
                  progress.check();
                  Solved one = solve(ranked);
                  progress.report(
                      (double) done.incrementAndGet() / best.size(), "solving dividers");
                  return one;
                })
            .sorted(Comparator.comparingDouble(Solved::score))
            .toList();
    List<DividerProposal> proposals = new ArrayList<>();
    for (int i = 0; i < solved.size(); i++) {
      proposals.add(proposal(solved.get(i), DividerWords.of(solved, i)));
    }
    return proposals;
  }

  /** The general tolerance of resistors, or what parts of such a stock come with. */
  private double tolerance() {
    return design.tolerances().resistor().map(Quantity::value).orElse(stock.tolerance());
  }

  /**
   * A divider with its solved figures.
   *
   * @param halfBand half the band of the gain, a fraction; NaN where it is not solved
   * @param worst lowest and highest factor that the two resistors alone can put to the gain
   * @param score infinite where the gain or its band is not solved
   */
  record Solved(
      DividerCandidate divider,
      List<Change> changes,
      FigureValue gain,
      double gainError,
      double halfBand,
      WorstCase worst,
      FigureValue offset,
      double biasOffset,
      FigureValue noise,
      double current,
      FigureValue margin,
      DividerScore terms,
      double score) {
    boolean isSolved() {
      return Double.isFinite(score);
    }
  }

  private Solved solve(DividerScreen.Ranked ranked) {
    DividerCandidate divider = ranked.divider();
    List<Change> changes = paths.changes(divider.upper().value(), lower(divider));
    Design changed = Change.applyAll(design, changes);
    HookupFigures figures = HookupFigures.of(changed, hookup);
    FigureValue gain = figures.solved(figure("closedLoopGain"));
    double error = gain.number().orElse(Double.NaN) / wanted - 1;
    double half = GainBand.half(figures, resistors(divider), stock.tolerance());
    FigureValue margin = figures.solved(figure("phaseMargin"));
    DividerScore terms = ranked.score().with(error, half, margin.number());
    return new Solved(
        divider,
        changes,
        gain,
        error,
        half,
        WorstCase.of(changed, paths, divider, facts.loop(), tolerance()),
        figures.solved(figure("outputOffset")),
        terms.offsetVolts(facts),
        noise(figures),
        DividerScore.current(facts, divider),
        margin,
        terms,
        Double.isNaN(terms.sum()) ? Double.POSITIVE_INFINITY : terms.sum());
  }

  private static FigureValue noise(HookupFigures figures) {
    FigureValue solved = figures.solved(figure("inputNoise"));
    FigureValue byHand = figures.formula(figure("inputNoise"));
    return solved.number().isPresent() || byHand.number().isEmpty() ? solved : byHand;
  }

  private DividerProposal proposal(Solved solved, String says) {
    double gain = solved.gain().number().orElse(Double.NaN);
    double half = Math.abs(gain) * solved.halfBand();
    return new DividerProposal(
        solved.changes(),
        solved.gain(),
        band(gain - half),
        band(gain + half),
        solved.offset(),
        solved.noise(),
        solved.current(),
        solved.margin(),
        solved.score(),
        says);
  }

  private static FigureValue band(double end) {
    return Double.isFinite(end)
        ? FigureValue.of(end)
        : FigureValue.none("a build within the tolerances could not be solved");
  }

  private static OptionalDouble lower(DividerCandidate divider) {
    return divider.lower().isPresent()
        ? OptionalDouble.of(divider.lowerOhms())
        : OptionalDouble.empty();
  }

  private List<String> resistors(DividerCandidate divider) {
    return divider.lower().isEmpty() ? List.of() : List.of(paths.upper(), paths.lower());
  }

  private static Figure figure(String key) {
    return Catalogue.find(key).orElseThrow();
  }
}
