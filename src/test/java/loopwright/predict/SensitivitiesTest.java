package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import loopwright.circuit.Parameter;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.design.Surroundings;
import loopwright.file.DesignText;
import loopwright.predict.PartSensitivity.Method;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Sensitivities of amplifiers known by their figures, which a hand calculation gives exactly. */
class SensitivitiesTest {
  private static final String FEEDBACK = "hookups.main.feedback.";
  private static final String SOURCE = "hookups.main.source.";
  private static final String TENFOLD =
      "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": \"9k\", \"lower\": \"1k\"}";

  private static Design figures(String amplifier, String hookup) {
    return DesignText.read(
        """
        {"loopwright": 1, "name": "by its figures", "rails": {"positive": 12, "negative": -12},
         "amplifier": {"kind": "figures", %s},
         "hookups": [{"name": "main", %s}]}
        """
            .formatted(amplifier, hookup));
  }

  private static FigureSensitivity of(Design design, String key) {
    return Sensitivities.of(design, "main", List.of(key), Progress.none()).get(0);
  }

  private static PartSensitivity part(FigureSensitivity figure, String name) {
    return figure.parts().stream()
        .filter(part -> part.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  /** Per cent per per cent. */
  private static double relative(FigureSensitivity figure, String name) {
    return part(figure, name).relative(figure.value().number().orElseThrow()).orElseThrow();
  }

  private static double sum(FigureSensitivity figure, Parameter parameter) {
    double value = figure.value().number().orElseThrow();
    return figure.parts().stream()
        .filter(part -> part.parameter() == parameter)
        .mapToDouble(part -> part.relative(value).orElseThrow())
        .sum();
  }

  /**
   * NG = 1 + upper/lower: one per cent more of either moves it by upper/(upper + lower) of that.
   */
  @Test
  void aDividersGainMovesByItsUpperShare() {
    FigureSensitivity gain = of(figures("\"gain\": 1e4", TENFOLD), "idealGain");
    assertThat(relative(gain, FEEDBACK + "upper")).isCloseTo(0.9, within(1e-13));
    assertThat(relative(gain, FEEDBACK + "lower")).isCloseTo(-0.9, within(1e-13));
    assertThat(part(gain, FEEDBACK + "upper").perSmallStep().orElseThrow())
        .isCloseTo(0.09, within(1e-14));
  }

  /**
   * Black (Bell System Technical Journal 13, 1934): G = A/(1 + A/NG), so that G moves by the share
   * G/NG of what the divider does.
   */
  @Test
  void aLoopsGainFollowsTheDividerButForItsOwnError() {
    FigureSensitivity gain = of(figures("\"gain\": 1000", TENFOLD), "closedLoopGainAtRest");
    double follows = 1 / (1 + 10.0 / 1000);
    assertThat(relative(gain, FEEDBACK + "upper")).isCloseTo(0.9 * follows, within(1e-11));
    assertThat(relative(gain, FEEDBACK + "lower")).isCloseTo(-0.9 * follows, within(1e-11));
    assertThat(part(gain, FEEDBACK + "upper").method()).isEqualTo(Method.ADJOINT);
  }

  /**
   * Euler's theorem: all resistors together leave a gain as it is (as Director and Rohrer, IEEE
   * Transactions on Circuit Theory 16, 1969, check theirs).
   */
  @Test
  void allResistorsTogetherLeaveAGainAsItIs() {
    Design design =
        figures(
            "\"gain\": 300",
            """
            "source": {"resistance": "2k", "attenuator": {"series": "10k", "shunt": "1k"},
                       "biasResistance": "4.7k"},
            "feedback": {"kind": "inverting", "upper": "22k", "inputResistor": "1.5k",
                         "returnResistance": "1k"},
            "load": {"resistance": "600", "isolation": "10"}
            """);
    for (String key : List.of("closedLoopGainAtRest", "idealGain", "loopGainDc", "noiseGain")) {
      FigureSensitivity gain = of(design, key);
      assertThat(gain.parts()).as(key).hasSizeGreaterThan(7);
      assertThat(gain.parts().stream().filter(p -> p.slope().orElseThrow() != 0)).isNotEmpty();
      assertThat(sum(gain, Parameter.RESISTANCE)).as(key).isCloseTo(0, within(1e-12));
    }
  }

  /** 1/(2π C (R_source + R_bias)): a corner is of degree −1 in capacitances and resistances. */
  @Test
  void aCornerFallsWithEveryResistanceAndCapacitance() {
    Design design =
        figures(
            "\"gain\": 1e8",
            """
            "source": {"resistance": "1k", "couplingCapacitance": "100n", "biasResistance": "9k"},
            "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k",
                         "leadCapacitance": "1n"}
            """);
    FigureSensitivity low = of(design, "lowCorner");
    assertThat(low.value().number().orElseThrow())
        .isCloseTo(1 / (2 * Math.PI * 100e-9 * 10e3), within(0.2));
    assertThat(relative(low, SOURCE + "couplingCapacitance")).isCloseTo(-1, within(1e-3));
    assertThat(relative(low, SOURCE + "resistance")).isCloseTo(-0.1, within(1e-3));
    for (FigureSensitivity corner : List.of(low, of(design, "bandwidth"))) {
      assertThat(corner.parts()).allMatch(part -> part.method() == Method.ADJOINT);
      assertThat(sum(corner, Parameter.CAPACITANCE)).isCloseTo(-1, within(1e-6));
      assertThat(sum(corner, Parameter.RESISTANCE)).isCloseTo(-1, within(1e-6));
    }
  }

  /** The output offset is NG times the input offset: −5 mV · 10/(1 + 10/1000). */
  @Test
  void anOffsetIsMovedAsItsNoiseGainIs() {
    FigureSensitivity offset =
        of(figures("\"gain\": 1000, \"inputOffset\": \"5 mV\"", TENFOLD), "outputOffset");
    double follows = 1 / (1 + 10.0 / 1000);
    assertThat(part(offset, FEEDBACK + "upper").slope().orElseThrow())
        .isCloseTo(-50e-3 * follows * 0.9 * follows, within(1e-13));
  }

  /**
   * Three equal poles at 1 MHz in a loop of 20: s³ + … with s/p = −1 + ∛20 e^{jπ/3}. The loop's
   * gain moves the root by a third of its cube root.
   */
  @Test
  void aGrowingPairMovesAsTheCubeRootOfTheLoop() {
    Design design =
        figures(
            "\"gain\": 200, \"poles\": [1e6, 1e6, 1e6]",
            "\"source\": {\"amplitude\": 0}, " + TENFOLD);
    double pole = 2 * Math.PI * 1e6;
    double root = Math.cbrt(20);
    FigureSensitivity growth = of(design, "worstGrowth");
    assertThat(growth.value().number().orElseThrow())
        .isCloseTo(pole * (root / 2 - 1), within(1e-4 * pole));
    assertThat(part(growth, FEEDBACK + "lower").slope().orElseThrow())
        .isCloseTo(0.9 * pole * root / 6, within(1e-7 * pole));
    FigureSensitivity frequency = of(design, "oscillationFrequency");
    assertThat(part(frequency, FEEDBACK + "lower").slope().orElseThrow())
        .isCloseTo(0.9 * 1e6 * root / 3 * Math.sqrt(0.75), within(1e-7 * 1e6));
  }

  /** What is read off a waveform goes by differences, and says how far to trust them. */
  @Test
  void figuresOfAWaveformGoByDifferencesWithAnError() {
    Design design =
        figures("\"gain\": 1000, \"deadZone\": 0.6", "\"source\": {\"amplitude\": 1}, " + TENFOLD);
    FigureSensitivity gain = of(design, "closedLoopGain");
    PartSensitivity upper = part(gain, FEEDBACK + "upper");
    assertThat(upper.method()).isEqualTo(Method.DIFFERENCES);
    assertThat(upper.error()).isPositive();
    assertThat(upper.slope().orElseThrow() / gain.value().number().orElseThrow())
        .isCloseTo(0.9 / 1.01, within(2e-3));
  }

  /** A divided source: in+ stands at 1 V · R_bias/(R_source + R_bias) = 0.9 V. */
  @Test
  void aNodesVoltageMovesAsItsDividerDoes() {
    Design design =
        figures(
            "\"gain\": 1000",
            "\"source\": {\"dc\": 1, \"resistance\": \"1k\", \"biasResistance\": \"9k\"}, "
                + TENFOLD);
    Map<String, List<PartSensitivity>> nodes =
        Sensitivities.ofNodes(design, "main", List.of("in+", "nowhere"), Progress.none());
    assertThat(nodes.get("nowhere")).isEmpty();
    PartSensitivity source =
        nodes.get("in+").stream()
            .filter(part -> part.name().equals(SOURCE + "resistance"))
            .findFirst()
            .orElseThrow();
    assertThat(source.slope().orElseThrow()).isCloseTo(-0.09, within(1e-13));
    assertThat(source.method()).isEqualTo(Method.ADJOINT);
  }

  /** Junction temperatures that move with a part are in whole solutions only. */
  @Test
  void withSelfHeatingWholeSolutionsAreCompared() {
    Design heating =
        RandomDesigns.of(20)
            .filter(design -> design.surroundings().selfHeating())
            .findFirst()
            .orElseThrow();
    FigureSensitivity offset = of(heating, "outputOffset");
    assertThat(offset.parts()).isNotEmpty();
    assertThat(offset.parts()).allMatch(part -> part.method() == Method.DIFFERENCES);
    Surroundings here = heating.surroundings();
    Design cold =
        heating.withSurroundings(
            new Surroundings(here.ambient(), here.strayCapacitance(), false, here.biasCoupling()));
    FigureSensitivity exact = of(cold, "outputOffset");
    PartSensitivity warm = part(offset, "pair.q1");
    assertThat(warm.slope().orElseThrow())
        .isCloseTo(
            part(exact, "pair.q1").slope().orElseThrow(),
            within(0.1 * Math.abs(warm.slope().orElseThrow())));
  }

  @Test
  void aFigureWithoutAValueKeepsItsReason() {
    FigureSensitivity margin = of(figures("\"gain\": 1000", TENFOLD), "phaseMargin");
    assertThat(margin.parts()).isEmpty();
    assertThat(margin.value().says()).isNotBlank();
    assertThatThrownBy(() -> of(figures("\"gain\": 1000", TENFOLD), "loudness"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("no figure is called loudness");
  }
}
