package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.solve.GeneratorWalk;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * In the dead zone of an unbiased output stage the loop is open, and a gain stage on an ideal
 * current source has a gain of 1e7 and more, so that no generator voltage holds its output anywhere
 * within the zone. That is steep, but it is no jump: a pseudo-arclength walk by another program
 * finds no fold.
 */
class SteepPlacesTest {
  @ParameterizedTest
  @ValueSource(longs = {105, 265, 298})
  void aWalkPassesTheDeadZone(long seed) {
    Design design = RandomDesigns.of(seed);
    AssembledHookup hookup = Solved.assembled(design);
    CircuitState rest = Solved.atRest(hookup);
    rest.holdBlockingCapacitors();
    double amplitude = design.hookups().get(0).source().amplitude().value();
    GeneratorWalk walk = new GeneratorWalk(hookup, rest, amplitude / 8);
    double steepest = 0;
    double target = rest.generator() - amplitude;
    while (walk.generator() != target) {
      double before = walk.state().voltage("gainOut");
      double from = walk.generator();
      assertThat(walk.step(target)).as("at %s V", walk.generator()).isTrue();
      double slope = (walk.state().voltage("gainOut") - before) / (walk.generator() - from);
      steepest = Math.max(steepest, Math.abs(slope));
    }
    assertThat(steepest).isGreaterThan(1e7);

    assertThat(walk.advance(rest.generator())).isTrue();
    for (String node : new String[] {"out", "gainOut", "pairOut", "tail"}) {
      assertThat(Math.abs(walk.state().voltage(node) - rest.voltage(node))).isLessThan(1e-8);
    }
  }
}
