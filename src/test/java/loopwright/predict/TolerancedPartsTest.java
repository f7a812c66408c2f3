package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.file.DesignText;
import loopwright.predict.TolerancedPart.Kind;
import org.junit.jupiter.api.Test;

/** What spreads in a design, and the builds that follow from it. */
class TolerancedPartsTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "5%", "capacitor": "10%", "baseEmitterVoltage": "5m",
         "beta": "datasheet", "rails": "2%", "ambient": {"minimum": 10, "maximum": 30}},
       "parts": {
         "n": {"kind": "npn", "datasheet": {
           "beta": [{"current": "0.1m", "minimum": 40},
                    {"current": "1m", "minimum": 70, "typical": 150, "maximum": 300}],
           "baseEmitterVoltage": [{"current": "1m", "typical": 0.65}]}},
         "p": {"kind": "pnp", "measured": {"beta": {"current": "1m", "value": 220}},
               "model": {"saturationCurrent": 1e-14, "forwardBeta": 200}}},
       "amplifier": {"kind": "stages",
         "inputPair": {"transistor": "n", "emitterResistance": 100,
           "tail": {"kind": "resistor", "resistance": "12k"},
           "load": {"kind": "resistors", "output": {"value": "1k5", "tolerance": "1%"}}},
         "gainStage": {"transistor": "p", "load": {"kind": "resistor",
             "resistance": {"value": "8k2", "measured": "8.15k"}},
           "compensation": {"capacitance": "150p"}},
         "outputStage": {"kind": "none"}},
       "hookups": [{"name": "divider",
         "source": {"resistance": 600, "amplitude": 0.1},
         "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"}},
        {"name": "follower",
         "source": {"resistance": 50},
         "feedback": {"kind": "nonInverting", "upper": 0}}]}
      """;

  private final Design design = DesignText.read(DESIGN);
  private final HookupFigures nominal = HookupFigures.of(design, "divider");
  private final List<TolerancedPart> parts = TolerancedParts.of(nominal);

  private TolerancedPart part(Kind kind, String name) {
    return parts.stream()
        .filter(part -> part.kind() == kind && part.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void aPartsOwnToleranceWinsOverTheGeneralOne() {
    assertThat(part(Kind.RESISTOR, "amplifier.inputPair.tail.resistance").high()).isEqualTo(0.05);
    assertThat(part(Kind.RESISTOR, "amplifier.inputPair.load.output").high()).isEqualTo(0.01);
    assertThat(part(Kind.CAPACITOR, "amplifier.gainStage.compensation.capacitance").low())
        .isEqualTo(-0.1);
  }

  @Test
  void whatWasMeasuredAndWiresDoNotSpread() {
    assertThat(parts)
        .noneMatch(part -> part.name().equals("amplifier.gainStage.load.resistance"))
        .noneMatch(part -> part.name().equals("hookups.follower.feedback.upper"))
        .noneMatch(part -> part.kind() == Kind.BETA && part.name().equals("gain.q1"));
  }

  @Test
  void betaSpreadsBetweenTheLimitsPrintedForTheNearestCurrent() {
    TolerancedPart beta = part(Kind.BETA, "pair.q1");
    assertThat(150 * Math.exp(beta.low())).isEqualTo(70, within(1e-9));
    assertThat(150 * Math.exp(beta.high())).isEqualTo(300, within(1e-9));
  }

  @Test
  void twoPartsOfOnePathSpreadEachByItself() {
    String path = "amplifier.inputPair.emitterResistance@pair.q";
    List<TolerancedPart> one = List.of(part(Kind.RESISTOR, path + "1"));
    assertThat(part(Kind.RESISTOR, path + "2").low()).isEqualTo(-0.05);

    HookupFigures built = nominal.of(TolerancedParts.build(design, one, new double[] {0.05}));
    Figure offset = Catalogue.find("inputOffset").orElseThrow();
    double shift =
        built.solved(offset).number().orElseThrow() - nominal.solved(offset).number().orElseThrow();
    // Δ(I_E R_E): Gray, Hurst, Lewis and Meyer, 3.5.6 (from memory); the load holds I_C1.
    double current =
        ((DeviceState.TransistorState) nominal.devices().get("pair.q1")).collectorCurrent();
    assertThat(shift).isEqualTo(5 * current, within(0.05 * 5 * current));
  }

  @Test
  void railsAndAmbientSpread() {
    assertThat(part(Kind.RAIL, "rails.negative").low()).isEqualTo(-0.02);
    TolerancedPart ambient = part(Kind.AMBIENT, "surroundings.ambient");
    assertThat(ambient.low()).isEqualTo(-15);
    assertThat(ambient.high()).isEqualTo(5);
  }

  @Test
  void aHookupLeavesThePartsOfOthersOut() {
    assertThat(TolerancedParts.in(parts, "divider"))
        .noneMatch(part -> part.name().startsWith("hookups.follower"))
        .anyMatch(part -> part.name().equals("hookups.divider.feedback.lower"))
        .anyMatch(part -> part.name().equals("amplifier.inputPair.tail.resistance"));
  }

  @Test
  void aBuildHasItsOwnValues() {
    List<TolerancedPart> two =
        List.of(part(Kind.RESISTOR, "hookups.divider.feedback.upper"), part(Kind.BETA, "pair.q1"));
    Build build = TolerancedParts.build(design, two, new double[] {0.02, Math.log(2)});
    PartValue upper = (PartValue) DesignPath.get(build.design(), "hookups.divider.feedback.upper");
    assertThat(upper.effective()).isEqualTo(10200, within(1e-9));
    assertThat(build.deviations().devices().get("pair.q1").betaRatio()).isEqualTo(2, within(1e-12));

    double before = baseCurrent(nominal);
    assertThat(baseCurrent(nominal.of(build))).isEqualTo(before / 2, within(0.01 * before));
  }

  @Test
  void aHigherBaseEmitterVoltageMovesTheInputOffsetByAsMuch() {
    // The offset follows the mismatch of V_BE directly: Gray, Hurst, Lewis and Meyer, 3.5.6 (from
    // memory).
    Figure offset = Catalogue.find("inputOffset").orElseThrow();
    List<TolerancedPart> one = List.of(part(Kind.BASE_EMITTER_VOLTAGE, "pair.q1"));
    HookupFigures moved = nominal.of(TolerancedParts.build(design, one, new double[] {3e-3}));
    double shift =
        moved.solved(offset).number().orElseThrow() - nominal.solved(offset).number().orElseThrow();
    assertThat(shift).isEqualTo(3e-3, within(5e-5));
  }

  @Test
  void figuresSolvedFromANeighbourAreThoseSolvedFromNothing() {
    List<TolerancedPart> one = List.of(part(Kind.RESISTOR, "amplifier.inputPair.load.output"));
    Build build = TolerancedParts.build(design, one, new double[] {0.01});
    HookupFigures fromNeighbour = nominal.of(build);
    HookupFigures fromNothing = HookupFigures.of(build.design(), "divider");
    for (String key : List.of("closedLoopGain", "outputOffset", "openLoopGain", "phaseMargin")) {
      Figure figure = Catalogue.find(key).orElseThrow();
      double expected = fromNothing.solved(figure).number().orElseThrow();
      assertThat(fromNeighbour.solved(figure).number().orElseThrow())
          .isEqualTo(expected, within(1e-7 * Math.abs(expected)));
    }
  }

  private static double baseCurrent(HookupFigures figures) {
    return ((DeviceState.TransistorState) figures.devices().get("pair.q1")).baseCurrent();
  }
}
