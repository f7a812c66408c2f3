package loopwright.predict;

import static loopwright.quantity.Unit.OHM;

import java.util.List;
import java.util.function.ToDoubleFunction;
import loopwright.assembly.Nodes;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.solve.MidbandNetwork;

/** Resistances at input and output. */
final class ImpedanceFigures {
  private ImpedanceFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "inputResistance",
            "Input resistance",
            OHM,
            "Resistance into the driven terminal with the source removed, at signal frequency; mean of"
                + " the high and the low level.",
            "high and low",
            "R_id (1 + A/NG); inverting inputResistor + upper/(1 + A) (Blackman 1943)",
            CostClass.LINEAR,
            solution -> mean(solution, MidbandNetwork::inputResistance),
            LoopFormulas::inputResistance),
        new Figure(
            "outputResistance",
            "Output resistance",
            OHM,
            "Resistance at the output, or behind isolation and coupling at the load, with the load"
                + " removed, at signal frequency; mean of the high and the low level.",
            "high and low",
            "R_o/(1 + A/NG) (Blackman 1943)",
            CostClass.LINEAR,
            solution -> mean(solution, network -> unloaded(solution, network)),
            LoopFormulas::outputResistance));
  }

  private static FigureValue mean(
      HookupSolution solution, ToDoubleFunction<MidbandNetwork> resistance) {
    double high = resistance.applyAsDouble(solution.midbandHigh());
    double low = resistance.applyAsDouble(solution.midbandLow());
    return FigureValue.of((high + low) / 2, solution.levels().remark());
  }

  private static double unloaded(HookupSolution solution, MidbandNetwork network) {
    Load load = solution.hookup().load();
    double loaded = network.resistanceAt(solution.assembled().circuit().node(Nodes.LOAD));
    double conductance = load.resistance().map(PartValue::effective).map(r -> 1 / r).orElse(0.0);
    return 1 / (1 / loaded - conductance);
  }
}
