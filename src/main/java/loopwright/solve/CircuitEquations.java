package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.numeric.ChargeEquations;
import loopwright.numeric.SystemFamily;

/** A circuit in time: every capacitor counts, and the generator does what its signal says. */
final class CircuitEquations implements ChargeEquations {
  private final CircuitState state;
  private final GeneratorSignal signal;
  private final double[] tolerances;
  private boolean afterJump;

  CircuitEquations(CircuitState state, GeneratorSignal signal, Transient.Accuracy accuracy) {
    this.state = state;
    this.signal = signal;
    this.tolerances = tolerances(state, accuracy);
  }

  /**
   * Voltages of nodes and whatever stores something are watched; currents of sources and of
   * blocking capacitors follow from them.
   */
  private static double[] tolerances(CircuitState state, Transient.Accuracy accuracy) {
    Circuit circuit = state.circuit();
    double[] tolerances = new double[circuit.unknowns()];
    Arrays.fill(tolerances, Double.POSITIVE_INFINITY);
    state.evaluate();
    double[] c = state.stamps().c;
    for (int slot = 0; slot < c.length; slot++) {
      if (c[slot] != 0) {
        tolerances[circuit.pattern().column(slot)] = accuracy.amperes();
      }
    }
    Arrays.fill(tolerances, 0, circuit.nodes(), accuracy.volts());
    return tolerances;
  }

  /** Whether the generator stands just after a jump at the present time, or just before it. */
  void setAfterJump(boolean after) {
    afterJump = after;
  }

  @Override
  public SystemFamily systems() {
    return state.circuit().systems();
  }

  @Override
  public double[] unknowns() {
    return state.unknowns();
  }

  @Override
  public void evaluate(double time) {
    state.setGenerator(afterJump ? signal.after(time) : signal.before(time));
    state.evaluate();
  }

  @Override
  public double[] f() {
    return state.stamps().f;
  }

  @Override
  public double[] q() {
    return state.stamps().q;
  }

  @Override
  public double[] g() {
    return state.stamps().g;
  }

  @Override
  public double[] c() {
    return state.stamps().c;
  }

  @Override
  public boolean limited() {
    return state.limited();
  }

  @Override
  public double tolerance(int unknown) {
    return tolerances[unknown];
  }
}
