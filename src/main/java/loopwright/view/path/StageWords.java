package loopwright.view.path;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.GainStage;
import loopwright.design.InputPair;
import loopwright.design.OutputStage;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.part.Polarity;

/** The stages of an amplifier in words. */
final class StageWords {
  /** Below this idle current a push-pull follower is as good as cut off, A. */
  private static final double CUT_OFF = 10e-6;

  /** From this half-width on a dead zone is worth a line, V. */
  private static final double ZONE = 0.01;

  private final PartWords parts;
  private final RestWords rest;
  private final StagesAmplifier amplifier;

  StageWords(StagesAmplifier amplifier, PartWords parts, RestWords rest) {
    this.amplifier = amplifier;
    this.parts = parts;
    this.rest = rest;
  }

  /** Pair, gain stage, follower. */
  List<Block> row() {
    return List.of(pair(amplifier.inputPair()), gain(amplifier.gainStage()), output());
  }

  /** What hangs from pair and gain stage. */
  Map<String, Block> hanging() {
    InputPair pair = amplifier.inputPair();
    Optional<Polarity> polarity = parts.polarity(pair.transistor());
    String rail = parts.lowerRail(pair.transistor());
    Map<String, Block> hanging = new LinkedHashMap<>();
    hanging.put(
        BlockIds.INPUT_PAIR,
        SourceWords.block(
            BlockIds.TAIL,
            "Tail",
            pair.tail(),
            polarity,
            rail,
            sum(rest.emitterCurrent("pair.q1"), rest.emitterCurrent("pair.q2"))));
    CurrentSource load = amplifier.gainStage().load();
    hanging.put(
        BlockIds.GAIN_STAGE,
        SourceWords.block(BlockIds.GAIN_LOAD, "Load", load, polarity, rail, loadCurrent(load)));
    return hanging;
  }

  private static OptionalDouble sum(OptionalDouble one, OptionalDouble other) {
    return one.isPresent() && other.isPresent()
        ? OptionalDouble.of(one.getAsDouble() + other.getAsDouble())
        : OptionalDouble.empty();
  }

  /** What the gain stage's load carries: by its own transistor, or by the drop across it. */
  private OptionalDouble loadCurrent(CurrentSource load) {
    if (load instanceof CurrentSource.Resistor resistor) {
      OptionalDouble drop = dropAcrossLoad();
      return drop.isPresent()
          ? OptionalDouble.of(drop.getAsDouble() / resistor.resistance().effective())
          : drop;
    }
    if (load instanceof CurrentSource.Ideal ideal) {
      return OptionalDouble.of(ideal.current().value());
    }
    return rest.current(load instanceof CurrentSource.Mirror ? "gainLoad.q2" : "gainLoad.q1");
  }

  private OptionalDouble dropAcrossLoad() {
    Optional<Polarity> polarity = parts.polarity(amplifier.inputPair().transistor());
    if (polarity.isEmpty()) {
      return OptionalDouble.empty();
    }
    boolean isNpn = polarity.get() == Polarity.NPN;
    OptionalDouble rail = rest.volts(isNpn ? "negative" : "positive");
    OptionalDouble drive = rest.volts(isNpn ? "driveLow" : "driveHigh");
    OptionalDouble node = drive.isPresent() ? drive : rest.volts("gainOut");
    return rail.isPresent() && node.isPresent()
        ? OptionalDouble.of(Math.abs(node.getAsDouble() - rail.getAsDouble()))
        : OptionalDouble.empty();
  }

  private Block pair(InputPair pair) {
    String first = RestWords.says(rest.current("pair.q1"));
    String second = RestWords.says(rest.current("pair.q2"));
    double mismatch = pair.baseEmitterMismatch().value();
    return new Block(
        BlockIds.INPUT_PAIR,
        Block.Kind.STAGE,
        "Pair",
        List.of(
            parts.transistor(pair.transistor()),
            load(pair.load()),
            PartWords.ohms(pair.emitterResistance(), " emitters"),
            PartWords.ohms(pair.baseResistance(), " bases"),
            mismatch == 0 ? "" : "mismatch " + PartWords.volts(mismatch)),
        first.isEmpty() ? "" : first + " | " + second);
  }

  private static String load(PairLoad load) {
    if (load instanceof PairLoad.Mirror mirror) {
      return "mirror " + mirror.transistor() + PartWords.ohms(", ", mirror.emitterResistance());
    }
    PairLoad.Resistors resistors = (PairLoad.Resistors) load;
    boolean both = resistors.other().effective() > 0;
    return PartWords.ohms(resistors.output())
        + (both ? " | " + PartWords.ohms(resistors.other()) : "")
        + " load";
  }

  private Block gain(GainStage stage) {
    return new Block(
        BlockIds.GAIN_STAGE,
        Block.Kind.STAGE,
        "Gain stage",
        List.of(
            parts.transistor(stage.transistor()),
            stage
                .buffer()
                .map(
                    buffer ->
                        "buffer "
                            + buffer.transistor()
                            + PartWords.ohms(", ", buffer.emitterResistance()))
                .orElse(""),
            stage
                .compensation()
                .map(
                    part ->
                        PartWords.farads(part.capacitance())
                            + PartWords.ohms(" + ", part.resistance())
                            + " Miller")
                .orElse(""),
            PartWords.ohms(stage.emitterResistance(), " emitter"),
            stage.emitterBypass().map(part -> PartWords.farads(part) + " bypass").orElse("")),
        RestWords.says(rest.current("gain.q1")));
  }

  private Block output() {
    if (!(amplifier.outputStage() instanceof OutputStage.PushPull stage)) {
      return new Block(
          BlockIds.OUTPUT_STAGE, Block.Kind.ABSENT, "No follower", List.of("out is gainOut"), "");
    }
    List<String> says = new ArrayList<>();
    says.add(two(stage.upper(), stage.lower()) + PartWords.ohms(", ", stage.emitterResistance()));
    says.addAll(bias(stage.bias()));
    stage
        .drivers()
        .ifPresent(
            drivers -> {
              says.add("drivers over " + PartWords.ohms(drivers.resistance()));
              says.add(two(drivers.upper(), drivers.lower()));
            });
    OptionalDouble zone = rest.figure("deadZone");
    boolean isJoined = stage.bias() instanceof Bias.Joined;
    if (isJoined && zone.isPresent() && zone.getAsDouble() >= ZONE) {
      says.add("dead zone \u00B1" + PartWords.volts(round(zone.getAsDouble())));
    }
    return new Block(BlockIds.OUTPUT_STAGE, Block.Kind.STAGE, "Follower", says, idle());
  }

  private static String two(String upper, String lower) {
    return upper + "/" + lower;
  }

  private static double round(double volts) {
    return Math.rint(volts * 1000) / 1000;
  }

  private static List<String> bias(Bias bias) {
    if (bias instanceof Bias.Joined) {
      return List.of("bases joined");
    }
    if (bias instanceof Bias.Diodes diodes) {
      return List.of(diodes.count() + " diodes " + diodes.diode());
    }
    Bias.VbeMultiplier multiplier = (Bias.VbeMultiplier) bias;
    return List.of(
        "VBE multiplier",
        multiplier.transistor(),
        PartWords.ohms(multiplier.upper()) + " over " + PartWords.ohms(multiplier.lower()));
  }

  private String idle() {
    OptionalDouble current = rest.current("out.upper");
    if (current.isEmpty()) {
      return "";
    }
    return current.getAsDouble() < CUT_OFF ? "cut off at rest" : "idle " + RestWords.says(current);
  }
}
