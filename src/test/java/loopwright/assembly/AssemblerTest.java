package loopwright.assembly;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import loopwright.circuit.Circuit;
import loopwright.design.Design;
import loopwright.file.DesignText;
import org.junit.jupiter.api.Test;

/** What the assembler makes of a small design, beyond what the laws of circuits hold it to. */
class AssemblerTest {
  private static final String TRANSISTOR =
      "\"model\": {\"saturationCurrent\": 1e-14, \"forwardBeta\": 200}";

  /** A pair on resistors, a gain stage on a resistor, no output stage; members may be added. */
  private static Design design(String more, String pair, String hookup) {
    return DesignText.read(
        """
        {"loopwright": 1, "name": "small", "rails": {"positive": 12, "negative": -12},
         "parts": {"n": {"kind": "npn", %s}, "p": {"kind": "pnp", %s}},
         "amplifier": {"kind": "stages",
           "inputPair": {"transistor": "n", %s
             "tail": {"kind": "resistor", "resistance": "12k"},
             "load": {"kind": "resistors", "output": "1k5"}},
           "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "4k7"}},
           "outputStage": {"kind": "none"}},
         %s
         "hookups": [{"name": "main", %s "feedback": {"kind": "nonInverting", "upper": 0}}]}
        """
            .formatted(TRANSISTOR, TRANSISTOR, pair, more, hookup));
  }

  private static AssembledHookup assemble(Design design) {
    return Assembler.assemble(design, design.hookups().get(0));
  }

  /** A resistance of 0 makes two nodes one, and both names mean it. */
  @Test
  void withoutResistanceTwoNamesMeanOneNode() {
    Circuit circuit = assemble(design("", "", "")).circuit();
    assertThat(circuit.node("emitter1")).isEqualTo(circuit.node("tail"));
    assertThat(circuit.node("emitter2")).isEqualTo(circuit.node("tail"));
    assertThat(circuit.node("gainEmitter")).isEqualTo(circuit.node("positive"));
    assertThat(circuit.node("pairOther")).isEqualTo(circuit.node("positive"));
    assertThat(circuit.node("out")).isEqualTo(circuit.node("gainOut"));
    assertThat(circuit.node("in-")).isEqualTo(circuit.node("out"));
    assertThat(circuit.node("base1")).isEqualTo(circuit.node("in+"));
    Circuit degenerated = assemble(design("", "\"emitterResistance\": 100,", "")).circuit();
    assertThat(degenerated.node("emitter1")).isNotEqualTo(degenerated.node("tail"));
  }

  /** I_S of Q1 is multiplied by exp(−value/V_T at 25 °C): 10 mV take a factor of 1.476. */
  @Test
  void aMismatchIsExtraVoltageOfTheFirstTransistor() {
    DeviceModels models = assemble(design("", "\"baseEmitterMismatch\": \"10 mV\",", "")).models();
    double ratio =
        models.transistor("pair.q2").saturationCurrent()
            / models.transistor("pair.q1").saturationCurrent();
    assertThat(ratio).isCloseTo(Math.exp(10e-3 / 25.692579121e-3), within(1e-9));
    assertThat(models.transistor("pair.q2").saturationCurrent()).isEqualTo(1e-14);
  }

  /** What a tester showed of one device is that device's alone. */
  @Test
  void aMeasuredBetaBelongsToItsDevice() {
    DeviceModels models =
        assemble(
                design(
                    "\"devices\": {\"pair.q2\": {\"measured\": {\"beta\": {\"current\": \"1m\","
                        + " \"value\": 320}}}},",
                    "",
                    ""))
            .models();
    assertThat(models.transistor("pair.q2").forwardBeta()).isCloseTo(320, within(0.5));
    assertThat(models.transistor("pair.q1").forwardBeta()).isEqualTo(200);
  }

  @Test
  void anExtraAtANodeThatIsNotThereIsRefused() {
    Design design =
        design(
            "\"extras\": [{\"name\": \"trim\", \"kind\": \"resistor\", \"from\": \"biasTap\","
                + " \"to\": \"positive\", \"value\": \"1M\"}],",
            "",
            "");
    assertThatThrownBy(() -> assemble(design))
        .isInstanceOf(AssemblyException.class)
        .hasMessageContaining("extras.trim.from")
        .hasMessageContaining("biasTap")
        .hasMessageContaining("main");
  }

  @Test
  void aProbeAtANodeThatIsNotThereIsRefused() {
    Design design =
        design("", "", "\"probes\": [{\"node\": \"driveLow\", \"resistance\": \"10M\"}],");
    assertThatThrownBy(() -> assemble(design))
        .isInstanceOf(AssemblyException.class)
        .hasMessageContaining("probes")
        .hasMessageContaining("driveLow");
  }
}
