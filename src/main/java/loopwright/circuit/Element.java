package loopwright.circuit;

import java.util.List;

/**
 * An element of a circuit: two-terminal parts, devices, sources and leads. It is immutable; what it
 * remembers between evaluations lives in the {@link CircuitState}.
 */
public sealed interface Element
    permits Resistor,
        Capacitor,
        BlockingCapacitor,
        CurrentSourceElement,
        VoltageSource,
        Lead,
        Inductor,
        Transistor,
        JunctionDiode,
        FigureAmplifier {
  /** Name in the design: path of a part, role of a device. */
  String name();

  /** Adds currents, charges and derivatives at the state's unknowns to its stamps. */
  void stamp(CircuitState state);

  /**
   * Adds −∂f/∂(source scale) to a right-hand side; only independent sources have one.
   *
   * @param rightHandSide by unknown; added to
   */
  default void exciteSources(CircuitState state, double[] rightHandSide) {
    // Most elements are no sources.
  }

  /**
   * Adds what noise this element makes at a state.
   *
   * @param state solved
   * @param sources added to
   */
  default void addNoise(CircuitState state, List<NoiseSource> sources) {
    // Sources, leads, capacitors and amplifiers known by their figures make none.
  }
}
