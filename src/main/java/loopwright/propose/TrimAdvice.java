package loopwright.propose;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.circuit.Parameter;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.Drawer;
import loopwright.design.PartValue;
import loopwright.predict.Build;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureSensitivity;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.PartSensitivity;
import loopwright.predict.Sensitivities;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.task.Progress;

/**
 * Which resistor trims the output offset and which the gain, which way and how much.
 *
 * @param offset output offset as predicted
 * @param gain closed-loop gain as predicted
 * @param offsetTrims the strongest first
 * @param gainTrims the strongest first
 * @param best the single change in values of the drawer, or else of E24, that leaves the least
 *     offset
 */
public record TrimAdvice(
    FigureValue offset,
    FigureValue gain,
    List<Trim> offsetTrims,
    List<Trim> gainTrims,
    Optional<Best> best) {
  /**
   * A change that was solved in full.
   *
   * @param change of one resistor
   * @param left output offset that it leaves, V
   * @param gain that it leaves; empty where it is not solved
   * @param says in words
   */
  public record Best(Change change, double left, OptionalDouble gain, String says) {}

  private static final Figure OFFSET = Catalogue.find("outputOffset").orElseThrow();
  private static final Figure GAIN = Catalogue.find("closedLoopGain").orElseThrow();
  private static final Drawer.Stock USUAL = new Drawer.Stock.Series("E24");

  /** A trim that moves a part by more is another design, as a natural logarithm. */
  private static final double FURTHEST = Math.log(3);

  /** A trim of the offset may move the gain by so much. */
  private static final double GAIN_MOVES = 0.005;

  private static final int SOLVED = 8;

  /** Keeps its own copies. */
  public TrimAdvice {
    offsetTrims = List.copyOf(offsetTrims);
    gainTrims = List.copyOf(gainTrims);
  }

  /**
   * Works it out.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws DesignException when the circuit finds no rest
   */
  public static TrimAdvice of(Design design, String hookup, Progress progress) {
    HookupFigures figures = HookupFigures.of(design, hookup);
    if (figures.failure().isPresent()) {
      throw new DesignException(
          "hookups." + hookup,
          "found no operating point, expected a circuit at rest: " + figures.failure().get());
    }
    progress.report(0.1, "sensitivities of offset and gain");
    List<FigureSensitivity> found =
        Sensitivities.of(design, hookup, List.of("outputOffset", "closedLoopGain"), progress);
    FigureValue offset = found.get(0).value();
    FigureValue gain = found.get(1).value();
    double ideal = figures.gains().idealGain().orElse(Double.NaN);
    List<Trim> offsets = trims(design, found.get(0), offset, 0, true);
    List<Trim> gains = trims(design, found.get(1), gain, ideal, false);
    progress.report(0.6, "trying values of the stock");
    return new TrimAdvice(
        offset, gain, offsets, gains, best(figures, offset, gain, offsets, progress));
  }

  private static List<Trim> trims(
      Design design, FigureSensitivity figure, FigureValue value, double target, boolean volts) {
    List<Trim> trims = new ArrayList<>();
    if (value.number().isEmpty()) {
      return trims;
    }
    double now = value.number().getAsDouble();
    for (PartSensitivity part : figure.parts()) {
      if (part.parameter() != Parameter.RESISTANCE || part.slope().isEmpty()) {
        continue;
      }
      Optional<Object> fitted = DesignPath.find(design, part.name());
      if (fitted.isEmpty() || !(fitted.get() instanceof PartValue present)) {
        continue;
      }
      double slope = part.slope().getAsDouble();
      double step = part.perSmallStep().orElse(0) / (volts ? 1 : now);
      if (Math.abs(slope) <= part.error() || Math.abs(step) < 1e-12) {
        continue;
      }
      double needed = Double.isFinite(target) ? Math.expm1((target - now) / slope) : Double.NaN;
      trims.add(
          new Trim(
              part.name(),
              present.effective(),
              step,
              needed,
              says(part.name(), step, needed, volts)));
    }
    trims.sort(Comparator.comparingDouble(trim -> -Math.abs(trim.perCent())));
    return trims;
  }

  private static String says(String path, double step, double needed, boolean volts) {
    String effect =
        volts
            ? EngineeringFormat.format(Math.abs(step), Unit.VOLT, 3)
            : EngineeringFormat.format(100 * Math.abs(step), Unit.ONE, 3) + " %";
    return "One per cent more of "
        + path
        + (step > 0 ? " raises " : " lowers ")
        + (volts ? "the output by " : "the gain by ")
        + effect
        + (Double.isFinite(needed) && Math.abs(Math.log1p(needed)) <= FURTHEST
            ? "; to first order it wants "
                + EngineeringFormat.format(Math.abs(100 * needed), Unit.ONE, 3)
                + (needed > 0 ? " % more." : " % less.")
            : "; alone it cannot bring it where it should be.");
  }

  private static Optional<Best> best(
      HookupFigures start,
      FigureValue offset,
      FigureValue gain,
      List<Trim> trims,
      Progress progress) {
    if (offset.number().isEmpty()) {
      return Optional.empty();
    }
    Design design = start.design();
    start.node("out");
    Drawer.Stock stock = design.drawer().resistors().orElse(USUAL);
    Values values = Values.of("drawer.resistors", stock, 0.1, 10e6);
    Best best = null;
    double least = Math.abs(offset.number().getAsDouble());
    int solved = 0;
    for (Trim trim : trims) {
      if (!Double.isFinite(trim.needed())
          || Math.abs(Math.log1p(trim.needed())) > FURTHEST
          || solved >= SOLVED) {
        continue;
      }
      progress.check();
      solved++;
      double exact = trim.present() * (1 + trim.needed());
      for (double value :
          List.of(values.nearest(exact), values.above(exact), values.below(exact))) {
        Change change = new Change(trim.path(), EngineeringFormat.spelling(value, Unit.OHM));
        HookupFigures changed = start.of(Build.nominal(Change.applyAll(design, List.of(change))));
        OptionalDouble left = changed.solved(OFFSET).number();
        if (left.isEmpty() || Math.abs(left.getAsDouble()) >= least) {
          continue;
        }
        OptionalDouble after = changed.solved(GAIN).number();
        if (movesGain(gain, after)) {
          continue;
        }
        least = Math.abs(left.getAsDouble());
        best =
            new Best(
                change,
                left.getAsDouble(),
                after,
                trim.path()
                    + " = "
                    + EngineeringFormat.format(value, Unit.OHM)
                    + " instead of "
                    + EngineeringFormat.format(trim.present(), Unit.OHM)
                    + " leaves "
                    + EngineeringFormat.format(left.getAsDouble(), Unit.VOLT, 3)
                    + " of "
                    + EngineeringFormat.format(offset.number().getAsDouble(), Unit.VOLT, 3)
                    + ", solved in full"
                    + (after.isPresent()
                        ? "; the gain is then "
                            + EngineeringFormat.format(after.getAsDouble(), Unit.ONE)
                            + "."
                        : "."));
      }
    }
    return Optional.ofNullable(best);
  }

  private static boolean movesGain(FigureValue before, OptionalDouble after) {
    return before.number().isPresent()
        && (after.isEmpty()
            || Math.abs(after.getAsDouble() / before.number().getAsDouble() - 1) > GAIN_MOVES);
  }
}
