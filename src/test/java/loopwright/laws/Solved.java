package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;

/** Random designs solved; one that cannot be solved fails the test with its reason. */
final class Solved {
  private Solved() {}

  /** The circuit of a design's first hookup, every junction at ambient. */
  static AssembledHookup assembled(Design design) {
    return Assembler.assemble(design, design.hookups().get(0));
  }

  /** The circuit at rest. */
  static CircuitState atRest(Design design) {
    return atRest(assembled(design));
  }

  /** The circuit at rest. */
  static CircuitState atRest(AssembledHookup hookup) {
    OperatingPoint point = OperatingPointSolver.solve(hookup.circuit());
    assertThat(point)
        .as("%s: %s", hookup.design().name(), point)
        .isInstanceOf(OperatingPoint.Found.class);
    return ((OperatingPoint.Found) point).state();
  }
}
