package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import loopwright.assembly.Deviations;
import loopwright.assembly.DeviceFault;
import loopwright.bench.Explanation.Kind;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Readings of builds with a known fault, and what the search makes of them. */
class FaultSearchTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
       "tolerances": {"resistor": "1%", "baseEmitterVoltage": "2m", "beta": "30%"},
       "parts": {
         "n": {"kind": "npn", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80}},
         "p": {"kind": "pnp", "model": {"saturationCurrent": 1e-14, "forwardBeta": 200,
               "earlyVoltage": 80}}},
       "amplifier": {"kind": "stages",
         "inputPair": {"transistor": "n", "emitterResistance": 100,
           "tail": {"kind": "resistor", "resistance": "12k"},
           "load": {"kind": "resistors", "output": "1k5", "other": "1k5"}},
         "gainStage": {"transistor": "p", "load": {"kind": "resistor", "resistance": "8k2"},
           "compensation": {"capacitance": "150p", "resistance": 100}},
         "outputStage": {"kind": "none"}},
       "hookups": [{"name": "gain",
         "source": {"resistance": 600},
         "feedback": {"kind": "nonInverting", "upper": "10k", "lower": "1k"},
         "load": {"resistance": "10k"}}],
       "bench": {
         "instruments": {"meter": {"kind": "voltmeter", "percentOfReading": "0.5%", "digits": 3,
                         "resolution": "1m"}},
         "readings": [READINGS]}}
      """;

  private static final List<String> NODES =
      List.of("pairOut", "pairOther", "tail", "emitter1", "out", "in-", "in+");

  private static final Design NOMINAL = DesignText.read(DESIGN.replace("READINGS", ""));

  /** The design with what a meter would show of a build, to the millivolt. */
  private static Design readings(Build build) {
    Map<String, Double> nodes = HookupFigures.of(NOMINAL, "gain").of(build).nodes();
    String readings =
        NODES.stream()
            .map(
                node ->
                    "{\"hookup\": \"gain\", \"quantity\": \"nodeVoltage\", \"node\": \""
                        + node
                        + "\", \"value\": "
                        + Math.round(1e3 * nodes.get(node)) / 1e3
                        + ", \"instrument\": \"meter\"}")
            .collect(Collectors.joining(", "));
    return DesignText.read(DESIGN.replace("READINGS", readings));
  }

  private static Explanations explain(Deviations fault) {
    return FaultSearch.of(readings(new Build(NOMINAL, fault)), Progress.none());
  }

  private static void isFirstOrAlike(Explanations explanations, String part) {
    Explanation first = explanations.explanations().get(0);
    assertThat(first.part().equals(part) || first.alike().contains(part))
        .as("%s behind %s", part, first)
        .isTrue();
  }

  @ParameterizedTest
  @CsvSource({
    "amplifier.inputPair.load.output, 1e7",
    "amplifier.inputPair.load.output, 1e-5",
    "amplifier.inputPair.tail.resistance, 10",
    "amplifier.gainStage.load.resistance, 0.1",
    "hookups.gain.feedback.lower, 1e7",
    "hookups.gain.feedback.upper, 1e6",
    "amplifier.inputPair.emitterResistance@pair.q2, 1e8"
  })
  void aBrokenOrWrongResistorIsFound(String element, double ratio) {
    Explanations explanations = explain(new Deviations(Map.of(), Map.of(element, ratio)));
    assertThat(explanations.explanations().get(0).kind()).isNotEqualTo(Kind.NO_FAULT);
    isFirstOrAlike(explanations, element);
  }

  @ParameterizedTest
  @CsvSource({
    "pair.q1, BASE_OPEN",
    "pair.q2, COLLECTOR_EMITTER_SHORT",
    "gain.q1, BASE_EMITTER_SHORT",
    "gain.q1, REVERSED",
    "gain.q1, WRONG_POLARITY"
  })
  void aFaultyTransistorIsFound(String role, DeviceFault fault) {
    isFirstOrAlike(
        explain(new Deviations(Map.of(), Map.of(), Map.of(role, fault), Set.of())), role);
  }

  @Test
  void aSoundBuildHasNoFault() {
    Explanation first = explain(Deviations.NONE).explanations().get(0);
    assertThat(first.kind()).isEqualTo(Kind.NO_FAULT);
    assertThat(first.probability()).isGreaterThan(0.5);
    assertThat(first.misfit().orElseThrow()).isLessThan(3);
  }

  @Test
  void aDriftedResistorIsFoundWithItsValue() {
    Explanation first =
        explain(new Deviations(Map.of(), Map.of("amplifier.inputPair.load.output", 1.4)))
            .explanations()
            .get(0);
    assertThat(first.kind()).isEqualTo(Kind.DRIFT);
    assertThat(first.part()).isEqualTo("amplifier.inputPair.load.output");
    // Within 3 %: the pair's V_BE, ± 2 mV, stands for ± 0.08 of ln(R) and more between the two.
    assertThat(first.value().orElseThrow()).isEqualTo(2100, within(100.0));
  }

  @Test
  void severalFaultsAtOnceAreNoneOfThese() {
    Explanations explanations =
        explain(
            new Deviations(
                Map.of(),
                Map.of(
                    "amplifier.inputPair.tail.resistance", 3.0,
                    "amplifier.inputPair.load.other", 4.0,
                    "amplifier.gainStage.load.resistance", 0.3)));
    assertThat(explanations.explanations().get(0).kind()).isEqualTo(Kind.NONE_OF_THESE);
  }

  @Test
  void whatToReadNextTellsTheLeadingExplanationsApart() {
    Explanations explanations =
        explain(new Deviations(Map.of(), Map.of("amplifier.inputPair.load.output", 1.4)));
    NextReading next = explanations.next().orElseThrow();
    assertThat(NODES).doesNotContain(next.node());
    assertThat(next.says()).contains("Measure node " + next.node());
  }

  @Test
  void probabilitiesOfAllThatCompeteAddUpToOne() {
    double sum =
        explain(new Deviations(Map.of(), Map.of("amplifier.gainStage.load.resistance", 0.1)))
            .explanations()
            .stream()
            .mapToDouble(Explanation::probability)
            .sum();
    assertThat(sum).isEqualTo(1, within(2e-3));
  }

  @Test
  void withoutReadingsThereIsNothingToExplain() {
    Explanations explanations = FaultSearch.of(NOMINAL, Progress.none());
    assertThat(explanations.explanations()).isEmpty();
    assertThat(explanations.says()).contains("nothing to explain");
  }
}
