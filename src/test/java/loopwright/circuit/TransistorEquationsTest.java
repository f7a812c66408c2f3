package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.part.TransistorParameters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The transport form of Gummel and Poon (Bell System Technical Journal 49, 1970, 827–852) against a
 * vector worked out from its printed equations with another program, without shunt conductances.
 */
class TransistorEquationsTest {
  private static final double ROOM = 298.15;

  private static final TransistorParameters VECTOR =
      IdealParts.withReverseBeta(IdealParts.transistor(1e-14, 200), 4)
          .withEarlyVoltage(100)
          .withKneeCurrent(0.1)
          .withRecombinationCurrent(1e-13);

  @ParameterizedTest
  @CsvSource({
    "0.60, 1.44610113e-4, 7.05313801e-7, 205.02947, 0.95918118, 5.62070e-3, 7.21941e5, 3.67338e4",
    "0.65, 1.00371248e-3, 4.88677796e-6, 205.39351, 0.96753111, 3.86976e-2, 1.03964e5, 5.27439e3",
    "0.70, 6.66545819e-3, 3.40777821e-5, 195.59542, 1.02004468, 2.44731e-1, 1.56478e4, 7.54853e2",
    "0.75, 3.67030258e-2, 2.38227601e-4, 154.06706, 1.29694714, 1.13341,    2.84037e3, 1.07898e2",
    "0.80, 1.45130590e-1, 1.66693830e-3, 87.06416,  2.29636081, 3.57045,    7.17974e2, 1.54157e1"
  })
  void followsTheTestVector(
      double vbe,
      double collector,
      double base,
      double beta,
      double charge,
      double transconductance,
      double outputResistance,
      double inputResistance) {
    TransistorEquations equations = new TransistorEquations(VECTOR, ROOM, 0);
    equations.evaluate(vbe, vbe - 5);
    // Half a unit of the last printed digit: nine digits, eight, six.
    assertThat(equations.collectorCurrent()).isCloseTo(collector, digits(collector, 9));
    assertThat(equations.baseCurrent()).isCloseTo(base, digits(base, 9));
    assertThat(equations.collectorCurrent() / equations.baseCurrent())
        .isCloseTo(beta, within(5e-6));
    assertThat(equations.baseCharge()).isCloseTo(charge, within(5e-9));
    assertThat(equations.collectorByBaseEmitter())
        .isCloseTo(transconductance, digits(transconductance, 6));
    assertThat(-1 / equations.collectorByBaseCollector())
        .isCloseTo(outputResistance, digits(outputResistance, 6));
    assertThat(1 / equations.baseByBaseEmitter())
        .isCloseTo(inputResistance, digits(inputResistance, 6));
  }

  /**
   * g_m = I_C/V_T, r_π = β/g_m, r_o = V_A/I_C (Gray, Hurst, Lewis and Meyer, section 1.4, from
   * memory) at 1 mA, β 200, V_A 100 V; with 5 V from base to collector r_o = (V_A + 5 V)/I_C.
   */
  @Test
  void smallSignalValuesAtOneMilliampere() {
    TransistorParameters parameters =
        IdealParts.carrying(1e-3, 0.65, 200, ROOM).withEarlyVoltage(100);
    TransistorEquations equations = new TransistorEquations(parameters, ROOM, 0);
    equations.evaluate(0.65, 0);
    assertThat(equations.collectorByBaseEmitter()).isCloseTo(38.92174450e-3, within(5e-12));
    assertThat(1 / equations.baseByBaseEmitter()).isCloseTo(5138.5158, within(5e-5));
    assertThat(-1 / equations.collectorByBaseCollector()).isCloseTo(100e3, within(0.05));

    equations.evaluate(0.65, -5);
    double atOneMilliampere = -equations.collectorCurrent() / equations.collectorByBaseCollector();
    assertThat(atOneMilliampere / 1e-3).isCloseTo(105e3, within(1e-3));
  }

  /**
   * f_T = g_m/(2π(C_π + C_µ)), C_π = C_je + τ_F g_m (Gray, Hurst, Lewis and Meyer, section 1.4,
   * from memory) with τ_F 400 ps, C_je 8 pF and C_µ 2.5 pF at the bias.
   */
  @ParameterizedTest
  @CsvSource({"1e-4, 51.378079e6", "1e-3, 237.625526e6", "1e-2, 372.748100e6"})
  void transitionFrequencyRisesWithCurrent(double current, double frequency) {
    double vbe = 0.65;
    double vbc = -5;
    TransistorParameters parameters =
        IdealParts.carrying(current, vbe, 200, ROOM)
            .withTransitTime(400e-12)
            .withBaseEmitterCapacitance(8e-12 / DepletionCapacitance.factor(vbe))
            .withBaseCollectorCapacitance(2.5e-12 / DepletionCapacitance.factor(vbc));
    TransistorEquations equations = new TransistorEquations(parameters, ROOM, 0);
    equations.evaluate(vbe, vbc);
    double capacitance =
        equations.baseEmitterChargeByBaseEmitter() + equations.baseCollectorChargeByBaseCollector();
    assertThat(equations.collectorByBaseEmitter() / (2 * Math.PI * capacitance))
        .isCloseTo(frequency, within(0.5));
  }

  /** At 10 mA and 300 MHz: C_π + C_µ = 206.48627 pF, C_π = 203.98627 pF where C_µ is 2.5 pF. */
  @Test
  void capacitancesFollowFromTransitionFrequency() {
    double depletion = 5e-12;
    double transitTime =
        1 / (2 * Math.PI * 300e6) - (depletion + 2.5e-12) * Physics.thermalVoltage(ROOM) / 10e-3;
    TransistorParameters parameters =
        IdealParts.carrying(10e-3, 0.7, 200, ROOM)
            .withTransitTime(transitTime)
            .withBaseEmitterCapacitance(depletion / DepletionCapacitance.factor(0.7))
            .withBaseCollectorCapacitance(2.5e-12 / DepletionCapacitance.factor(-5));
    TransistorEquations equations = new TransistorEquations(parameters, ROOM, 0);
    equations.evaluate(0.7, -5);
    assertThat(equations.baseEmitterChargeByBaseEmitter()).isCloseTo(203.98627e-12, within(5e-18));
    assertThat(equations.baseCollectorChargeByBaseCollector()).isCloseTo(2.5e-12, within(1e-22));
  }

  /** The shunt of 1e-13 S across each junction belongs to the equations' definition. */
  @Test
  void theShuntConductsAcrossBothJunctions() {
    TransistorEquations bare = new TransistorEquations(VECTOR, ROOM, 0);
    TransistorEquations whole = new TransistorEquations(VECTOR, ROOM);
    bare.evaluate(0.3, -5);
    whole.evaluate(0.3, -5);
    assertThat(whole.collectorCurrent() - bare.collectorCurrent()).isCloseTo(5e-13, within(1e-22));
    assertThat(whole.baseCurrent() - bare.baseCurrent())
        .isCloseTo(1e-13 * (0.3 - 5), within(1e-22));
  }

  private static org.assertj.core.data.Offset<Double> digits(double value, int digits) {
    double unit = Math.pow(10, Math.floor(Math.log10(Math.abs(value))) - digits + 1);
    return within(0.5 * unit * 1.000001);
  }
}
