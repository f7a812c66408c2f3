package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.BilinearForm;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.circuit.ElementSensitivities;
import loopwright.numeric.Complex;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.SparsityPattern;

/**
 * How responses of the small-signal circuit change with the parts: by the adjoint network (Director
 * and Rohrer 1969), and through the operating point, on which the devices' small-signal values
 * hang.
 *
 * <p>With M = G + sC, M x = b and Mᵀy = a the change of Re aᵀx is −Re yᵀ(dM)x, and dM has a share
 * of the part itself and one of every voltage of the static state that moves.
 */
public final class NetworkSensitivity {
  private static final int TURNS = 4;

  /** Distance from a natural frequency at which its vectors are sought, as a share of it. */
  private static final double BESIDE = 1e-9;

  private final CircuitState state;
  private final StateSensitivity ofState;
  private final ComplexSystem system;
  private final int unknowns;
  private double re;
  private double im;

  private NetworkSensitivity(CircuitState state, StateSensitivity ofState) {
    this.state = state;
    this.ofState = ofState;
    this.system = state.circuit().systems().complex();
    this.unknowns = state.circuit().unknowns();
    state.evaluate();
  }

  /**
   * The network with every capacitor in place.
   *
   * @param solved not modified
   * @param ofState the same state
   */
  public static NetworkSensitivity of(CircuitState solved, StateSensitivity ofState) {
    CircuitState open = solved.copy();
    open.openBlockingCapacitors();
    return new NetworkSensitivity(open, ofState);
  }

  /**
   * The network at signal frequency: blocking capacitors are shorts, all others open.
   *
   * @param solved with blocking capacitors held; not modified
   * @param ofState the same state
   * @throws ArithmeticException when the network is singular there
   */
  public static NetworkSensitivity midband(CircuitState solved, StateSensitivity ofState) {
    CircuitState held = solved.copy();
    if (held.blocking() != CircuitState.Blocking.HELD) {
      held.holdBlockingCapacitors();
    }
    NetworkSensitivity network = new NetworkSensitivity(held, ofState);
    network.at(0, 0);
    return network;
  }

  /**
   * Goes to a complex frequency.
   *
   * @param growth real part of s, 1/s
   * @param omega imaginary part, rad/s
   * @throws ArithmeticException when the network is singular there
   */
  public void at(double growth, double omega) {
    re = growth;
    im = omega;
    if (!system.factor(state.stamps().g, state.stamps().c, re, im)) {
      throw new ArithmeticException("the small-signal circuit is singular");
    }
  }

  /** What an excitation of 1 in a row gives in every unknown, interleaved. */
  public double[] solve(int row) {
    double[] x = new double[2 * unknowns];
    Complex.ONE.addTo(x, row);
    system.solve(x);
    return x;
  }

  /** An empty vector of weights by unknown, interleaved. */
  public double[] weights() {
    return new double[2 * unknowns];
  }

  /**
   * Adds the derivatives of Re aᵀx by the parts.
   *
   * @param x solution for an excitation that does not change
   * @param weights a, interleaved; not modified
   * @param sums added to
   */
  public void add(double[] x, double[] weights, ElementSensitivities sums) {
    double[] y = weights.clone();
    system.solveTransposed(y);
    addForm(y, x, sums);
  }

  /**
   * Derivative of Re aᵀx by a movement of s.
   *
   * @param x solution for an excitation that does not change
   * @param weights a, interleaved; not modified
   * @param direction how s moves
   */
  public double slope(double[] x, double[] weights, Complex direction) {
    double[] y = weights.clone();
    system.solveTransposed(y);
    return -product(y, capacitive(x, false)).times(direction).re();
  }

  /**
   * Adds the derivatives of Re(weight · s) of a natural frequency s, from its right and left
   * vectors: ds = −yᵀ(dG + s dC)x/(yᵀC x).
   *
   * @param root the natural frequency, a single one
   * @param weight factor; 1 for its growth, −j for its angular frequency
   * @param sums added to
   * @throws ArithmeticException when its vectors cannot be found
   */
  public void addRoot(Complex root, Complex weight, ElementSensitivities sums) {
    at(root.re() * (1 + BESIDE), root.im() * (1 + BESIDE));
    double[] right = weights();
    double[] left = weights();
    Arrays.fill(right, 1);
    Arrays.fill(left, 1);
    for (int turn = 0; turn < TURNS; turn++) {
      right = unit(turned(capacitive(right, false), false));
      left = unit(turned(capacitive(left, true), true));
    }
    re = root.re();
    im = root.im();
    Complex factor = weight.over(product(left, capacitive(right, false)));
    if (!Double.isFinite(factor.re()) || !Double.isFinite(factor.im())) {
      throw new ArithmeticException("the natural frequency has no vectors of its own");
    }
    double[] scaled = weights();
    for (int i = 0; i < unknowns; i++) {
      Complex.at(left, i).times(factor).addTo(scaled, i);
    }
    addForm(scaled, right, sums);
  }

  private double[] turned(double[] vector, boolean transposed) {
    if (transposed) {
      system.solveTransposed(vector);
    } else {
      system.solve(vector);
    }
    return vector;
  }

  private static double[] unit(double[] vector) {
    double largest = 0;
    for (double value : vector) {
      largest = Math.max(largest, Math.abs(value));
    }
    for (int i = 0; i < vector.length; i++) {
      vector[i] /= largest;
    }
    return vector;
  }

  private void addForm(double[] y, double[] x, ElementSensitivities sums) {
    BilinearForm form = new BilinearForm(y, x, re, im);
    double[] byUnknown = new double[unknowns];
    for (Element element : state.circuit().elements()) {
      element.addLinearSensitivity(state, form, byUnknown, sums);
    }
    ofState.add(byUnknown, sums);
  }

  /** C x, or Cᵀx. */
  private double[] capacitive(double[] x, boolean transposed) {
    SparsityPattern pattern = state.circuit().pattern();
    double[] c = state.stamps().c;
    double[] product = weights();
    for (int slot = 0; slot < c.length; slot++) {
      int row = transposed ? pattern.column(slot) : pattern.row(slot);
      int column = transposed ? pattern.row(slot) : pattern.column(slot);
      product[2 * row] += c[slot] * x[2 * column];
      product[2 * row + 1] += c[slot] * x[2 * column + 1];
    }
    return product;
  }

  private static Complex product(double[] one, double[] other) {
    Complex sum = new Complex(0, 0);
    for (int i = 0; i < one.length / 2; i++) {
      sum = sum.plus(Complex.at(one, i).times(Complex.at(other, i)));
    }
    return sum;
  }
}
