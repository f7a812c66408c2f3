package loopwright.view;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Amplifier;
import loopwright.design.Bench;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.Design;
import loopwright.design.Drawer;
import loopwright.design.Feedback;
import loopwright.design.FiguresAmplifier;
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
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Designs for the tests of views: amplifiers, and hookups to go around them. */
public final class SampleDesigns {
  private SampleDesigns() {}

  /** A design of one amplifier in one hookup, on ±12 V. */
  public static Design design(Amplifier amplifier, Hookup hookup) {
    return new Design(
        Design.VERSION,
        "sample",
        Optional.empty(),
        new Rails(
            Quantity.of(12),
            Quantity.of(-12),
            PartValue.of(0),
            Quantity.of(0),
            Optional.empty(),
            Optional.empty()),
        new Surroundings(Quantity.of(25), Quantity.of(0), false, Quantity.of(0)),
        Map.of("QN", record(Polarity.NPN), "QP", record(Polarity.PNP)),
        amplifier,
        Map.of(),
        List.of(),
        List.of(hookup),
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

  private static TransistorRecord record(Polarity polarity) {
    return new TransistorRecord(
        polarity,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        List.of());
  }

  /** An npn pair with a mirror tail, a degenerated gain stage, joined bases. */
  public static StagesAmplifier npn() {
    return new StagesAmplifier(
        new InputPair(
            "QN",
            new CurrentSource.Mirror("QN", PartValue.of(10e3), PartValue.of(0), Optional.empty()),
            new PairLoad.Resistors(PartValue.of(1500), PartValue.of(0)),
            PartValue.of(0),
            PartValue.of(0),
            Quantity.of(0)),
        new GainStage(
            "QP",
            new CurrentSource.Resistor(PartValue.of(8200)),
            PartValue.of(100),
            Optional.empty(),
            Optional.empty(),
            Optional.of(new GainStage.Compensation(PartValue.of(33e-12), PartValue.of(0)))),
        pushPull(new Bias.Joined()));
  }

  /** A mirror-loaded pnp pair, two-transistor sources, buffer, V_BE multiplier, drivers. */
  public static StagesAmplifier pnp() {
    return new StagesAmplifier(
        new InputPair(
            "QP",
            new CurrentSource.TwoTransistor(
                "QP", PartValue.of(22e3), PartValue.of(560), Optional.empty()),
            new PairLoad.Mirror("QN", PartValue.of(100)),
            PartValue.of(220),
            PartValue.of(47),
            Quantity.of(0)),
        new GainStage(
            "QN",
            new CurrentSource.DiodeBiased(
                "QP", "D", 2, PartValue.of(22e3), PartValue.of(330), Optional.empty()),
            PartValue.of(47),
            Optional.of(PartValue.of(100e-6)),
            Optional.of(new GainStage.Buffer("QN", PartValue.of(4700))),
            Optional.of(new GainStage.Compensation(PartValue.of(100e-12), PartValue.of(220)))),
        new OutputStage.PushPull(
            "QN",
            "QP",
            new Bias.VbeMultiplier("QN", PartValue.of(2200), PartValue.of(1000)),
            PartValue.of(22),
            Optional.of(new OutputStage.Drivers("QN", "QP", PartValue.of(470)))));
  }

  /** The same pair and gain stage without a follower. */
  public static StagesAmplifier withoutFollower() {
    StagesAmplifier npn = npn();
    return new StagesAmplifier(npn.inputPair(), npn.gainStage(), new OutputStage.None());
  }

  private static OutputStage pushPull(Bias bias) {
    return new OutputStage.PushPull("QN", "QP", bias, PartValue.of(0), Optional.empty());
  }

  /** An amplifier that was measured: gain 500, offset 6.1 mV, dead zone 0.6 V. */
  public static FiguresAmplifier figures() {
    Quantity infinite = Quantity.of(Double.POSITIVE_INFINITY);
    return new FiguresAmplifier(
        Quantity.of(500),
        Quantity.of(6.1e-3),
        Quantity.of(0.6),
        List.of(Quantity.of(50e3), Quantity.of(5e6)),
        infinite,
        Quantity.of(0),
        Quantity.of(0),
        infinite,
        Quantity.of(0),
        Optional.empty(),
        Optional.empty(),
        infinite);
  }

  /** A generator of 600 Ω and 1 kHz. */
  public static Source source(double amplitude) {
    return new Source(
        PartValue.of(600),
        Quantity.of(0),
        Quantity.of(amplitude),
        Quantity.of(1000),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND);
  }

  /** The same behind an attenuator of 1000 : 1. */
  public static Source attenuated(double amplitude) {
    Source plain = source(amplitude);
    return new Source(
        plain.resistance(),
        plain.dc(),
        plain.amplitude(),
        plain.frequency(),
        Optional.of(new Source.Attenuator(PartValue.of(99.9e3), PartValue.of(100))),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND);
  }

  /** 10 kΩ and 100 pF at the output. */
  public static Load load() {
    return new Load(
        Optional.of(PartValue.of(10e3)),
        Optional.of(PartValue.of(100e-12)),
        PartValue.of(0),
        Optional.empty(),
        Optional.empty());
  }

  /** Nothing at the output. */
  public static Load noLoad() {
    return new Load(
        Optional.empty(), Optional.empty(), PartValue.of(0), Optional.empty(), Optional.empty());
  }

  /** A load behind 47 Ω. */
  public static Load isolated() {
    Load plain = load();
    return new Load(
        plain.resistance(),
        plain.capacitance(),
        PartValue.of(47),
        Optional.empty(),
        Optional.empty());
  }

  /** A divider for a gain of 11. */
  public static Hookup divider(double amplitude) {
    return hookup("divider", source(amplitude), divided(), load());
  }

  private static Feedback divided() {
    return new Feedback.NonInverting(
        PartValue.of(10e3),
        Optional.of(PartValue.of(1e3)),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  /** A wire from out to the inverting input. */
  public static Hookup follower(double amplitude) {
    return hookup("follower", source(amplitude), wire(TakenFrom.OUT), load());
  }

  /** A wire from the far side of an isolation resistor. */
  public static Hookup followerFromLoad(double amplitude) {
    return hookup("follower from load", source(amplitude), wire(TakenFrom.LOAD), isolated());
  }

  private static Feedback wire(TakenFrom from) {
    return new Feedback.NonInverting(
        PartValue.of(0),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        from);
  }

  /** An inverting gain of −10. */
  public static Hookup inverting(double amplitude) {
    return hookup(
        "inverting",
        source(amplitude),
        new Feedback.Inverting(
            PartValue.of(100e3),
            PartValue.of(10e3),
            Optional.empty(),
            PartValue.of(9100),
            ReturnNode.GROUND,
            TakenFrom.OUT),
        load());
  }

  /** No feedback, behind an attenuator. */
  public static Hookup open(double amplitude) {
    return hookup("open", attenuated(amplitude), new Feedback.Open(PartValue.of(600)), noLoad());
  }

  private static Hookup hookup(String name, Source source, Feedback feedback, Load load) {
    return new Hookup(name, source, feedback, load, List.of());
  }
}
