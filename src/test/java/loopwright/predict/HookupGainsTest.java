package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.design.ReturnNode;
import loopwright.design.Source;
import loopwright.design.TakenFrom;
import loopwright.quantity.Quantity;
import org.junit.jupiter.api.Test;

/** Ideal gains from Ohm's law alone; the two-resistor divider's worst cases are arithmetic. */
class HookupGainsTest {
  private static final Load NO_LOAD =
      new Load(
          Optional.empty(), Optional.empty(), PartValue.of(0), Optional.empty(), Optional.empty());

  private static Source source(double resistance, Optional<Source.Attenuator> attenuator) {
    return source(resistance, attenuator, Optional.empty(), Optional.empty());
  }

  private static Source source(
      double resistance,
      Optional<Source.Attenuator> attenuator,
      Optional<PartValue> coupling,
      Optional<PartValue> bias) {
    return new Source(
        PartValue.of(resistance),
        Quantity.of(0.5),
        Quantity.of(1),
        Quantity.of(1000),
        attenuator,
        coupling,
        bias,
        ReturnNode.GROUND);
  }

  private static Feedback divider(double upper, double lower, boolean blocked) {
    return new Feedback.NonInverting(
        PartValue.of(upper),
        Optional.of(PartValue.of(lower)),
        blocked ? Optional.of(PartValue.of(1e-4)) : Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  private static HookupGains gains(Source source, Feedback feedback) {
    return new HookupGains(new Hookup("test", source, feedback, NO_LOAD, List.of()));
  }

  @Test
  void aDividerOfTenToOneGivesEleven() {
    HookupGains gains = gains(source(600, Optional.empty()), divider(10e3, 1e3, false));
    assertThat(gains.idealGain().orElseThrow()).isCloseTo(11, within(1e-12));
    assertThat(gains.noiseGain().orElseThrow()).isCloseTo(11, within(1e-12));
    assertThat(gains.reference(0)).isCloseTo(5.5, within(1e-12));
  }

  @Test
  void fivePerCentPartsSpreadElevenFromTenToTwelve() {
    HookupGains low = gains(source(0, Optional.empty()), divider(9.5e3, 1.05e3, false));
    HookupGains high = gains(source(0, Optional.empty()), divider(10.5e3, 0.95e3, false));
    assertThat(low.idealGain().orElseThrow()).isCloseTo(10.05, within(0.005));
    assertThat(high.idealGain().orElseThrow()).isCloseTo(12.05, within(0.005));
  }

  @Test
  void aBlockedDividerHasNoiseGainOneAtRest() {
    HookupGains gains = gains(source(600, Optional.empty()), divider(10e3, 1e3, true));
    assertThat(gains.noiseGain().orElseThrow()).isCloseTo(11, within(1e-12));
    assertThat(gains.restNoiseGain().orElseThrow()).isEqualTo(1);
    assertThat(gains.reference(0)).isCloseTo(0.5, within(1e-12));
  }

  @Test
  void anInverterCountsItsSourceResistance() {
    Feedback inverting =
        new Feedback.Inverting(
            PartValue.of(47e3),
            PartValue.of(1e3),
            Optional.empty(),
            PartValue.of(910),
            ReturnNode.GROUND,
            TakenFrom.OUT);
    HookupGains gains = gains(source(10e3, Optional.empty()), inverting);
    assertThat(gains.idealGain().orElseThrow()).isCloseTo(-47.0 / 11, within(1e-12));
    assertThat(gains.noiseGain().orElseThrow()).isCloseTo(1 + 47.0 / 11, within(1e-12));
    assertThat(gains.restResistanceAtPlus()).isEqualTo(910);
  }

  @Test
  void anAttenuatorOfThousandToOneScalesTheInput() {
    Source.Attenuator attenuator = new Source.Attenuator(PartValue.of(9990), PartValue.of(10));
    HookupGains gains =
        gains(source(0, Optional.of(attenuator)), new Feedback.Open(PartValue.of(0)));
    assertThat(gains.inputRatio()).isCloseTo(1e-3, within(1e-15));
    assertThat(gains.sourceResistance()).isCloseTo(9.99, within(1e-12));
    assertThat(gains.idealGain()).isEmpty();
  }

  @Test
  void aCoupledInputSeesItsBiasResistorAtRest() {
    HookupGains gains =
        gains(
            source(
                10e3,
                Optional.empty(),
                Optional.of(PartValue.of(1e-6)),
                Optional.of(PartValue.of(90e3))),
            divider(10e3, 1e3, false));
    assertThat(gains.inputRatio()).isCloseTo(0.9, within(1e-12));
    assertThat(gains.sourceResistance()).isCloseTo(9e3, within(1e-9));
    assertThat(gains.restResistanceAtPlus()).isEqualTo(90e3);
    assertThat(gains.reference(0)).isZero();
  }
}
