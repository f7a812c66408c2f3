package loopwright.predict;

import java.util.OptionalDouble;

/** A device at rest, in its own polarity: values are positive in normal operation. */
public sealed interface DeviceState {
  /** Dissipation, W. */
  double power();

  /** °C; empty when the thermal resistance is not known. */
  OptionalDouble junctionTemperature();

  /** A transistor; currents in A, voltages between terminals in V. */
  record TransistorState(
      double collectorCurrent,
      double baseCurrent,
      double baseEmitterVoltage,
      double collectorEmitterVoltage,
      double power,
      OptionalDouble junctionTemperature)
      implements DeviceState {}

  /** A diode; current in A, voltage in V. */
  record DiodeState(
      double current, double voltage, double power, OptionalDouble junctionTemperature)
      implements DeviceState {}
}
