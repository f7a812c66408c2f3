package loopwright.check;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import loopwright.design.Design;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;

/** A transistor that is saturated at rest or at an end of the signal, or close to it. */
final class SaturationCheck implements Check {
  /** Below this a small transistor is saturated; common practice, no source. */
  private static final double SATURATED = 0.25;

  /** Below this little is left before it saturates; common practice, no source. */
  private static final double CLOSE = 0.5;

  private static final String REST = "at rest";

  /** A device that carries less takes no part, A. */
  private static final double IDLE = 1e-6;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    Set<String> told = new HashSet<>();
    SwingDevices.places(prediction)
        .forEach(
            (place, devices) ->
                devices.forEach(
                    (role, device) -> {
                      if (device instanceof DeviceState.TransistorState state
                          && state.collectorCurrent() + state.baseCurrent() > IDLE
                          && state.collectorEmitterVoltage() < room(place)
                          && told.add(role)) {
                        findings.add(
                            place.equals(REST)
                                ? finding(role, state)
                                : swinging(role, state, place));
                      }
                    }));
    return findings;
  }

  /** At rest some room shall be left; at the ends of the signal it may all be used. */
  private static double room(String place) {
    return place.equals(REST) ? CLOSE : SATURATED;
  }

  private static Finding swinging(String role, DeviceState.TransistorState state, String place) {
    return new Finding(
        Finding.Severity.RISKY,
        role,
        "It saturates "
            + place
            + ": only "
            + Say.volts(state.collectorEmitterVoltage())
            + " from collector to emitter at "
            + Say.amperes(state.collectorCurrent())
            + ".",
        "Less amplitude, or: " + lowerFirst(remedy(role)));
  }

  private static String lowerFirst(String sentence) {
    return Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1);
  }

  private static Finding finding(String role, DeviceState.TransistorState state) {
    boolean saturated = state.collectorEmitterVoltage() < SATURATED;
    String says =
        saturated
            ? "It is saturated at rest: only "
                + Say.volts(state.collectorEmitterVoltage())
                + " from collector to emitter at "
                + Say.amperes(state.collectorCurrent())
                + ", so that it neither amplifies nor keeps its current."
            : "It has little headroom at rest: "
                + Say.volts(state.collectorEmitterVoltage())
                + " from collector to emitter; below about 0.25 V it saturates.";
    return new Finding(
        saturated ? Finding.Severity.FAILS : Finding.Severity.RISKY, role, says, remedy(role));
  }

  private static String remedy(String role) {
    String at = role.substring(0, role.indexOf('.'));
    return switch (at) {
      case "pair" -> "A smaller load resistor or tail current leaves its collector more room.";
      case "gain" -> "Less current from the pair's load, or less load on the gain stage, frees it.";
      case "tail", "gainLoad" ->
          "Smaller emitter resistors, or a rail further away, leave the current source more room.";
      default -> "More supply voltage, or less drop in its emitter resistor, gives it room.";
    };
  }
}
