package loopwright.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import loopwright.bench.Explanation.Kind;
import loopwright.design.Design;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.task.Progress;

/**
 * Explains all readings of a bench together: no fault at all, one part that has drifted, one fault,
 * or none of these. Every fault is solved in the full circuit; all compete by how probable they
 * make the readings and how probable they are to begin with.
 */
public final class FaultSearch {
  /** How probable each kind is before any reading; assumptions, no source. */
  private static final double NO_FAULT = 0.6;

  private static final double DRIFT = 0.1;
  private static final double FAULT = 0.25;
  private static final double NONE_OF_THESE = 0.05;

  /** Drifts that the first-order estimate ranks below so many others are not searched. */
  private static final int DRIFTS = 6;

  /**
   * A fault that some of the readings leave this much less probable than what is known already,
   * natural logarithm, is not solved further: one in ten milliards.
   */
  private static final double HOPELESS = 23;

  private static final int SHOWN = 12;
  private static final double LEAST_SHOWN = 1e-4;

  /** Three standard uncertainties, squared. */
  private static final double ALIKE = 9;

  private final Design design;
  private final Evidence evidence;
  private final List<Hypothesis> hypotheses = new ArrayList<>();

  /** An explanation in the making. */
  record Hypothesis(
      Kind kind,
      String part,
      String says,
      OptionalDouble value,
      double misfit,
      double logWeight,
      Optional<FaultyReadings.Shown> shown) {}

  private FaultSearch(Design design, Evidence evidence) {
    this.design = design;
    this.evidence = evidence;
  }

  /**
   * Explains.
   *
   * @param design a valid design with readings, every part it names among its own
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public static Explanations of(Design design, Progress progress) {
    Evidence evidence = new Evidence(design, PredictedReadings.of(design, progress));
    if (evidence.count() == 0) {
      return new Explanations(
          List.of(),
          Optional.empty(),
          "No reading of a hookup can be judged: there is nothing to explain.");
    }
    return new FaultSearch(design, evidence).search(progress);
  }

  private Explanations search(Progress progress) {
    Evidence.Fit none = evidence.fit(evidence.nominal());
    FaultyReadings readings =
        new FaultyReadings(design, evidence.judged(), evidence.light(), evidence.first());
    double anywhere = Math.log(NONE_OF_THESE) + evidence.logDensityAnywhere();
    hypotheses.add(
        new Hypothesis(
            Kind.NO_FAULT,
            "",
            "no fault: every part within its tolerance",
            OptionalDouble.empty(),
            none.misfit(),
            Math.log(NO_FAULT) + none.logDensity(),
            Optional.of(readings.of(Build::nominal))));
    faults(Math.max(anywhere, hypotheses.get(0).logWeight()) - HOPELESS, progress);
    drifts(readings, progress);
    hypotheses.add(
        new Hypothesis(
            Kind.NONE_OF_THESE,
            "",
            "none of these: a fault that is not on the list, or several at once",
            OptionalDouble.empty(),
            Double.NaN,
            anywhere,
            Optional.empty()));
    return ranked();
  }

  /**
   * @param least logarithm of the weight below which it does not matter how little a fault weighs
   */
  private void faults(double least, Progress progress) {
    HookupFigures nominal = evidence.first().apart(design, firstHookup());
    List<Candidate> candidates = FaultCatalogue.of(nominal);
    double prior = Math.log(FAULT / candidates.size());
    Hypothesis[] found = new Hypothesis[candidates.size()];
    AtomicInteger done = new AtomicInteger();
    List<ReadingGroup> circuits = ReadingGroup.of(design);
    int lanes = Runtime.getRuntime().availableProcessors();
    IntStream.range(0, lanes)
        .parallel()
        .forEach(
            lane -> {
              // What is solved of a hookup serves one thread, so each lane has its own.
              FaultyReadings readings =
                  new FaultyReadings(design, evidence.judged(), circuits, evidence.first());
              for (int i = lane; i < candidates.size(); i += lanes) {
                progress.check();
                Candidate candidate = candidates.get(i);
                FaultyReadings.Shown shown =
                    readings.of(
                        candidate, values -> prior + evidence.atMost(values).logDensity() >= least);
                Evidence.Fit fit =
                    shown.whole() ? evidence.fit(shown.values()) : evidence.atMost(shown.values());
                found[i] =
                    new Hypothesis(
                        Kind.FAULT,
                        candidate.part(),
                        candidate.says(),
                        OptionalDouble.empty(),
                        fit.misfit(),
                        prior + fit.logDensity(),
                        Optional.of(shown));
                progress.report(
                    (double) done.incrementAndGet() / candidates.size(), "trying faults");
              }
            });
    hypotheses.addAll(Arrays.asList(found));
  }

