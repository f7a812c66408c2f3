package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import org.junit.jupiter.api.Test;

/** Noise of whole hookups. */
class NoiseFiguresTest {
  private static final double THERMAL = 4 * Physics.BOLTZMANN * 298.15;
  private static final int DESIGNS = 40;

  /** Behind a noiseless amplifier of endless gain only the divider is heard: 4kT (9 kΩ ∥ 1 kΩ). */
  @Test
  void behindANoiselessAmplifierTheDividerIsHeard() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1e9, \"inputResistance\": \"100k\", \"outputResistance\": 10",
            "\"feedback\": {\"kind\": \"nonInverting\", \"upper\": \"9k\", \"lower\": \"1k\"}");
    double input = Math.sqrt(THERMAL * 900);
    assertThat(loop.solved("inputNoise")).isCloseTo(input, within(1e-7 * input));
    double output = 10 * input * Math.sqrt(100e3 - 10);
    assertThat(loop.solved("outputNoise")).isCloseTo(output, within(1e-7 * output));
    assertThat(says(loop, "inputNoise")).contains("makes no noise");
    assertThat(says(loop, "outputNoise")).startsWith("from 10 Hz to 100 kHz");
  }

  /** Inverting by 10, the same divider has a noise gain of 11: √(4kT · 1k · 11 · 10)/10. */
  @Test
  void invertingTheNoiseIsReferredThroughTheSmallerIdealGain() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1e9",
            """
            "feedback": {"kind": "inverting", "upper": "10k", "inputResistor": "1k",
                         "returnResistance": 0}
            """);
    double input = Math.sqrt(THERMAL * (1e3 + 1e3 / 10));
    assertThat(loop.solved("inputNoise")).isCloseTo(input, within(1e-7 * input));
  }

  /** Without feedback the source's resistance is heard as it stands, whatever the gain. */
  @Test
  void openTheNoiseIsReferredThroughTheSolvedGain() {
    Predicted open =
        Predicted.figures(
            "\"gain\": 800, \"inputOffset\": \"5 mV\"",
            "\"source\": {\"resistance\": \"2k\"},"
                + " \"feedback\": {\"kind\": \"open\", \"returnResistance\": \"1k\"}");
    double input = Math.sqrt(THERMAL * 3000);
    assertThat(open.solved("inputNoise")).isCloseTo(input, within(1e-9 * input));
    assertThat(says(open, "inputNoise")).contains("solved gain of 800", "generator at 5 mV");
  }

  /**
   * With enough loop gain formula and solution agree but for what the formula leaves out, and what
   * it leaves out only adds: later stages, load, tail and capacitors.
   */
  @Test
  void formulaAndSolutionAgreeWhereTheLoopIsStrong() {
    int compared = 0;
    int near = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      HookupFigures figures = HookupFigures.of(design, design.hookups().get(0).name());
      OptionalDouble solved = number(figures, "inputNoise");
      FigureValue formula = figures.formula(Catalogue.find("inputNoise").orElseThrow());
      OptionalDouble loop = number(figures, "loopGainDc");
      if (solved.isPresent() && formula.number().isPresent() && loop.orElse(0) > 200) {
        double ratio = solved.getAsDouble() / formula.number().getAsDouble();
        compared++;
        near += ratio > 0.98 && ratio < 1.5 ? 1 : 0;
      }
    }
    assertThat(compared).isGreaterThan(DESIGNS / 8);
    assertThat(near).isEqualTo(compared);
  }

  private static OptionalDouble number(HookupFigures figures, String key) {
    return figures.solved(Catalogue.find(key).orElseThrow()).number();
  }

  private static String says(Predicted predicted, String key) {
    return predicted.hookup().figures().get(key).solved().says();
  }
}
