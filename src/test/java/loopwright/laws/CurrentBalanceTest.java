package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import org.junit.jupiter.api.Test;

/**
 * Kirchhoff's current law at every node of every random design: the parts are connected as the
 * format's page says, and what flows at the solved voltages adds up to nothing.
 */
class CurrentBalanceTest {
  private static final int DESIGNS = 200;

  @Test
  void currentsBalanceAtEveryNode() {
    RandomDesigns.of(DESIGNS).forEach(CurrentBalanceTest::check);
  }

  private static void check(Design design) {
    CircuitState state = Solved.atRest(design);
    AssembledHookup hookup = Solved.assembled(design);
    Wiring wiring = new Wiring();
    new HookupWiring(design, design.hookups().get(0), wiring).add();
    new StageWiring(design, wiring).add();
    CurrentSum sum = new CurrentSum(hookup, state, wiring);
    Set<String> fed =
        Stream.of("ground", "generator", "ideal.positive", "ideal.negative")
            .map(wiring::node)
            .collect(Collectors.toSet());

    sum.nodes()
        .forEach(
            (name, node) -> {
              if (!fed.contains(name)) {
                // Half as much again for what two ways of rounding leave.
                assertThat(Math.abs(node.leaving()))
                    .as("%s at %s", design.name(), name)
                    .isLessThanOrEqualTo(1.5 * node.allowed());
              }
            });
    for (String device : new String[] {"pair.q1", "pair.q2", "gain.q1"}) {
      assertThat(wiring.transistors()).anyMatch(at -> at.role().equals(device));
    }
    assertThat(wiring.transistors().size() + wiring.diodes().size())
        .isEqualTo(hookup.circuit().devices().size());
    checkSupply(hookup, state, sum, wiring, "ideal.positive", 1);
    checkSupply(hookup, state, sum, wiring, "ideal.negative", -1);
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
