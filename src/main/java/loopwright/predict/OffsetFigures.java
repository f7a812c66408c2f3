package loopwright.predict;

import static loopwright.quantity.Unit.VOLT;
import static loopwright.quantity.Unit.VOLT_PER_KELVIN;

import java.util.List;
import java.util.Optional;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.Surroundings;
import loopwright.quantity.Quantity;

/** Offsets at input and output. */
final class OffsetFigures {
  /** Half the temperature step of the drift's difference quotient, K. */
  private static final double HALF_STEP = 0.5;

  private OffsetFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "inputOffset",
            "Input offset",
            VOLT,
            "Mean of v(in+) − v(in−) at the high and the low level: the differential input that"
                + " centres the output (sense of IEC 60748-3).",
            "high and low",
            "V_T ln(I_C1/I_C2), Early term, mismatch, base and emitter resistances",
            CostClass.LINEAR,
            solution -> FigureValue.of(inputOffset(solution), solution.levels().remark()),
            OffsetFormula::inputOffset),
        new Figure(
            "outputOffset",
            "Output offset",
            VOLT,
            "Output at rest less what an ideal amplifier would put there.",
            "at rest",
            "(−inputOffset − I_B1 R₊) NG₀/(1 + NG₀/A) + I_B2 upper/(1 + NG₀/A)",
            CostClass.LINEAR,
            solution -> FigureValue.of(outputOffset(solution)),
            OffsetBudget::outputOffset),
        new Figure(
            "outputMean",
            "Mean of the output",
            VOLT,
            "Mean of the static waveform at the output.",
            "over the waveform",
            "",
            CostClass.WAVEFORM,
            solution -> FigureValue.of(solution.waveform().mean()),
            NoFormula.ROAD),
        new Figure(
            "offsetDrift",
            "Offset drift",
            VOLT_PER_KELVIN,
            "Change of the input offset per kelvin of ambient temperature.",
            "high and low",
            "",
            CostClass.LINEAR,
            OffsetFigures::drift,
            NoFormula.ROAD));
  }

  /** Mean of the differential input at the high and the low level, V. */
  static double inputOffset(HookupSolution solution) {
    Levels levels = solution.levels();
    AssembledHookup hookup = solution.assembled();
    return (difference(hookup, levels.high()) + difference(hookup, levels.low())) / 2;
  }

  /** v(in+) − v(in−) at a state, V. */
  static double difference(AssembledHookup hookup, CircuitState state) {
    return state.voltage(hookup.inPlus()) - state.voltage(hookup.feedbackLead().to());
  }

  static double outputOffset(HookupSolution solution) {
    return solution.rest().state().voltage(solution.assembled().out()) - solution.reference();
  }

  private static FigureValue drift(HookupSolution solution) {
    HookupSolution warm = at(solution, HALF_STEP);
    HookupSolution cool = at(solution, -HALF_STEP);
    double drift = (inputOffset(warm) - inputOffset(cool)) / (2 * HALF_STEP);
    if (solution.gains().noiseGain().isEmpty()) {
      return FigureValue.of(drift);
    }
    double output =
        (outputOffset(warm) - outputOffset(cool))
            / (2 * HALF_STEP)
            / solution.gains().noiseGain().getAsDouble();
    return FigureValue.of(
        drift,
        "the output offset over the noise gain drifts by " + Text.of(output, VOLT_PER_KELVIN));
  }

  private static HookupSolution at(HookupSolution solution, double warmer) {
    Design design = solution.design();
    Surroundings here = design.surroundings();
    Design moved =
        design.withSurroundings(
            new Surroundings(
                Quantity.of(here.ambient().value() + warmer),
                here.strayCapacitance(),
                here.selfHeating(),
                here.biasCoupling()));
    return new HookupSolution(
        moved,
        solution.hookup(),
        solution.assembled().models().of(moved, solution.assembled().models().deviations()),
        Optional.of(solution));
  }
}
