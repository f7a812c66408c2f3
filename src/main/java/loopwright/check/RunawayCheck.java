package loopwright.check;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.circuit.Physics;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DeviceRoles;
import loopwright.design.OutputStage;
import loopwright.design.StagesAmplifier;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.predict.DeviceState;
import loopwright.predict.HeatReport;
import loopwright.predict.HeatSolver;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RunawayFormula;
import loopwright.quantity.Quantity;
import loopwright.task.Progress;

/**
 * An output stage that heats itself until nothing holds it, at the hottest ambient it shall stand.
 */
final class RunawayCheck implements Check {
  /** A loop by hand below this is not worth solving. */
  private static final double SUSPICIOUS = 0.3;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    boolean suspicious =
        design.amplifier() instanceof StagesAmplifier stages
            && stages.outputStage() instanceof OutputStage.PushPull stage
            && prediction.rest().isPresent()
            && List.of("out.upper", "out.lower").stream()
                .anyMatch(
                    role ->
                        byHand(
                                design,
                                role,
                                prediction.rest().get().devices().get(role),
                                stage.emitterResistance().effective())
                            > SUSPICIOUS);
    return suspicious ? solved(design, prediction) : List.of();
  }

  private static double byHand(
      Design design, String role, DeviceState device, double emitterResistance) {
    Optional<Quantity> thermal =
        DeviceRoles.find(design, role)
            .map(found -> design.parts().get(found.part()))
            .filter(TransistorRecord.class::isInstance)
            .flatMap(record -> ((TransistorRecord) record).limits())
            .flatMap(TransistorLimits::thermalResistance);
    if (thermal.isEmpty()
        || !(device instanceof DeviceState.TransistorState state)
        || !(state.collectorCurrent() > 0)) {
      return 0;
    }
    double kelvin = Physics.ZERO_CELSIUS + design.surroundings().ambient().value();
    return RunawayFormula.loop(
        state.collectorEmitterVoltage(),
        thermal.get().value(),
        RunawayFormula.kappa(state.baseEmitterVoltage(), kelvin),
        emitterResistance,
        Physics.thermalVoltage(kelvin),
        state.collectorCurrent());
  }

  private static List<Finding> solved(Design design, HookupPrediction prediction) {
    double hot =
        design
            .tolerances()
            .ambient()
            .map(range -> range.maximum().value())
            .orElse(design.surroundings().ambient().value());
    HeatSolver.Runaway runaway =
        HeatSolver.runaway(design, prediction.hookup().name(), hot, Progress.none());
    OptionalDouble loop = runaway.loop();
    if (loop.isPresent() && loop.getAsDouble() <= RunawayFormula.WANTED) {
      return List.of();
    }
    boolean gone = loop.isEmpty() || loop.getAsDouble() >= 1;
    String says =
        gone
            ? "The output stage runs away with heat at an ambient of "
                + Say.celsius(hot)
                + (loop.isPresent()
                    ? ": a first bit of heat brings "
                        + times(loop.getAsDouble())
                        + " as much again."
                    : ": " + runaway.reason() + ".")
            : "The output stage is close to thermal runaway at an ambient of "
                + Say.celsius(hot)
                + ": a first bit of heat brings "
                + times(loop.getAsDouble())
                + " as much again; from 1 on nothing holds it.";
    List<Change> changes = HeatSolver.changes(design, runaway.leastResistance());
    return List.of(
        new Finding(
            gone ? Finding.Severity.FAILS : Finding.Severity.RISKY,
            "amplifier.outputStage",
            says,
            changes.isEmpty()
                ? "Less idle current, less supply voltage, a heat sink, or a bias device on the same"
                    + " heat sink."
                : runaway.resistanceSays() + "; a bias device on the same heat sink helps as well.",
            changes));
  }

  private static String times(double loop) {
    return HeatReport.loop(loop);
  }
}
