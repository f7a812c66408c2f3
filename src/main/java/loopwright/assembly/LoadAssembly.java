package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.design.Hookup;
import loopwright.design.Load;
import loopwright.design.Probe;

/** What the amplifier drives, and what hangs on its nodes. */
final class LoadAssembly {
  private LoadAssembly() {}

  static void add(Workpiece work, Hookup hookup) {
    Load load = hookup.load();
    String path = "hookups." + hookup.name() + ".load";
    String behindIsolation = load.couplingCapacitance().isPresent() ? "loadCoupling" : Nodes.LOAD;
    work.resistor(path + ".isolation", Nodes.OUT, behindIsolation, load.isolation());
    load.couplingCapacitance()
        .ifPresent(
            capacitance ->
                work.blockingCapacitor(
                    path + ".couplingCapacitance", behindIsolation, Nodes.LOAD, capacitance));
    load.resistance()
        .ifPresent(
            resistance ->
                work.resistor(path + ".resistance", Nodes.LOAD, CircuitBuilder.GROUND, resistance));
    load.capacitance()
        .ifPresent(
            capacitance ->
                work.capacitor(
                    path + ".capacitance", Nodes.LOAD, CircuitBuilder.GROUND, capacitance));
    load.snubber()
        .ifPresent(
            snubber -> {
              work.resistor(
                  path + ".snubber.resistance", Nodes.OUT, "snubberFoot", snubber.resistance());
              work.capacitor(
                  path + ".snubber.capacitance",
                  "snubberFoot",
                  CircuitBuilder.GROUND,
                  snubber.capacitance());
            });
  }

  /** Probes come last: they may hang on any node, and an unknown one is an error. */
  static void addProbes(Workpiece work, Hookup hookup) {
    for (int i = 0; i < hookup.probes().size(); i++) {
      Probe probe = hookup.probes().get(i);
      String path = "hookups." + hookup.name() + ".probes." + i;
      if (!work.circuit().has(probe.node())) {
        throw new AssemblyException(
            path
                + ".node: found \""
                + probe.node()
                + "\", expected a node that the circuit of this hookup has");
      }
      probe
          .resistance()
          .ifPresent(
              resistance ->
                  work.resistor(
                      path + ".resistance", probe.node(), CircuitBuilder.GROUND, resistance));
      probe
          .capacitance()
          .ifPresent(
              capacitance ->
                  work.capacitor(
                      path + ".capacitance", probe.node(), CircuitBuilder.GROUND, capacitance));
    }
  }
}
