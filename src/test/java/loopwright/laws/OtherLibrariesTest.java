package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.numeric.DenseComplexSystem;
import loopwright.numeric.SparsityPattern;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NaturalFrequencies.Pole;
import org.hipparchus.complex.Complex;
import org.hipparchus.complex.ComplexField;
import org.hipparchus.linear.Array2DRowFieldMatrix;
import org.hipparchus.linear.ArrayFieldVector;
import org.hipparchus.linear.FieldLUDecomposition;
import org.hipparchus.linear.FieldMatrix;
import org.junit.jupiter.api.Test;

/** Responses and natural frequencies of random designs against Hipparchus and against EJML. */
class OtherLibrariesTest {
  private static final int DESIGNS = 15;
  private static final int ROOTS_OF = 8;

  private static final double[] FREQUENCIES = {0.1, 100, 1e4, 1e6, 3e7, 1e9};

  @Test
  void responsesAreThoseOfOtherLibraries() {
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      LinearNetwork network = linear(design);
      int generator = network.hookup().generator().branch();
      int out = network.hookup().out();
      for (double frequency : FREQUENCIES) {
        double[] shown = network.response(frequency);
        Complex ours = new Complex(shown[0], shown[1]);
        Complex byHipparchus = byHipparchus(network, frequency, generator, out);
        Complex byEjml = byEjml(network, frequency, generator, out);
        double scale = byHipparchus.norm() + 1e-12;
        assertThat(ours.subtract(byHipparchus).norm() / scale)
            .as("%s at %s Hz", design.name(), frequency)
            .isLessThan(1e-7);
        assertThat(ours.subtract(byEjml).norm() / scale)
            .as("%s at %s Hz", design.name(), frequency)
            .isLessThan(1e-7);
      }
    }
  }

  /**
   * Newton's step for a root of det(G + sC), −1/tr((G + sC)⁻¹C), worked out by Hipparchus, moves no
   * natural frequency; and within a circle there are as many roots as the determinant turns.
   */
  @Test
  void naturalFrequenciesAreAllTheRootsOfTheDeterminant() {
    for (Design design : RandomDesigns.of(ROOTS_OF).toList()) {
      LinearNetwork network = linear(design);
      List<Complex> roots =
          new NaturalFrequencies(network)
              .of(network).stream()
                  .filter(pole -> pole.magnitude() < 1e11)
                  .flatMap(OtherLibrariesTest::both)
                  .toList();
      assertThat(roots).as(design.name()).hasSizeGreaterThan(5);
      for (Complex root : roots) {
        if (root.getImaginary() >= 0) {
          assertThat(newtonStep(network, root).norm() / root.norm())
              .as("%s: %s", design.name(), root)
              .isLessThan(1e-5);
        }
      }
      for (double radius : new double[] {3e5, 1e7, 3e8, 1e10}) {
        assertThat(rootsWithin(network, radius))
            .as("%s: within %s rad/s", design.name(), radius)
            .isEqualTo(roots.stream().filter(root -> root.norm() < radius).count());
      }
    }
  }

  private static Stream<Complex> both(Pole pole) {
    Complex root = new Complex(pole.re(), pole.im());
    return pole.im() > 0 ? Stream.of(root, root.conjugate()) : Stream.of(root);
  }

  private static Complex newtonStep(LinearNetwork network, Complex root) {
    SparsityPattern pattern = network.pattern();
    FieldMatrix<Complex> inverse =
        new FieldLUDecomposition<>(matrix(network, root)).getSolver().getInverse();
    Complex trace = Complex.ZERO;
    for (int slot = 0; slot < pattern.slots(); slot++) {
      trace =
          trace.add(
              inverse
                  .getEntry(pattern.column(slot), pattern.row(slot))
                  .multiply(network.c()[slot]));
    }
    return trace.reciprocal();
  }

  /** How often the determinant turns round zero along a circle round zero. */
  private static long rootsWithin(LinearNetwork network, double radius) {
    DenseComplexSystem system = new DenseComplexSystem(network.pattern());
    int steps = 400;
    double turned = 0;
    double before = Double.NaN;
    for (int k = 0; k <= steps; k++) {
      double angle = Math.PI * (k + 0.5) / (steps + 1);
      assertThat(
              system.factor(
                  network.g(), network.c(), radius * Math.cos(angle), radius * Math.sin(angle)))
          .isTrue();
      double argument = system.determinantArgument();
      double turn = k == 0 ? 2 * argument : 2 * Math.IEEEremainder(argument - before, 2 * Math.PI);
      turned += k == 0 ? 0 : turn;
      before = argument;
    }
    return Math.round(turned / (2 * Math.PI));
  }

  private static LinearNetwork linear(Design design) {
    AssembledHookup hookup = Solved.assembled(design);
    LinearNetwork network = new LinearNetwork(hookup);
    network.linearise(Solved.atRest(hookup));
    return network;
  }

  private static FieldMatrix<Complex> matrix(LinearNetwork network, Complex frequency) {
    SparsityPattern pattern = network.pattern();
    FieldMatrix<Complex> matrix =
        new Array2DRowFieldMatrix<>(ComplexField.getInstance(), pattern.size(), pattern.size());
    for (int slot = 0; slot < pattern.slots(); slot++) {
      matrix.addToEntry(
          pattern.row(slot),
          pattern.column(slot),
          frequency.multiply(network.c()[slot]).add(network.g()[slot]));
    }
    return matrix;
  }

  private static Complex byHipparchus(LinearNetwork network, double frequency, int row, int out) {
    Complex[] rightHandSide = new Complex[network.pattern().size()];
    Arrays.fill(rightHandSide, Complex.ZERO);
    rightHandSide[row] = Complex.ONE;
    return new FieldLUDecomposition<>(matrix(network, new Complex(0, 2 * Math.PI * frequency)))
        .getSolver()
        .solve(new ArrayFieldVector<>(rightHandSide))
        .getEntry(out);
  }

  private static Complex byEjml(LinearNetwork network, double frequency, int row, int out) {
    DenseComplexSystem system = new DenseComplexSystem(network.pattern());
    assertThat(system.factor(network.g(), network.c(), 0, 2 * Math.PI * frequency)).isTrue();
    double[] vector = new double[2 * network.pattern().size()];
    vector[2 * row] = 1;
    system.solve(vector);
    return new Complex(vector[2 * out], vector[2 * out + 1]);
  }
}
