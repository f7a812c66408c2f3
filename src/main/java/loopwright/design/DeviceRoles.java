package loopwright.design;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;

/**
 * Names the transistors and diodes that a design has, in the order of the signal path, with the
 * part that each is and the polarity that it must have.
 */
public final class DeviceRoles {
  /** More diodes than this in a chain are a slip of the pen. */
  static final int MOST_DIODES = 100;

  private final Design design;
  private final Optional<Polarity> pair;
  private final List<DeviceRole> roles = new ArrayList<>();

  private DeviceRoles(Design design) {
    this.design = design;
    this.pair = pairPolarity(design);
  }

  /** All devices; none for an amplifier known by its figures. */
  public static List<DeviceRole> of(Design design) {
    DeviceRoles found = new DeviceRoles(design);
    if (design.amplifier() instanceof StagesAmplifier stages) {
      found.inputPair(stages.inputPair());
      found.gainStage(stages.gainStage());
      found.outputStage(stages.outputStage());
    }
    return List.copyOf(found.roles);
  }

  /** The device of that role, if the amplifier has it. */
  public static Optional<DeviceRole> find(Design design, String role) {
    return of(design).stream().filter(device -> device.role().equals(role)).findFirst();
  }

  /**
   * The polarity of the input pair, on which that of everything else depends; empty when the
   * amplifier has no pair, or its part is unknown or no transistor.
   */
  public static Optional<Polarity> pairPolarity(Design design) {
    if (design.amplifier() instanceof StagesAmplifier stages) {
      PartRecord part = design.parts().get(stages.inputPair().transistor());
      if (part instanceof TransistorRecord transistor) {
        return Optional.of(transistor.kind());
      }
    }
    return Optional.empty();
  }

  private void inputPair(InputPair stage) {
    String at = "amplifier.inputPair";
    transistor("pair.q1", stage.transistor(), at + ".transistor", pair);
    transistor("pair.q2", stage.transistor(), at + ".transistor", pair);
    if (stage.load() instanceof PairLoad.Mirror mirror) {
      transistor("pair.q3", mirror.transistor(), at + ".load.transistor", other());
      transistor("pair.q4", mirror.transistor(), at + ".load.transistor", other());
    }
    currentSource("tail", stage.tail(), at + ".tail");
  }

  private void gainStage(GainStage stage) {
    String at = "amplifier.gainStage";
    stage
        .buffer()
        .ifPresent(
            buffer ->
                transistor("gain.buffer", buffer.transistor(), at + ".buffer.transistor", other()));
    transistor("gain.q1", stage.transistor(), at + ".transistor", other());
    currentSource("gainLoad", stage.load(), at + ".load");
  }

  private void outputStage(OutputStage stage) {
    String at = "amplifier.outputStage";
    if (!(stage instanceof OutputStage.PushPull pushPull)) {
      return;
    }
    Optional<Polarity> npn = Optional.of(Polarity.NPN);
    Optional<Polarity> pnp = Optional.of(Polarity.PNP);
    if (pushPull.bias() instanceof Bias.VbeMultiplier multiplier) {
      transistor("bias.q1", multiplier.transistor(), at + ".bias.transistor", npn);
    } else if (pushPull.bias() instanceof Bias.Diodes diodes) {
      diodes("bias", diodes.diode(), diodes.count(), at + ".bias.diode");
    }
    pushPull
        .drivers()
        .ifPresent(
            drivers -> {
              transistor("driver.upper", drivers.upper(), at + ".drivers.upper", npn);
              transistor("driver.lower", drivers.lower(), at + ".drivers.lower", pnp);
            });
    transistor("out.upper", pushPull.upper(), at + ".upper", npn);
    transistor("out.lower", pushPull.lower(), at + ".lower", pnp);
  }

  /** A source that pulls toward M has the pair's own polarity. */
  private void currentSource(String name, CurrentSource source, String at) {
    if (source instanceof CurrentSource.Mirror mirror) {
      transistor(name + ".q1", mirror.transistor(), at + ".transistor", pair);
      transistor(name + ".q2", mirror.transistor(), at + ".transistor", pair);
    } else if (source instanceof CurrentSource.DiodeBiased biased) {
      transistor(name + ".q1", biased.transistor(), at + ".transistor", pair);
      diodes(name, biased.diode(), biased.count(), at + ".diode");
    } else if (source instanceof CurrentSource.TwoTransistor two) {
      transistor(name + ".q1", two.transistor(), at + ".transistor", pair);
      transistor(name + ".q2", two.transistor(), at + ".transistor", pair);
    }
  }

  private void transistor(String role, String part, String path, Optional<Polarity> polarity) {
    add(role, part, path, false, polarity);
  }

  private void diodes(String name, String part, int count, String path) {
    for (int i = 1; i <= Math.min(count, MOST_DIODES); i++) {
      add(name + ".d" + i, part, path, true, Optional.empty());
    }
  }

  private void add(
      String role, String part, String path, boolean diode, Optional<Polarity> polarity) {
    Optional<DeviceChoice> choice = Optional.ofNullable(design.devices().get(role));
    Optional<String> own = choice.flatMap(DeviceChoice::part);
    roles.add(
        new DeviceRole(
            role,
            own.orElse(part),
            own.isPresent() ? "devices." + role + ".part" : path,
            diode,
            polarity,
            choice.flatMap(DeviceChoice::measured)));
  }

  private Optional<Polarity> other() {
    return pair.map(Polarity::opposite);
  }
}
