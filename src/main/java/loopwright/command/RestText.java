package loopwright.command;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import loopwright.predict.DeviceState;
import loopwright.predict.RestState;
import loopwright.quantity.Unit;

/** The amplifier at rest: every node, every device, and what the supplies give. */
final class RestText {
  private RestText() {}

  static void print(RestState rest, TextPage page) {
    page.heading("At rest").columns(nodes(rest));
    TextTable transistors =
        new TextTable().row("Transistor", "I_C", "I_B", "V_BE", "V_CE", "power", "junction");
    TextTable diodes = new TextTable().row("Diode", "current", "voltage", "power", "junction");
    boolean anyTransistor = false;
    boolean anyDiode = false;
    for (Map.Entry<String, DeviceState> device : rest.devices().entrySet()) {
      if (device.getValue() instanceof DeviceState.TransistorState transistor) {
        anyTransistor = true;
        transistors.row(
            device.getKey(),
            format(transistor.collectorCurrent(), Unit.AMPERE),
            format(transistor.baseCurrent(), Unit.AMPERE),
            format(transistor.baseEmitterVoltage(), Unit.VOLT),
            format(transistor.collectorEmitterVoltage(), Unit.VOLT),
            format(transistor.power(), Unit.WATT),
            junction(transistor));
      } else if (device.getValue() instanceof DeviceState.DiodeState diode) {
        anyDiode = true;
        diodes.row(
            device.getKey(),
            format(diode.current(), Unit.AMPERE),
            format(diode.voltage(), Unit.VOLT),
            format(diode.power(), Unit.WATT),
            junction(diode));
      }
    }
    if (anyTransistor) {
      page.heading("Transistors at rest").table(transistors);
    }
    if (anyDiode) {
      page.heading("Diodes at rest").table(diodes);
    }
    page.heading("Supply at rest")
        .paragraph(
            "positive "
                + format(rest.positiveCurrent(), Unit.AMPERE)
                + ", negative "
                + format(rest.negativeCurrent(), Unit.AMPERE));
  }

  private static List<String> nodes(RestState rest) {
    TextTable table = new TextTable();
    rest.nodes().forEach((name, volts) -> table.row(name, format(volts, Unit.VOLT)));
    return new ArrayList<>(table.lines());
  }

  private static String junction(DeviceState device) {
    return device.junctionTemperature().isPresent()
        ? format(device.junctionTemperature().getAsDouble(), Unit.CELSIUS)
        : "–";
  }
}
