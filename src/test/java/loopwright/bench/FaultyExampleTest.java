package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loopwright.bench.Explanation.Kind;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.file.ExampleDesigns;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** The example of a faulty build: its readings are what it says they are, and explained. */
class FaultyExampleTest {
  private static final String WRONG = "amplifier.gainStage.load.resistance";

  private static final Design EXAMPLE = ExampleDesigns.read("river-gauge-faulty.json");

  /** The notes: 47 kΩ in place of 4.7 kΩ, computed, and rounded as a meter shows it. */
  @Test
  void itsReadingsAreThoseOfTheBuildThatItsNotesTellOf() {
    SimulatedBench bench = new SimulatedBench(EXAMPLE);
    Candidate fault =
        bench.faults().stream()
            .filter(each -> each.says().equals(WRONG + ": a decade wrong, 47 kΩ"))
            .findFirst()
            .orElseThrow();
    Design computed =
        bench.read(Optional.of(fault), new double[bench.parts().size()], Optional.empty()).get();
    List<Reading> readings = EXAMPLE.bench().readings();
    for (int i = 0; i < readings.size(); i++) {
      double value = computed.bench().readings().get(i).value().value();
      assertThat(readings.get(i).value().value())
          .as("%s", computed.bench().readings().get(i))
          .isEqualTo(value, within(1e-9));
    }
  }

  @Test
  void theSetDoesNotAgreeAndTheWrongPartIsNamedFirst() {
    assertThat(BenchComparison.of(EXAMPLE, Progress.none()).set().agrees()).isFalse();
    Explanations explanations = FaultSearch.of(EXAMPLE, Progress.none());
    Explanation first = explanations.explanations().get(0);
    assertThat(first.kind()).isEqualTo(Kind.FAULT);
    assertThat(first.part()).isEqualTo(WRONG);
    assertThat(explanations.next()).isPresent();
  }
}
