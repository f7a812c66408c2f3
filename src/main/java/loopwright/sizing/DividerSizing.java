package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Feedback;
import loopwright.predict.Build;
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
  private final AmplifierFacts facts;
  private final String at;

  private DividerSizing(HookupFigures nominal, double wanted, ResistorStock stock) {
    this.design = nominal.design();
    this.hookup = nominal.hookup().name();
    this.wanted = wanted;
    this.stock = stock;
    this.facts = AmplifierFacts.of(nominal);
    this.at = "hookups." + hookup + ".feedback";
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
   * @return the best first, at least one
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
    HookupFigures nominal = HookupFigures.of(design, hookup);
    String at = "hookups." + hookup + ".feedback";
    if (nominal.hookup().feedback() instanceof Feedback.Open) {
      throw new DesignException(at, "found an open hookup, expected one with feedback");
    }
    boolean inverting = nominal.hookup().feedback() instanceof Feedback.Inverting;
    if (!(Math.abs(gain) > 0) || !Double.isFinite(gain) || (!inverting && gain < 0)) {
      throw new DesignException(
          at,
          "found a wanted gain of "
              + EngineeringFormat.format(gain, Unit.ONE)
              + ", expected "
              + (inverting
                  ? "one that is not zero"
                  : "one above zero: the feedback does not invert"));
    }
    double signed = inverting ? -Math.abs(gain) : gain;
    ResistorStock stock = ResistorStock.of(design, series, twoParts);
    return new DividerSizing(nominal, signed, stock).ranked(nominal, progress);
  }

  private List<DividerProposal> ranked(HookupFigures nominal, Progress progress) {
    List<DividerScreen.Ranked> best =
        new DividerScreen(facts, stock, wanted, tolerance()).best(SOLVED, at);
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

  /** A divider with its solved figures. */
  record Solved(
      DividerCandidate divider,
      List<Change> changes,
      FigureValue gain,
      double halfBand,
      FigureValue offset,
      FigureValue noise,
      double current,
      FigureValue margin,
      DividerScore terms,
      double score) {}

  private Solved solve(DividerScreen.Ranked ranked) {
    List<Change> changes = changes(ranked.divider());
    HookupFigures figures =
        HookupFigures.of(design, hookup).of(Build.nominal(Change.applyAll(design, changes)));
    FigureValue gain = figures.solved(figure("closedLoopGain"));
    double half = GainBand.half(figures, paths(ranked.divider()), stock.tolerance());
    DividerScore terms =
        ranked
            .score()
            .with(gain.number().isPresent() ? gain.number().getAsDouble() / wanted - 1 : 0, half);
    FigureValue noise = figures.solved(figure("inputNoise"));
    return new Solved(
        ranked.divider(),
        changes,
        gain,
        half,
        figures.solved(figure("outputOffset")),
        noise.number().isPresent() ? noise : figures.formula(figure("inputNoise")),
        current(ranked.divider()),
        figures.solved(figure("phaseMargin")),
        terms,
        gain.number().isPresent() ? terms.sum() : Double.MAX_VALUE);
  }

  private DividerProposal proposal(Solved solved, String says) {
    OptionalDouble gain = solved.gain().number();
    double half =
        gain.isPresent() && Double.isFinite(solved.halfBand())
            ? Math.abs(gain.getAsDouble()) * solved.halfBand()
            : Double.NaN;
    return new DividerProposal(
        solved.changes(),
        solved.gain(),
        Double.isNaN(half) ? OptionalDouble.empty() : OptionalDouble.of(gain.orElse(0) - half),
        Double.isNaN(half) ? OptionalDouble.empty() : OptionalDouble.of(gain.orElse(0) + half),
        solved.offset(),
        solved.noise(),
        solved.current(),
        solved.margin(),
        solved.score(),
        says);
  }

  private double current(DividerCandidate divider) {
    double peak = facts.amplitude() > 0 ? Math.abs(wanted) * facts.amplitude() : 1;
    double resistance = divider.upper().value() + (facts.inverting() ? 0 : divider.lowerOhms());
    return Double.isInfinite(resistance) || resistance == 0 ? 0 : peak / resistance;
  }

  private List<Change> changes(DividerCandidate divider) {
    List<Change> changes = new ArrayList<>();
    changes.add(change(at + ".upper", divider.upper().value()));
    divider.lower().ifPresent(lower -> changes.add(change(lowerPath(), lower.value())));
    boolean standing = nonInverting() != null && nonInverting().lower().isPresent();
    if (divider.lower().isEmpty() && standing) {
      changes.add(new Change(lowerPath(), ""));
    }
    return changes;
  }

  private Feedback.NonInverting nonInverting() {
    return design.hookup(hookup).orElseThrow().feedback() instanceof Feedback.NonInverting divider
        ? divider
        : null;
  }

  private String lowerPath() {
    return at + (facts.inverting() ? ".inputResistor" : ".lower");
  }

  private List<String> paths(DividerCandidate divider) {
    return divider.lower().isEmpty() ? List.of() : List.of(at + ".upper", lowerPath());
  }

  private static Change change(String path, double value) {
    return new Change(path, EngineeringFormat.spelling(value, Unit.OHM));
  }

  private static Figure figure(String key) {
    return Catalogue.find(key).orElseThrow();
  }
}
