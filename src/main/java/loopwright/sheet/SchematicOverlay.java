package loopwright.sheet;

import java.util.Optional;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** What a prediction lays over a schematic: node voltages, device currents, and what is amiss. */
public final class SchematicOverlay {
  /** How a device stands at rest. */
  enum Health {
    GOOD,
    SATURATED,
    CUT_OFF,
    HOT
  }

  /** Below this a small transistor is saturated, V; common practice, no source. */
  private static final double SATURATED = 0.25;

  /** A device that carries less takes no part, A. */
  private static final double IDLE = 1e-6;

  /** A junction above this deserves a look, °C; common practice, no source. */
  private static final double HOT = 100;

  private final RestState rest;

  private SchematicOverlay(RestState rest) {
    this.rest = rest;
  }

  /** That of a prediction; empty where it finds no rest. */
  public static Optional<SchematicOverlay> of(HookupPrediction prediction) {
    return prediction.rest().map(SchematicOverlay::new);
  }

  /** Voltage of a node; empty where the circuit has none of that name. */
  Optional<String> voltage(String node) {
    return Optional.ofNullable(rest.nodes().get(node))
        .map(volts -> EngineeringFormat.format(volts, Unit.VOLT));
  }

  /** Current of a device; empty where it is none. */
  Optional<String> current(String role) {
    DeviceState device = rest.devices().get(role);
    if (device instanceof DeviceState.TransistorState transistor) {
      return Optional.of(EngineeringFormat.format(transistor.collectorCurrent(), Unit.AMPERE, 3));
    }
    return device instanceof DeviceState.DiodeState diode
        ? Optional.of(EngineeringFormat.format(diode.current(), Unit.AMPERE, 3))
        : Optional.empty();
  }

  Health health(String role) {
    DeviceState device = rest.devices().get(role);
    if (device == null) {
      return Health.GOOD;
    }
    if (device.junctionTemperature().isPresent()
        && device.junctionTemperature().getAsDouble() > HOT) {
      return Health.HOT;
    }
    if (device instanceof DeviceState.TransistorState transistor) {
      double current = transistor.collectorCurrent() + transistor.baseCurrent();
      if (current < IDLE) {
        return Health.CUT_OFF;
      }
      return transistor.collectorEmitterVoltage() < SATURATED ? Health.SATURATED : Health.GOOD;
    }
    return Health.GOOD;
  }
}
