package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;

class PolarityTest {
  private static final TransistorParameters PARAMETERS =
      new TransistorParameters(
          1e-14, 200, 4, 60, 0.1, 1e-13, 2, 0, 0, 0, 8e-12, 3e-12, 4e-10, 1e-8, 0);

  /**
   * A pnp at mirrored voltages carries mirrored currents and charges; its derivatives are equal.
   */
  @Test
  void aPnpMirrorsAnNpnExactly() {
    CircuitState npn = state(Polarity.NPN);
    CircuitState pnp = state(Polarity.PNP);
    Random random = new Random(7);
    for (int i = 0; i < 100; i++) {
      for (int node = 0; node < 3; node++) {
        double volts = -1 + 2 * random.nextDouble();
        npn.unknowns()[node] = volts;
        pnp.unknowns()[node] = -volts;
      }
      npn.evaluate();
      pnp.evaluate();
      for (int node = 0; node < 3; node++) {
        assertThat(pnp.stamps().f[node]).isEqualTo(-npn.stamps().f[node]);
        assertThat(pnp.stamps().q[node]).isEqualTo(-npn.stamps().q[node]);
      }
      assertThat(pnp.stamps().g).isEqualTo(npn.stamps().g);
      assertThat(pnp.stamps().c).isEqualTo(npn.stamps().c);
      assertThat(npn.stamps().f[0]).isNotZero();
    }
  }

  /** What goes into a device comes out of it: the rows of each column add up to nothing. */
  @Test
  void currentsAndChargesOfADeviceAddUpToNothing() {
    CircuitState state = state(Polarity.NPN);
    state.unknowns()[0] = 0.3;
    state.unknowns()[1] = 0.65;
    state.evaluate();
    double current = state.stamps().f[0] + state.stamps().f[1] + state.stamps().f[2];
    double charge = state.stamps().q[0] + state.stamps().q[1] + state.stamps().q[2];
    assertThat(Math.abs(current)).isLessThan(1e-15 * Math.abs(state.stamps().f[2]));
    assertThat(Math.abs(charge)).isLessThan(1e-15 * Math.abs(state.stamps().q[2]));
  }

  private static CircuitState state(Polarity polarity) {
    CircuitBuilder builder = new CircuitBuilder(298.15);
    builder.transistor("q", polarity, "c", "b", "e", PARAMETERS, 298.15);
    builder.resistor("ties the emitter", "e", CircuitBuilder.GROUND, 1e3);
    return builder.build(0).newState();
  }
}
