package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.FigureAmplifier;
import loopwright.circuit.Lead;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/**
 * Loop gain by double injection (Middlebrook, International Journal of Electronics 38, 1975,
 * 485–512): with impedances Z₁ into the amplifier and Z₂ into the network, T_v = T(1 + Z₂/Z₁) +
 * Z₂/Z₁ and T_i = T(1 + Z₁/Z₂) + Z₁/Z₂. T = 10, Z₂/Z₁ = 0.25 give 12.75 and 54.
 */
class DoubleInjectionTest {
  private SolvedCircuit loop;
  private Lead lead;

  /** Gain −12.5 behind 1 kΩ works into 4 kΩ: T = 12.5 · 4/5 = 10. */
  @BeforeEach
  void closeTheLoop() {
    CircuitBuilder builder = new CircuitBuilder(298.15);
    builder.supply("reference", "in+", 0);
    builder.resistor("input", "amplifierSide", CircuitBuilder.GROUND, 4e3);
    builder.figureAmplifier(
        new FigureAmplifier.Figures(
            12.5,
            0,
            Double.POSITIVE_INFINITY,
            0,
            -10,
            10,
            1e3,
            Double.POSITIVE_INFINITY,
            new double[0]),
        "in+",
        "amplifierSide",
        "gainOut",
        "networkSide");
    builder.lead("lead", "networkSide", "amplifierSide");
    loop = SolvedCircuit.of(builder);
    lead = loop.circuit().element("lead", Lead.class);
  }

  @Test
  void theVoltageRatioIsThatOfASeriesSource() {
    double network = loop.smallSignal().response(1e3, lead.branch(), lead.from())[0];
    double amplifier = loop.smallSignal().response(1e3, lead.branch(), lead.to())[0];
    assertThat(-network / amplifier).isCloseTo(12.75, within(1e-12));
  }

  @Test
  void theCurrentRatioIsThatOfAShuntSource() {
    double alongLead = loop.smallSignal().response(1e3, lead.to(), lead.branch())[0];
    double intoNetwork = -alongLead;
    double intoAmplifier = 1 + alongLead;
    assertThat(intoNetwork / intoAmplifier).isCloseTo(54, within(1e-10));
  }

  @Test
  void theTwoTogetherGiveTheLoopGain() {
    double[] loopGain = loop.smallSignal().loopGain(1e3, lead);
    assertThat(loopGain[0]).isCloseTo(10, within(1e-12));
    assertThat(loopGain[1]).isCloseTo(0, within(1e-12));
  }
}
