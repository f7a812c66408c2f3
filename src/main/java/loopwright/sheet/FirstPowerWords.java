package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import loopwright.bench.FirstPower;
import loopwright.design.Design;
import loopwright.design.StagesAmplifier;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** What to do before power and at first power, step by step (common practice, no source). */
final class FirstPowerWords {
  private FirstPowerWords() {}

  static List<String> unpowered(Design design) {
    List<String> steps = new ArrayList<>();
    steps.add(
        "Check every part against the list, every transistor and diode against its pinout, every"
            + " electrolytic for polarity.");
    String rails =
        design.rails().negative().value() == 0
            ? "from positive to ground"
            : "from positive to ground, from negative to ground, from positive to negative";
    steps.add(
        "Supply disconnected, meter on ohms: "
            + rails
            + " and from out to each of them; a few ohms or less anywhere is a short to be found first.");
    return steps;
  }

  static List<String> powerUp(Design design, String hookup, FirstPower power) {
    List<String> steps = new ArrayList<>();
    steps.add(
        "Build hookup \u201C"
            + hookup
            + "\u201D below, generator connected and without signal; nothing at out that could be"
            + " harmed.");
    boolean known = design.amplifier() instanceof StagesAmplifier;
    for (FirstPower.Supply supply : power.supplies()) {
      String rail = supply.positive() ? "positive" : "negative";
      if (known && supply.current().number().isPresent()) {
        steps.add(
            "Supply of the "
                + rail
                + " rail: "
                + EngineeringFormat.format(supply.volts(), Unit.VOLT)
                + ", current limit "
                + amps(supply.limit())
                + ". Expect "
                + amps(supply.current().number().getAsDouble())
                + band(supply)
                + "; stop value "
                + amps(supply.stop())
                + ": above it switch off at once.");
      } else {
        steps.add(
            "Supply of the "
                + rail
                + " rail: "
                + EngineeringFormat.format(supply.volts(), Unit.VOLT)
                + ", current limit as low as lets the amplifier start. What it draws is not known"
                + (known ? ": " + supply.current().says() : ", since its stages are not")
                + ".");
      }
    }
    steps.add(
        "Switch on and watch the supply current for a minute: if it climbs or passes its stop value,"
            + " switch off, let the parts cool and go back to the checks before power.");
    steps.add(
        "Measure the nodes in the order of the table, one hand, probe tip on one lead only. At the"
            + " first that lies outside low to high stop and look at its suspects.");
    steps.add("Then look for oscillation, then connect signal, and load last.");
    return steps;
  }

  private static String band(FirstPower.Supply supply) {
    String low = amps(supply.low());
    String high = amps(supply.high());
    return low.equals(high) ? "" : " (" + low + " to " + high + ")";
  }

  private static String amps(double value) {
    return EngineeringFormat.format(value, Unit.AMPERE, 3);
  }
}
