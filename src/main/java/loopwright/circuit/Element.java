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
   * Adds −λᵀ∂f/∂p for every parameter p of this element: what its change does to a quantity of the
   * static state whose adjoint solution is λ.
   *
   * @param state solved
   * @param adjoint λ by unknown
   * @param sums added to
   */
  default void addStaticSensitivity(
      CircuitState state, double[] adjoint, ElementSensitivities sums) {
    // Leads and capacitors have no part in static currents.
  }

  /**
   * Adds the change of a response of the small-signal circuit: −∂/∂p of the form for every
   * parameter of this element at fixed voltages, and −∂/∂v for the voltages that its small-signal
   * values hang on.
   *
   * @param state solved
   * @param form of the response's solution and adjoint solution
   * @param byUnknown change by unknown of the static state; added to
   * @param sums added to
   */
  default void addLinearSensitivity(
      CircuitState state, BilinearForm form, double[] byUnknown, ElementSensitivities sums) {
    // Sources and leads have constant entries.
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
