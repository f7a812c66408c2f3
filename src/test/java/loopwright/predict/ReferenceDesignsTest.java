package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import loopwright.file.DesignText;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Twelve designs over the stage library with their figures from an independent reference solver,
 * and the tolerances that the reference states: see {@code about} in {@code
 * reference-designs.json}.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class ReferenceDesignsTest {
  /** What to expect of a figure: relative, or absolute where that is larger. */
  private record Tolerance(double relative, double absolute) {
    void check(String what, double actual, double expected) {
      double allowed = Math.max(relative * Math.abs(expected), absolute);
      assertThat(Math.abs(actual - expected))
          .as("%s: found %s, the reference says %s", what, actual, expected)
          .isLessThanOrEqualTo(allowed);
    }
  }

  private static final Tolerance NODE = new Tolerance(0, 3e-6);

  /**
   * The reference states none for the output at a level; this only tells that it is the same level.
   */
  private static final Tolerance SAME_LEVEL = new Tolerance(1e-4, 1e-5);

  private static final Tolerance GAIN = new Tolerance(2e-4, 0);
  private static final Tolerance OFFSET = new Tolerance(1e-4, 5e-7);
  private static final Tolerance SMALL = new Tolerance(2e-2, 5e-7);

  private static final Map<String, Tolerance> FIGURES =
      Map.ofEntries(
          Map.entry("openLoopGain", GAIN),
          Map.entry("openLoopGainHigh", GAIN),
          Map.entry("openLoopGainLow", GAIN),
          Map.entry("closedLoopGain", GAIN),
          Map.entry("inputOffset", OFFSET),
          Map.entry("outputOffset", OFFSET),
          Map.entry("outputMean", new Tolerance(1e-3, 5e-5)),
          Map.entry("deadZone", new Tolerance(1e-3, 2e-5)),
          Map.entry("commonModeRejection", SMALL),
          Map.entry("thd", SMALL),
          Map.entry("crossoverError", SMALL));

  /** Nodes that the format does not name bear the reference's own names. */
  private static final List<String> OWN_NAMES =
      List.of("pair.m", "tail.", "gainLoad.", "bias1", "compMid");

  /** A case with our prediction. */
  private record Case(int number, JsonNode reference, Predicted predicted) {
    @Override
    public String toString() {
      return "reference design " + number;
    }
  }

  private List<Case> cases;

  @BeforeAll
  void predict() throws IOException {
    try (InputStream file =
        ReferenceDesignsTest.class.getResourceAsStream("/loopwright/reference-designs.json")) {
      JsonNode all = new ObjectMapper().readTree(file).get("cases");
      cases =
          IntStream.range(0, all.size())
              .mapToObj(
                  i -> {
                    JsonNode one = all.get(i);
                    double[] frequencies = frequencies(one.get("reference"));
                    return new Case(
                        i + 1,
                        one.get("reference"),
                        Predicted.of(DesignText.read(one.get("design").toString()), frequencies));
                  })
              .toList();
    }
    assertThat(cases).hasSize(12);
  }

  List<Case> cases() {
    return cases;
  }

  private static double[] frequencies(JsonNode reference) {
    return Stream.of("response", "loopGain")
        .flatMap(curve -> StreamSupport.stream(reference.get(curve).spliterator(), false))
        .mapToDouble(point -> point.get("f").asDouble())
        .distinct()
        .sorted()
        .toArray();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void nodesAtRest(Case one) {
    Map<String, Double> nodes = one.predicted().hookup().rest().orElseThrow().nodes();
    int checked = 0;
    for (Map.Entry<String, JsonNode> node : one.reference().get("nodes").properties()) {
      if (OWN_NAMES.stream().noneMatch(node.getKey()::startsWith)) {
        assertThat(nodes).containsKey(node.getKey());
        NODE.check(node.getKey(), nodes.get(node.getKey()), node.getValue().asDouble());
        checked++;
      }
    }
    assertThat(checked).isGreaterThanOrEqualTo(9);
  }

  @ParameterizedTest
  @MethodSource("cases")
  void figures(Case one) {
    GAIN.check("ideal", one.predicted().solved("idealGain"), number(one, "ideal"));
    double amplitude = one.predicted().hookup().hookup().source().amplitude().value();
    GAIN.check("P", Math.abs(one.predicted().solved("idealGain")) * amplitude, number(one, "P"));
    for (Map.Entry<String, JsonNode> figure : one.reference().get("figures").properties()) {
      String key = figure.getKey();
      if (figure.getValue().isNull()) {
        assertThat(one.predicted().solvedOrNone(key)).as(key).isEmpty();
      } else {
        assertThat(FIGURES).containsKey(key);
        FIGURES.get(key).check(key, one.predicted().solved(key), figure.getValue().asDouble());
      }
    }
    assertThat(one.reference().get("figures").size()).isEqualTo(FIGURES.size());
  }

  @ParameterizedTest
  @MethodSource("cases")
  void responseAndLoopGain(Case one) {
    checkPoints(one.predicted().hookup().response(), one.reference().get("response"), 1e-4);
    checkPoints(one.predicted().hookup().loopGain(), one.reference().get("loopGain"), 1e-3);
  }

  private static void checkPoints(List<ComplexPoint> points, JsonNode expected, double relative) {
    assertThat(expected.size()).isPositive();
    for (JsonNode point : expected) {
      double frequency = point.get("f").asDouble();
      ComplexPoint ours =
          points.stream().filter(p -> p.frequency() == frequency).findFirst().orElseThrow();
      double re = point.get("re").asDouble();
      double im = point.get("im").asDouble();
      assertThat(Math.hypot(ours.re() - re, ours.im() - im))
          .as(
              "at %s Hz: found %s + j %s, expected %s + j %s",
              frequency, ours.re(), ours.im(), re, im)
          .isLessThanOrEqualTo(relative * Math.hypot(re, im));
    }
  }

  @ParameterizedTest
  @MethodSource("cases")
  void growingFrequenciesAtRest(Case one) {
    List<Root> ours =
        one.predicted().hookup().unstablePoles().stream()
            .sorted(Comparator.comparingDouble(Root::im))
            .toList();
    List<JsonNode> expected =
        StreamSupport.stream(one.reference().get("unstable").spliterator(), false)
            .sorted(Comparator.comparingDouble(root -> root.get(1).asDouble()))
            .toList();
    assertThat(ours).hasSameSizeAs(expected);
    for (int i = 0; i < ours.size(); i++) {
      double re = expected.get(i).get(0).asDouble();
      double im = expected.get(i).get(1).asDouble();
      assertThat(Math.hypot(ours.get(i).re() - re, ours.get(i).im() - im))
          .isLessThanOrEqualTo(2e-3 * Math.hypot(re, im));
    }
  }

  @ParameterizedTest
  @MethodSource("cases")
  void verdictAtEveryLevel(Case one) {
    double amplitude = one.predicted().hookup().hookup().source().amplitude().value();
    double centre = one.predicted().hookup().hookup().source().dc().value();
    JsonNode levels = one.reference().get("overSwing");
    assertThat(levels.size()).isEqualTo(21);
    for (int k = 0; k < 21; k++) {
      double generator = centre + amplitude * (k - 10) / 10;
      SwingLevel ours =
          one.predicted().hookup().overSwing().stream()
              .min(Comparator.comparingDouble(level -> Math.abs(level.generator() - generator)))
              .orElseThrow();
      assertThat(Math.abs(ours.generator() - generator)).isLessThan(1e-9);
      SAME_LEVEL.check("output", ours.output(), levels.get(k).get("output").asDouble());
      assertThat(ours.stable())
          .as("at %s V", ours.output())
          .isEqualTo(levels.get(k).get("unstable").isEmpty());
    }
  }

  private static double number(Case one, String key) {
    return one.reference().get(key).asDouble();
  }
}
