package loopwright.propose;

import static loopwright.propose.Draft.text;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import loopwright.check.Finding;
import loopwright.check.Findings;
import loopwright.design.Design;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.quantity.Unit;
import loopwright.task.Progress;

/** A design solved in full, beside what was wanted of it. */
final class Verdict {
  /** Swing predicted over swing wanted; common practice, no source. */
  static final double SWING_RESERVE = 1.05;

  static final String SWING_UP = "Swing upward";
  static final String SWING_DOWN = "Swing downward";
  static final String GAIN = "Gain";
  static final String BANDWIDTH = "Bandwidth";
  static final String MARGIN = "Phase margin, worst level";
  static final String SLEW = "Slew rate";
  static final String LOW_CORNER = "Low corner";
  static final String JUNCTION = "Hottest junction";
  static final String FINDINGS = "Findings that fail";

  private static final double[] FREQUENCIES = {1e3};

  private final Specification wanted;
  private final HookupPrediction hookup;
  private final Design design;
  private final List<Finding> findings;
  private final List<Demand> demands = new ArrayList<>();

  private Verdict(Specification wanted, Design design, Prediction prediction) {
    this.wanted = wanted;
    this.design = design;
    this.hookup = prediction.hookups().get(0);
    this.findings = Findings.of(prediction);
    judge();
  }

  /** Solves and judges. */
  static Verdict of(Specification wanted, Design design, Progress progress) {
    return new Verdict(
        wanted, design, Predictor.predict(design, List.of(Draft.HOOKUP), FREQUENCIES, progress));
  }

  Design design() {
    return design;
  }

  List<Demand> demands() {
    return demands;
  }

  List<Finding> findings() {
    return findings;
  }

  boolean isMet() {
    return demands.stream().allMatch(Demand::met);
  }

  /** Whether a demand is met; true where it is not among the demands. */
  boolean meets(String name) {
    return demands.stream().filter(demand -> demand.name().equals(name)).allMatch(Demand::met);
  }

  /** Why it finds no rest, or empty. */
  String failure() {
    return hookup.failure();
  }

  /** Collector current at rest of a transistor, A. */
  OptionalDouble current(String role) {
    return hookup
        .rest()
        .map(rest -> rest.devices().get(role))
        .map(
            device ->
                device instanceof TransistorState state
                    ? OptionalDouble.of(state.collectorCurrent())
                    : OptionalDouble.empty())
        .orElse(OptionalDouble.empty());
  }

  /** Predicted value of a demand over the wanted one. */
  double share(String name) {
    return demands.stream()
        .filter(demand -> demand.name().equals(name))
        .mapToDouble(demand -> demand.predicted().orElse(0) / demand.wanted())
        .findFirst()
        .orElse(1);
  }

  OptionalDouble solved(String key) {
    FigureResult result = hookup.figures().get(key);
    return result == null ? OptionalDouble.empty() : result.solved().number();
  }

  private FigureValue value(String key) {
    return hookup.figures().get(key).solved();
  }

  private void judge() {
    double middle =
        hookup.rest().map(rest -> rest.nodes().getOrDefault("midRail", 0.0)).orElse(0.0);
    gain();
    clip(SWING_UP, "clipHigh", middle, 1);
    clip(SWING_DOWN, "clipLow", middle, -1);
    atLeast(BANDWIDTH, wanted.bandwidth(), solved("bandwidth"), Unit.HERTZ, value("bandwidth"));
    margin();
    slew();
    if (wanted.single()) {
      double most = wanted.signalFrequency() / 5;
      OptionalDouble corner = solved("lowCorner");
      boolean met = corner.isPresent() && corner.getAsDouble() <= most;
      demands.add(
          new Demand(
              LOW_CORNER,
              most,
              corner,
              Unit.HERTZ,
              met,
              met ? "" : "Larger blocking capacitors, or a higher signal frequency, must give."));
    }
    OptionalDouble hottest = solved("hottestJunction");
    boolean cool = hottest.isEmpty() || hottest.getAsDouble() <= 150;
    demands.add(
        new Demand(
            JUNCTION,
            150,
            hottest,
            Unit.CELSIUS,
            cool,
            cool ? "" : "A heat sink, a stronger part, lower rails or a lighter load must give."));
    List<Finding> failing =
        findings.stream().filter(found -> found.severity() == Finding.Severity.FAILS).toList();
    demands.add(
        new Demand(
            FINDINGS,
            0,
            OptionalDouble.of(failing.size()),
            Unit.ONE,
            failing.isEmpty(),
            failing.stream()
                .map(found -> found.where() + ": " + found.says())
                .collect(Collectors.joining(" "))));
  }

