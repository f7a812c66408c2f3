package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.predict.Root;
import loopwright.predict.SampleDesigns;
import loopwright.predict.SwingLevel;
import org.junit.jupiter.api.Test;

class StabilityTextTest {
  private static final Feedback WIRE = SampleDesigns.divider(0, Optional.empty());

  @Test
  void namesTheSmallestMarginOfAStableSwing() {
    assertThat(sentences(WIRE, List.of(), stable(-1, 48), stable(0, 60), stable(1, 52)))
        .containsExactly(
            "Stable at all 3 output levels from −1 V to 1 V; smallest phase margin 48° at −1 V.");
  }

  @Test
  void saysFromWhereToWhereAnOscillationGrowsAndWhereFastest() {
    assertThat(
            sentences(
                WIRE,
                List.of(),
                growing(-1, 2e6),
                stable(0, 60),
                growing(0.5, 1e6),
                growing(1, 4e6)))
        .containsExactly(
            "Oscillation grows with the output at −1 V; fastest at −1 V, at 13 MHz, by the"
                + " factor e every 500 ns.",
            "Oscillation grows with the output from 500 mV to 1 V; fastest at 1 V, at 13 MHz, by the"
                + " factor e every 250 ns.");
  }

  @Test
  void tellsLatchingFromOscillation() {
    assertThat(sentences(WIRE, List.of(new Root(1e6, 0)), stable(0, 60)))
        .containsExactly("Latches at rest: a voltage runs away by the factor e every 1 µs.");
    assertThat(sentences(WIRE, List.of(new Root(1e6, 2 * Math.PI * 13e6)), stable(0, 60)))
        .containsExactly(
            "Oscillates at rest: starts at 13 MHz and grows by the factor e every 1 µs.");
    SwingLevel latched =
        new SwingLevel(
            0, 2, false, OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), 1);
    assertThat(sentences(WIRE, List.of(), stable(0, 60), latched))
        .containsExactly("Latches with the output at 2 V.");
  }

  @Test
  void givesAnOpenHookupNoMargin() {
    assertThat(sentences(new Feedback.Open(PartValue.of(0)), List.of(), stable(0, 60)))
        .containsExactly(
            "Stable at rest; without an amplitude no other level was looked at. There is no loop to"
                + " have a margin.");
  }

  @Test
  void givesNoVerdictWithoutAnOperatingPoint() {
    assertThat(StabilityText.sentences(prediction(WIRE, Optional.empty(), List.of())))
        .containsExactly("No verdict: it would not settle");
    assertThat(sentences(WIRE, List.of()))
        .containsExactly("No verdict: no output level was solved.");
  }

  private static List<String> sentences(Feedback feedback, List<Root> roots, SwingLevel... levels) {
    RestState rest = new RestState(Map.of(), Map.of(), 0, 0);
    return StabilityText.sentences(prediction(feedback, Optional.of(rest), roots, levels));
  }

  private static HookupPrediction prediction(
      Feedback feedback, Optional<RestState> rest, List<Root> roots, SwingLevel... levels) {
    Hookup hookup = SampleDesigns.hookup("bench", feedback);
    return new HookupPrediction(
        hookup,
        rest,
        rest.isPresent() ? "" : "it would not settle",
        Map.of(),
        List.of(),
        List.of(),
        roots,
        List.of(levels),
        "",
        List.of(),
        List.of(),
        Optional.empty(),
        List.of());
  }

  private static SwingLevel stable(double output, double margin) {
    return level(output, true, -1e6, margin);
  }

  private static SwingLevel growing(double output, double growth) {
    return level(output, false, growth, -10);
  }

  private static SwingLevel level(double output, boolean stable, double growth, double margin) {
    return new SwingLevel(
        output,
        output,
        stable,
        OptionalDouble.of(13e6),
        OptionalDouble.of(growth),
        OptionalDouble.of(margin),
        1);
  }
}
