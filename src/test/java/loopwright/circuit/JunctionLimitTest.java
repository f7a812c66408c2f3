package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.part.DiodeParameters;
import org.junit.jupiter.api.Test;

/** Junction steps taken in current above the voltage of least radius of curvature (from memory). */
class JunctionLimitTest {
  private static final double THERMAL = Physics.thermalVoltage(298.15);
  private static final double CRITICAL = 0.725251784;

  /** V_crit = V_T ln(V_T/(√2 I_S)) for I_S = 1e-14 A. */
  @Test
  void criticalVoltageIsThatOfLeastRadius() {
    TransistorEquations transistor =
        new TransistorEquations(IdealParts.transistor(1e-14, 100), 298.15);
    assertThat(transistor.criticalVoltage()).isCloseTo(CRITICAL, within(5e-10));
    DiodeEquations diode = new DiodeEquations(new DiodeParameters(1e-14, 1, 0, 0, 0), 298.15);
    assertThat(diode.criticalVoltage()).isCloseTo(CRITICAL, within(5e-10));
  }

  /** 0.65 V and a proposed step of 1 V: 0.65 + V_T ln(1 + 1 V/V_T) = 0.744726513 V. */
  @Test
  void aLongStepIsTakenInCurrent() {
    assertThat(JunctionLimit.limit(1.65, 0.65, THERMAL, CRITICAL))
        .isCloseTo(0.744726513, within(5e-10));
  }

  @Test
  void aStepBelowTheCriticalVoltageOrAShortOneIsLeftAlone() {
    assertThat(JunctionLimit.limit(0.7, -5, THERMAL, CRITICAL)).isEqualTo(0.7);
    assertThat(JunctionLimit.limit(-30, 0.7, THERMAL, CRITICAL)).isEqualTo(-30);
    assertThat(JunctionLimit.limit(0.80, 0.76, THERMAL, CRITICAL)).isEqualTo(0.80);
  }

  /** From an unbiased junction the proposed voltage is taken as a current of its own size. */
  @Test
  void aStepFromReverseStartsAtTheLogarithm() {
    assertThat(JunctionLimit.limit(10, -2, THERMAL, CRITICAL))
        .isCloseTo(THERMAL * Math.log(10 / THERMAL), within(1e-15));
  }

  @Test
  void aStepFarDownFromAForwardJunctionStopsAtTheCriticalVoltage() {
    assertThat(JunctionLimit.limit(0.73, 0.95, THERMAL, CRITICAL)).isEqualTo(CRITICAL);
  }
}
