package loopwright.solve;

import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.circuit.VoltageSource;

/** What a continuation moves: the scale of all sources, or the generator. */
interface Drive {
  /** Its value at a state. */
  double get(CircuitState state);

  /** Sets it. */
  void set(CircuitState state, double value);

  /** Adds −∂f/∂(its value) to a right-hand side. */
  void excite(CircuitState state, double[] rightHandSide);

  /** The common factor on every independent source. */
  static Drive sources() {
    return new Drive() {
      @Override
      public double get(CircuitState state) {
        return state.sourceScale();
      }

      @Override
      public void set(CircuitState state, double value) {
        state.setSourceScale(value);
      }

      @Override
      public void excite(CircuitState state, double[] rightHandSide) {
        for (Element element : state.circuit().elements()) {
          element.exciteSources(state, rightHandSide);
        }
      }
    };
  }

  /** The generator. */
  static Drive generator(VoltageSource generator) {
    return new Drive() {
      @Override
      public double get(CircuitState state) {
        return state.generator();
      }

      @Override
      public void set(CircuitState state, double value) {
        state.setGenerator(value);
      }

      @Override
      public void excite(CircuitState state, double[] rightHandSide) {
        rightHandSide[generator.branch()] += state.sourceScale();
      }
    };
  }
}
