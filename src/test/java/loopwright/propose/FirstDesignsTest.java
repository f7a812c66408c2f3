package loopwright.propose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import loopwright.check.Finding;
import loopwright.check.Findings;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Drawer;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.predict.SwingLevel;
import loopwright.task.CancelledException;
import loopwright.task.Progress;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** A first design keeps what it promises, or says what does not go. */
class FirstDesignsTest {
  private static final Shelf SHELF = new ShelfFile().shipped();

  private static FirstDesign first(Specification wanted) {
    return FirstDesigns.of(wanted, SHELF, Progress.none());
  }

  /** Holds an offered design against a prediction of its own; a refusal against its demands. */
  private static void holds(Specification wanted, FirstDesign first) {
    if (first.design().isEmpty()) {
      assertThat(first.demands()).anyMatch(demand -> !demand.met());
      assertThat(first.demands())
          .allSatisfy(demand -> assertThat(demand.met() || !demand.says().isBlank()).isTrue());
      assertThat(first.says()).startsWith("No design is offered. ");
      return;
    }
    Design design = first.design().get();
    Prediction prediction =
        Predictor.predict(design, List.of(), new double[] {1e3}, Progress.none());
    HookupPrediction hookup = prediction.hookups().get(0);
    double middle = hookup.rest().orElseThrow().nodes().getOrDefault("midRail", 0.0);
    assertThat(solved(hookup, "closedLoopGain") / wanted.gain())
        .isEqualTo(wanted.inverting() ? -1 : 1, within(wanted.gainTolerance()));
    assertThat(solved(hookup, "clipHigh") - middle).isGreaterThanOrEqualTo(1.05 * wanted.swing());
    assertThat(middle - solved(hookup, "clipLow")).isGreaterThanOrEqualTo(1.05 * wanted.swing());
    assertThat(solved(hookup, "bandwidth")).isGreaterThanOrEqualTo(wanted.bandwidth());
    assertThat(hookup.overSwing()).isNotEmpty().allMatch(SwingLevel::stable);
    assertThat(hookup.overSwing())
        .allMatch(level -> level.phaseMargin().orElse(180) >= wanted.margin());
    assertThat(Findings.of(prediction))
        .noneMatch(finding -> finding.severity() == Finding.Severity.FAILS);
    assertThat(first.reasons()).hasSizeGreaterThan(10);
    assertThat(first.reasons()).allSatisfy(reason -> assertThat(reason.says()).isNotBlank());
  }

  private static double solved(HookupPrediction hookup, String key) {
    return hookup.figures().get(key).solved().number().orElseThrow();
  }

  @Test
  void aFollowerIsOfferedAndTheSameTwice() {
    Specification wanted = Specifications.of(12, -12, 1, false, 2e3, 5, 200e3);
    FirstDesign once = first(wanted);
    assertThat(once.design()).as(once.says()).isPresent();
    holds(wanted, once);
    assertThat(first(wanted)).isEqualTo(once);
  }

  @Test
  void anInvertingAmplifierOnOneSupplyIsOffered() {
    Specification wanted = Specifications.of(9, 0, 2, true, 0, 1.5, 50e3, Preference.SIMPLE);
    FirstDesign first = first(wanted);
    assertThat(first.design()).as(first.says()).isPresent();
    holds(wanted, first);
  }

  @Test
  void aSwingBeyondTheRailsIsRefusedWithWhatWouldDo() {
    FirstDesign first = first(Specifications.of(9, -9, 10, false, 600, 9, 20e3));
    assertThat(first.design()).isEmpty();
    assertThat(first.says()).contains("Swing", "1 V too little", "rails of 10 V", "ask for 8 V");
  }

  @Test
  void aLoadThatWouldBurnEveryTransistorIsRefused() {
    FirstDesign first = first(Specifications.of(12, -12, 10, false, 8, 9, 20e3));
    assertThat(first.design()).isEmpty();
    assertThat(first.says()).contains("upper output transistor", "heat sink", "lower rails");
  }

  @Test
  void aPartThatNoShelfHasIsSaid() {
    Specification usual = Specifications.of(12, -12, 1, false, 2e3, 5, 200e3);
    Specification wanted =
        new Specification(
            12,
            -12,
            1,
            false,
            OptionalDouble.empty(),
            0,
            5,
            1e5,
            50,
            1e3,
            List.of("XY1"),
            usual.resistors(),
            usual.capacitors(),
            60,
            0.02,
            Set.of());
    assertThatThrownBy(() -> first(wanted))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("found \"XY1\"")
        .hasMessageContaining("BC547B");
  }

  @Test
  void valuesThatCannotBeAreSaidAllAtOnce() {
    assertThatThrownBy(
            () ->
                new Specification(
                    -1,
                    5,
                    0.5,
                    false,
                    OptionalDouble.of(0),
                    1,
                    0,
                    1,
                    -1,
                    0,
                    List.of(),
                    new Drawer.Stock.Series("E24"),
                    new Drawer.Stock.Series("E6"),
                    0,
                    0,
                    Set.of()))
        .isInstanceOfSatisfying(DesignException.class, e -> assertThat(e.problems()).hasSize(11));
  }

  @Test
  void itEndsWhenNobodyWantsItAnyMore() {
    Progress gone =
        new Progress() {
          @Override
          public void report(double share, String says) {
            // Nobody listens.
          }

          @Override
          public boolean cancelled() {
            return true;
          }
        };
    Specification wanted = Specifications.of(12, -12, 1, false, 2e3, 5, 200e3);
    assertThatThrownBy(() -> FirstDesigns.of(wanted, SHELF, gone))
        .isInstanceOf(CancelledException.class);
  }

  /** Two minutes and more; its table is copied to docs/reliability.md. */
  @Tag("campaign")
  @Test
  void plausibleSpecificationsAreMetOrRefused() throws IOException {
    int count = Integer.getInteger("campaign.designs", 40);
    StringBuilder table =
        new StringBuilder("| seed | rails | gain | load | swing | bandwidth | outcome |\n");
    table.append("|---|---|---|---|---|---|---|\n");
    for (long seed = 1; seed <= count; seed++) {
      Specification wanted = Specifications.plausible(seed);
      FirstDesign first = first(wanted);
      holds(wanted, first);
      table.append(
          String.format(
              Locale.ROOT,
              "| %d | %.0f, %.0f | %s%.0f | %s | %.1f V | %.0f kHz | %s |%n",
              seed,
              wanted.positive(),
              wanted.negative(),
              wanted.inverting() ? "−" : "",
              wanted.gain(),
              wanted.loadResistance().isPresent()
                  ? String.format(Locale.ROOT, "%.0f Ω", wanted.loadResistance().getAsDouble())
                  : "none",
              wanted.swing(),
              wanted.bandwidth() / 1e3,
              first.design().isPresent()
                  ? "met"
                  : first.says().replace("No design is offered. ", "refused: ")));
    }
    Path folder = Files.createDirectories(Path.of("target", "campaigns"));
    Files.writeString(folder.resolve("first-designs.md"), table);
  }
}
