package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.IntStream;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.numeric.SparsityPattern;
import loopwright.solve.GeneratorWalk;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

/** What is called solved is solved, and what is reached by a walk does not depend on the way. */
class SolutionTest {
  private static final int DESIGNS = 60;

  /** The definition's own: the last step below 1e-9 V at every node. */
  private static final double STEP = 1e-9;

  /** One more Newton step, by another library, moves no node at rest nor on the way up and down. */
  @Test
  void aSolvedStateStaysWhereItIs() {
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      CircuitState rest = Solved.atRest(hookup);
      assertThat(step(rest)).as("%s at rest", design.name()).isLessThan(STEP);
      for (int direction : new int[] {1, -1}) {
        GeneratorWalk walk = walk(hookup, rest);
        boolean reached = walk.advance(rest.generator() + direction * amplitude(design));
        assertThat(step(walk.state()))
            .as("%s at generator %s, reached %s", design.name(), walk.generator(), reached)
            .isLessThan(STEP);
      }
    }
  }

  /** Up, down and back to rest: every level is the same state in either direction. */
  @Test
  void aSweepIsTheSameBothWays() {
    int whole = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      CircuitState rest = Solved.atRest(hookup);
      double reach = amplitude(design);
      List<Double> up =
          IntStream.rangeClosed(0, 8)
              .mapToObj(k -> rest.generator() + reach * (k - 4) / 4)
              .toList();
      GeneratorWalk walk = walk(hookup, rest);
      if (!walk.advance(up.get(0))) {
        continue;
      }
      double[][] rising = new double[up.size()][];
      boolean through = true;
      for (int k = 0; k < up.size() && through; k++) {
        through = walk.advance(up.get(k));
        rising[k] = walk.state().unknowns().clone();
      }
      for (int k = up.size() - 1; k >= 0 && through; k--) {
        through = walk.advance(up.get(k));
        for (int node = 0; through && node < hookup.circuit().nodes(); node++) {
          assertThat(Math.abs(walk.state().unknowns()[node] - rising[k][node]))
              .as("%s at %s", design.name(), hookup.circuit().nodeName(node))
              .isLessThan(10 * STEP);
        }
      }
      whole += through ? 1 : 0;
    }
    assertThat(whole).isGreaterThanOrEqualTo(DESIGNS - 2);
  }

  private static double amplitude(Design design) {
    return design.hookups().get(0).source().amplitude().value();
  }

  private static GeneratorWalk walk(AssembledHookup hookup, CircuitState rest) {
    CircuitState held = rest.copy();
    held.holdBlockingCapacitors();
    return new GeneratorWalk(hookup, held, amplitude(hookup.design()));
  }

  /** Largest movement of a node in a Newton step from a state, V. */
  private static double step(CircuitState solved) {
    CircuitState state = solved.copy();
    state.evaluate();
    SparsityPattern pattern = state.circuit().pattern();
    double[][] matrix = new double[pattern.size()][pattern.size()];
    for (int slot = 0; slot < pattern.slots(); slot++) {
      matrix[pattern.row(slot)][pattern.column(slot)] += state.stamps().g[slot];
    }
    double[] f = state.stamps().f.clone();
    for (int row = 0; row < f.length; row++) {
      double largest = 0;
      for (double value : matrix[row]) {
        largest = Math.max(largest, Math.abs(value));
      }
      for (int column = 0; column < f.length; column++) {
        matrix[row][column] /= largest;
      }
      f[row] /= largest;
    }
    double[] step =
        new LUDecomposition(new Array2DRowRealMatrix(matrix, false), 0)
            .getSolver()
            .solve(new ArrayRealVector(f, false))
            .toArray();
    double largest = 0;
    for (int node = 0; node < state.circuit().nodes(); node++) {
      largest = Math.max(largest, Math.abs(step[node]));
    }
    return largest;
  }
}
