package loopwright.laws;

import java.util.Arrays;
import loopwright.circuit.Lead;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.DenseComplexSystem;
import loopwright.numeric.SparsityPattern;
import loopwright.solve.LinearNetwork;
import org.hipparchus.complex.Complex;

/**
 * The loop cut open in its lead, seen from the two ends of the cut, x on the network's side and y
 * on the amplifier's. With the open-circuit impedances z of these two ports, double injection gives
 *
 * <pre>
 * T = (z_yx − z_xy)/(z_xx + z_yy − 2 z_yx),   1 + T = (z_xx + z_yy − z_xy − z_yx)/(z_xx + z_yy − 2 z_yx)
 * </pre>
 *
 * (worked out from T = (T_v T_i − 1)/(T_v + T_i + 2)), so that the poles of T are the roots of the
 * cut circuit's determinant times z_xx + z_yy − 2 z_yx.
 */
final class BrokenLoop {
  private final ComplexSystem system;
  private final double[] g;
  private final double[] c;
  private final int x;
  private final int y;
  private final double[] vector;

  BrokenLoop(LinearNetwork network, Lead lead) {
    SparsityPattern closed = network.pattern();
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    for (int slot = 0; slot < closed.slots(); slot++) {
      if (closed.row(slot) != lead.branch()) {
        builder.slot(closed.row(slot), closed.column(slot));
      }
    }
    // The lead's own equation becomes: no current.
    int cut = builder.slot(lead.branch(), lead.branch());
    SparsityPattern open = builder.build(closed.size());
    this.g = new double[open.slots()];
    this.c = new double[open.slots()];
    for (int slot = 0; slot < closed.slots(); slot++) {
      if (closed.row(slot) != lead.branch()) {
        int at = builder.slot(closed.row(slot), closed.column(slot));
        g[at] += network.g()[slot];
        c[at] += network.c()[slot];
      }
    }
    g[cut] = 1;
    this.system = new DenseComplexSystem(open);
    this.vector = new double[2 * open.size()];
    this.x = lead.from();
    this.y = lead.to();
  }

  /** T at a complex frequency by the impedances of the cut. */
  Complex loopGain(double re, double im) {
    factor(re, im);
    Complex xy = impedance(x, y);
    Complex yx = impedance(y, x);
    return yx.subtract(xy).divide(poles(yx));
  }

  /** Argument of the polynomial whose roots are the poles of T. */
  double poleArgument(double re, double im) {
    factor(re, im);
    return system.determinantArgument() + poles(impedance(y, x)).getArgument();
  }

  private Complex poles(Complex yx) {
    return impedance(x, x).add(impedance(y, y)).subtract(yx.multiply(2));
  }

  private void factor(double re, double im) {
    if (!system.factor(g, c, re, im)) {
      throw new ArithmeticException("the cut circuit is singular at " + re + " + j " + im);
    }
  }

  /** Voltage at one node for a current into another. */
  private Complex impedance(int at, int into) {
    Arrays.fill(vector, 0);
    vector[2 * into] = 1;
    system.solve(vector);
    return new Complex(vector[2 * at], vector[2 * at + 1]);
  }
}
