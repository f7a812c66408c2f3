package loopwright.predict;

import java.util.Map;
import loopwright.assembly.DeviceDeviation;
import loopwright.design.Design;

/**
 * One build of a design: its own values, its own transistors.
 *
 * @param design the design with the values of this build
 * @param devices by role, the transistors that differ from their records
 */
public record Build(Design design, Map<String, DeviceDeviation> devices) {
  /** Keeps its own copy. */
  public Build {
    devices = Map.copyOf(devices);
  }

  /** A build with every part as the design says. */
  public static Build nominal(Design design) {
    return new Build(design, Map.of());
  }
}
