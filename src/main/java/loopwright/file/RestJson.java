package loopwright.file;

import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;

/** The amplifier at rest as JSON. */
final class RestJson {
  private RestJson() {}

  /** Nodes, devices and supply currents; null with the reason where nothing was solved. */
  static Json of(HookupPrediction hookup) {
    if (hookup.rest().isEmpty()) {
      return Json.block(
          List.of(
              member("nodes", ResultJson.nothing()),
              member("devices", ResultJson.nothing()),
              member("supplyCurrents", ResultJson.nothing()),
              member("reason", text(hookup.failure()))));
    }
    RestState rest = hookup.rest().get();
    return Json.block(
        List.of(
            member("nodes", nodes(rest.nodes())),
            member("devices", devices(rest.devices())),
            member("supplyCurrents", supply(rest))));
  }

  private static Json nodes(Map<String, Double> nodes) {
    List<Json.Member> members = new ArrayList<>();
    nodes.forEach((name, volts) -> members.add(member(name, number(volts))));
    return Json.block(members);
  }

  private static Json devices(Map<String, DeviceState> devices) {
    List<Json.Member> members = new ArrayList<>();
    devices.forEach((role, state) -> members.add(member(role, device(state))));
    return Json.block(members);
  }

  private static Json device(DeviceState state) {
    List<Json.Member> members = new ArrayList<>();
    if (state instanceof DeviceState.TransistorState transistor) {
      members.add(member("collectorCurrent", number(transistor.collectorCurrent())));
      members.add(member("baseCurrent", number(transistor.baseCurrent())));
      members.add(member("baseEmitterVoltage", number(transistor.baseEmitterVoltage())));
      members.add(member("collectorEmitterVoltage", number(transistor.collectorEmitterVoltage())));
    } else if (state instanceof DeviceState.DiodeState diode) {
      members.add(member("current", number(diode.current())));
      members.add(member("voltage", number(diode.voltage())));
    }
    members.add(member("power", number(state.power())));
    OptionalDouble junction = state.junctionTemperature();
    members.add(member("junctionTemperature", number(junction)));
    if (junction.isEmpty()) {
      members.add(
          member(
              "reason", text("junctionTemperature: the part's thermal resistance is not known")));
    }
    return Json.block(members);
  }

  private static Json supply(RestState rest) {
    return Json.block(
        List.of(
            member("positive", number(rest.positiveCurrent())),
            member("negative", number(rest.negativeCurrent()))));
  }
}
