package loopwright.sheet;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import loopwright.design.Design;
import loopwright.design.Extra;

/** The number that every place of the stage library has. */
final class DesignatorPlaces {
  private static final int EXTRAS = 61;
  private static final int HUNDRED = 100;

  /** Beyond all that have a place of their own. */
  private static final int ELSEWHERE = 901;

  private static final Map<String, Integer> PLACES = new HashMap<>();

  static {
    place(1, "amplifier.inputPair.load.output", "amplifier.inputPair.load.other");
    place(3, "amplifier.inputPair.load.emitterResistance@pair.q3");
    place(4, "amplifier.inputPair.load.emitterResistance@pair.q4");
    place(5, "amplifier.inputPair.emitterResistance@pair.q1");
    place(6, "amplifier.inputPair.emitterResistance@pair.q2");
    place(7, "amplifier.inputPair.baseResistance@pair.q1");
    place(8, "amplifier.inputPair.baseResistance@pair.q2");
    source(11, "amplifier.inputPair.tail", "tail");
    place(21, "amplifier.gainStage.emitterResistance");
    place(22, "amplifier.gainStage.buffer.emitterResistance");
    place(23, "amplifier.gainStage.compensation.resistance");
    place(21, "amplifier.gainStage.emitterBypass");
    place(22, "amplifier.gainStage.compensation.capacitance");
    source(31, "amplifier.gainStage.load", "gainLoad");
    place(41, "amplifier.outputStage.emitterResistance@out.upper");
    place(42, "amplifier.outputStage.emitterResistance@out.lower");
    place(43, "amplifier.outputStage.drivers.resistance");
    place(44, "amplifier.outputStage.bias.upper", "amplifier.outputStage.bias.lower");
    place(51, "rails.midRail.upper", "rails.midRail.lower");
    place(51, "rails.decoupling.capacitance@positive", "rails.decoupling.capacitance@negative");
    place(53, "rails.midRail.capacitance");
    place(1, "source.resistance", "source.attenuator.series", "source.attenuator.shunt");
    place(4, "source.biasResistance", "feedback.upper", "feedback.lower");
    place(6, "feedback.inputResistor", "feedback.returnResistance");
    place(8, "load.isolation", "load.resistance", "load.snubber.resistance");
    place(1, "source.couplingCapacitance", "feedback.lowerCapacitance");
    place(3, "feedback.leadCapacitance", "load.couplingCapacitance", "load.capacitance");
    place(6, "load.snubber.capacitance");
    place(1, "pair.q1", "pair.q2", "pair.q3", "pair.q4");
    place(11, "tail.q1", "tail.q2");
    place(21, "gain.q1", "gain.buffer");
    place(31, "gainLoad.q1", "gainLoad.q2");
    place(41, "bias.q1", "driver.upper", "driver.lower", "out.upper", "out.lower");
    place(11, "tail.d1");
    place(31, "gainLoad.d1");
    place(41, "bias.d1");
  }

  private DesignatorPlaces() {}

  private static void place(int first, String... names) {
    for (int i = 0; i < names.length; i++) {
      PLACES.put(names[i], first + i);
    }
  }

  private static void source(int first, String path, String role) {
    place(first, path + ".resistance");
    place(first, path + ".setResistance");
    place(first, path + ".feedResistance");
    place(first + 1, path + ".emitterResistance");
    place(first + 1, path + ".senseResistance");
    place(first + 1, path + ".emitterResistance@" + role + ".q1");
    place(first + 2, path + ".emitterResistance@" + role + ".q2");
  }

  /**
   * Whether a path is that of a part to fit: not the resistance of a lead or inside a capacitor,
   * nor a probe.
   */
  static boolean isPart(String path) {
    boolean ofSupply =
        path.equals("rails.resistance") || path.equals("rails.decoupling.resistance");
    return !ofSupply && !path.contains(".probes.") && !path.startsWith("bench.");
  }

  /** The place of a device; the diodes of a chain follow the first. */
  static int device(String role) {
    Integer own = PLACES.get(role);
    if (own != null) {
      return own;
    }
    int digits = role.length();
    while (digits > 0 && Character.isDigit(role.charAt(digits - 1))) {
      digits--;
    }
    Integer first = PLACES.get(role.substring(0, digits) + "1");
    return first == null || digits == role.length()
        ? ELSEWHERE
        : first + Integer.parseInt(role.substring(digits)) - 1;
  }

  /**
   * The place of a resistor or capacitor.
   *
   * @param name path, with what tells it from its twin
   * @param hookup index of the hookup whose circuit it is in
   */
  static int part(Design design, String name, int hookup) {
    if (name.startsWith("extras.")) {
      String extra = name.substring("extras.".length()).replaceAll("\\.value$", "");
      List<String> names = design.extras().stream().map(Extra::name).toList();
      return EXTRAS + Math.max(0, names.indexOf(extra));
    }
    if (name.startsWith("hookups.")) {
      String own = "hookups." + design.hookups().get(hookup).name() + ".";
      String rest = name.startsWith(own) ? name.substring(own.length()) : name;
      return HUNDRED * (hookup + 1) + PLACES.getOrDefault(rest, HUNDRED / 2);
    }
    return PLACES.getOrDefault(name, ELSEWHERE);
  }
}
