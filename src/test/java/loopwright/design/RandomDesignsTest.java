package loopwright.design;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** What laws are tried on: sound designs in which every variant of the stage library appears. */
class RandomDesignsTest {
  @Test
  void everyDesignIsSound() {
    RandomDesigns.of(200)
        .forEach(design -> assertThat(DesignValidation.check(design)).as(design.name()).isEmpty());
  }

  @Test
  void everyVariantAppears() {
    Map<Class<?>, Integer> counts = RandomDesigns.count(RandomDesigns.of(100));
    Stream.of(CurrentSource.class, PairLoad.class, OutputStage.class, Bias.class, Feedback.class)
        .flatMap(family -> Stream.of(family.getPermittedSubclasses()))
        .forEach(
            variant ->
                assertThat(counts.getOrDefault(variant, 0)).as("%s", variant).isGreaterThan(5));
    assertThat(counts.get(OutputStage.Drivers.class)).isGreaterThan(5);
    assertThat(counts.get(GainStage.Buffer.class)).isGreaterThan(5);
    assertThat(counts.get(GainStage.Compensation.class)).isGreaterThan(5);
  }
}
