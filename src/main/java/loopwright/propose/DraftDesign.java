package loopwright.propose;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Bench;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.Design;
import loopwright.design.DesignValidation;
import loopwright.design.Drawer;
import loopwright.design.FeedFrom;
import loopwright.design.Feedback;
import loopwright.design.GainStage;
import loopwright.design.Hookup;
import loopwright.design.InputPair;
import loopwright.design.Limit;
import loopwright.design.Load;
import loopwright.design.OutputStage;
import loopwright.design.PairLoad;
import loopwright.design.PartValue;
import loopwright.design.Rails;
import loopwright.design.ReturnNode;
import loopwright.design.Source;
import loopwright.design.StagesAmplifier;
import loopwright.design.Surroundings;
import loopwright.design.TakenFrom;
import loopwright.design.Tolerances;
import loopwright.design.UsedParts;
import loopwright.part.Shelf;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** Turns the choices into a design. */
final class DraftDesign {
  /** Leads from the supply, about 1 µH a metre each; common practice, no source. */
  static final double LEAD_INDUCTANCE = 0.5e-6;

  private static final double STRAY = 2e-12;

  private final Specification wanted;
  private final Draft draft;

  private DraftDesign(Specification wanted, Draft draft) {
    this.wanted = wanted;
    this.draft = draft;
  }

  /** The design, sound and with every part record that it uses. */
  static Design of(Specification wanted, Draft draft, Shelf shelf) {
    Design design = new DraftDesign(wanted, draft).design();
    return DesignValidation.requireSound(UsedParts.withPartsFrom(design, shelf));
  }

  private Design design() {
    return new Design(
        Design.VERSION,
        name(),
        Optional.of(
            "First design from a specification. The prediction is no test of a build: power it"
                + " first from a current-limited supply, let parts cool before touching them, and"
                + " follow local rules."),
        rails(),
        new Surroundings(
            Quantity.of(25), Quantity.spelled(STRAY, Unit.FARAD), false, Quantity.of(0)),
        Map.of(),
        new StagesAmplifier(pair(), gainStage(), output()),
        Map.of(),
        List.of(),
        List.of(hookup()),
        new Tolerances(
            Optional.of(Quantity.parse("1%", Unit.ONE)),
            Optional.of(Quantity.parse("10%", Unit.ONE)),
            Optional.of(Quantity.parse("2m", Unit.VOLT)),
            Optional.of(new Tolerances.BetaSpread.FromDatasheet()),
            Optional.empty(),
            Optional.empty()),
        List.<Limit>of(),
        new Drawer(
            Optional.of(wanted.resistors()),
            Optional.of(wanted.capacitors()),
            wanted.transistors()),
        new Bench(Map.of(), List.of(), List.of(), Optional.empty()));
  }

  private String name() {
    return (wanted.inverting() ? "Inverting amplifier, gain −" : "Amplifier, gain ")
        + Draft.text(wanted.gain(), Unit.ONE)
        + ", ±"
        + Draft.text(wanted.swing(), Unit.VOLT);
  }

  private Rails rails() {
    Optional<Rails.MidRail> midRail =
        wanted.single()
            ? Optional.of(
                new Rails.MidRail(
                    ohms(draft.midResistor), ohms(draft.midResistor), farads(draft.midCapacitor)))
            : Optional.empty();
    return new Rails(
        Quantity.of(wanted.positive()),
        Quantity.of(wanted.negative()),
        ohms(0),
        Quantity.spelled(LEAD_INDUCTANCE, Unit.HENRY),
        Optional.of(new Rails.Decoupling(farads(draft.decoupling), ohms(draft.decouplingResistor))),
        midRail);
  }

  private InputPair pair() {
    PairLoad load =
        draft.mirrorLoad
            ? new PairLoad.Mirror(draft.pnp, ohms(draft.pairEmitter))
            : new PairLoad.Resistors(ohms(draft.pairResistor), ohms(draft.pairResistor));
    CurrentSource tail =
        draft.tailSource
            ? new CurrentSource.Mirror(
                draft.npn, ohms(draft.tailResistor), ohms(draft.tailEmitter), feed())
            : new CurrentSource.Resistor(ohms(draft.tailResistor));
    return new InputPair(draft.npn, tail, load, ohms(draft.degeneration), ohms(0), Quantity.of(0));
  }

