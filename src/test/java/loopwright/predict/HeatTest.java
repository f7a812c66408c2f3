package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.file.DesignText;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

class HeatTest {
  /** Two ideal-ish output devices, diodes between their bases, on a stiff bias. */
  private static Design stage(double emitterResistance, double load, double thermalResistance) {
    return DesignText.read(
        """
        {"loopwright": 1, "name": "warm", "rails": {"positive": 12, "negative": -12},
         "parts": {
           "n": {"kind": "npn", "model": {"saturationCurrent": 2e-14, "forwardBeta": 300},
                 "limits": {"thermalResistance": %1$s}},
           "p": {"kind": "pnp", "model": {"saturationCurrent": 2e-14, "forwardBeta": 300},
                 "limits": {"thermalResistance": %1$s}},
           "cold": {"kind": "npn", "model": {"saturationCurrent": 2e-14, "forwardBeta": 300}},
           "coldp": {"kind": "pnp", "model": {"saturationCurrent": 2e-14, "forwardBeta": 300}},
           "d": {"kind": "diode", "model": {"saturationCurrent": 4e-14, "ideality": 1}}},
         "amplifier": {"kind": "stages",
           "inputPair": {"transistor": "cold", "tail": {"kind": "ideal", "current": "2m"},
             "load": {"kind": "resistors", "output": "680"}},
           "gainStage": {"transistor": "coldp", "load": {"kind": "ideal", "current": "20m"},
             "compensation": {"capacitance": "1n"}},
           "outputStage": {"kind": "pushPull", "upper": "n", "lower": "p",
             "bias": {"kind": "diodes", "diode": "d", "count": 2},
             "emitterResistance": %2$s}},
         "hookups": [{"name": "follower", "source": {"amplitude": 1},
           "feedback": {"kind": "nonInverting", "upper": 0}, "load": {"resistance": %3$s}}]}
        """
            .formatted(thermalResistance, emitterResistance, load));
  }

  private static HeatReport report(Design design) {
    return HeatSolver.solve(design, "follower", Progress.none());
  }

  /** A worked case of the loop-gain method: 12 V, 200 K/W, 2 mV/K, 10 mA, V_T at 25 °C. */
  @Test
  void theFormulaGivesTheWorkedCase() {
    double thermal = Physics.thermalVoltage(298.15);
    assertThat(RunawayFormula.loop(12, 200, 2e-3, 0, thermal, 10e-3))
        .isCloseTo(1.868244, within(5e-7));
    assertThat(RunawayFormula.loop(12, 200, 2e-3, 10, thermal, 10e-3))
        .isCloseTo(0.381884, within(5e-7));
    assertThat(RunawayFormula.leastResistance(12, 200, 2e-3, 1, thermal, 10e-3))
        .isCloseTo(2.230742, within(5e-7));
    assertThat(RunawayFormula.leastResistance(1, 10, 2e-3, 1, thermal, 1e-3)).isZero();
  }

  /** Silicon: about 2 mV/K at 0.65 V (common practice, no source). */
  @Test
  void kappaIsThatOfSilicon() {
    assertThat(RunawayFormula.kappa(0.65, 298.15)).isBetween(1.7e-3, 2.1e-3);
  }

  /** With the bases held by a stiff bias the circuit shows what the formula says. */
  @Test
  void theCircuitAgreesWithTheFormula() {
    for (double ohms : new double[] {2.2, 10, 22}) {
      HeatReport report = report(stage(ohms, 1000, 60));
      assertThat(report.estimates()).hasSize(2);
      for (RunawayEstimate estimate : report.estimates()) {
        // The bases are not ideally held: the partner takes up a part of what one device does.
        assertThat(estimate.solved().orElseThrow())
            .as("%s with %s ohms", estimate.role(), ohms)
            .isBetween(0.4 * estimate.formula(), 1.05 * estimate.formula());
      }
    }
  }

