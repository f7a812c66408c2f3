package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import loopwright.circuit.Circuit;
import loopwright.circuit.FollowerChain;
import loopwright.numeric.SystemFamily;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import loopwright.solve.SmallSignalCircuit;
import org.junit.jupiter.api.Test;

/**
 * The multiplications of one factorisation and solution of a chain grow hardly faster than its
 * length: exponent by least squares over the logarithms.
 */
class ChainGrowthTest {
  private static final double MOST = 1.2;

  /** Every unknown takes part. */
  private static final double LEAST = 0.95;

  private static final int[] UNKNOWNS = {30, 100, 300, 1000};

  @Test
  void theWorkGrowsHardlyFasterThanTheLength() {
    double x = 0;
    double y = 0;
    double xx = 0;
    double xy = 0;
    for (int unknowns : UNKNOWNS) {
      Circuit circuit = FollowerChain.ofUnknowns(unknowns);
      assertThat(circuit.unknowns()).isBetween(unknowns - 4, unknowns);
      OperatingPoint point = OperatingPointSolver.solve(circuit);
      assertThat(point).isInstanceOf(OperatingPoint.Found.class);
      SmallSignalCircuit network = new SmallSignalCircuit(circuit);
      network.linearise(((OperatingPoint.Found) point).state());
      network.response(1e6, 0, circuit.node("node1"));
      SystemFamily systems = circuit.systems();
      double n = Math.log(circuit.unknowns());
      double work = Math.log(systems.multiplyAdds());
      x += n;
      y += work;
      xx += n * n;
      xy += n * work;
      assertThat(systems.denseFallbacks()).isZero();
    }
    int count = UNKNOWNS.length;
    double exponent = (count * xy - x * y) / (count * xx - x * x);
    assertThat(exponent).isBetween(LEAST, MOST);
  }
}
