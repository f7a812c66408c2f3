package loopwright.predict;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * Heat in a hookup: idle current and runaway against ambient temperature, dissipation over the
 * swing, and what a short circuit does.
 *
 * @param hookup name of the hookup
 * @param idleDevice whose current is called idle: the output device that carries less, else the
 *     gain transistor
 * @param ambients from cold to hot
 * @param estimates of the output devices at the hottest ambient
 * @param leastResistance smallest E12 value of the output's emitter resistance with which the
 *     solved loop stays at half at the hottest ambient, Ω; 0 where none is needed
 * @param resistanceSays the same in a sentence, or why there is no such value
 * @param devices over the swing, the hottest first
 * @param swingReason why there are none; empty otherwise
 * @param shortCircuit what a short circuit does, or why it is not known
 */
public record HeatReport(
    String hookup,
    String idleDevice,
    List<AmbientHeat> ambients,
    List<RunawayEstimate> estimates,
    OptionalDouble leastResistance,
    String resistanceSays,
    List<SwingHeat> devices,
    String swingReason,
    String shortCircuit) {
  /** What stands beside every figure of heat. */
  public static final List<String> CAUTIONS =
      List.of(
          "Temperatures are those that the parts reach after minutes; how fast is not computed. A"
              + " stage can run away in seconds: set the bias from its least current upward, with"
              + " the supply's current limited.",
          "A small plastic part at half a watt has a junction near 125 °C and burns skin. Let parts"
              + " cool, and measure with a thermocouple, not with a finger; tabs of heat sinks are"
              + " often the collector, and live.",
          "A reactive or dc load heats an output device more than a resistor does. Local codes, site"
              + " rules and licensed practice come before anything said here.");

  /** Keeps its own copies. */
  public HeatReport {
    ambients = List.copyOf(ambients);
    estimates = List.copyOf(estimates);
    devices = List.copyOf(devices);
  }

  /** A loop of dissipation and temperature as sentences write it. */
  public static String loop(double loop) {
    return EngineeringFormat.format(loop, Unit.ONE, 2);
  }
}
