package loopwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Marks and letters of IEC 60062. */
class LetterCodeTest {
  @ParameterizedTest
  @CsvSource({
    "4K7K, 4700, K",
    "4K7J, 4700, J",
    "470RK, 470, K",
    "470KK, 470e3, K",
    "R47F, 0.47, F",
    "2M2M, 2.2e6, M"
  })
  void tellsTheMultiplierFromTheTolerance(String text, double ohms, ToleranceLetter letter) {
    LetterCode code = LetterCode.parse(text, Unit.OHM);
    assertThat(code.value()).isEqualTo(ohms);
    assertThat(code.tolerance()).contains(letter);
  }

  @Test
  void readsMarksWithoutTolerance() {
    assertThat(LetterCode.parse("470K", Unit.OHM).tolerance()).isEmpty();
    assertThat(LetterCode.parse("470K", Unit.OHM).value()).isEqualTo(470e3);
    assertThat(LetterCode.parse("100nF", Unit.FARAD).tolerance()).isEmpty();
    assertThat(LetterCode.parse("4p7D", Unit.FARAD).tolerance()).contains(ToleranceLetter.D);
  }

  @ParameterizedTest
  @ValueSource(strings = {"4K7Q", "470J", "", "K", "4K7KK", "4.7K"})
  void refusesWhatIsNoMark(String text) {
    assertThatThrownBy(() -> LetterCode.parse(text, Unit.OHM))
        .isInstanceOf(QuantityException.class)
        .hasMessageContaining("found \"");
  }

  /** 4.7 kΩ ±5 % lies between 4465 and 4935 Ω. */
  @Test
  void givesTheBoundsOfAMarkedPart() {
    Offset<Double> rounding = Offset.offset(1e-9);
    assertThat(ToleranceLetter.J.lowest(4700, Unit.OHM)).isCloseTo(4465, rounding);
    assertThat(ToleranceLetter.J.highest(4700, Unit.OHM)).isCloseTo(4935, rounding);
    assertThat(ToleranceLetter.Z.lowest(100e-9, Unit.FARAD)).isCloseTo(80e-9, Offset.offset(1e-20));
    assertThat(ToleranceLetter.Z.highest(100e-9, Unit.FARAD))
        .isCloseTo(180e-9, Offset.offset(1e-20));
  }

  /** D to N as public charts of the code print them, B and C from memory. */
  @ParameterizedTest
  @CsvSource({
    "B, 0.001",
    "C, 0.0025",
    "D, 0.005",
    "F, 0.01",
    "G, 0.02",
    "J, 0.05",
    "K, 0.1",
    "M, 0.2",
    "N, 0.3"
  })
  void knowsTheSymmetricLetters(String letter, double fraction) {
    ToleranceLetter tolerance = ToleranceLetter.fromLetter(letter).orElseThrow();
    assertThat(tolerance.highest(1, Unit.OHM)).isCloseTo(1 + fraction, Offset.offset(1e-12));
    assertThat(tolerance.lowest(1, Unit.OHM)).isCloseTo(1 - fraction, Offset.offset(1e-12));
  }

  @ParameterizedTest
  @CsvSource({"B, 0.1e-12", "C, 0.25e-12", "D, 0.5e-12"})
  void readsPicofaradsOnSmallCapacitors(ToleranceLetter letter, double farads) {
    assertThat(letter.highest(4.7e-12, Unit.FARAD))
        .isCloseTo(4.7e-12 + farads, Offset.offset(1e-24));
    assertThat(letter.lowest(4.7e-12, Unit.FARAD))
        .isCloseTo(4.7e-12 - farads, Offset.offset(1e-24));
    assertThat(letter.highest(47e-12, Unit.FARAD)).isNotEqualTo(47e-12 + farads);
  }
}
