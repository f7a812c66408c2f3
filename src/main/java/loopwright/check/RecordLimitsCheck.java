package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.DeviceRoles;
import loopwright.part.DiodeLimits;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** A device beyond a limit of its record at rest, or close to it. */
final class RecordLimitsCheck implements Check {
  /**
   * Beyond this share of a limit little is left for spread and mains; common practice, no source.
   */
  private static final double CLOSE = 0.8;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    Map<String, DeviceState> devices = prediction.rest().map(RestState::devices).orElse(Map.of());
    devices.forEach(
        (role, device) ->
            DeviceRoles.find(design, role)
                .map(found -> design.parts().get(found.part()))
                .ifPresent(record -> device(role, device, record, findings)));
    return findings;
  }

  private static void device(
      String role, DeviceState device, PartRecord record, List<Finding> findings) {
    if (device instanceof DeviceState.TransistorState state
        && record instanceof TransistorRecord transistor) {
      transistor.limits().ifPresent(limits -> transistor(role, state, limits, findings));
    } else if (device instanceof DeviceState.DiodeState state
        && record instanceof DiodeRecord diode) {
      diode.limits().ifPresent(limits -> diode(role, state, limits, findings));
    }
  }

  private static void transistor(
      String role,
      DeviceState.TransistorState state,
      TransistorLimits limits,
      List<Finding> findings) {
    against(
        role,
        "collector-emitter voltage",
        state.collectorEmitterVoltage(),
        limits.collectorEmitterVoltage(),
        Unit.VOLT,
        findings);
    against(
        role,
        "collector current",
        state.collectorCurrent(),
        limits.collectorCurrent(),
        Unit.AMPERE,
        findings);
    against(role, "dissipation", state.power(), limits.power(), Unit.WATT, findings);
    temperature(role, state.junctionTemperature(), limits.junctionTemperature(), findings);
  }

  private static void diode(
      String role, DeviceState.DiodeState state, DiodeLimits limits, List<Finding> findings) {
    against(
        role, "reverse voltage", -state.voltage(), limits.reverseVoltage(), Unit.VOLT, findings);
    against(role, "current", state.current(), limits.current(), Unit.AMPERE, findings);
    against(role, "dissipation", state.power(), limits.power(), Unit.WATT, findings);
  }

  private static void against(
      String role,
      String what,
      double value,
      Optional<Quantity> limit,
      Unit unit,
      List<Finding> findings) {
    if (limit.isEmpty() || !(value > CLOSE * limit.get().value())) {
      return;
    }
    boolean beyond = value > limit.get().value();
    findings.add(
        new Finding(
            beyond ? Finding.Severity.FAILS : Finding.Severity.RISKY,
            role,
            "Its "
                + what
                + " of "
                + EngineeringFormat.format(value, unit, 3)
                + " at rest is "
                + (beyond ? "beyond" : "close to")
                + " the limit of "
                + EngineeringFormat.format(limit.get().value(), unit, 3)
                + " of its record.",
            "Choose a part with a limit of at least "
                + EngineeringFormat.format(value / CLOSE, unit, 2)
                + ", or run it at less."));
  }

  private static void temperature(
      String role, OptionalDouble celsius, Optional<Quantity> limit, List<Finding> findings) {
    if (limit.isEmpty() || celsius.isEmpty() || celsius.getAsDouble() <= limit.get().value()) {
      return;
    }
    findings.add(
        new Finding(
            Finding.Severity.FAILS,
            role,
            "Its junction would reach "
                + Say.celsius(celsius.getAsDouble())
                + " at rest, beyond the limit of "
                + Say.celsius(limit.get().value())
                + "; it burns skin long before.",
            "Less current or voltage, or a heat sink; let parts cool before touching them."));
  }
}
