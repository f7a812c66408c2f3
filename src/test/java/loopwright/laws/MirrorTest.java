package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Comparator;
import java.util.List;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.DesignValidation;
import loopwright.design.MirroredDesigns;
import loopwright.design.RandomDesigns;
import loopwright.solve.LinearNetwork;
import loopwright.solve.MidbandNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NaturalFrequencies.Pole;
import org.junit.jupiter.api.Test;

/**
 * A design and its twin of the other polarity show mirrored voltages and equal small-signal
 * figures. A V_BE multiplier is an npn in both: between its two ends that makes no difference at
 * rest, but its capacitances sit elsewhere.
 */
class MirrorTest {
  private static final int DESIGNS = 80;

  /** Two paths to one solution leave this much, V. */
  private static final double VOLTS = 1e-8;

  @Test
  void twinsAreMirrorImages() {
    int dynamic = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      Design twin = MirroredDesigns.of(design);
      assertThat(DesignValidation.check(twin)).as(twin.name()).isEmpty();
      AssembledHookup one = Solved.assembled(design);
      AssembledHookup other = Solved.assembled(twin);
      CircuitState ours = Solved.atRest(one);
      CircuitState theirs = Solved.atRest(other);
      checkVoltages(design, one, ours, theirs);
      assertThat(new MidbandNetwork(other, theirs).gain())
          .as(design.name())
          .isCloseTo(
              new MidbandNetwork(one, ours).gain(),
              within(1e-6 * Math.abs(new MidbandNetwork(one, ours).gain()) + 1e-12));
      if (!MirroredDesigns.hasMultiplier(design)) {
        checkFrequencies(design, linear(one, ours), linear(other, theirs));
        dynamic++;
      }
    }
    assertThat(dynamic).isGreaterThan(DESIGNS / 2);
  }

  private static void checkVoltages(
      Design design, AssembledHookup one, CircuitState ours, CircuitState theirs) {
    for (String node : one.circuit().nodeNames()) {
      if (!Nodes.isInternal(node) && !MirroredDesigns.unlike().contains(node)) {
        double volts = ours.voltage(node);
        assertThat(theirs.voltage(MirroredDesigns.name(design, node)))
            .as("%s at %s", design.name(), node)
            .isCloseTo(-volts, within(VOLTS * (1 + Math.abs(volts))));
      }
    }
  }

  private static LinearNetwork linear(AssembledHookup hookup, CircuitState state) {
    LinearNetwork network = new LinearNetwork(hookup);
    network.linearise(state);
    return network;
  }

  private static void checkFrequencies(Design design, LinearNetwork one, LinearNetwork other) {
    for (double frequency : new double[] {1, 1e3, 1e5, 1e7}) {
      double[] ours = one.response(frequency);
      double[] theirs = other.response(frequency);
      assertThat(Math.hypot(ours[0] - theirs[0], ours[1] - theirs[1]))
          .as("%s at %s Hz", design.name(), frequency)
          .isLessThan(1e-6 * Math.hypot(ours[0], ours[1]) + 1e-12);
    }
    List<Pole> growing = growing(one);
    List<Pole> theirs = growing(other);
    assertThat(theirs).as(design.name()).hasSameSizeAs(growing);
    for (int i = 0; i < growing.size(); i++) {
      double apart =
          Math.hypot(
              growing.get(i).re() - theirs.get(i).re(), growing.get(i).im() - theirs.get(i).im());
      assertThat(apart).as(design.name()).isLessThan(1e-6 * growing.get(i).magnitude());
    }
  }

  private static List<Pole> growing(LinearNetwork network) {
    return new NaturalFrequencies(network)
        .of(network).stream()
            .filter(Pole::grows)
            .sorted(Comparator.comparingDouble(Pole::im).thenComparingDouble(Pole::re))
            .toList();
  }
}
