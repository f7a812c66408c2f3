package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.LongFunction;
import loopwright.design.Design;
import loopwright.design.FrozenDesigns;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Any design is answered: solved with balanced currents, or refused with a reason. */
class OperatingPointCampaignTest {
  private static final int FEW = 400;

  @Test
  void plausibleDesignsAreSolved() {
    OperatingPointCampaign.Table table =
        OperatingPointCampaign.run(FrozenDesigns::plausible, 1, FEW);
    assertThat(table.unsolved()).isEmpty();
    assertThat(table.solved()).isEqualTo(1);
  }

  @Test
  void absurdDesignsAreAnswered() {
    OperatingPointCampaign.Table table = OperatingPointCampaign.run(FrozenDesigns::absurd, 1, FEW);
    assertThat(table.broken()).as("%s", table.unsolved()).isZero();
    assertThat(table.solved()).isEqualTo(1);
  }

  /**
   * An ideal source sinks more than the gain stage gives: its node runs off by millions of volts.
   */
  @ParameterizedTest
  @ValueSource(longs = {1915, 4143})
  void aNodeThatRunsOffIsSolvedAllTheSame(long seed) {
    OperatingPointCampaign.Table table =
        OperatingPointCampaign.run(FrozenDesigns::plausible, seed, 1);
    assertThat(table.unsolved()).isEmpty();
  }

  /** Resistors, rails and sources that fit nothing: each once ended the search. */
  @ParameterizedTest
  @ValueSource(
      longs = {
        103, 504, 528, 1001, 1008, 1332, 1486, 1915, 2215, 3246, 3548, 3600, 4143, 4675, 4680, 4952,
        5428, 5479, 5632
      })
  void onceUnsolvedStaysSolved(long seed) {
    OperatingPointCampaign.Table table = OperatingPointCampaign.run(FrozenDesigns::absurd, seed, 1);
    assertThat(table.unsolved()).isEmpty();
  }

  /** Where an ideal source drives its node beyond all measure, the answer says which node. */
  @ParameterizedTest
  @ValueSource(longs = {953, 2936, 3188, 11929, 12331, 12364, 16995, 18480, 18897})
  void whatIsNotSolvedSaysWhy(long seed) {
    OperatingPointCampaign.Table table = OperatingPointCampaign.run(FrozenDesigns::absurd, seed, 1);
    assertThat(table.broken()).isZero();
    for (OperatingPointCampaign.Case unsolved : table.unsolved()) {
      assertThat(unsolved.says())
          .contains("nothing takes up the current at node ")
          .contains("beyond ");
    }
  }

  @Test
  @Tag("campaign")
  void manyPlausibleDesigns() throws IOException {
    OperatingPointCampaign.Table table = campaign("plausible", FrozenDesigns::plausible);
    assertThat(table.broken()).isZero();
    assertThat(table.solved()).isGreaterThanOrEqualTo(0.9999);
  }

  @Test
  @Tag("campaign")
  void manyAbsurdDesigns() throws IOException {
    OperatingPointCampaign.Table table = campaign("absurd", FrozenDesigns::absurd);
    assertThat(table.broken()).isZero();
    assertThat(table.solved()).isGreaterThanOrEqualTo(0.999);
  }

  private static OperatingPointCampaign.Table campaign(String name, LongFunction<Design> generator)
      throws IOException {
    int designs = Integer.getInteger("campaign.designs", 100_000);
    OperatingPointCampaign.Table table = OperatingPointCampaign.run(generator, 1, designs);
    Path report = Files.createDirectories(Path.of("target", "campaigns"));
    Files.write(report.resolve("operating-point-" + name + ".txt"), lines(table));
    return table;
  }

  private static List<String> lines(OperatingPointCampaign.Table table) {
    List<String> lines = new ArrayList<>();
    lines.add(table.designs() + " designs from seed 1");
    table.counts().forEach((outcome, count) -> lines.add(outcome + " " + count));
    table.unsolved().forEach(each -> lines.add(each.seed() + ": " + each.says()));
    return lines;
  }
}