  /** The hookup of the first reading that is judged. */
  private String firstHookup() {
    return design
        .bench()
        .readings()
        .get(evidence.judged().get(0))
        .hookup()
        .orElseGet(() -> design.hookups().get(0).name());
  }

  private void drifts(FaultyReadings readings, Progress progress) {
    List<TolerancedPart> parts = evidence.parts();
    if (parts.isEmpty()) {
      return;
    }
    double prior = Math.log(DRIFT / parts.size());
    IntStream.range(0, parts.size())
        .boxed()
        .sorted(Comparator.comparingDouble(part -> -promise(part)))
        .limit(DRIFTS)
        .forEach(
            part -> {
              progress.check();
              DriftFit drift = DriftFit.of(evidence, readings, part);
              TolerancedPart spreads = parts.get(part);
              hypotheses.add(
                  new Hypothesis(
                      Kind.DRIFT,
                      spreads.name(),
                      DriftWords.of(design, spreads, drift.deviation()),
                      DriftWords.value(design, spreads, drift.deviation()),
                      drift.fit().misfit(),
                      prior + drift.logEvidence(),
                      Optional.of(drift.shown())));
            });
  }

  /** How much of the misfit a drift of this part could take away, to first order. */
  private double promise(int part) {
    double[] slope = evidence.slope(part);
    double square = evidence.product(slope, slope);
    double along = evidence.product(slope, evidence.residual());
    double usual = DriftFit.usual(evidence.parts().get(part));
    return square == 0 ? 0 : along * along / (square + 1 / (usual * usual));
  }

  private Explanations ranked() {
    hypotheses.removeIf(hypothesis -> hypothesis.logWeight() == Double.NEGATIVE_INFINITY);
    hypotheses.sort(Comparator.comparingDouble(Hypothesis::logWeight).reversed());
    double most = hypotheses.get(0).logWeight();
    double sum = hypotheses.stream().mapToDouble(h -> Math.exp(h.logWeight() - most)).sum();
    List<Explanation> explanations = new ArrayList<>();
    for (Hypothesis hypothesis : hypotheses) {
      double probability = Math.exp(hypothesis.logWeight() - most) / sum;
      boolean always =
          hypothesis.kind() == Kind.NO_FAULT || hypothesis.kind() == Kind.NONE_OF_THESE;
      if (always || (explanations.size() < SHOWN && probability > LEAST_SHOWN)) {
        explanations.add(
            new Explanation(
                hypothesis.kind(),
                hypothesis.part(),
                hypothesis.says(),
                hypothesis.value(),
                Double.isFinite(hypothesis.misfit())
                    ? OptionalDouble.of(hypothesis.misfit())
                    : OptionalDouble.empty(),
                probability,
                alike(hypothesis)));
      }
    }
    return new Explanations(
        explanations,
        NextReadingSearch.of(design, hypotheses, sum, most),
        evidence.count()
            + " readings, "
            + hypotheses.size()
            + " explanations that compete; single faults only; figures of the whole swing, of drift, of"
            + " noise and of the time domain are left out.");
  }

  private List<String> alike(Hypothesis one) {
    if (one.shown().isEmpty()) {
      return List.of();
    }
    double[] values = one.shown().get().values();
    return hypotheses.stream()
        .filter(other -> other != one && other.kind() == Kind.FAULT)
        .filter(other -> !other.part().equals(one.part()) && other.shown().isPresent())
        .filter(other -> evidence.distance(values, other.shown().get().values()) < ALIKE)
        .map(Hypothesis::part)
        .distinct()
        .toList();
  }
}
