package loopwright.check;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.Unit;
import loopwright.sizing.PairCentring;

/** A pair whose two halves carry different currents, with the resistor that centres it. */
final class PairBalanceCheck implements Check {
  private static final String LOAD = "amplifier.inputPair.load.output";

  /**
   * Currents further apart than this ratio make more offset than two unmatched transistors do: ± 5
   * mV each (common practice, no source), 10 mV between them, exp(10 mV/V_T).
   */
  private static final double APART = 1.48;

  private static final double IDLE = 1e-9;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    Map<String, DeviceState> devices = prediction.rest().map(RestState::devices).orElse(Map.of());
    if (!(devices.get("pair.q1") instanceof DeviceState.TransistorState q1)
        || !(devices.get("pair.q2") instanceof DeviceState.TransistorState q2)
        || prediction.hookup().feedback() instanceof Feedback.Open) {
      return List.of();
    }
    double one = Math.max(q1.collectorCurrent(), IDLE);
    double other = Math.max(q2.collectorCurrent(), IDLE);
    if (one < APART * other && other < APART * one) {
      return List.of();
    }
    OptionalDouble offset = Solved.of(prediction, "inputOffset");
    String says =
        "The pair is out of balance: "
            + Say.amperes(q1.collectorCurrent())
            + " against "
            + Say.amperes(q2.collectorCurrent())
            + (offset.isPresent()
                ? ", which with all else makes an input offset of "
                    + Say.volts(offset.getAsDouble())
                : "")
            + ".";
    Optional<PairCentring> centring = centring(design, prediction);
    return List.of(
        new Finding(
            Finding.Severity.RISKY,
            "amplifier.inputPair",
            says,
            centring.map(PairBalanceCheck::remedy).orElse(""),
            centring
                .map(found -> List.of(Say.change(LOAD, found.preferred(), Unit.OHM)))
                .orElse(List.of())));
  }

  private static Optional<PairCentring> centring(Design design, HookupPrediction prediction) {
    boolean resistors =
        design.amplifier() instanceof StagesAmplifier stages
            && stages.inputPair().load() instanceof PairLoad.Resistors;
    return resistors ? PairCentring.of(design, prediction.hookup().name()) : Optional.empty();
  }

  private static String remedy(PairCentring centring) {
    return "A load resistor of "
        + Say.ohms(centring.exact())
        + " centres the output; the nearest preferred value, "
        + Say.ohms(centring.preferred())
        + ", leaves "
        + Say.volts(centring.left())
        + " at the output.";
  }
}
