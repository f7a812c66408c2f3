package loopwright.circuit;

import java.util.Arrays;

/**
 * Where elements put their currents, charges and derivatives. The matrices G and C are kept by
 * slot, see {@link loopwright.numeric.SparsityPattern}; the vectors by unknown. Ground has index −1
 * and is dropped.
 *
 * <p>The arrays are shared on purpose: solvers read them in hot loops.
 */
public final class Stamps {
  /** ∂f/∂x by slot, S (or 1, Ω in branch rows). */
  public final double[] g;

  /** ∂q/∂x by slot, F (or H in branch rows). */
  public final double[] c;

  /** Sum of the currents that leave each node, A; the residual in branch rows, V. */
  public final double[] f;

  /** Sum of the charges at each node, C; flux in branch rows, Vs. */
  public final double[] q;

  /** Sum of the magnitudes of those currents, A; of voltages in branch rows. */
  public final double[] currentScale;

  /** Sum of small-signal conductance × |voltage| over what meets at each node, A. */
  public final double[] conductanceScale;

  /** Arrays for a circuit of so many unknowns and slots. */
  Stamps(int unknowns, int slots) {
    g = new double[slots];
    c = new double[slots];
    f = new double[unknowns];
    q = new double[unknowns];
    currentScale = new double[unknowns];
    conductanceScale = new double[unknowns];
  }

  /** Element of a vector by unknown; ground, index −1, is zero. */
  static double at(double[] vector, int unknown) {
    return unknown < 0 ? 0 : vector[unknown];
  }

  /** Adds to an element of a vector by unknown; ground is dropped. */
  static void add(double[] vector, int unknown, double value) {
    if (unknown >= 0) {
      vector[unknown] += value;
    }
  }

  void clear() {
    Arrays.fill(g, 0);
    Arrays.fill(c, 0);
    Arrays.fill(f, 0);
    Arrays.fill(q, 0);
    Arrays.fill(currentScale, 0);
    Arrays.fill(conductanceScale, 0);
  }

  /** Adds a conductance to a slot of G. */
  void conductance(int slot, double value) {
    if (slot >= 0) {
      g[slot] += value;
    }
  }

  /** Adds a capacitance to a slot of C. */
  void capacitance(int slot, double value) {
    if (slot >= 0) {
      c[slot] += value;
    }
  }

  /**
   * Adds a current that leaves a node.
   *
   * @param node its index
   * @param current A
   * @param conducted conductance × |voltage| behind it, A
   */
  void current(int node, double current, double conducted) {
    if (node >= 0) {
      f[node] += current;
      currentScale[node] += Math.abs(current);
      conductanceScale[node] += conducted;
    }
  }

  /** Adds a charge to a node. */
  void charge(int node, double charge) {
    if (node >= 0) {
      q[node] += charge;
    }
  }
}
