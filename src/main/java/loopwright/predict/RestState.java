package loopwright.predict;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The amplifier at rest.
 *
 * @param nodes volts by node name; two names of one node both appear
 * @param devices state by role
 * @param positiveCurrent A, positive in normal operation
 * @param negativeCurrent A, positive in normal operation
 */
public record RestState(
    Map<String, Double> nodes,
    Map<String, DeviceState> devices,
    double positiveCurrent,
    double negativeCurrent) {
  /** Keeps its own copies in their order. */
  public RestState {
    nodes = Collections.unmodifiableMap(new LinkedHashMap<>(nodes));
    devices = Collections.unmodifiableMap(new LinkedHashMap<>(devices));
  }
}
