package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loopwright.assembly.AssembledHookup;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.numeric.ComplexSystem;
import loopwright.numeric.DenseComplexSystem;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NaturalFrequencies.Pole;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

/**
 * Growing natural frequencies against what the argument principle counts, for the circuit's
 * determinant, and for the loop gain: clockwise encirclements of −1 by T plus T's own poles in the
 * right half-plane (Nyquist, Bell System Technical Journal 11, 1932, 126–147, from memory).
 */
class EncirclementTest {
  private static final int DESIGNS = 40;

  @Test
  void rootsAndEncirclementsAgree() {
    int growing = 0;
    int loops = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      LinearNetwork network = new LinearNetwork(hookup);
      network.linearise(Solved.atRest(hookup));
      List<Pole> poles = new NaturalFrequencies(network).of(network);
      int count = poles.stream().filter(Pole::grows).mapToInt(p -> p.im() > 0 ? 2 : 1).sum();
      double[] seams = poles.stream().mapToDouble(Pole::im).filter(w -> w > 0).toArray();

      assertThat(HalfPlane.count(determinant(network), seams))
          .as("%s: roots of the determinant", design.name())
          .isEqualTo(count);
      if (!hookup.isOpen()) {
        BrokenLoop broken = new BrokenLoop(network, hookup.feedbackLead());
        int own = HalfPlane.count(broken::poleArgument, seams);
        int encirclements = HalfPlane.count((re, im) -> difference(broken, re, im), seams);
        assertThat(encirclements + own)
            .as("%s: encirclements %d, poles of T %d", design.name(), encirclements, own)
            .isEqualTo(count);
        checkLoopGain(design, network, broken);
        loops++;
      }
      growing += count > 0 ? 1 : 0;
    }
    assertThat(growing).isBetween(DESIGNS / 10, DESIGNS / 2);
    assertThat(loops).isGreaterThan(DESIGNS / 2);
  }

  /** Zeros less poles of 1 + T. */
  private static double difference(BrokenLoop broken, double re, double im) {
    return broken.loopGain(re, im).add(1).getArgument();
  }

  /** The loop gain that the program shows is the one that is counted here. */
  private static void checkLoopGain(Design design, LinearNetwork network, BrokenLoop broken) {
    for (double frequency : new double[] {0.1, 1e3, 1e5, 1e6, 1e7, 1e8}) {
      double[] shown = network.loopGain(frequency);
      Complex counted = broken.loopGain(0, 2 * Math.PI * frequency);
      assertThat(counted.subtract(new Complex(shown[0], shown[1])).norm())
          .as("%s at %s Hz", design.name(), frequency)
          .isLessThan(1e-6 * counted.norm() + 1e-9);
    }
  }

  private static HalfPlane.Argument determinant(LinearNetwork network) {
    ComplexSystem system = new DenseComplexSystem(network.pattern());
    return (re, im) -> {
      if (!system.factor(network.g(), network.c(), re, im)) {
        throw new ArithmeticException("the circuit is singular at " + re + " + j " + im);
      }
      return system.determinantArgument();
    };
  }
}
