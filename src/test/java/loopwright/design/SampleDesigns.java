package loopwright.design;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeLimits;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Pin;
import loopwright.part.Polarity;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Designs for tests: a bare one, and one in which everything that can stand does stand. */
final class SampleDesigns {
  private SampleDesigns() {}

  /** Three stages on two rails, one follower hookup, no more than is needed. */
  static Design bare() {
    Design design =
        new Design(
            Design.VERSION,
            "bare",
            Optional.empty(),
            rails("12", "-12"),
            defaults(Surroundings.class),
            Map.of("N", transistor(Polarity.NPN), "P", transistor(Polarity.PNP), "D", diode()),
            new StagesAmplifier(
                new InputPair(
                    "N",
                    new CurrentSource.Resistor(part("12k")),
                    new PairLoad.Resistors(part("1k2"), part("0")),
                    part("0"),
                    part("0"),
                    Quantity.of(0)),
                new GainStage(
                    "P",
                    new CurrentSource.Resistor(part("4k7")),
                    part("0"),
                    Optional.empty(),
                    Optional.empty(),
                    Optional.empty()),
                new OutputStage.PushPull("N", "P", new Bias.Joined(), part("0"), Optional.empty())),
            Map.of(),
            List.of(),
            List.of(hookup("follower", follower())),
            defaults(Tolerances.class),
            List.of(),
            defaults(Drawer.class),
            defaults(Bench.class));
    return design;
  }

  /** The bare design with the polarity of everything turned over. */
  static Design bareTurnedOver() {
    Design design = bare();
    design = set(design, "amplifier.inputPair.transistor", "P");
    return set(design, "amplifier.gainStage.transistor", "N");
  }

  /** An amplifier known by its figures. */
  static Design figures() {
    return set(
        bare(),
        "amplifier",
        new FiguresAmplifier(
            quantity("500"),
            quantity("6.1m"),
            quantity("0.6"),
            List.of(quantity("10k"), quantity("1M")),
            quantity("100k"),
            quantity("10p"),
            quantity("1u"),
            quantity("1000"),
            quantity("100"),
            Optional.of(quantity("10")),
            Optional.of(quantity("-10")),
            quantity("1e6")));
  }

  /** Every optional block present, every list with an entry, all three kinds of hookup. */
  static Design full() {
    Map<String, PartRecord> parts = new LinkedHashMap<>(bare().parts());
    parts.put("ND", datasheetTransistor(Polarity.NPN));
    parts.put("DD", datasheetDiode());
    Map<String, DeviceChoice> devices = new LinkedHashMap<>();
    devices.put("pair.q1", new DeviceChoice(Optional.of("ND"), Optional.of(measured())));
    return new Design(
        Design.VERSION,
        "full",
        Optional.of("everything fitted"),
        new Rails(
            quantity("12"),
            quantity("-12"),
            part("1"),
            quantity("1u"),
            Optional.of(new Rails.Decoupling(part("100u"), part("0.1"))),
            Optional.of(new Rails.MidRail(part("10k"), part("10k"), part("47u")))),
        new Surroundings(quantity("30"), quantity("2p"), true, quantity("0.5")),
        parts,
        fullAmplifier(),
        devices,
        List.of(
            new Extra.ExtraResistor("trim", "pairOther", "positive", part("1M")),
            new Extra.ExtraCapacitor("lag", "pairOut", "positive", part("10p"))),
        List.of(
            hookup("gain", divider()),
            hookup(
                "inverting",
                new Feedback.Inverting(
                    part("10k"),
                    part("1k"),
                    Optional.of(part("10p")),
                    part("910"),
                    ReturnNode.GROUND,
                    TakenFrom.LOAD)),
            new Hookup("open", fullSource(), new Feedback.Open(part("1k")), fullLoad(), probes())),
        new Tolerances(
            Optional.of(quantity("1%")),
            Optional.of(quantity("10%")),
            Optional.of(quantity("5m")),
            Optional.of(new Tolerances.BetaSpread.ByFraction(quantity("30%"))),
            Optional.of(quantity("2%")),
            Optional.of(new Tolerances.AmbientRange(quantity("15"), quantity("35")))),
        List.of(
            new Limit(
                "gain",
                Optional.of("closedLoopGain"),
                Optional.empty(),
                Optional.of(quantity("9.7")),
                Optional.of(quantity("10")),
                quantity("0.01"))),
        new Drawer(
            Optional.of(new Drawer.Stock.Series("E24")),
            Optional.of(new Drawer.Stock.Values(List.of(quantity("22p"), quantity("100p")))),
            List.of("N", "P")),
        bench());
  }

