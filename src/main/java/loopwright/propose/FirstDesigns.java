package loopwright.propose;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.assembly.AssemblyException;
import loopwright.check.Finding;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.part.Shelf;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.sizing.DividerProposal;
import loopwright.sizing.DividerSizing;
import loopwright.task.Progress;

/**
 * Makes a first design: values by hand, then solved in full and changed, a bounded number of times,
 * until the prediction meets every demand. Equal specifications give equal designs.
 */
public final class FirstDesigns {
  private static final int ROUNDS = 30;

  private final Specification wanted;
  private final Shelf shelf;
  private final Progress progress;
  private final Values resistors;
  private final Values capacitors;

  private FirstDesigns(Specification wanted, Shelf shelf, Progress progress) {
    this.wanted = wanted;
    this.shelf = shelf;
    this.progress = progress;
    this.resistors = Values.of("resistors", wanted.resistors(), 0.1, 10e6);
    this.capacitors = Values.of("capacitors", wanted.capacitors(), 1e-12, 10e-3);
  }

  /**
   * Designs.
   *
   * @param wanted what it is to do
   * @param shelf records of the parts at hand
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws DesignException when a stock holds nothing or a part at hand is on no shelf
   */
  public static FirstDesign of(Specification wanted, Shelf shelf, Progress progress) {
    for (String name : wanted.transistors()) {
      if (shelf.find(name).isEmpty()) {
        throw new DesignException(
            "parts at hand",
            "found \""
                + name
                + "\", expected a name from the shelf: "
                + String.join(", ", shelf.names()));
      }
    }
    return new FirstDesigns(wanted, shelf, progress).design();
  }

  private FirstDesign design() {
    progress.report(0, "choosing values by hand");
    Draft draft;
    try {
      draft =
          new HandChoices(
                  wanted, new Transistors(wanted.transistors(), shelf), resistors, capacitors)
              .choose();
    } catch (CannotException e) {
      return new FirstDesign(
          Optional.empty(),
          List.of(),
          List.of(e.demand()),
          List.of(),
          refusal(List.of(e.demand())));
    }
    Adjustments adjustments = new Adjustments(wanted, draft, resistors, capacitors);
    Verdict verdict = solve(draft, 0);
    for (int round = 1; round < ROUNDS; round++) {
      boolean changed =
          adjustments.currents(verdict)
              || (!draft.ranked && rank(draft, verdict))
              || adjustments.loop(verdict);
      if (!changed) {
        break;
      }
      verdict = solve(draft, round);
    }
    return result(draft, verdict);
  }

  private FirstDesign result(Draft draft, Verdict verdict) {
    if (!verdict.isMet()) {
      return new FirstDesign(
          Optional.empty(),
          draft.reasons(),
          verdict.demands(),
          verdict.findings(),
          refusal(verdict.demands()));
    }
    long risky =
        verdict.findings().stream()
            .filter(found -> found.severity() == Finding.Severity.RISKY)
            .count();
    return new FirstDesign(
        Optional.of(verdict.design()),
        draft.reasons(),
        verdict.demands(),
        verdict.findings(),
        "Every demand is met as predicted, at every level of the swing, with nominal parts"
            + (risky == 0 ? "." : "; " + risky + " of its findings say what is risky."));
  }

  private static String refusal(List<Demand> demands) {
    return "No design is offered. "
        + demands.stream()
            .filter(demand -> !demand.met())
            .map(demand -> demand.name() + ": " + demand.says())
            .collect(Collectors.joining(" "));
  }

  private Verdict solve(Draft draft, int round) {
    progress.check();
    progress.report((double) round / ROUNDS, "solving design " + (round + 1));
    Design design = DraftDesign.of(wanted, draft, shelf);
    return Verdict.of(wanted, design, progress);
  }

  /** Once the amplifier is settled its divider is ranked among all that the stock can make. */
  private boolean rank(Draft draft, Verdict verdict) {
    draft.ranked = true;
    if (Double.isNaN(draft.lower) || !verdict.failure().isEmpty()) {
      return false;
    }
    progress.check();
    List<DividerProposal> ranked;
    try {
      ranked =
          DividerSizing.of(
              verdict.design(), Draft.HOOKUP, wanted.gain(), "drawer", false, progress);
    } catch (DesignException | AssemblyException e) {
      draft.changed(
          Draft.WITHIN + "feedback", "as it was", "No divider could be ranked: " + e.getMessage());
      return false;
    }
    Optional<DividerProposal> chosen = serving(ranked);
    if (chosen.isEmpty()) {
      return false;
    }
    DividerProposal best = chosen.get();
    double upper = draft.upper;
    double lower = draft.lower;
    for (Change change : best.changes()) {
      if (change.value().isBlank()) {
        return false;
      }
      double ohms = Quantity.parse(change.value(), Unit.OHM).value();
      if (change.path().endsWith(".upper")) {
        draft.upper = ohms;
      } else {
        draft.lower = ohms;
      }
    }
    if (draft.upper == upper && draft.lower == lower) {
      return false;
    }
    draft.changed(
        Draft.WITHIN + "feedback",
        Draft.text(draft.upper, Unit.OHM) + " / " + Draft.text(draft.lower, Unit.OHM),
        "Best of the stock's dividers whose gain and margin serve, each weighed by gain error, band, load, offset, noise"
            + " and phase: "
            + best.says());
    adjustBlocking(draft);
    return true;
  }

  /** The best whose gain is near enough, of those that hold the margin at rest where one does. */
  private Optional<DividerProposal> serving(List<DividerProposal> ranked) {
    List<DividerProposal> near =
        ranked.stream()
            .filter(
                one ->
                    one.gain().number().isPresent()
                        && Math.abs(Math.abs(one.gain().number().getAsDouble()) / wanted.gain() - 1)
                            <= wanted.gainTolerance())
            .toList();
    return near.stream()
        .filter(one -> one.phaseMargin().number().orElse(180) >= wanted.margin())
        .findFirst()
        .or(() -> near.stream().findFirst());
  }

  private void adjustBlocking(Draft draft) {
    if (!wanted.single()) {
      return;
    }
    double low = wanted.signalFrequency() / HandChoices.BELOW_SIGNAL;
    if (wanted.inverting()) {
      draft.sourceCapacitor =
          capacitors.atLeast(HandFormulas.corner(low, draft.lower + wanted.sourceResistance()));
      draft.changed(
          Draft.WITHIN + "source.couplingCapacitance",
          Draft.text(draft.sourceCapacitor, Unit.FARAD),
          "1/(2π f R) for the ranked input resistor.");
    } else {
      draft.footCapacitor = capacitors.atLeast(HandFormulas.corner(low, draft.lower));
      draft.changed(
          Draft.WITHIN + "feedback.lowerCapacitance",
          Draft.text(draft.footCapacitor, Unit.FARAD),
          "1/(2π f R) for the ranked lower resistor.");
    }
  }
}
