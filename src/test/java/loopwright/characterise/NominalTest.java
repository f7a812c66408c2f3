package loopwright.characterise;

import static loopwright.characterise.Records.none;
import static loopwright.characterise.Records.of;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** The rules for nominal values are the project's own; the numbers are elementary. */
class NominalTest {
  @Test
  void aTypicalValueWins() {
    assertThat(Nominal.of(of(1), of(5), of(6))).isEqualTo(new Nominal(5, Nominal.Origin.TYPICAL));
  }

  @Test
  void betweenMinimumAndMaximumGainsAreMeanedAsRatiosAndTheRestAsSums() {
    assertThat(Nominal.ofGain(of(100), none(), of(400)).value()).isCloseTo(200, within(1e-12));
    assertThat(Nominal.of(of(0.65), none(), of(0.85)).value()).isCloseTo(0.75, within(1e-15));
  }

  @Test
  void aMinimumAloneCountsOneAndAHalfTimes() {
    assertThat(Nominal.ofGain(of(40), none(), none()))
        .isEqualTo(new Nominal(60, Nominal.Origin.ABOVE_MINIMUM));
  }

  @Test
  void aMaximumAloneIsNeverFitted() {
    assertThat(Nominal.of(none(), none(), of(4)).isUsable()).isFalse();
    assertThat(Nominal.of(none(), none(), none()).isUsable()).isFalse();
  }
}