  private Optional<FeedFrom> feed() {
    return wanted.single() ? Optional.of(FeedFrom.OPPOSITE_RAIL) : Optional.empty();
  }

  private GainStage gainStage() {
    CurrentSource load =
        draft.gainSource
            ? new CurrentSource.Mirror(
                draft.sourcePart, ohms(draft.gainResistor), ohms(draft.sourceEmitter), feed())
            : new CurrentSource.Resistor(ohms(draft.gainResistor));
    return new GainStage(
        draft.gainPart,
        load,
        ohms(draft.gainEmitter),
        Optional.empty(),
        draft.bufferResistor > 0
            ? Optional.of(new GainStage.Buffer(draft.pnp, ohms(draft.bufferResistor)))
            : Optional.empty(),
        Optional.of(new GainStage.Compensation(farads(draft.capacitor), ohms(draft.nulling))));
  }

  private OutputStage output() {
    if (draft.output == Draft.Output.NONE) {
      return new OutputStage.None();
    }
    Bias bias =
        draft.output == Draft.Output.DIODES
            ? new Bias.Diodes(draft.diode, 2)
            : new Bias.VbeMultiplier(
                draft.sourcePart, ohms(draft.biasUpper), ohms(draft.biasLower));
    return new OutputStage.PushPull(
        draft.upperPart,
        draft.lowerPart,
        bias,
        ohms(draft.emitterResistor),
        draft.drivers
            ? Optional.of(
                new OutputStage.Drivers(
                    draft.upperDriver, draft.lowerDriver, ohms(draft.driverResistor)))
            : Optional.empty());
  }

  private Hookup hookup() {
    double amplitude = wanted.swing() / wanted.gain();
    boolean single = wanted.single();
    Source source =
        new Source(
            ohms(wanted.sourceResistance()),
            Quantity.of(0),
            Quantity.of(
                Double.parseDouble(String.format(java.util.Locale.ROOT, "%.4g", amplitude))),
            Quantity.spelled(wanted.signalFrequency(), Unit.HERTZ),
            Optional.empty(),
            single ? Optional.of(farads(draft.sourceCapacitor)) : Optional.empty(),
            single && !wanted.inverting()
                ? Optional.of(ohms(draft.biasResistor))
                : Optional.empty(),
            middle());
    Load load =
        new Load(
            wanted.loadResistance().isPresent()
                ? Optional.of(ohms(wanted.loadResistance().getAsDouble()))
                : Optional.empty(),
            wanted.loadCapacitance() > 0
                ? Optional.of(farads(wanted.loadCapacitance()))
                : Optional.empty(),
            ohms(draft.isolation),
            single && wanted.loadResistance().isPresent()
                ? Optional.of(farads(draft.loadCapacitor))
                : Optional.empty(),
            Optional.empty());
    return new Hookup(Draft.HOOKUP, source, feedback(), load, List.of());
  }

  private ReturnNode middle() {
    return wanted.single() ? ReturnNode.MID_RAIL : ReturnNode.GROUND;
  }

  private Feedback feedback() {
    if (wanted.inverting()) {
      return new Feedback.Inverting(
          ohms(draft.upper), ohms(draft.lower), Optional.empty(), ohms(0), middle(), TakenFrom.OUT);
    }
    boolean wire = Double.isNaN(draft.lower);
    return new Feedback.NonInverting(
        ohms(draft.upper),
        wire ? Optional.empty() : Optional.of(ohms(draft.lower)),
        !wire && wanted.single() ? Optional.of(farads(draft.footCapacitor)) : Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  private static PartValue ohms(double value) {
    return PartValue.of(value == 0 ? Quantity.of(0) : Quantity.spelled(value, Unit.OHM));
  }

  private static PartValue farads(double value) {
    return PartValue.of(Quantity.spelled(value, Unit.FARAD));
  }
}
