package loopwright.session;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Bench;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.Design;
import loopwright.design.Drawer;
import loopwright.design.Feedback;
import loopwright.design.GainStage;
import loopwright.design.Hookup;
import loopwright.design.InputPair;
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
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** Designs for tests of the session and of the window. */
public final class SampleDesigns {
  private SampleDesigns() {}

  /** A coil amplifier on ±12 V with two hookups, {@code divider} and {@code follower}. */
  public static Design coilAmplifier() {
    return new Design(
        Design.VERSION,
        "Seismometer coil amplifier",
        Optional.empty(),
        new Rails(
            Quantity.literal("12"),
            Quantity.literal("-12"),
            PartValue.of(0),
            Quantity.of(0),
            Optional.empty(),
            Optional.empty()),
        new Surroundings(Quantity.of(25), Quantity.of(0), false, Quantity.of(0)),
        parts(),
        new StagesAmplifier(pair(), gainStage(), follower()),
        Map.of(),
        List.of(),
        List.of(
            hookup("divider", ohms("10k"), Optional.of(ohms("1k"))),
            hookup("follower", PartValue.of(0), Optional.empty())),
        new Tolerances(
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty()),
        List.of(),
        new Drawer(Optional.empty(), Optional.empty(), List.of()),
        new Bench(Map.of(), List.of(), List.of(), Optional.empty()));
  }

  /** The same amplifier with another load of the gain stage. */
  public static Design withGainLoad(Design design, String resistance) {
    StagesAmplifier stages = (StagesAmplifier) design.amplifier();
    GainStage gain = stages.gainStage();
    return new Design(
        design.loopwright(),
        design.name(),
        design.notes(),
        design.rails(),
        design.surroundings(),
        design.parts(),
        new StagesAmplifier(
            stages.inputPair(),
            new GainStage(
                gain.transistor(),
                new CurrentSource.Resistor(ohms(resistance)),
                gain.emitterResistance(),
                gain.emitterBypass(),
                gain.buffer(),
                gain.compensation()),
            stages.outputStage()),
        design.devices(),
        design.extras(),
        design.hookups(),
        design.tolerances(),
        design.limits(),
        design.drawer(),
        design.bench());
  }

  private static Map<String, PartRecord> parts() {
    return Map.of(
        "npn small-signal", transistor(Polarity.NPN, 1e-14, 200),
        "pnp small-signal", transistor(Polarity.PNP, 1e-14, 180));
  }

  private static TransistorRecord transistor(Polarity polarity, double current, double beta) {
    Optional<Quantity> none = Optional.empty();
    return new TransistorRecord(
        polarity,
        Optional.of(
            new TransistorModel(
                Optional.of(Quantity.of(current)),
                Optional.of(Quantity.of(beta)),
                none,
                Optional.of(Quantity.of(80)),
                none,
                none,
                none,
                none,
                none,
                none,
                Optional.of(Quantity.literal("12e-12")),
                Optional.of(Quantity.literal("4e-12")),
                Optional.of(Quantity.literal("4e-10")),
                none,
                none)),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        List.of());
  }

  private static InputPair pair() {
    return new InputPair(
        "npn small-signal",
        new CurrentSource.Mirror(
            "npn small-signal", ohms("10k"), PartValue.of(0), Optional.empty()),
        new PairLoad.Resistors(ohms("1k5"), PartValue.of(0)),
        PartValue.of(0),
        PartValue.of(0),
        Quantity.of(0));
  }

  private static GainStage gainStage() {
    return new GainStage(
        "pnp small-signal",
        new CurrentSource.Resistor(ohms("8k2")),
        ohms("100"),
        Optional.empty(),
        Optional.empty(),
        Optional.of(
            new GainStage.Compensation(
                PartValue.of(Quantity.parse("33e-12", Unit.FARAD)), PartValue.of(0))));
  }

  private static OutputStage follower() {
    return new OutputStage.PushPull(
        "npn small-signal",
        "pnp small-signal",
        new Bias.Joined(),
        PartValue.of(0),
        Optional.empty());
  }

  private static Hookup hookup(String name, PartValue upper, Optional<PartValue> lower) {
    return new Hookup(
        name,
        new Source(
            ohms("600"),
            Quantity.of(0),
            Quantity.parse("0.2", Unit.VOLT),
            Quantity.of(1000),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            ReturnNode.GROUND),
        new Feedback.NonInverting(
            upper, lower, Optional.empty(), Optional.empty(), ReturnNode.GROUND, TakenFrom.OUT),
        new Load(
            Optional.of(ohms("10k")),
            Optional.empty(),
            PartValue.of(0),
            Optional.empty(),
            Optional.empty()),
        List.of());
  }

  private static PartValue ohms(String value) {
    return PartValue.of(Quantity.parse(value, Unit.OHM));
  }
}
