package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;

import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Transistor;
import loopwright.circuit.VoltageSource;

/** A small circuit at its operating point, with the questions that tests put to it. */
final class SolvedCircuit {
  private final Circuit circuit;
  private final CircuitState state;
  private final SmallSignalCircuit smallSignal;

  private SolvedCircuit(CircuitState state) {
    this.circuit = state.circuit();
    this.state = state;
    this.smallSignal = new SmallSignalCircuit(circuit);
    smallSignal.linearise(state);
  }

  /** Solves; a circuit without an operating point fails the test. */
  static SolvedCircuit of(CircuitBuilder builder) {
    OperatingPoint point = OperatingPointSolver.solve(builder.build(0));
    assertThat(point).isInstanceOf(OperatingPoint.Found.class);
    return new SolvedCircuit(((OperatingPoint.Found) point).state());
  }

  Circuit circuit() {
    return circuit;
  }

  CircuitState state() {
    return state;
  }

  SmallSignalCircuit smallSignal() {
    return smallSignal;
  }

  double voltage(String node) {
    return state.voltage(node);
  }

  double collectorCurrent(String role) {
    return circuit.element(role, Transistor.class).collectorCurrent(state);
  }

  double baseCurrent(String role) {
    return circuit.element(role, Transistor.class).baseCurrent(state);
  }

  /** Change of a node's voltage for one volt more of a supply, at dc. */
  double gain(String supply, String node) {
    return smallSignal.response(0, branch(supply), circuit.node(node))[0];
  }

  /** Complex gain from a supply to a node at a frequency in Hz. */
  double[] gain(double frequency, String supply, String node) {
    return smallSignal.response(frequency, branch(supply), circuit.node(node));
  }

  /** Change of a voltage between two nodes for one volt more of a supply, at dc. */
  double gain(String supply, String plus, String minus) {
    return gain(supply, plus) - gain(supply, minus);
  }

  /** Resistance that a supply works into, Ω. */
  double resistanceSeenBy(String supply) {
    int branch = branch(supply);
    return 1 / smallSignal.response(0, branch, branch)[0];
  }

  /** Resistance from a node to ground, everything in place, Ω. */
  double resistanceAt(String node) {
    int index = circuit.node(node);
    return smallSignal.response(0, index, index)[0];
  }

  private int branch(String supply) {
    return circuit.element(supply, VoltageSource.class).branch();
  }
}
