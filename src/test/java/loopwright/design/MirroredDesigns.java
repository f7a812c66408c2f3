package loopwright.design;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/**
 * The twin of a design in which every npn is a pnp of the same parameters and the other way round,
 * the rails have changed places, and every voltage its sign. The transistor of a V_BE multiplier,
 * an npn in either, stays what it is.
 */
public final class MirroredDesigns {
  /** Part record that the multiplier's transistor keeps under a name of its own. */
  private static final String MULTIPLIER = "multiplier";

  private static final Map<String, String> SWAPPED =
      both(
          Map.of(
              "positive", "negative",
              "ideal.positive", "ideal.negative",
              "decoupling.positive", "decoupling.negative",
              "driveHigh", "driveLow",
              "powerHigh", "powerLow",
              "outHigh", "outLow",
              "out.upper", "out.lower",
              "driver.upper", "driver.lower"));

  private MirroredDesigns() {}

  /** The twin of a design of stages. */
  public static Design of(Design design) {
    StagesAmplifier stages = (StagesAmplifier) design.amplifier();
    Map<String, PartRecord> parts = new LinkedHashMap<>();
    design.parts().forEach((name, record) -> parts.put(name, turned(record)));
    if (multiplier(stages).isPresent()) {
      parts.put(MULTIPLIER, design.parts().get(multiplier(stages).get().transistor()));
    }
    return new Design(
        design.loopwright(),
        design.name() + ", mirrored",
        design.notes(),
        turned(design.rails()),
        design.surroundings(),
        parts,
        new StagesAmplifier(stages.inputPair(), stages.gainStage(), turned(stages.outputStage())),
        turned(design.devices()),
        design.extras().stream().map(MirroredDesigns::turned).toList(),
        design.hookups().stream().map(MirroredDesigns::turned).toList(),
        design.tolerances(),
        design.limits(),
        design.drawer(),
        design.bench());
  }

  /** The name that a node or a device of the design has in its twin. */
  public static String name(Design design, String name) {
    StagesAmplifier stages = (StagesAmplifier) design.amplifier();
    if (stages.outputStage() instanceof OutputStage.PushPull pushPull
        && pushPull.bias() instanceof Bias.Diodes diodes) {
      String turned = chain(name, "bias", diodes.count());
      if (!turned.equals(name)) {
        return turned;
      }
    }
    String turned = chain(name, "tail", count(stages.inputPair().tail()));
    turned =
        turned.equals(name) ? chain(name, "gainLoad", count(stages.gainStage().load())) : turned;
    return SWAPPED.getOrDefault(turned, turned);
  }

  private static int count(CurrentSource source) {
    return source instanceof CurrentSource.DiodeBiased biased ? biased.count() : 0;
  }

  /** Diodes and nodes of a chain are counted from its other end. */
  private static String chain(String name, String prefix, int count) {
    Matcher diode = Pattern.compile(Pattern.quote(prefix) + "\\.d(\\d+)").matcher(name);
    if (diode.matches()) {
      return prefix + ".d" + (count + 1 - Integer.parseInt(diode.group(1)));
    }
    String nodes = prefix.equals("bias") ? "biasChain" : prefix + ".chain";
    Matcher node = Pattern.compile(Pattern.quote(nodes) + "(\\d+)").matcher(name);
    return node.matches() ? nodes + (count - Integer.parseInt(node.group(1))) : name;
  }

  private static PartRecord turned(PartRecord record) {
    if (!(record instanceof TransistorRecord transistor)) {
      return record;
    }
    return new TransistorRecord(
        transistor.kind() == Polarity.NPN ? Polarity.PNP : Polarity.NPN,
        transistor.model(),
        transistor.datasheet(),
        transistor.measured(),
        transistor.limits(),
        transistor.source(),
        transistor.pins());
  }

  private static Rails turned(Rails rails) {
    return new Rails(
        Quantity.of(0 - rails.negative().value()),
        Quantity.of(0 - rails.positive().value()),
        rails.resistance(),
        rails.inductance(),
        rails.decoupling(),
        rails.midRail().map(mid -> new Rails.MidRail(mid.lower(), mid.upper(), mid.capacitance())));
  }

  private static Optional<Bias.VbeMultiplier> multiplier(StagesAmplifier stages) {
    return stages.outputStage() instanceof OutputStage.PushPull pushPull
            && pushPull.bias() instanceof Bias.VbeMultiplier multiplier
        ? Optional.of(multiplier)
        : Optional.empty();
  }

  private static OutputStage turned(OutputStage stage) {
    if (!(stage instanceof OutputStage.PushPull pushPull)) {
      return stage;
    }
    Bias bias =
        pushPull.bias() instanceof Bias.VbeMultiplier multiplier
            ? new Bias.VbeMultiplier(MULTIPLIER, multiplier.upper(), multiplier.lower())
            : pushPull.bias();
    return new OutputStage.PushPull(
        pushPull.lower(),
        pushPull.upper(),
        bias,
        pushPull.emitterResistance(),
        pushPull
            .drivers()
            .map(
                drivers ->
                    new OutputStage.Drivers(
                        drivers.lower(), drivers.upper(), drivers.resistance())));
  }

  private static Map<String, DeviceChoice> turned(Map<String, DeviceChoice> devices) {
    Map<String, DeviceChoice> turned = new LinkedHashMap<>();
    devices.forEach((role, choice) -> turned.put(SWAPPED.getOrDefault(role, role), choice));
    return turned;
  }

  private static Extra turned(Extra extra) {
    String from = SWAPPED.getOrDefault(extra.from(), extra.from());
    String to = SWAPPED.getOrDefault(extra.to(), extra.to());
    return extra instanceof Extra.ExtraResistor
        ? new Extra.ExtraResistor(extra.name(), from, to, extra.value())
        : new Extra.ExtraCapacitor(extra.name(), from, to, extra.value());
  }

  private static Hookup turned(Hookup hookup) {
    Source source = hookup.source();
    return new Hookup(
        hookup.name(),
        new Source(
            source.resistance(),
            Quantity.of(0 - source.dc().value()),
            source.amplitude(),
            source.frequency(),
            source.attenuator(),
            source.couplingCapacitance(),
            source.biasResistance(),
            source.biasTo()),
        hookup.feedback(),
        hookup.load(),
        hookup.probes().stream()
            .map(
                probe ->
                    new Probe(
                        SWAPPED.getOrDefault(probe.node(), probe.node()),
                        probe.resistance(),
                        probe.capacitance()))
            .toList());
  }

  private static Map<String, String> both(Map<String, String> oneWay) {
    Map<String, String> swapped = new LinkedHashMap<>(oneWay);
    oneWay.forEach((key, value) -> swapped.put(value, key));
    return swapped;
  }

  /** Whether the design has a V_BE multiplier, which has no mirrored twin in the library. */
  public static boolean hasMultiplier(Design design) {
    return multiplier((StagesAmplifier) design.amplifier()).isPresent();
  }

  /** Names of nodes that differ between twins: the multiplier's own tap. */
  public static List<String> unlike() {
    return List.of("biasTap");
  }
}
