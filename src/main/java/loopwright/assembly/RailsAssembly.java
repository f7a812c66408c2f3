package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.design.Rails;

/** Supplies, what stands between them and the rails, decoupling and mid-rail. */
final class RailsAssembly {
  private RailsAssembly() {}

  static void add(Workpiece work) {
    Rails rails = work.design().rails();
    CircuitBuilder circuit = work.circuit();
    feed(work, Nodes.IDEAL_POSITIVE, Nodes.POSITIVE, rails.positive().value());
    feed(work, Nodes.IDEAL_NEGATIVE, Nodes.NEGATIVE, rails.negative().value());
    rails
        .midRail()
        .ifPresent(
            mid -> {
              work.resistor("rails.midRail.upper", Nodes.POSITIVE, Nodes.MID_RAIL, mid.upper());
              work.resistor("rails.midRail.lower", Nodes.MID_RAIL, Nodes.NEGATIVE, mid.lower());
              circuit.blockingCapacitor(
                  "rails.midRail.capacitance",
                  Nodes.MID_RAIL,
                  CircuitBuilder.GROUND,
                  mid.capacitance().effective());
            });
  }

  private static void feed(Workpiece work, String ideal, String rail, double volts) {
    Rails rails = work.design().rails();
    CircuitBuilder circuit = work.circuit();
    circuit.withoutStray(ideal);
    circuit.withoutStray(rail);
    circuit.supply("supply." + rail, ideal, volts);
    circuit.inductor(
        "rails.resistance@" + rail,
        ideal,
        rail,
        work.value("rails.resistance@" + rail, rails.resistance()),
        rails.inductance().value());
    rails
        .decoupling()
        .ifPresent(
            decoupling -> {
              String middle = "decoupling." + rail;
              circuit.withoutStray(middle);
              work.capacitor(
                  "rails.decoupling.capacitance@" + rail, rail, middle, decoupling.capacitance());
              work.resistor(
                  "rails.decoupling.resistance@" + rail,
                  middle,
                  CircuitBuilder.GROUND,
                  decoupling.resistance());
            });
  }
}
