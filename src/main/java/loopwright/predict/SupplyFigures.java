package loopwright.predict;

import static loopwright.quantity.Unit.AMPERE;
import static loopwright.quantity.Unit.CELSIUS;
import static loopwright.quantity.Unit.ONE;
import static loopwright.quantity.Unit.WATT;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.VoltageSource;
import loopwright.solve.MidbandNetwork;

/** Supply, heat and supply rejection. */
final class SupplyFigures {
  private SupplyFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "supplyPower",
            "Supply power",
            WATT,
            "What both supplies deliver at rest.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> FigureValue.of(supplyPower(solution)),
            NoFormula.ROAD),
        new Figure(
            "hottestJunction",
            "Hottest junction",
            CELSIUS,
            "Highest junction temperature over the levels that the output passes, ambient plus power"
                + " times thermal resistance.",
            "over the swing",
            "",
            CostClass.WAVEFORM,
            SupplyFigures::hottest,
            NoFormula.ROAD),
        new Figure(
            "shortCircuitCurrent",
            "Short-circuit current",
            AMPERE,
            "Output current with the output held at its reference and the generator where it would"
                + " give ± P.",
            "large signal",
            "",
            CostClass.WAVEFORM,
            solution -> {
              ShortCircuit circuit = solution.shortCircuit();
              return FigureValue.of(circuit.current(), circuit.says());
            },
            NoFormula.ROAD),
        rejection(
            "supplyRejectionPositive",
            "Positive supply rejection",
            AssembledHookup::positiveSupply),
        rejection(
            "supplyRejectionNegative",
            "Negative supply rejection",
            AssembledHookup::negativeSupply));
  }

  private static double supplyPower(HookupSolution solution) {
    CircuitState state = solution.rest().state();
    VoltageSource positive = solution.assembled().positiveSupply();
    VoltageSource negative = solution.assembled().negativeSupply();
    return positive.nominal(state) * positive.current(state)
        + negative.nominal(state) * negative.current(state);
  }

  private static FigureValue hottest(HookupSolution solution) {
    DeviceReadout readout = new DeviceReadout(solution.assembled());
    double most = Double.NEGATIVE_INFINITY;
    String where = "";
    for (SwingStability.Solved solved : solution.swing().levels()) {
      Map<String, DeviceState> devices = readout.read(solved.state(), Map.of());
      for (Map.Entry<String, DeviceState> device : devices.entrySet()) {
        OptionalDouble celsius = device.getValue().junctionTemperature();
        if (celsius.orElse(Double.NEGATIVE_INFINITY) > most) {
          most = celsius.getAsDouble();
          where = device.getKey() + " with the output at " + Text.volts(solved.level().output());
        }
      }
    }
    return where.isEmpty()
        ? FigureValue.none("no part record states a thermal resistance")
        : FigureValue.of(most, where);
  }

  private static Figure rejection(
      String key, String label, Function<AssembledHookup, VoltageSource> supply) {
    return new Figure(
        key,
        label,
        ONE,
        "Change of a supply, behind its resistance, over the change of the output divided by the"
            + " noise gain; the smaller of the high and the low level.",
        "high and low",
        "",
        CostClass.LINEAR,
        solution -> {
          solution.needLoop();
          double noiseGain = solution.gains().noiseGain().orElseThrow();
          VoltageSource source = supply.apply(solution.assembled());
          return FigureValue.of(
              Math.min(
                  rejection(solution.midbandHigh(), source, noiseGain),
                  rejection(solution.midbandLow(), source, noiseGain)),
              solution.levels().remark());
        },
        NoFormula.ROAD);
  }

  private static double rejection(MidbandNetwork network, VoltageSource source, double noiseGain) {
    return noiseGain / Math.abs(network.outputBySupply(source));
  }
}