  /** The full design with the stage variants that it leaves out. */
  static Design variant() {
    Design design = full();
    design =
        set(
            design,
            "amplifier.inputPair.tail",
            new CurrentSource.Mirror(
                "N", part("10k"), part("100"), Optional.of(FeedFrom.OPPOSITE_RAIL)));
    design = set(design, "amplifier.gainStage.load", new CurrentSource.Ideal(quantity("2 mA")));
    design = set(design, "amplifier.outputStage.bias", new Bias.Diodes("D", 3));
    design = set(design, "tolerances.beta", new Tolerances.BetaSpread.FromDatasheet());
    return set(
        design,
        "limits.1",
        new Limit(
            "gain",
            Optional.empty(),
            Optional.of("out"),
            Optional.of(quantity("-50m")),
            Optional.empty(),
            quantity("0")));
  }

  private static StagesAmplifier fullAmplifier() {
    return new StagesAmplifier(
        new InputPair(
            "N",
            new CurrentSource.TwoTransistor(
                "N", part("10k"), part("680"), Optional.of(FeedFrom.MID_RAIL)),
            new PairLoad.Mirror("P", part("100")),
            new PartValue(
                quantity("47"), Optional.of(quantity("1%")), Optional.of(quantity("46.8"))),
            part("100"),
            quantity("1m")),
        new GainStage(
            "P",
            new CurrentSource.DiodeBiased(
                "N", "D", 2, part("10k"), part("120"), Optional.of(FeedFrom.GROUND)),
            part("47"),
            Optional.of(part("10u")),
            Optional.of(new GainStage.Buffer("P", part("10k"))),
            Optional.of(new GainStage.Compensation(part("22p"), part("330")))),
        new OutputStage.PushPull(
            "N",
            "P",
            new Bias.VbeMultiplier("N", part("1k"), part("680")),
            part("10"),
            Optional.of(new OutputStage.Drivers("N", "P", part("470")))));
  }

  private static Bench bench() {
    return new Bench(
        Map.of(
            "meter",
            new Instrument(
                InstrumentKind.VOLTMETER,
                Optional.of(quantity("0.5%")),
                Optional.of(quantity("0.1%")),
                Optional.of(quantity("20 V")),
                Optional.of(quantity("2")),
                Optional.of(quantity("10 mV")),
                Optional.of(quantity("8")),
                Optional.of(quantity("1")),
                Optional.of(quantity("10M")),
                Optional.of(quantity("100p")),
                Optional.of(quantity("50")))),
        List.of(
            new Reading(
                Optional.of("gain"),
                "nodeVoltage",
                quantity("-60m"),
                Optional.of("out"),
                Optional.of("pair.q1"),
                Optional.of("amplifier.inputPair.baseResistance"),
                Optional.of(Reading.Rail.POSITIVE),
                Optional.of(quantity("1k")),
                Optional.of(quantity("0.1")),
                Optional.of("meter"),
                Optional.of(quantity("1m")),
                Optional.of(Reading.Expression.PEAK_TO_PEAK),
                Optional.of("warm"),
                Optional.of("2026-05-01T10:00"))),
        List.of(
            new Curve(
                "step",
                Optional.of("gain"),
                List.of(new Curve.Column("time", "s", List.of(quantity("0"), quantity("1u")))),
                Optional.of("step.csv"),
                Optional.of("00ff"))),
        Optional.of(
            new BuildRecord(
                Optional.of("A. Builder"),
                Optional.of("2026-05-01"),
                Map.of("meter", "12345"),
                Optional.of("ff00"))));
  }

