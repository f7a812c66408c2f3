package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.Stream;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.file.DesignText;
import loopwright.numeric.SparsityPattern;
import org.junit.jupiter.api.Test;

/**
 * The matrices of frequency-domain analysis are the derivatives of what the circuit's own currents
 * and charges do: G of the currents, C of the charges, so that time and frequency agree.
 */
class DerivativesTest {
  private static final int DESIGNS = 60;

  /** Half the span of a difference quotient, V or A. */
  private static final double SPAN = 2e-5;

  private static final String FIGURES =
      """
      {"loopwright": 1, "name": "by its figures", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 500, "inputOffset": "6.1m", "deadZone": 0.6,
         "poles": ["10k", "3M"], "inputResistance": "100k", "inputCapacitance": "10p",
         "inputBiasCurrent": "1u", "commonModeRejection": 1000, "outputResistance": 100},
       "hookups": [{"name": "main", "load": {"resistance": "2k", "capacitance": "1n"},
         "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}]}
      """;

  @Test
  void matricesAreTheDerivativesOfCurrentsAndCharges() {
    Stream.concat(RandomDesigns.of(DESIGNS), Stream.of(DesignText.read(FIGURES)))
        .forEach(
            design -> {
              CircuitState state = Solved.atRest(design);
              check(design, state);
              disturb(state);
              check(design, state);
              state.holdBlockingCapacitors();
              check(design, state);
            });
  }

  /** Moves every node by up to 20 mV from where the currents balance. */
  private static void disturb(CircuitState state) {
    Random random = new Random(11);
    for (int i = 0; i < state.circuit().nodes(); i++) {
      state.unknowns()[i] += 0.04 * (random.nextDouble() - 0.5);
    }
  }

  private static void check(Design design, CircuitState state) {
    SparsityPattern pattern = state.circuit().pattern();
    int size = pattern.size();
    // Twice: a device whose step is limited or whose piece changes needs a second look.
    state.evaluate();
    state.evaluate();
    assertThat(state.limited()).isFalse();
    double[][] g = dense(pattern, state.stamps().g);
    double[][] c = dense(pattern, state.stamps().c);
    for (int column = 0; column < size; column++) {
      double at = state.unknowns()[column];
      double[][] near = ends(state, column, at, SPAN);
      double[][] far = ends(state, column, at, 2 * SPAN);
      state.unknowns()[column] = at;
      for (int row = 0; row < size; row++) {
        // The shares of the quotient's own error: rounding of sums of some volts, amperes,
        // coulombs.
        assertThat((8 * near[0][row] - far[0][row]) / (12 * SPAN))
            .as("%s: G at %s, %s", design.name(), name(state, row), name(state, column))
            .isCloseTo(g[row][column], within(1e-6 * Math.abs(g[row][column]) + rounding(g, row)));
        assertThat((8 * near[1][row] - far[1][row]) / (12 * SPAN))
            .as("%s: C at %s, %s", design.name(), name(state, row), name(state, column))
            .isCloseTo(c[row][column], within(1e-6 * Math.abs(c[row][column]) + rounding(c, row)));
      }
    }
  }

  /** Currents and charges at one end less those at the other. */
  private static double[][] ends(CircuitState state, int column, double at, double span) {
    state.unknowns()[column] = at + span;
    state.evaluate();
    double[] current = state.stamps().f.clone();
    double[] charge = state.stamps().q.clone();
    state.unknowns()[column] = at - span;
    state.evaluate();
    for (int row = 0; row < current.length; row++) {
      current[row] -= state.stamps().f[row];
      charge[row] -= state.stamps().q[row];
    }
    return new double[][] {current, charge};
  }

  private static double rounding(double[][] matrix, int row) {
    double largest = 0;
    for (double value : matrix[row]) {
      largest = Math.max(largest, Math.abs(value));
    }
    return 1e-8 * largest;
  }

  private static double[][] dense(SparsityPattern pattern, double[] values) {
    double[][] matrix = new double[pattern.size()][pattern.size()];
    for (int slot = 0; slot < pattern.slots(); slot++) {
      matrix[pattern.row(slot)][pattern.column(slot)] += values[slot];
    }
    return matrix;
  }

  private static String name(CircuitState state, int unknown) {
    return state.circuit().nodeName(unknown);
  }
}
