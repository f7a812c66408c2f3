package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.circuit.CircuitState;
import loopwright.design.FiguresAmplifier;

/**
 * What makes the output offset, cause by cause, and what is left. Each input-referred cause e
 * counts −e·NG₀/(1 + NG₀/A) at the output.
 */
final class OffsetBudget {
  private OffsetBudget() {}

  /** Output offset by hand: (−inputOffset − I_B1 R₊) NG₀/(1 + NG₀/A) + I_B2 upper/(1 + NG₀/A). */
  static FigureValue outputOffset(HookupSolution solution) {
    OptionalDouble noiseGain = solution.gains().restNoiseGain();
    if (noiseGain.isEmpty()) {
      throw new UnsolvedException("the hookup is open: there is no loop");
    }
    KnownFigure offset = KnownFigure.of(solution, "inputOffset");
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    BiasCurrents bias = BiasCurrents.of(solution);
    double error = 1 + noiseGain.getAsDouble() / gain.value();
    double atInput = -offset.value() - plusDrop(solution, bias);
    double volts =
        (atInput * noiseGain.getAsDouble() + bias.minus() * solution.gains().upper()) / error;
    return FigureValue.of(volts, "with " + offset.says() + " and " + gain.says());
  }

  private static double plusDrop(HookupSolution solution, BiasCurrents bias) {
    double resistance = solution.gains().restResistanceAtPlus();
    if (bias.plus() == 0) {
      return 0;
    }
    if (Double.isInfinite(resistance)) {
      throw new UnsolvedException("the non-inverting input has no dc path");
    }
    return bias.plus() * resistance;
  }

  /** The contributions; they add up to the solved output offset. Empty where there is no loop. */
  static List<OffsetShare> shares(HookupSolution solution) {
    Outcome<List<OffsetShare>> outcome = Outcome.of(() -> split(solution));
    return outcome.isPresent() ? outcome.value() : List.of();
  }

  private static List<OffsetShare> split(HookupSolution solution) {
    OptionalDouble noiseGain = solution.gains().restNoiseGain();
    if (noiseGain.isEmpty()) {
      throw new UnsolvedException("the hookup is open: there is no loop");
    }
    double ng = noiseGain.getAsDouble();
    double high = GainFigures.mean(solution.midbandHigh());
    double low = GainFigures.mean(solution.midbandLow());
    double gain = 2 / (1 / high + 1 / low);
    double error = 1 + ng / gain;
    double perInput = -ng / error;
    double inputOffset = OffsetFigures.inputOffset(solution);
    double solved = OffsetFigures.outputOffset(solution);
    BiasCurrents bias = BiasCurrents.of(solution);

    List<OffsetShare> shares = new ArrayList<>();
    double explained = 0;
    if (!(solution.design().amplifier() instanceof FiguresAmplifier)) {
      for (OffsetFormula.Cause cause : OffsetFormula.causes(solution)) {
        shares.add(new OffsetShare(cause.name(), cause.volts() * perInput));
        explained += cause.volts();
      }
      shares.add(
          new OffsetShare(
              "input offset beyond the hand formula", (inputOffset - explained) * perInput));
    } else {
      shares.add(new OffsetShare("input offset", inputOffset * perInput));
    }
    shares.add(
        new OffsetShare(
            "base current in the source resistance", plusDrop(solution, bias) * perInput));
    shares.add(
        new OffsetShare(
            "base current in the feedback resistor",
            bias.minus() * solution.gains().upper() / error));
    shares.add(new OffsetShare("common mode", commonMode(solution, perInput)));
    shares.add(
        new OffsetShare(
            "curvature of the gain", curvature(solution, high, low, solved) * perInput));
    double before = shares.stream().mapToDouble(OffsetShare::output).sum();
    double crossover = crossover(solution) / gain * perInput;
    shares.add(new OffsetShare("remainder", solved - before - crossover));
    shares.add(new OffsetShare("crossover: where in the dead zone it rests", crossover));
    return shares;
  }

  /** Common-mode input at rest against the mean of the levels, times c. */
  private static double commonMode(HookupSolution solution, double perInput) {
    Outcome<Double> share = Outcome.of(() -> GainFigures.commonModeShare(solution));
    if (!share.isPresent()) {
      return 0;
    }
    Levels levels = solution.levels();
    double moved =
        common(solution, levels.rest())
            - (common(solution, levels.high()) + common(solution, levels.low())) / 2;
    return -share.value() * moved * perInput;
  }

  private static double common(HookupSolution solution, CircuitState state) {
    return (state.voltage(solution.assembled().inPlus())
            + state.voltage(solution.assembled().feedbackLead().to()))
        / 2;
  }

  /**
   * Differential input that the bend of the transfer curve between the levels adds at rest, V: with
   * 1/A changing linearly from low to high, (1/A_high − 1/A_low)/(2P)·(o² − P²/4) at an output o
   * from the reference.
   */
  private static double curvature(HookupSolution solution, double high, double low, double offset) {
    double peak = solution.levels().peak();
    return (1 / high - 1 / low) / (2 * peak) * (offset * offset - peak * peak / 4);
  }

  /** How far v(gainOut) − v(out) at rest stands from its mean at the levels, V. */
  private static double crossover(HookupSolution solution) {
    Levels levels = solution.levels();
    return drop(solution, levels.rest())
        - (drop(solution, levels.high()) + drop(solution, levels.low())) / 2;
  }

  private static double drop(HookupSolution solution, CircuitState state) {
    return state.voltage(solution.assembled().gainOut())
        - state.voltage(solution.assembled().out());
  }
}
