package loopwright.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Quantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ChangeTest {
  private final Design design = SampleDesigns.full();

  @Test
  void readsTheTextByTheFieldsMeasure() {
    Design changed =
        new Change("amplifier.gainStage.compensation.resistance", "4k7").applyTo(design);
    assertThat(DesignPath.get(changed, "amplifier.gainStage.compensation.resistance"))
        .isEqualTo(PartValue.of(new Quantity(4700, "4k7", false)));
    assertThat(new Change("surroundings.ambient", "40 °C").applyTo(design).surroundings().ambient())
        .isEqualTo(new Quantity(40, "40 °C", false));
  }

  @Test
  void keepsTheToleranceOfAPartAndDropsWhatWasMeasured() {
    Design changed = new Change("amplifier.inputPair.emitterResistance", "68").applyTo(design);
    assertThat(DesignPath.get(changed, "amplifier.inputPair.emitterResistance"))
        .isEqualTo(
            new PartValue(
                new Quantity(68, "68", false),
                Optional.of(SampleDesigns.quantity("1%")),
                Optional.empty()));
    Design measured =
        new Change("amplifier.inputPair.emitterResistance.measured", "47.3").applyTo(design);
    assertThat(DesignPath.get(measured, "amplifier.inputPair.emitterResistance.value"))
        .isEqualTo(SampleDesigns.quantity("47"));
  }

  /** Changes made together may set one thing and take another away. */
  @Test
  void changesTogetherMaySetAndTakeAway() {
    Change set = new Change("hookups.gain.feedback.upper", "0");
    Change take = new Change("hookups.gain.feedback.lower", "");
    assertThat(DesignPath.find(design, take.path())).isPresent();
    Design changed = Change.applyAll(design, List.of(take, set));
    assertThat(DesignPath.find(changed, take.path())).isEmpty();
    assertThat(changed).isEqualTo(set.applyTo(take.applyTo(design)));
  }

  @ParameterizedTest
  @CsvSource({
    "name, new name",
    "surroundings.selfHeating, false",
    "amplifier.gainStage.load.count, 3",
    "hookups.gain.feedback.returnTo, ground",
    "parts.N.kind, pnp",
    "drawer.resistors, E12",
    "tolerances.beta, datasheet",
    "tolerances.beta, 20%",
    "limits.0.maximum, 10.2",
    "bench.readings.0.value, -58 mV"
  })
  void readsEveryShapeOfSingleValue(String path, String text) {
    Design changed = new Change(path, text).applyTo(design);
    assertThat(changed).isNotEqualTo(design);
    assertThat(DesignPath.get(changed, path))
        .isEqualTo(FieldText.parse(DesignPath.field(design, path), text, path));
  }

  @Test
  void anEmptyTextTakesSomethingOptionalAway() {
    assertThat(new Change("amplifier.gainStage.emitterBypass", "").applyTo(design))
        .isEqualTo(DesignPath.set(design, "amplifier.gainStage.emitterBypass", null));
    assertThatThrownBy(
            () -> new Change("amplifier.gainStage.load.feedResistance", "").applyTo(design))
        .isInstanceOf(DesignException.class);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "amplifier.gainStage.emitterResistance | 4.7 kHz | found \"4.7 kHz\", expected a resistance"
            + " in Ω, such as 4.7k or 4k7",
        "amplifier.gainStage.emitterResistance | -47 | found \"-47\", expected a resistance in Ω"
            + " that is zero or more",
        "amplifier.gainStage.load.count | 2.5 | found \"2.5\", expected a whole number",
        "surroundings.selfHeating | yes | found \"yes\", expected true or false",
        "hookups.gain.feedback.returnTo | earth | found \"earth\", expected one of ground, midRail",
        "drawer.resistors | E13 | found \"E13\", expected a list of values, or a series such as E24",
        "tolerances.resistor | 150% | found \"150%\", expected a plain number that is a fraction from"
            + " 0 to 1, or per cent",
        "amplifier.gainStage.load | resistor | found \"resistor\", expected a block whose kind is one"
            + " of resistor, ideal, mirror, diodeBiased, twoTransistor",
        "limits.0.minimum | infinite | found \"infinite\", expected a plain number that is finite"
      })
  void namesPlaceFoundAndExpected(String path, String text, String says) {
    assertThatThrownBy(() -> new Change(path, text).applyTo(design))
        .isInstanceOf(DesignException.class)
        .hasMessage(path + ": " + says)
        .satisfies(
            thrown ->
                assertThat(((DesignException) thrown).problems())
                    .containsExactly(new Problem(path, says)));
  }
}
