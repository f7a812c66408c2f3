package loopwright.assembly;

import java.util.Map;
import java.util.Set;

/**
 * How one build differs from its design where the design has no place to say so.
 *
 * @param devices by role, the devices that differ from their records
 * @param parts by name of the element, ratio to the design's value of a resistor or capacitor: of
 *     one whose path stands for several, or of one that is broken
 * @param faults by role, what is wrong with a transistor
 * @param shorted names of capacitors that conduct
 */
public record Deviations(
    Map<String, DeviceDeviation> devices,
    Map<String, Double> parts,
    Map<String, DeviceFault> faults,
    Set<String> shorted) {
  /** Everything as the design says. */
  public static final Deviations NONE = new Deviations(Map.of(), Map.of());

  /** Keeps its own copies. */
  public Deviations {
    devices = Map.copyOf(devices);
    parts = Map.copyOf(parts);
    faults = Map.copyOf(faults);
    shorted = Set.copyOf(shorted);
  }

  /** Deviations of values only. */
  public Deviations(Map<String, DeviceDeviation> devices, Map<String, Double> parts) {
    this(devices, parts, Map.of(), Set.of());
  }

  /** Ratio of an element to the design's value. */
  double ratio(String element) {
    return parts.getOrDefault(element, 1.0);
  }
}
