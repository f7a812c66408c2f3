package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.assembly.DeviceModels;
import loopwright.design.Design;
import loopwright.file.DesignText;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Slewing by hand and in time (Solomon, IEEE Journal of Solid-State Circuits 9, 1974, 314–332): the
 * current that the pair can give each way over the compensation. It holds where the compensation is
 * at least ten times every other capacitance, the tail is constant, and the pair's load holds its
 * current; then both roads agree within 10 %.
 */
class SlewTest {
  private static final String PARTS =
      """
      "parts": {
        "N": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 300,
          "earlyVoltage": 100, "baseEmitterCapacitance": "4p", "baseCollectorCapacitance": "3p",
          "transitTime": 4e-10}},
        "P": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 300,
          "earlyVoltage": 100, "baseEmitterCapacitance": "4p", "baseCollectorCapacitance": "3p",
          "transitTime": 4e-10}}}
      """;

  /** A follower: its pair, and what its transistors are. */
  private static HookupSolution follower(boolean mirror, boolean npn, double tail) {
    String pair = npn ? "N" : "P";
    String other = npn ? "P" : "N";
    String load =
        mirror
            ? "{\"kind\": \"mirror\", \"transistor\": \"" + other + "\"}"
            : "{\"kind\": \"resistors\", \"output\": " + 0.68 / (tail / 2) + "}";
    Design design =
        DesignText.read(
            """
            {"loopwright": 1, "name": "slewing", "rails": {"positive": 12, "negative": -12},
             "surroundings": {"strayCapacitance": "1p"}, %s,
             "amplifier": {"kind": "stages",
               "inputPair": {"transistor": "%s", "load": %s,
                 "tail": {"kind": "ideal", "current": %s}},
               "gainStage": {"transistor": "%s",
                 "load": {"kind": "mirror", "transistor": "%s", "setResistance": "2k8"},
                 "compensation": {"capacitance": "220p"}},
               "outputStage": {"kind": "none"}},
             "hookups": [{"name": "follower", "source": {"amplitude": 5},
               "feedback": {"kind": "nonInverting", "upper": 0}}]}
            """
                .formatted(PARTS, pair, load, tail, other, pair));
    return new HookupSolution(design, design.hookups().get(0), new DeviceModels(design));
  }

  private static double number(FigureValue value) {
    assertThat(value.number()).as(value.says()).isPresent();
    return value.number().orElseThrow();
  }

  @ParameterizedTest
  @CsvSource({
    "false, true, 0.5e-3",
    "true, true, 0.5e-3",
    "false, false, 0.2e-3",
    "true, false, 0.2e-3"
  })
  void bothRoadsAgree(boolean mirror, boolean npn, double tail) {
    HookupSolution follower = follower(mirror, npn, tail);
    for (String key : new String[] {"slewRising", "slewFalling", "fullPowerBandwidth"}) {
      Figure figure = Catalogue.find(key).orElseThrow();
      double formula = number(figure.estimate(follower));
      double solved = number(figure.solve(follower));
      assertThat(solved).as(key).isCloseTo(formula, within(0.1 * formula));
    }
  }
}
