package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.function.Consumer;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.RealSystem;
import loopwright.numeric.SparsityPattern;
import loopwright.numeric.SystemFamily;

/**
 * The linear systems of a circuit at one state, solved through the circuit's own {@link
 * SystemFamily} as the program does: plain and transposed, with an excitation of one row and with
 * one of all rows; the complex ones at some frequencies from 1 Hz to 1 GHz.
 */
final class SolvedSystems {
  private static final double LOWEST = 1;
  private static final double HIGHEST = 1e9;
  private static final double[] NONE = {};

  private final String name;
  private final SparsityPattern pattern;
  private final RealSystem real;
  private final ComplexSystem complex;
  private final Random random;
  private final Consumer<LinearProblem> check;

  SolvedSystems(String name, Circuit circuit, long seed, Consumer<LinearProblem> check) {
    this.name = name;
    this.pattern = circuit.pattern();
    this.real = circuit.systems().real();
    this.complex = circuit.systems().complex();
    this.random = new Random(seed);
    this.check = check;
  }

  /** Solves what a state gives, which is evaluated already. */
  void solveAt(CircuitState state, int frequencies) {
    double[] g = state.stamps().g.clone();
    double[] c = state.stamps().c.clone();
    assertThat(real.factor(g)).as("%s: the static equations are singular", name).isTrue();
    for (boolean transposed : new boolean[] {false, true}) {
      for (double[] b : rightHandSides(1)) {
        double[] x = b.clone();
        if (transposed) {
          real.solveTransposed(x);
        } else {
          real.solve(x);
        }
        String what = name + (transposed ? ", static, transposed" : ", static");
        check.accept(new LinearProblem(what, pattern, g, NONE, transposed, b, x));
      }
    }
    for (int k = 0; k < frequencies; k++) {
      double frequency =
          LOWEST * Math.pow(HIGHEST / LOWEST, (k + random.nextDouble()) / frequencies);
      solveAt(g, c, frequency);
    }
  }

  private void solveAt(double[] g, double[] c, double frequency) {
    double omega = 2 * Math.PI * frequency;
    assertThat(complex.factor(g, c, 0, omega)).as("%s at %s Hz", name, frequency).isTrue();
    double[] im = new double[c.length];
    for (int slot = 0; slot < c.length; slot++) {
      im[slot] = omega * c[slot];
    }
    for (boolean transposed : new boolean[] {false, true}) {
      for (double[] b : rightHandSides(2)) {
        double[] x = b.clone();
        if (transposed) {
          complex.solveTransposed(x);
        } else {
          complex.solve(x);
        }
        String what = name + ", " + frequency + " Hz" + (transposed ? ", transposed" : "");
        check.accept(new LinearProblem(what, pattern, g, im, transposed, b, x));
      }
    }
  }

  private double[][] rightHandSides(int parts) {
    double[] one = new double[parts * pattern.size()];
    one[parts * random.nextInt(pattern.size())] = 1;
    return new double[][] {one, random.doubles(parts * pattern.size(), -1, 1).toArray()};
  }
}
