package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.GainStage;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * A slew rate that the hand formula does not tell: what the formula leaves out is large in this
 * design. The formula holds within a tenth where all it assumes is so; a quarter is more than that.
 */
final class SlewCheck implements Check {
  private static final double APART = 0.25;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    List<Finding> findings = new ArrayList<>();
    if (design.amplifier() instanceof StagesAmplifier stages) {
      add(findings, stages, prediction, "slewRising", "up");
      add(findings, stages, prediction, "slewFalling", "down");
    }
    return findings;
  }

  private static void add(
      List<Finding> findings,
      StagesAmplifier stages,
      HookupPrediction prediction,
      String key,
      String way) {
    FigureResult result = prediction.figures().get(key);
    if (result == null) {
      return;
    }
    OptionalDouble solved = result.solved().number();
    OptionalDouble formula = result.formula().number();
    if (solved.isPresent()
        && formula.isPresent()
        && Double.isFinite(formula.getAsDouble())
        && Math.abs(solved.getAsDouble() / formula.getAsDouble() - 1) > APART) {
      findings.add(
          new Finding(
              Finding.Severity.REMARK,
              "hookups." + prediction.hookup().name(),
              "The output slews "
                  + way
                  + " at "
                  + text(solved.getAsDouble())
                  + ", not at the "
                  + text(formula.getAsDouble())
                  + " of the hand formula: "
                  + why(stages)
                  + ".",
              ""));
    }
  }

  private static String why(StagesAmplifier stages) {
    GainStage gain = stages.gainStage();
    List<String> reasons = new ArrayList<>();
    if (gain.compensation().isEmpty()) {
      reasons.add("without a compensation capacitor the transistors' own charges decide");
    }
    if (gain.emitterResistance().effective() > 0) {
      reasons.add(
          "the gain stage's emitter resistor makes the pair's output move, and part of its current"
              + " goes into its load");
    }
    if (stages.inputPair().load() instanceof PairLoad.Resistors) {
      reasons.add("the pair's load resistor takes more or less current as its voltage moves");
    }
    reasons.add("the formula takes one capacitance and a constant current each way");
    return String.join("; ", reasons);
  }

  private static String text(double value) {
    return EngineeringFormat.format(value, Unit.VOLT_PER_SECOND, 3);
  }
}
