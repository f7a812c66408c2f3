package loopwright.check;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loopwright.design.Design;
import loopwright.design.DeviceRoles;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * A base-emitter junction reversed beyond its limit at rest or at an end of the signal: breakdown
 * is not modelled.
 */
final class ReverseJunctionCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    Set<String> told = new HashSet<>();
    SwingDevices.places(prediction)
        .forEach(
            (place, devices) ->
                devices.forEach(
                    (role, device) -> {
                      if (device instanceof DeviceState.TransistorState state) {
                        limit(design, role)
                            .filter(limit -> -state.baseEmitterVoltage() > limit.value())
                            .filter(limit -> told.add(role))
                            .ifPresent(limit -> findings.add(finding(role, state, limit, place)));
                      }
                    }));
    return findings;
  }

  private static Optional<Quantity> limit(Design design, String role) {
    return DeviceRoles.find(design, role)
        .map(device -> design.parts().get(device.part()))
        .filter(TransistorRecord.class::isInstance)
        .flatMap(record -> ((TransistorRecord) record).limits())
        .flatMap(TransistorLimits::emitterBaseVoltage);
  }

  private static Finding finding(
      String role, DeviceState.TransistorState state, Quantity limit, String place) {
    return new Finding(
        Finding.Severity.FAILS,
        role,
        "Its base-emitter junction is reversed by "
            + EngineeringFormat.format(-state.baseEmitterVoltage(), Unit.VOLT)
            + " "
            + place
            + ", beyond its limit of "
            + EngineeringFormat.format(limit.value(), Unit.VOLT)
            + "; it would break down, which these figures do not show.",
        "");
  }
}
