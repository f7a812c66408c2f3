package loopwright.check;

import java.util.List;
import java.util.Map;
import loopwright.design.Design;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/** A gain stage that is cut off: what drops across the pair's load does not open its base. */
final class GainStageCheck implements Check {
  private static final double CUT_OFF = 1e-6;

  /** What a conducting small transistor needs, V; common practice, no source. */
  private static final double BASE_EMITTER = 0.65;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    Map<String, DeviceState> devices = prediction.rest().map(RestState::devices).orElse(Map.of());
    if (!(devices.get("gain.q1") instanceof DeviceState.TransistorState gain)
        || gain.collectorCurrent() > CUT_OFF) {
      return List.of();
    }
    double tail =
        devices.get("pair.q1") instanceof DeviceState.TransistorState q1
                && devices.get("pair.q2") instanceof DeviceState.TransistorState q2
            ? q1.collectorCurrent() + q2.collectorCurrent()
            : 0;
    boolean resistors =
        design.amplifier() instanceof StagesAmplifier stages
            && stages.inputPair().load() instanceof PairLoad.Resistors;
    double wanted = tail > 0 && resistors ? BASE_EMITTER / (tail / 2) : 0;
    return List.of(
        new Finding(
            Finding.Severity.FAILS,
            "gain.q1",
            "The gain stage is cut off at rest: only "
                + Say.volts(gain.baseEmitterVoltage())
                + " between its base and emitter, so that nothing drives the output.",
            wanted > 0
                ? "A load resistor of about "
                    + Say.ohms(PreferredValues.E24.nearest(wanted))
                    + " lets half the tail current open it."
                : "The pair's load must drop one base-emitter voltage at half the tail current.",
            wanted > 0
                ? List.of(
                    Say.change(
                        "amplifier.inputPair.load.output",
                        PreferredValues.E24.nearest(wanted),
                        Unit.OHM))
                : List.of()));
  }
}
