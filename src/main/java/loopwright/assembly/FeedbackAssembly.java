package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.TakenFrom;

/** The network that brings the output back, up to the lead of the inverting input. */
final class FeedbackAssembly {
  private FeedbackAssembly() {}

  static void add(Workpiece work, Hookup hookup) {
    String path = "hookups." + hookup.name() + ".feedback";
    if (hookup.feedback() instanceof Feedback.NonInverting divider) {
      addDivider(work, divider, path);
    } else if (hookup.feedback() instanceof Feedback.Inverting inverting) {
      addInverting(work, inverting, path);
    } else if (hookup.feedback() instanceof Feedback.Open open) {
      work.resistor(
          path + ".returnResistance",
          Nodes.IN_MINUS,
          CircuitBuilder.GROUND,
          open.returnResistance());
    }
    work.circuit().withoutStray(HookupNodes.IN_MINUS_AMPLIFIER);
    work.circuit()
        .measuredLead(HookupNodes.FEEDBACK_LEAD, Nodes.IN_MINUS, HookupNodes.IN_MINUS_AMPLIFIER);
  }

  private static void addDivider(Workpiece work, Feedback.NonInverting divider, String path) {
    String top = node(divider.from());
    work.resistor(path + ".upper", top, Nodes.IN_MINUS, divider.upper());
    divider
        .leadCapacitance()
        .ifPresent(
            capacitance ->
                work.capacitor(path + ".leadCapacitance", top, Nodes.IN_MINUS, capacitance));
    divider
        .lower()
        .ifPresent(
            lower -> {
              String returned = Workpiece.returnNode(divider.returnTo());
              boolean blocked = divider.lowerCapacitance().isPresent();
              String foot = blocked ? "dividerFoot" : returned;
              work.resistor(path + ".lower", Nodes.IN_MINUS, foot, lower);
              divider
                  .lowerCapacitance()
                  .ifPresent(
                      capacitance ->
                          work.blockingCapacitor(
                              path + ".lowerCapacitance", foot, returned, capacitance));
            });
  }

  private static void addInverting(Workpiece work, Feedback.Inverting inverting, String path) {
    String top = node(inverting.from());
    work.resistor(path + ".upper", top, Nodes.IN_MINUS, inverting.upper());
    inverting
        .leadCapacitance()
        .ifPresent(
            capacitance ->
                work.capacitor(path + ".leadCapacitance", top, Nodes.IN_MINUS, capacitance));
    work.resistor(
        path + ".inputResistor", Nodes.INPUT_END, Nodes.IN_MINUS, inverting.inputResistor());
    work.resistor(
        path + ".returnResistance",
        Workpiece.returnNode(inverting.returnTo()),
        Nodes.IN_PLUS,
        inverting.returnResistance());
  }

  private static String node(TakenFrom from) {
    return from == TakenFrom.OUT ? Nodes.OUT : Nodes.LOAD;
  }
}