  /** Together both devices run away as the hand formula, which holds the bias, says of each. */
  @Test
  void theWholeLoopIsTheFormulaOfOne() {
    HeatReport report = report(stage(10, 1000, 60));
    AmbientHeat hottest = report.ambients().get(report.ambients().size() - 1);
    double byHand = (report.estimates().get(0).formula() + report.estimates().get(1).formula()) / 2;
    assertThat(hottest.loop().orElseThrow()).isCloseTo(byHand, within(0.05 * byHand));
  }

  /**
   * The settled heat is the sum of a geometric series: 1/(1 − loop) times the first, as long as the
   * loop is small (what bends in it goes with its square).
   */
  @Test
  void theSettledHeatIsTheSumOfTheSeries() {
    for (double ohms : new double[] {10, 22, 47}) {
      AmbientHeat heat = report(stage(ohms, 1000, 60)).ambients().get(2);
      double loop = heat.loop().orElseThrow();
      assertThat(loop).isBetween(0.01, 0.3);
      assertThat(heat.idle().orElseThrow() / heat.idleUnheated().orElseThrow())
          .isCloseTo(1 / (1 - loop), within(loop * loop));
    }
  }

  /**
   * Idle current climbs with temperature (a published build log of an output stage with a V_BE
   * multiplier: 20 mA at 29 °C, 38 mA at 49 °C, 58 mA at 66 °C, 104 mA at 89 °C; trend only).
   */
  @Test
  void idleCurrentClimbsWithAmbient() {
    HeatReport report = report(stage(4.7, 1000, 60));
    double before = 0;
    for (AmbientHeat ambient : report.ambients()) {
      assertThat(ambient.reason()).isEmpty();
      assertThat(ambient.idle().orElseThrow()).isGreaterThan(before);
      assertThat(ambient.idle().orElseThrow()).isGreaterThan(ambient.idleUnheated().orElseThrow());
      before = ambient.idle().orElseThrow();
    }
  }

  @Test
  void withoutEmitterResistorsItRunsAwayAndTheReportSaysWhatHolds() {
    HeatReport report = report(stage(0, 1000, 200));
    AmbientHeat hottest = report.ambients().get(report.ambients().size() - 1);
    assertThat(hottest.loop().isEmpty() || hottest.loop().getAsDouble() >= 1).isTrue();
    double least = report.leastResistance().orElseThrow();
    assertThat(least).isGreaterThan(0);
    HeatReport cured = report(stage(least, 1000, 200));
    assertThat(cured.ambients().get(cured.ambients().size() - 1).loop().orElseThrow())
        .isLessThanOrEqualTo(RunawayFormula.WANTED);
    assertThat(HeatSolver.changes(stage(0, 1000, 200), report.leastResistance())).hasSize(1);
  }

  /**
   * Class B: V²/(π²R) a device at a sine of 2V/π (a textbook's worked example, ±12 V into 8 Ω:
   * 1.824 W each at 7.639 V). Here into 100 Ω, 1/12.5 of it, without bias and with what the drive
   * leaves.
   */
  @Test
  void classBHeatsAsTheHandbooksSay() {
    assertThat(12 * 12 / (Math.PI * Math.PI * 8)).isCloseTo(1.823781306, within(1e-9));
    HeatReport report = report(stage(1, 100, 60));
    SwingHeat upper =
        report.devices().stream().filter(d -> d.role().equals("out.upper")).findAny().orElseThrow();
    assertThat(upper.classB().orElseThrow()).isCloseTo(1.823781306 * 8 / 100, within(1e-9));
    // Idle current adds to it: some mA at 12 V.
    assertThat(upper.mean()).isBetween(0.95 * 0.1459, 0.1459 + 1.3 * upper.rest());
    assertThat(upper.amplitude()).isBetween(6.0, 9.5);
  }

  @Test
  void aDesignWithoutThermalResistancesSaysSo() {
    Design bare = stage(1, 1000, 60);
    bare = DesignPath.set(bare, "parts.n.limits", null);
    bare = DesignPath.set(bare, "parts.p.limits", null);
    HeatReport report = report(bare);
    assertThat(report.ambients().get(0).reason()).contains("thermal resistance");
    assertThat(report.estimates()).isEmpty();
  }
}
