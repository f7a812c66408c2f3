package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import loopwright.bench.NodeSuspects.Suspect;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupFigures;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** What first power asks for, and what a node that is off points to. */
class FirstPowerTest {
  private final Design design =
      new DesignFile(
              new ShelfFile().shipped(),
              Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
          .read(Path.of("examples", "seismometer-coil.json"))
          .design();

  @Test
  void limitAndStopLieAboveEveryGoodBuild() {
    FirstPower power = FirstPower.of(design, "divider", 60, 1, Progress.none());
    HookupFigures nominal = HookupFigures.of(design, "divider");

    assertThat(power.supplies()).hasSize(2);
    for (FirstPower.Supply supply : power.supplies()) {
      double current = supply.current().number().orElseThrow();
      assertThat(current)
          .isEqualTo(nominal.supplyCurrent(supply.positive()).number().orElseThrow());
      assertThat(supply.low()).isLessThan(current);
      assertThat(supply.high()).isGreaterThan(current);
      assertThat(supply.stop()).isGreaterThan(supply.high());
      assertThat(supply.limit()).isGreaterThan(supply.stop());
    }
    assertThat(FirstPower.of(design, "divider", 60, 1, Progress.none())).isEqualTo(power);
  }

  /**
   * Laws of the circuit, no program: with its tail's set resistor open the pair carries nothing, so
   * that its loads drop nothing and its collectors rise to the rail; with the gain stage's load
   * resistor open nothing pulls the output down.
   */
  @Test
  void suspectsAreThoseThatTheLawsOfTheCircuitName() {
    NodeSuspects suspects =
        NodeSuspects.of(
            design,
            "divider",
            List.of("positive", "pairOther", "pairOut", "gainOut", "tail.reference"),
            Map.of(),
            Progress.none());

    assertThat(suspects.nodes().get(0).name()).isEqualTo("positive");
    assertThat(suspects.shown()).isBetween(suspects.faults() / 2, suspects.faults());
    NodeSuspects.Node other = node(suspects, "pairOther");
    assertThat(parts(other.ifHigh())).contains("amplifier.inputPair.load.other");
    assertThat(parts(node(suspects, "tail.reference").ifHigh()))
        .contains("amplifier.inputPair.tail.setResistance");
    assertThat(node(suspects, "positive").ifLow())
        .contains(new Suspect("rails.positive", "rails.positive: missing"));
  }

  /** Every suspect that is named does move the node, and that way. */
  @Test
  void theOrderShowsMostFaultsFirst() {
    List<String> names = List.of("out", "pairOut", "tail", "emitter1");
    NodeSuspects suspects = NodeSuspects.of(design, "divider", names, Map.of(), Progress.none());

    assertThat(suspects.nodes()).extracting(NodeSuspects.Node::name).containsAll(names);
    assertThat(suspects.nodes().get(0).ifHigh()).isNotEmpty();
    assertThat(suspects.nodes())
        .allSatisfy(node -> assertThat(node.ifHigh().size()).isLessThanOrEqualTo(3));
    assertThat((double) suspects.shown() / suspects.faults()).isCloseTo(0.7, within(0.3));
  }

  private static NodeSuspects.Node node(NodeSuspects suspects, String name) {
    return suspects.nodes().stream()
        .filter(node -> node.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  private static List<String> parts(List<Suspect> suspects) {
    return suspects.stream().map(Suspect::part).toList();
  }
}
