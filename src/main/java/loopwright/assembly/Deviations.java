package loopwright.assembly;

import java.util.Map;

/**
 * How one build differs from its design where the design has no place to say so.
 *
 * @param devices by role, the transistors that differ from their records
 * @param parts by name of the element, ratio to the design's value of a resistor or capacitor whose
 *     path stands for several
 */
public record Deviations(Map<String, DeviceDeviation> devices, Map<String, Double> parts) {
  /** Everything as the design says. */
  public static final Deviations NONE = new Deviations(Map.of(), Map.of());

  /** Keeps its own copies. */
  public Deviations {
    devices = Map.copyOf(devices);
    parts = Map.copyOf(parts);
  }

  /** Ratio of an element to the design's value. */
  double ratio(String element) {
    return parts.getOrDefault(element, 1.0);
  }
}
