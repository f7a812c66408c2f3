package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.Source;

/** The generator and what stands between it and the driven terminal. */
final class SourceAssembly {
  private SourceAssembly() {}

  static void add(Workpiece work, Hookup hookup) {
    Source source = hookup.source();
    CircuitBuilder circuit = work.circuit();
    String path = "hookups." + hookup.name() + ".source";
    circuit.withoutStray(Nodes.GENERATOR);
    circuit.generator("generator", Nodes.GENERATOR, source.dc().value());

    String end = HookupNodes.SOURCE_END;
    String beforeCoupling = source.couplingCapacitance().isPresent() ? "coupling" : end;
    String afterResistance = source.attenuator().isPresent() ? "attenuatorTop" : beforeCoupling;
    work.resistor(path + ".resistance", Nodes.GENERATOR, afterResistance, source.resistance());
    source
        .attenuator()
        .ifPresent(
            attenuator -> {
              work.resistor(
                  path + ".attenuator.series",
                  "attenuatorTop",
                  beforeCoupling,
                  attenuator.series());
              work.resistor(
                  path + ".attenuator.shunt",
                  beforeCoupling,
                  CircuitBuilder.GROUND,
                  attenuator.shunt());
            });
    source
        .couplingCapacitance()
        .ifPresent(
            capacitance ->
                work.blockingCapacitor(
                    path + ".couplingCapacitance", beforeCoupling, end, capacitance));
    source
        .biasResistance()
        .ifPresent(
            resistance ->
                work.resistor(
                    path + ".biasResistance",
                    end,
                    Workpiece.returnNode(source.biasTo()),
                    resistance));

    String driven =
        hookup.feedback() instanceof Feedback.Inverting ? Nodes.INPUT_END : Nodes.IN_PLUS;
    // The driven terminal gets the stray capacitor; its twin ahead of the lead does not, and the
    // terminal gets none either where it is the generator's own.
    circuit.withoutStray(HookupNodes.SOURCE_END);
    circuit.lead(HookupNodes.SOURCE_LEAD, HookupNodes.SOURCE_END, driven);
    if (isWire(source)) {
      circuit.withoutStray(driven);
    }
  }

  private static boolean isWire(Source source) {
    return source.resistance().effective() == 0
        && source.couplingCapacitance().isEmpty()
        && source.attenuator().map(part -> part.series().effective() == 0).orElse(true);
  }
}
