package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.NoiseSource;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NoiseSolver;
import org.junit.jupiter.api.Test;

/** The noise of every random design, once by one adjoint solution and once source by source. */
class NoiseTransfersTest {
  private static final int DESIGNS = 60;

  @Test
  void oneAdjointSolutionGivesWhatASolutionForEachSourceGives() {
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      CircuitState rest = Solved.atRest(hookup);
      LinearNetwork network = new LinearNetwork(hookup);
      network.linearise(rest);
      NoiseSolver solver = new NoiseSolver(network, rest, hookup.out());
      assertThat(solver.sources()).hasSizeGreaterThan(8);
      for (double frequency : new double[] {10, 1e3, 1e6}) {
        double[] adjoint = solver.densities(frequency);
        double[] direct = direct(network, solver.sources(), frequency, hookup.out());
        double total = Arrays.stream(direct).sum();
        for (int i = 0; i < direct.length; i++) {
          assertThat(adjoint[i])
              .as("%s, %s at %s Hz", design.name(), solver.sources().get(i), frequency)
              .isCloseTo(direct[i], within(1e-9 * total));
        }
      }
    }
  }

  private static double[] direct(
      LinearNetwork network, List<NoiseSource> sources, double frequency, int out) {
    double[] densities = new double[sources.size()];
    for (int i = 0; i < densities.length; i++) {
      NoiseSource source = sources.get(i);
      double[] to = transfer(network, frequency, source.to(), out);
      double[] from = transfer(network, frequency, source.from(), out);
      double size = Math.hypot(to[0] - from[0], to[1] - from[1]);
      densities[i] = size * size * source.density(frequency);
    }
    return densities;
  }

  private static double[] transfer(LinearNetwork network, double frequency, int row, int out) {
    return row < 0 ? new double[2] : network.response(frequency, row, out);
  }
}
