package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.FigureAmplifier;
import loopwright.design.FiguresAmplifier;
import loopwright.quantity.Quantity;

/** An amplifier known by its figures, with what its inputs draw. */
final class FiguresAssembly {
  private FiguresAssembly() {}

  static void add(Workpiece work, FiguresAmplifier amplifier) {
    CircuitBuilder circuit = work.circuit();
    double[] rates =
        amplifier.poles().stream().mapToDouble(pole -> 2 * Math.PI * pole.value()).toArray();
    circuit.figureAmplifier(
        new FigureAmplifier.Figures(
            amplifier.gain().value(),
            amplifier.inputOffset().value(),
            amplifier.commonModeRejection().value(),
            amplifier.deadZone().value(),
            amplifier.outputLow().orElse(work.design().rails().negative()).value(),
            amplifier.outputHigh().orElse(work.design().rails().positive()).value(),
            amplifier.outputResistance().value(),
            amplifier.slewRate().value(),
            rates),
        Nodes.IN_PLUS,
        HookupNodes.IN_MINUS_AMPLIFIER,
        Nodes.GAIN_OUT,
        Nodes.OUT);
    Quantity resistance = amplifier.inputResistance();
    if (Double.isFinite(resistance.value())) {
      circuit.noiselessResistor(
          "amplifier.inputResistance",
          Nodes.IN_PLUS,
          HookupNodes.IN_MINUS_AMPLIFIER,
          resistance.value());
    }
    for (String input : new String[] {Nodes.IN_PLUS, HookupNodes.IN_MINUS_AMPLIFIER}) {
      circuit.capacitor(
          "amplifier.inputCapacitance@" + input,
          input,
          CircuitBuilder.GROUND,
          amplifier.inputCapacitance().value());
      circuit.currentSource(
          "amplifier.inputBiasCurrent@" + input,
          input,
          CircuitBuilder.GROUND,
          amplifier.inputBiasCurrent().value());
    }
  }
}
