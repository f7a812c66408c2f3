package loopwright.laws;

import loopwright.design.Design;
import loopwright.design.Extra;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.design.Probe;
import loopwright.design.Rails;
import loopwright.design.ReturnNode;
import loopwright.design.Source;
import loopwright.design.TakenFrom;

/**
 * Rails, source, feedback, load, probes and extras as the format's page describes them, at rest.
 */
final class HookupWiring {
  private final Design design;
  private final Hookup hookup;
  private final Wiring wiring;

  HookupWiring(Design design, Hookup hookup, Wiring wiring) {
    this.design = design;
    this.hookup = hookup;
    this.wiring = wiring;
  }

  void add() {
    rails();
    source();
    feedback();
    load();
    for (Probe probe : hookup.probes()) {
      probe.resistance().ifPresent(r -> wiring.resistor(probe.node(), "ground", r.effective()));
      probe.capacitance().ifPresent(c -> wiring.capacitor(probe.node(), "ground", c.effective()));
    }
    for (Extra extra : design.extras()) {
      if (extra instanceof Extra.ExtraResistor) {
        wiring.resistor(extra.from(), extra.to(), extra.value().effective());
      } else {
        wiring.capacitor(extra.from(), extra.to(), extra.value().effective());
      }
    }
  }

  private void rails() {
    Rails rails = design.rails();
    wiring.resistor("ideal.positive", "positive", rails.resistance().effective());
    wiring.resistor("ideal.negative", "negative", rails.resistance().effective());
    rails
        .decoupling()
        .ifPresent(
            decoupling -> {
              for (String rail : new String[] {"positive", "negative"}) {
                String middle = "decoupling." + rail;
                wiring.capacitor(rail, middle, decoupling.capacitance().effective());
                wiring.resistor(middle, "ground", decoupling.resistance().effective());
              }
            });
    rails
        .midRail()
        .ifPresent(
            mid -> {
              if (mid.capacitance().effective() > 0) {
                wiring.blocking("midRail", "ground", mid.capacitance().effective());
              }
              wiring.resistor("positive", "midRail", mid.upper().effective());
              wiring.resistor("midRail", "negative", mid.lower().effective());
            });
  }

  /** Generator, resistance, attenuator, coupling, bias resistance, driven input. */
  private void source() {
    Source source = hookup.source();
    String driven = hookup.feedback() instanceof Feedback.Inverting ? "inputEnd" : "in+";
    boolean coupled = source.couplingCapacitance().isPresent();
    String beforeCoupling = coupled ? "coupling" : driven;
    String afterResistance = source.attenuator().isPresent() ? "attenuatorTop" : beforeCoupling;
    wiring.resistor("generator", afterResistance, source.resistance().effective());
    source
        .attenuator()
        .ifPresent(
            attenuator -> {
              wiring.resistor("attenuatorTop", beforeCoupling, attenuator.series().effective());
              wiring.resistor(beforeCoupling, "ground", attenuator.shunt().effective());
            });
    source
        .couplingCapacitance()
        .ifPresent(coupling -> wiring.blocking("coupling", driven, coupling.effective()));
    source
        .biasResistance()
        .ifPresent(bias -> wiring.resistor(driven, node(source.biasTo()), bias.effective()));
  }

  private void feedback() {
    if (hookup.feedback() instanceof Feedback.NonInverting divider) {
      wiring.resistor(from(divider.from()), "in-", divider.upper().effective());
      if (divider.lower().isPresent()) {
        String foot =
            divider.lowerCapacitance().isPresent() ? "dividerFoot" : node(divider.returnTo());
        wiring.resistor("in-", foot, divider.lower().map(PartValue::effective).orElseThrow());
        divider
            .lowerCapacitance()
            .ifPresent(c -> wiring.blocking(foot, node(divider.returnTo()), c.effective()));
      }
      divider
          .leadCapacitance()
          .ifPresent(c -> wiring.capacitor(from(divider.from()), "in-", c.effective()));
    } else if (hookup.feedback() instanceof Feedback.Inverting inverting) {
      wiring.resistor(from(inverting.from()), "in-", inverting.upper().effective());
      wiring.resistor("inputEnd", "in-", inverting.inputResistor().effective());
      inverting
          .leadCapacitance()
          .ifPresent(c -> wiring.capacitor(from(inverting.from()), "in-", c.effective()));
      wiring.resistor("in+", node(inverting.returnTo()), inverting.returnResistance().effective());
    } else if (hookup.feedback() instanceof Feedback.Open open) {
      wiring.resistor("in-", "ground", open.returnResistance().effective());
    }
  }

  private void load() {
    Load load = hookup.load();
    boolean coupled = load.couplingCapacitance().isPresent();
    wiring.resistor("out", coupled ? "loadCoupling" : "load", load.isolation().effective());
    load.resistance().ifPresent(r -> wiring.resistor("load", "ground", r.effective()));
    load.capacitance().ifPresent(c -> wiring.capacitor("load", "ground", c.effective()));
    load.couplingCapacitance()
        .ifPresent(c -> wiring.blocking("loadCoupling", "load", c.effective()));
    load.snubber()
        .ifPresent(
            snubber -> {
              wiring.resistor("out", "snubberFoot", snubber.resistance().effective());
              wiring.capacitor("snubberFoot", "ground", snubber.capacitance().effective());
            });
  }

  private static String from(TakenFrom from) {
    return from == TakenFrom.LOAD ? "load" : "out";
  }

  private static String node(ReturnNode node) {
    return node == ReturnNode.MID_RAIL ? "midRail" : "ground";
  }
}
