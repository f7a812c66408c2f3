package loopwright.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.circuit.Physics;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.design.StagesAmplifier;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.HookupFigures;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/** The ways in which the trade cures an amplifier that oscillates, with the values to try. */
final class CureWays {
  private static final String COMPENSATION = "amplifier.gainStage.compensation.";
  private static final String INSIDE =
      "the amplifier is known by its figures; nothing in it changes";
  private static final double LEAST_CAPACITANCE = 1e-12;
  private static final double MOST_MILLER = 10e-9;
  private static final double MOST_LEAD = 1e-9;
  private static final double SAME_GAIN = 0.03;

  private final HookupFigures nominal;
  private final Design design;
  private final Hookup hookup;
  private final String at;

  private CureWays(HookupFigures nominal) {
    this.nominal = nominal;
    this.design = nominal.design();
    this.hookup = nominal.hookup();
    this.at = "hookups." + hookup.name() + ".";
  }

  /** The ways for a hookup, those with one part first. */
  static List<CureWay> of(HookupFigures nominal) {
    CureWays ways = new CureWays(nominal);
    List<CureWay> single =
        List.of(
            ways.miller(),
            ways.millerWithResistor(),
            ways.lead(),
            ways.isolation(),
            ways.snubber(),
            ways.degeneration(),
            ways.divider());
    List<CureWay> all = new ArrayList<>(single);
    CureWay miller = single.get(0);
    if (!miller.candidates().isEmpty()) {
      single.stream()
          .skip(2)
          .filter(other -> !other.candidates().isEmpty())
          .forEach(other -> all.add(pair(miller, other)));
    }
    return all;
  }

  private CureWay miller() {
    return stages().isEmpty()
        ? CureWay.closed("Miller capacitor", INSIDE)
        : CureWay.open(
            "Miller capacitor",
            millerValues().stream().map(value -> List.of(capacitance(value))).toList());
  }

  private CureWay millerWithResistor() {
    String kind = "Miller capacitor with series resistor";
    if (stages().isEmpty()) {
      return CureWay.closed(kind, INSIDE);
    }
    if (!(nominal.devices().get("gain.q1") instanceof TransistorState gain)
        || !(gain.collectorCurrent() > 0)) {
      return CureWay.closed(kind, "the gain stage carries no current at rest");
    }
    double kelvin = Physics.ZERO_CELSIUS + design.surroundings().ambient().value();
    double degeneration = stages().get().gainStage().emitterResistance().effective();
    double inverse = Physics.thermalVoltage(kelvin) / gain.collectorCurrent() + degeneration;
    List<List<Change>> candidates = new ArrayList<>();
    // The zero moves to infinity at 1/G_m and from there into the left half plane.
    for (double value : millerValues()) {
      for (double factor : new double[] {1, 2, 4, 8}) {
        double resistance = PreferredValues.E12.nearest(factor * inverse);
        candidates.add(
            List.of(capacitance(value), change(COMPENSATION + "resistance", resistance, Unit.OHM)));
      }
    }
    return CureWay.open(kind, candidates);
  }

  private List<Double> millerValues() {
    double present =
        stages()
            .flatMap(stages -> stages.gainStage().compensation())
            .map(compensation -> compensation.capacitance().effective())
            .orElse(0.0);
    return Stock.capacitors(design, Math.max(LEAST_CAPACITANCE, present * 1.01), MOST_MILLER);
  }

  private static Change capacitance(double value) {
    return change(COMPENSATION + "capacitance", value, Unit.FARAD);
  }

  private CureWay lead() {
    String kind = "lead capacitor";
    if (nominal.gains().upper() == 0) {
      return CureWay.closed(kind, "there is no resistor between output and inverting input");
    }
    return CureWay.open(
        kind,
        Stock.capacitors(design, LEAST_CAPACITANCE, MOST_LEAD).stream()
            .map(value -> List.of(change(at + "feedback.leadCapacitance", value, Unit.FARAD)))
            .toList());
  }

  private CureWay isolation() {
    String kind = "isolation resistor";
    if (hookup.load().capacitance().isEmpty() && hookup.load().resistance().isEmpty()) {
      return CureWay.closed(kind, "there is no load to keep away from the output");
    }
    double present = hookup.load().isolation().effective();
    return CureWay.open(
        kind,
        Stock.resistors(design, Math.max(1, present * 1.01), 1e3).stream()
            .map(value -> List.of(change(at + "load.isolation", value, Unit.OHM)))
            .toList());
  }

