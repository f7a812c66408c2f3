package loopwright.assembly;

import loopwright.circuit.Circuit;
import loopwright.circuit.Lead;
import loopwright.circuit.VoltageSource;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.Hookup;

/**
 * The circuit that a design stands for in one hookup, with the places that every measurement needs.
 *
 * @param design the design
 * @param hookup the hookup
 * @param circuit their circuit
 * @param models the models of its devices
 */
public record AssembledHookup(Design design, Hookup hookup, Circuit circuit, DeviceModels models) {
  /** Index of the output node. */
  public int out() {
    return circuit.node(Nodes.OUT);
  }

  /** Index of the gain stage's output node. */
  public int gainOut() {
    return circuit.node(Nodes.GAIN_OUT);
  }

  /** Index of the non-inverting input. */
  public int inPlus() {
    return circuit.node(Nodes.IN_PLUS);
  }

  /** The lead between feedback network and amplifier. */
  public Lead feedbackLead() {
    return circuit.element(HookupNodes.FEEDBACK_LEAD, Lead.class);
  }

  /** The lead between source network and driven terminal. */
  public Lead sourceLead() {
    return circuit.element(HookupNodes.SOURCE_LEAD, Lead.class);
  }

  /** The generator. */
  public VoltageSource generator() {
    return circuit.element("generator", VoltageSource.class);
  }

  /**
   * The source that holds the output.
   *
   * @throws java.util.NoSuchElementException when the output is free
   */
  public VoltageSource holder() {
    return circuit.element(HookupNodes.HOLDER, VoltageSource.class);
  }

  /** The positive supply. */
  public VoltageSource positiveSupply() {
    return circuit.element("supply.positive", VoltageSource.class);
  }

  /** The negative supply. */
  public VoltageSource negativeSupply() {
    return circuit.element("supply.negative", VoltageSource.class);
  }

  /** Whether nothing comes back from the output. */
  public boolean isOpen() {
    return hookup.feedback() instanceof Feedback.Open;
  }

  /** Whether the source drives the inverting input. */
  public boolean isInverting() {
    return hookup.feedback() instanceof Feedback.Inverting;
  }
}
