package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.circuit.DeviceTerminals;
import loopwright.circuit.DeviceTerminals.DiodeTerminals;
import loopwright.circuit.DeviceTerminals.TransistorTerminals;
import loopwright.circuit.JunctionDiode;
import loopwright.circuit.Physics;
import loopwright.circuit.Transistor;
import loopwright.part.DiodeLimits;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Currents, voltages and dissipation of every device at a solved state. */
final class DeviceReadout {
  private final AssembledHookup hookup;
  private final JunctionHeat heat;
  private final Map<String, OptionalDouble> thermalResistances = new LinkedHashMap<>();

  DeviceReadout(AssembledHookup hookup) {
    this.hookup = hookup;
    this.heat = new JunctionHeat(hookup.design());
    for (DeviceTerminals device : hookup.circuit().devices()) {
      thermalResistances.put(device.role(), thermalResistance(device.role()));
    }
  }

  /** Thermal resistance by role, K/W; empty where the record states none. */
  Map<String, OptionalDouble> thermalResistances() {
    return thermalResistances;
  }

  /**
   * Every device at a state.
   *
   * @param kelvins junction temperatures that the circuit was solved at, by role; empty when it was
   *     solved at ambient and temperatures follow from dissipation
   */
  Map<String, DeviceState> read(CircuitState state, Map<String, Double> kelvins) {
    Map<String, DeviceState> devices = new LinkedHashMap<>();
    for (DeviceTerminals device : hookup.circuit().devices()) {
      devices.put(device.role(), read(device, state, kelvins));
    }
    return devices;
  }

  private DeviceState read(
      DeviceTerminals device, CircuitState state, Map<String, Double> kelvins) {
    Circuit circuit = hookup.circuit();
    if (device instanceof TransistorTerminals terminals) {
      Transistor transistor = circuit.element(device.role(), Transistor.class);
      int sign = terminals.polarity().sign();
      double vbe = sign * (state.voltage(terminals.base()) - state.voltage(terminals.emitter()));
      double vce =
          sign * (state.voltage(terminals.collector()) - state.voltage(terminals.emitter()));
      double ic = transistor.collectorCurrent(state);
      double ib = transistor.baseCurrent(state);
      double power = ic * vce + ib * vbe;
      return new DeviceState.TransistorState(
          ic, ib, vbe, vce, power, temperature(device.role(), power, kelvins));
    }
    DiodeTerminals terminals = (DiodeTerminals) device;
    double current = circuit.element(device.role(), JunctionDiode.class).current(state);
    double voltage = state.voltage(terminals.anode()) - state.voltage(terminals.cathode());
    double power = current * voltage;
    return new DeviceState.DiodeState(
        current, voltage, power, temperature(device.role(), power, kelvins));
  }

  private OptionalDouble temperature(String role, double power, Map<String, Double> kelvins) {
    OptionalDouble resistance = thermalResistances.get(role);
    if (resistance.isPresent() && kelvins.containsKey(role)) {
      return OptionalDouble.of(kelvins.get(role) - Physics.ZERO_CELSIUS);
    }
    return heat.celsius(power, resistance);
  }

  private OptionalDouble thermalResistance(String role) {
    PartRecord record = hookup.models().record(role);
    Optional<Quantity> value =
        record instanceof TransistorRecord transistor
            ? transistor.limits().flatMap(TransistorLimits::thermalResistance)
            : ((DiodeRecord) record).limits().flatMap(DiodeLimits::thermalResistance);
    return value.map(v -> OptionalDouble.of(v.value())).orElse(OptionalDouble.empty());
  }
}
