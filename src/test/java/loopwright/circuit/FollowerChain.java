package loopwright.circuit;

import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;

/**
 * A ladder of resistors and capacitors with an emitter follower in every section, NPN and PNP in
 * turn so that their V_BE cancel: a circuit of any length, four unknowns a section.
 */
public final class FollowerChain {
  private static final int UNKNOWNS_PER_SECTION = 4;
  private static final double KELVIN = 298.15;
  private static final double RAIL = 10;
  private static final double SATURATION_CURRENT = 1e-14;
  private static final double BETA = 200;

  private FollowerChain() {}

  /** The longest chain of so many unknowns at the most. */
  public static Circuit ofUnknowns(int most) {
    // Two supplies and the generator with their branches, and the node behind them.
    return of((most - 6) / UNKNOWNS_PER_SECTION);
  }

  /** A chain of so many sections. */
  static Circuit of(int sections) {
    CircuitBuilder chain = new CircuitBuilder(KELVIN);
    chain.supply("supply.positive", "positive", RAIL);
    chain.supply("supply.negative", "negative", -RAIL);
    chain.generator("generator", "node0", 0);
    TransistorParameters parameters =
        IdealParts.withNoise(IdealParts.transistor(SATURATION_CURRENT, BETA), 100, 0);
    for (int k = 1; k <= sections; k++) {
      boolean npn = k % 2 == 1;
      String ladder = "ladder" + k;
      String node = "node" + k;
      chain.resistor("along" + k, "node" + (k - 1), ladder, 1e3);
      chain.capacitor("across" + k, ladder, CircuitBuilder.GROUND, 10e-12);
      chain.transistor(
          "q" + k,
          npn ? Polarity.NPN : Polarity.PNP,
          "collector" + k,
          ladder,
          node,
          parameters,
          KELVIN);
      chain.resistor("decoupling" + k, npn ? "positive" : "negative", "collector" + k, 100);
      chain.resistor("tail" + k, npn ? "negative" : "positive", node, 10e3);
    }
    return chain.build(2e-12);
  }
}
