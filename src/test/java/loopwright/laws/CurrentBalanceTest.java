package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Set;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.solve.GeneratorWalk;
import org.junit.jupiter.api.Test;

/**
 * Kirchhoff's current law at every node of every random design: the parts are connected as the
 * format's page says, and what flows at the solved voltages adds up to nothing.
 */
class CurrentBalanceTest {
  private static final int DESIGNS = 200;

  @Test
  void currentsBalanceAtRest() {
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      CircuitState rest = Solved.atRest(hookup);
      Wiring wiring = Wiring.of(design);
      CurrentSum sum = checkNodes(hookup, rest, wiring, wiring.fed());
      checkSupply(hookup, rest, sum, wiring, "ideal.positive", 1);
      checkSupply(hookup, rest, sum, wiring, "ideal.negative", -1);
      for (String device : new String[] {"pair.q1", "pair.q2", "gain.q1"}) {
        assertThat(wiring.transistors()).anyMatch(at -> at.role().equals(device));
      }
      assertThat(wiring.transistors().size() + wiring.diodes().size())
          .isEqualTo(hookup.circuit().devices().size());
    }
  }

  /** Over the swing blocking capacitors carry a current: nodes that they touch are left out. */
  @Test
  void currentsBalanceOverTheSwing() {
    for (Design design : RandomDesigns.of(DESIGNS / 2).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      CircuitState rest = Solved.atRest(hookup);
      rest.holdBlockingCapacitors();
      Wiring wiring = Wiring.of(design);
      Set<String> leftOut = wiring.fed();
      for (Wiring.Capacitance capacitor : wiring.capacitances()) {
        if (capacitor.blocking()) {
          leftOut.add(wiring.node(capacitor.from()));
          leftOut.add(wiring.node(capacitor.to()));
        }
      }
      double amplitude = design.hookups().get(0).source().amplitude().value();
      for (double share : new double[] {0.5, 1, -0.5, -1}) {
        GeneratorWalk walk = new GeneratorWalk(hookup, rest, amplitude / 4);
        walk.advance(rest.generator() + share * amplitude);
        checkNodes(hookup, walk.state(), wiring, leftOut);
      }
    }
  }

  private static CurrentSum checkNodes(
      AssembledHookup hookup, CircuitState state, Wiring wiring, Set<String> leftOut) {
    CurrentSum sum = new CurrentSum(hookup, state, wiring);
    sum.nodes()
        .forEach(
            (name, node) -> {
              if (!leftOut.contains(name)) {
                assertThat(Math.abs(node.leaving()))
                    .as("%s at %s", hookup.design().name(), name)
                    .isLessThanOrEqualTo(CurrentSum.ROUNDED_TWICE * node.allowed());
              }
            });
    assertThat(sum.nodes()).hasSizeGreaterThan(8);
    return sum;
  }

  /** What the supply delivers is what leaves its node. */
  private static void checkSupply(
      AssembledHookup hookup,
      CircuitState state,
      CurrentSum sum,
      Wiring wiring,
      String node,
      int side) {
    String name = wiring.node(node);
    if (name.equals(wiring.node("ground")) || !sum.nodes().containsKey(name)) {
      return;
    }
    double delivered =
        (side > 0 ? hookup.positiveSupply() : hookup.negativeSupply()).current(state);
    CurrentSum.Node at = sum.nodes().get(name);
    assertThat(delivered)
        .as("%s at %s", hookup.design().name(), node)
        .isCloseTo(at.leaving(), within(10 * at.allowed()));
  }
}
