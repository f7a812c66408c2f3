package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import loopwright.check.Finding;
import loopwright.check.Finding.Severity;
import loopwright.design.Amplifier;
import loopwright.design.Hookup;
import loopwright.view.SampleDesigns;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FindingPlaceTest {
  private static SignalPath path(Amplifier amplifier) {
    Hookup hookup = SampleDesigns.divider(0.2);
    return PathReader.read(SampleDesigns.design(amplifier, hookup), hookup, Optional.empty());
  }

  private static List<String> marked(Amplifier amplifier, String where) {
    SignalPath path = path(amplifier);
    FindingPlace places = new FindingPlace(path);
    List<Finding> findings = List.of(new Finding(Severity.RISKY, where, "says", ""));
    return path.walk().stream()
        .filter(block -> places.worst(findings, block).isPresent())
        .map(Block::id)
        .toList();
  }

  @ParameterizedTest
  @CsvSource({
    "amplifier.inputPair.load.output, amplifier.inputPair",
    "amplifier.inputPair.tail.setResistance, amplifier.inputPair.tail",
    "amplifier.gainStage.load, amplifier.gainStage.load",
    "amplifier.gainStage.compensation.capacitance, amplifier.gainStage",
    "pair.q2, amplifier.inputPair",
    "tail.q1, amplifier.inputPair.tail",
    "gain.q1, amplifier.gainStage",
    "gainLoad.q1, amplifier.gainStage.load",
    "out.upper, amplifier.outputStage",
    "bias.q1, amplifier.outputStage",
    "pairOut, amplifier.inputPair",
    "hookups.divider, feedback",
    "hookups.divider.feedback.upper, feedback",
    "hookups.divider.source.amplitude, source",
    "hookups.divider.load.isolation, load"
  })
  void aPlaceBelongsToOneBlock(String where, String block) {
    assertThat(marked(SampleDesigns.npn(), where)).containsExactly(block);
  }

  @Test
  void anotherHookupsFindingsMarkNothing() {
    assertThat(marked(SampleDesigns.npn(), "hookups.follower")).isEmpty();
    assertThat(marked(SampleDesigns.npn(), "hookups.divider2.load")).isEmpty();
    assertThat(marked(SampleDesigns.npn(), "parts.QN")).isEmpty();
  }

  @Test
  void allOfAnAmplifierByFiguresIsOneBlock() {
    assertThat(marked(SampleDesigns.figures(), "amplifier.deadZone")).containsExactly("amplifier");
    assertThat(marked(SampleDesigns.figures(), "out")).containsExactly("amplifier");
  }

  @Test
  void theWorstOneCounts() {
    SignalPath path = path(SampleDesigns.npn());
    Finding risky = new Finding(Severity.RISKY, "pair.q1", "risky", "");
    Finding fails = new Finding(Severity.FAILS, "pair.q2", "fails", "");
    Block pair = path.find("amplifier.inputPair").orElseThrow();
    assertThat(new FindingPlace(path).worst(List.of(risky, fails), pair)).contains(fails);
  }
}