  private void gain() {
    double target = (wanted.inverting() ? -1 : 1) * wanted.gain();
    OptionalDouble solved = solved("closedLoopGain");
    double error = solved.isPresent() ? Math.abs(solved.getAsDouble() / target - 1) : Double.NaN;
    boolean met = error <= wanted.gainTolerance();
    demands.add(
        new Demand(
            GAIN,
            target,
            solved,
            Unit.ONE,
            met,
            met
                ? ""
                : Double.isNaN(error)
                    ? value("closedLoopGain").says()
                    : "It is off by "
                        + text(100 * error, Unit.ONE)
                        + " %, "
                        + text(100 * wanted.gainTolerance(), Unit.ONE)
                        + " % may be: finer resistors, a wider tolerance, or a lower gain must"
                        + " give."));
  }

  private void clip(String name, String key, double middle, int sense) {
    OptionalDouble clip = solved(key);
    OptionalDouble reach =
        clip.isPresent()
            ? OptionalDouble.of(sense * (clip.getAsDouble() - middle))
            : OptionalDouble.empty();
    double least = SWING_RESERVE * wanted.swing();
    boolean met = reach.isPresent() && reach.getAsDouble() >= least;
    String says = "";
    if (reach.isEmpty()) {
      says = value(key).says();
    } else if (!met) {
      double missing = least - reach.getAsDouble();
      says =
          text(missing, Unit.VOLT)
              + " short (with 5 % to spare; "
              + value(key).says()
              + "): "
              + text(missing, Unit.VOLT)
              + " more supply on that side, a swing of "
              + text(Math.max(0, reach.getAsDouble() / SWING_RESERVE), Unit.VOLT)
              + ", or a lighter load must give.";
    }
    demands.add(new Demand(name, wanted.swing(), reach, Unit.VOLT, met, says));
  }

  private void atLeast(
      String name, double least, OptionalDouble predicted, Unit unit, FigureValue value) {
    boolean met = predicted.isPresent() && predicted.getAsDouble() >= least;
    demands.add(
        new Demand(
            name,
            least,
            predicted,
            unit,
            met,
            met
                ? ""
                : predicted.isEmpty()
                    ? value.says()
                    : text(least - predicted.getAsDouble(), unit)
                        + " short: faster transistors, a lower gain, a smaller margin or a lighter"
                        + " capacitance must give."));
  }

  private void margin() {
    OptionalDouble worst = solved("worstPhaseMargin");
    boolean stable =
        !hookup.overSwing().isEmpty()
            && hookup.overSwing().stream().allMatch(level -> level.stable());
    boolean met = stable && (worst.isEmpty() || worst.getAsDouble() >= wanted.margin());
    demands.add(
        new Demand(
            MARGIN,
            wanted.margin(),
            worst,
            Unit.DEGREE,
            met,
            met
                ? worst.isEmpty() ? value("worstPhaseMargin").says() : ""
                : (stable
                        ? text(wanted.margin() - worst.orElse(0), Unit.DEGREE) + " short"
                        : "it oscillates at some level")
                    + ": a lower bandwidth, less load capacitance, a higher gain or faster output"
                    + " transistors must give."));
  }

  private void slew() {
    double least = 2 * Math.PI * wanted.signalFrequency() * wanted.swing();
    OptionalDouble rising = slew("slewRising");
    OptionalDouble falling = slew("slewFalling");
    OptionalDouble slower =
        rising.isPresent() && falling.isPresent()
            ? OptionalDouble.of(
                Math.min(Math.abs(rising.getAsDouble()), Math.abs(falling.getAsDouble())))
            : OptionalDouble.empty();
    atLeast(SLEW, least, slower, Unit.VOLT_PER_SECOND, value("slewRising"));
  }

  /** Solved; where the time domain is not solved, by hand. */
  private OptionalDouble slew(String key) {
    OptionalDouble solved = solved(key);
    return solved.isPresent() ? solved : hookup.figures().get(key).formula().number();
  }
}