  static Feedback.NonInverting follower() {
    return new Feedback.NonInverting(
        part("0"),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  private static Feedback.NonInverting divider() {
    return new Feedback.NonInverting(
        part("9k1"),
        Optional.of(part("1k")),
        Optional.of(part("100u")),
        Optional.of(part("10p")),
        ReturnNode.MID_RAIL,
        TakenFrom.OUT);
  }

  static Hookup hookup(String name, Feedback feedback) {
    return new Hookup(name, defaults(Source.class), feedback, defaults(Load.class), List.of());
  }

  private static Source fullSource() {
    return new Source(
        part("50"),
        quantity("0.1"),
        quantity("10m"),
        quantity("1k"),
        Optional.of(new Source.Attenuator(part("10k"), part("100"))),
        Optional.of(part("1u")),
        Optional.of(part("100k")),
        ReturnNode.MID_RAIL);
  }

  private static Load fullLoad() {
    return new Load(
        Optional.of(part("1k")),
        Optional.of(part("1n")),
        part("47"),
        Optional.of(part("100u")),
        Optional.of(new Load.Snubber(part("10"), part("100n"))));
  }

  private static List<Probe> probes() {
    return List.of(new Probe("out", Optional.of(part("10M")), Optional.of(part("12p"))));
  }

  static Rails rails(String positive, String negative) {
    return new Rails(
        quantity(positive),
        quantity(negative),
        part("0"),
        Quantity.of(0),
        Optional.empty(),
        Optional.empty());
  }

  /** A transistor by its model, every parameter given. */
  static TransistorRecord transistor(Polarity polarity) {
    TransistorModel model =
        new TransistorModel(
            Optional.of(quantity("1e-14")),
            Optional.of(quantity("200")),
            Optional.of(quantity("4")),
            Optional.of(quantity("100")),
            Optional.of(quantity("0.1")),
            Optional.of(quantity("1e-13")),
            Optional.of(quantity("2")),
            Optional.of(quantity("50")),
            Optional.of(quantity("0.5")),
            Optional.of(quantity("1")),
            Optional.of(quantity("8p")),
            Optional.of(quantity("3p")),
            Optional.of(quantity("400p")),
            Optional.of(quantity("100n")),
            Optional.of(quantity("1k")));
    return new TransistorRecord(
        polarity,
        Optional.of(model),
        Optional.empty(),
        Optional.of(measured()),
        Optional.of(
            new TransistorLimits(
                Optional.of(quantity("40")),
                Optional.of(quantity("6")),
                Optional.of(quantity("0.2")),
                Optional.of(quantity("0.5")),
                Optional.of(quantity("200")),
                Optional.of(quantity("150")))),
        Optional.of("from memory"),
        List.of(Pin.EMITTER, Pin.BASE, Pin.COLLECTOR));
  }

  static TransistorRecord datasheetTransistor(Polarity polarity) {
    return new TransistorRecord(
        polarity,
        Optional.empty(),
        Optional.of(
            new TransistorDatasheet(
                List.of(
                    new TransistorDatasheet.Beta(
                        quantity("2m"),
                        Optional.of(quantity("5")),
                        Optional.of(quantity("200")),
                        Optional.of(quantity("290")),
                        Optional.of(quantity("450")))),
                List.of(
                    new TransistorDatasheet.BaseEmitterVoltage(
                        quantity("2m"),
                        Optional.of(quantity("0.58")),
                        Optional.of(quantity("0.66")),
                        Optional.of(quantity("0.7")),
                        false)),
                Optional.of(
                    new TransistorDatasheet.TransitionFrequency(
                        quantity("10m"),
                        Optional.of(quantity("5")),
                        Optional.of(quantity("150 MHz")),
                        Optional.of(quantity("300 MHz")))),
                Optional.of(capacitance("10", "4.5p")),
                Optional.of(capacitance("0.5", "9p")),
                Optional.of(
                    new TransistorDatasheet.OutputConductance(
                        quantity("1m"),
                        Optional.of(quantity("10")),
                        Optional.of(quantity("1u")),
                        Optional.of(quantity("40u")))),
                Optional.of(quantity("80")),
                Optional.of(quantity("100")))),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        List.of());
  }

  private static TransistorDatasheet.Capacitance capacitance(String voltage, String farads) {
    return new TransistorDatasheet.Capacitance(
        quantity(voltage), Optional.of(quantity(farads)), Optional.of(quantity(farads)));
  }

  static TransistorMeasured measured() {
    return new TransistorMeasured(
        Optional.of(new TransistorMeasured.Beta(quantity("2m"), quantity("310"))),
        Optional.of(
            new TransistorMeasured.BaseEmitterVoltage(
                quantity("2m"), quantity("0.655"), quantity("23"))));
  }

  static DiodeRecord diode() {
    return new DiodeRecord(
        Optional.of(
            new DiodeModel(
                Optional.of(quantity("2e-9")),
                Optional.of(quantity("1.8")),
                Optional.of(quantity("0.5")),
                Optional.of(quantity("4p")),
                Optional.of(quantity("4n")))),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        List.of());
  }

  static DiodeRecord datasheetDiode() {
    return new DiodeRecord(
        Optional.empty(),
        Optional.of(
            new DiodeDatasheet(
                List.of(
                    new DiodeDatasheet.ForwardVoltage(
                        quantity("10m"),
                        Optional.of(quantity("0.72")),
                        Optional.of(quantity("1")))),
                Optional.of(quantity("4p")),
                Optional.of(quantity("4n")))),
        Optional.of(
            new DiodeLimits(
                Optional.of(quantity("75")),
                Optional.of(quantity("0.15")),
                Optional.of(quantity("0.5")),
                Optional.of(quantity("300")))),
        Optional.of("public datasheets of the type"),
        List.of(Pin.ANODE, Pin.CATHODE));
  }

  static Design set(Design design, String path, Object value) {
    return DesignPath.set(design, path, value);
  }

  static Quantity quantity(String text) {
    return Quantity.parseAny(text).quantity();
  }

  static PartValue part(String text) {
    return PartValue.of(quantity(text));
  }

  static <T> T defaults(Class<T> block) {
    return block.cast(Schema.of(block).defaults());
  }
}