  private CureWay snubber() {
    if (hookup.load().snubber().isPresent()) {
      return CureWay.closed("snubber", "there is one already");
    }
    List<List<Change>> candidates = new ArrayList<>();
    for (double capacitance : PreferredValues.E3.between(100e-12, 1e-6)) {
      for (double resistance : PreferredValues.E3.between(4.7, 470)) {
        candidates.add(
            List.of(
                change(at + "load.snubber.resistance", resistance, Unit.OHM),
                change(at + "load.snubber.capacitance", capacitance, Unit.FARAD)));
      }
    }
    return CureWay.open("snubber", candidates);
  }

  private CureWay degeneration() {
    String kind = "emitter resistors of the pair";
    if (stages().isEmpty()) {
      return CureWay.closed(kind, INSIDE);
    }
    double present = stages().get().inputPair().emitterResistance().effective();
    return CureWay.open(
        kind,
        Stock.resistors(design, Math.max(10, present * 1.01), 2200).stream()
            .map(value -> List.of(change("amplifier.inputPair.emitterResistance", value, Unit.OHM)))
            .toList());
  }

  /** Both resistors of the divider lower, their ratio as near as the stock allows. */
  private CureWay divider() {
    String kind = "divider of lower resistance";
    Optional<PartValue> lower =
        hookup.feedback() instanceof Feedback.NonInverting divider
            ? divider.lower()
            : hookup.feedback() instanceof Feedback.Inverting inverting
                ? Optional.of(inverting.inputResistor())
                : Optional.empty();
    double upper = nominal.gains().upper();
    if (lower.isEmpty() || upper == 0) {
      return CureWay.closed(kind, "there is no divider");
    }
    boolean inverting = hookup.feedback() instanceof Feedback.Inverting;
    String lowerPath = at + "feedback." + (inverting ? "inputResistor" : "lower");
    double ratio = upper / lower.get().effective();
    List<Double> stock = Stock.resistors(design, 1, upper);
    List<List<Change>> candidates = new ArrayList<>();
    List<Double> values = Stock.resistors(design, 10, lower.get().effective() * 0.99);
    for (int i = values.size() - 1; i >= 0; i--) {
      double foot = values.get(i);
      stock.stream()
          .filter(value -> Math.abs(value / (foot * ratio) - 1) < SAME_GAIN)
          .min((a, b) -> Double.compare(off(a, foot * ratio), off(b, foot * ratio)))
          .ifPresent(
              top ->
                  candidates.add(
                      List.of(
                          change(at + "feedback.upper", top, Unit.OHM),
                          change(lowerPath, foot, Unit.OHM))));
    }
    return candidates.isEmpty()
        ? CureWay.closed(kind, "no two resistors in stock keep the gain")
        : CureWay.open(kind, candidates);
  }

  private static double off(double value, double wanted) {
    return Math.abs(Math.log(value / wanted));
  }

  /** Two ways together, on a grid wide enough to be tried in time. */
  private static CureWay pair(CureWay one, CureWay other) {
    String kind = one.kind() + " and " + other.kind();
    List<List<Change>> candidates = new ArrayList<>();
    for (List<Change> first : every(one.candidates(), 4)) {
      for (List<Change> second : every(other.candidates(), 1 + other.candidates().size() / 8)) {
        List<Change> both = new ArrayList<>(first);
        both.addAll(second);
        candidates.add(both);
      }
    }
    return CureWay.open(kind, candidates);
  }

  private static List<List<Change>> every(List<List<Change>> all, int stride) {
    List<List<Change>> some = new ArrayList<>();
    for (int i = 0; i < all.size(); i += stride) {
      some.add(all.get(i));
    }
    return some;
  }

  private Optional<StagesAmplifier> stages() {
    return design.amplifier() instanceof StagesAmplifier stages
        ? Optional.of(stages)
        : Optional.empty();
  }

  private static Change change(String path, double value, Unit unit) {
    return new Change(path, EngineeringFormat.spelling(value, unit));
  }
}
