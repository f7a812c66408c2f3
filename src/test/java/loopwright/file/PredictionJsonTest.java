package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.check.Finding;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.SampleDesigns;
import loopwright.predict.SamplePredictions;
import loopwright.predict.SwingLevel;
import org.junit.jupiter.api.Test;

class PredictionJsonTest {
  private static final Finding FINDING =
      new Finding(
          Finding.Severity.RISKY,
          "amplifier.inputPair",
          "The pair is out of balance by 29 %.",
          "Use 1.3 kΩ in both collectors.");

  @Test
  void hasEveryMemberOfTheContractInItsOrder() throws Exception {
    JsonNode root = read(SamplePredictions.solved(SampleDesigns.figures()), List.of(FINDING));

    assertThat(names(root)).containsExactly("design", "hookups", "findings");
    assertThat(root.get("design").asText()).isEqualTo("River gauge");
    assertThat(root.get("hookups")).hasSize(2);
    JsonNode hookup = root.get("hookups").get(0);
    assertThat(names(hookup))
        .containsExactly(
            "name",
            "operatingPoint",
            "figures",
            "response",
            "loopGain",
            "unstablePoles",
            "overSwing",
            "offsetContributions",
            "harmonics");
    assertThat(names(hookup.get("operatingPoint")))
        .containsExactly("nodes", "devices", "supplyCurrents");
    assertThat(names(hookup.at("/operatingPoint/devices/pair.q1")))
        .containsExactly(
            "collectorCurrent",
            "baseCurrent",
            "baseEmitterVoltage",
            "collectorEmitterVoltage",
            "power",
            "junctionTemperature");
    assertThat(names(hookup.at("/operatingPoint/supplyCurrents")))
        .containsExactly("positive", "negative");
    assertThat(names(hookup.at("/response/0"))).containsExactly("frequency", "re", "im");
    assertThat(names(hookup.at("/loopGain/0"))).containsExactly("frequency", "re", "im");
    assertThat(names(hookup.at("/overSwing/0")))
        .containsExactly("output", "stable", "frequency", "growth", "phaseMargin");
    assertThat(names(hookup.at("/offsetContributions/0"))).containsExactly("cause", "output");
    assertThat(names(root.at("/findings/0")))
        .containsExactly("severity", "where", "says", "remedy");
    assertThat(root.at("/findings/0/severity").asText()).isEqualTo("risky");
  }

  @Test
  void keepsEveryDigit() throws Exception {
    JsonNode hookup = solvedHookup();

    assertThat(hookup.at("/operatingPoint/nodes/gainOut").doubleValue()).isEqualTo(1.0 / 3);
    assertThat(hookup.at("/harmonics/3").doubleValue()).isEqualTo(3e-4);
    assertThat(hookup.at("/overSwing/3/growth").doubleValue()).isEqualTo(4e6);
  }

  @Test
  void givesAnAloneStandingFigureNoReason() throws Exception {
    JsonNode figure = solvedHookup().at("/figures/openLoopGain");

    assertThat(names(figure)).containsExactly("formula", "solved", "unit");
    assertThat(figure.get("formula").doubleValue()).isEqualTo(1104);
    assertThat(figure.get("solved").doubleValue()).isEqualTo(1064.25);
    assertThat(figure.get("unit").asText()).isEqualTo("1");
  }

  @Test
  void saysWhichValueIsMissingAndWhy() throws Exception {
    JsonNode figures = solvedHookup().get("figures");

    JsonNode margin = figures.get("worstPhaseMargin");
    assertThat(margin.get("formula").isNull()).isTrue();
    assertThat(margin.get("solved").doubleValue()).isEqualTo(-20);
    assertThat(margin.get("unit").asText()).isEqualTo("°");
    assertThat(margin.get("reason").asText()).isEqualTo("formula: no hand formula");
    assertThat(figures.at("/bandwidth/reason").asText())
        .isEqualTo("formula: no unity frequency; solved: something grows");
    assertThat(figures.at("/noiseGain/reason").asText()).isEqualTo("solved: has no solved value");
  }

  @Test
  void keepsWhatIsSaidOfANumberApartFromReasons() throws Exception {
    JsonNode offset = solvedHookup().at("/figures/outputOffset");

    assertThat(names(offset)).containsExactly("formula", "solved", "unit", "remark");
    assertThat(offset.get("remark").asText())
        .isEqualTo("formula: with A and the input offset as solved");
  }

  @Test
  void givesADiodeItsOwnMembersAndAMissingTemperatureAReason() throws Exception {
    JsonNode diode = solvedHookup().at("/operatingPoint/devices/bias.d1");

    assertThat(names(diode))
        .containsExactly("current", "voltage", "power", "junctionTemperature", "reason");
    assertThat(diode.get("junctionTemperature").isNull()).isTrue();
    assertThat(diode.get("reason").asText()).contains("thermal resistance");
  }

  @Test
  void leavesNullsWithReasonsWhereNothingWasSolved() throws Exception {
    JsonNode hookup =
        read(SamplePredictions.failed(SampleDesigns.figures()), List.of()).at("/hookups/1");

    JsonNode rest = hookup.get("operatingPoint");
    assertThat(rest.get("nodes").isNull()).isTrue();
    assertThat(rest.get("devices").isNull()).isTrue();
    assertThat(rest.get("supplyCurrents").isNull()).isTrue();
    assertThat(rest.get("reason").asText()).isEqualTo("no operating point: gainOut stands at 31 V");
    assertThat(hookup.get("figures")).isNotEmpty();
    for (JsonNode figure : hookup.get("figures")) {
      assertThat(figure.get("solved").isNull()).isTrue();
      assertThat(figure.get("reason").asText())
          .isEqualTo("formula and solved: no operating point: gainOut stands at 31 V");
    }
    assertThat(hookup.get("response")).isEmpty();
  }

  @Test
  void givesALevelWithoutComplexPairOrMarginItsReasons() throws Exception {
    SwingLevel level =
        new SwingLevel(
            0, 2, false, OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), 1);
    HookupPrediction sample = SamplePredictions.solved(SampleDesigns.figures().hookups().get(0));
    HookupPrediction hookup =
        new HookupPrediction(
            sample.hookup(),
            sample.rest(),
            "",
            sample.figures(),
            List.of(),
            List.of(),
            List.of(),
            List.of(level),
            "the walk ends: out jumps at 2 V",
            List.of(),
            List.of(),
            Optional.empty(),
            List.of());

    JsonNode root =
        read(new Prediction(SampleDesigns.figures(), List.of(hookup)), List.of()).at("/hookups/0");

    assertThat(root.at("/overSwing/0/growth").isNull()).isTrue();
    assertThat(root.at("/overSwing/0/reason").asText())
        .isEqualTo(
            "frequency: no natural frequency is complex; growth: no natural frequency is complex;"
                + " phaseMargin: loop gain never passes 1");
    assertThat(root.get("remark").asText()).isEqualTo("the walk ends: out jumps at 2 V");
  }

  private static JsonNode solvedHookup() throws Exception {
    return read(SamplePredictions.solved(SampleDesigns.figures()), List.of()).at("/hookups/0");
  }

  private static JsonNode read(Prediction prediction, List<Finding> findings) throws Exception {
    return new ObjectMapper().readTree(PredictionJson.write(prediction, findings));
  }

  private static List<String> names(JsonNode block) {
    List<String> names = new ArrayList<>();
    block.fieldNames().forEachRemaining(names::add);
    return names;
  }
}
