package loopwright.sheet;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import loopwright.bench.FirstPower;
import loopwright.design.Design;
import loopwright.file.DesignChecksum;
import loopwright.predict.CostClass;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.predict.TolerancedParts;
import loopwright.spread.HookupSpread;
import loopwright.spread.Sampling;
import loopwright.spread.Spread;
import loopwright.task.Progress;

/** Works out what stands on the sheet for the bench. */
public final class SheetMaker {
  /**
   * Enough for a band on paper: its ends then move by some tenth of its width. Figures of a whole
   * waveform cost a hundred times as much and are left without a band.
   */
  private static final Sampling SAMPLING = new Sampling(200, 0, 1);

  private final LocalDate date;
  private final Sampling sampling;

  /**
   * @param date that stands on the sheet
   */
  public SheetMaker(LocalDate date) {
    this(date, SAMPLING);
  }

  /**
   * @param date that stands on the sheet
   * @param sampling how many builds are drawn for the bands
   */
  SheetMaker(LocalDate date, Sampling sampling) {
    this.date = date;
    this.sampling = sampling;
  }

  /**
   * Makes a sheet. Equal designs, hookups and dates give equal sheets.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup that is drawn and powered first; the others follow as set-ups
   *     to build
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public BenchSheet make(Design design, String hookup, Progress progress) {
    progress.report(0, "predicting");
    Prediction prediction =
        Predictor.predict(design, List.of(), new double[] {1}, CostClass.WAVEFORM, progress);
    progress.report(0.3, "sampling builds");
    boolean tolerances = !TolerancedParts.of(HookupFigures.of(design, hookup)).isEmpty();
    Map<String, HookupSpread> spreads = tolerances ? spreads(prediction, progress) : Map.of();
    progress.check();
    Designators designators = Designators.of(design);
    HookupPrediction first =
        prediction.hookups().stream()
            .filter(each -> each.hookup().name().equals(hookup))
            .findFirst()
            .orElseThrow(() -> new IllegalArgumentException("no hookup is called " + hookup));
    PartList parts = new PartList(design, designators);
    HookupCards cards = new HookupCards(design, designators);
    return new BenchSheet(
        design,
        hookup,
        date,
        DesignChecksum.of(design),
        bands(tolerances, spreads),
        first.rest().isPresent() ? Optional.empty() : Optional.of(first.failure()),
        parts.pinouts(),
        parts.lines(),
        FirstPowerWords.unpowered(design),
        FirstPowerWords.powerUp(
            design,
            hookup,
            FirstPower.of(design, hookup, sampling.samples(), sampling.seed(), progress)),
        new NodeTable(design, designators)
            .of(first, Optional.ofNullable(spreads.get(hookup)), progress),
        prediction.hookups().stream()
            .map(each -> cards.card(each, Optional.ofNullable(spreads.get(each.hookup().name()))))
            .toList(),
        Cautions.of(design, prediction));
  }

  private Map<String, HookupSpread> spreads(Prediction prediction, Progress progress) {
    List<String> solved =
        prediction.hookups().stream()
            .filter(each -> each.rest().isPresent())
            .map(each -> each.hookup().name())
            .toList();
    if (solved.isEmpty()) {
      return Map.of();
    }
    return Spread.of(prediction.design(), solved, sampling, progress).stream()
        .collect(Collectors.toMap(HookupSpread::name, Function.identity()));
  }

  private String bands(boolean tolerances, Map<String, HookupSpread> spreads) {
    if (!tolerances) {
      return "The design states no tolerances, so there is no low and no high.";
    }
    int unsolved = spreads.values().stream().mapToInt(HookupSpread::unsolved).sum();
    return "Low and high hold 95 % of "
        + sampling.samples()
        + " builds drawn from the design's tolerances; figures of a whole waveform have none."
        + (unsolved == 0 ? "" : " " + unsolved + " builds found no operating point.");
  }
}
