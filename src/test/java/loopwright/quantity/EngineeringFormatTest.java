package loopwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class EngineeringFormatTest {
  @ParameterizedTest
  @CsvSource({
    "4700, OHM, 4.7 kΩ",
    "-0.0061, VOLT, −6.1 mV",
    "0.00152, AMPERE, 1.52 mA",
    "0, VOLT, 0 V",
    "-0.0, VOLT, 0 V",
    "999.94, OHM, 999.9 Ω",
    "999.96, OHM, 1 kΩ",
    "-999960, HERTZ, −1 MHz",
    "999.96e9, HERTZ, 1000 GHz",
    "0.47e-12, FARAD, 0.47 pF",
    "2200e-6, FARAD, 2200 µF",
    "0.022, FARAD, 22 mF",
    "4.7e-9, FARAD, 4.7 nF",
    "1e-18, AMPERE, 1e-18 A",
    "13.123456e6, HERTZ, 13.12 MHz",
    "1104.3, ONE, 1104",
    "0.99909, ONE, 0.9991",
    "9.8765, ONE, 9.877",
    "9.88, ONE, 9.88",
    "123456, ONE, 123500",
    "0.00012345, ONE, 0.0001235",
    "0.000012345, ONE, 12.35e-6",
    "12345678, ONE, 12.35e6",
    "25, CELSIUS, 25 °C",
    "68.42, DEGREE, 68.42°",
    "-3.01, DECIBEL, −3.01 dB",
    "21276595.7, VOLT_PER_SECOND, 21.28 V/µs",
    "500e3, VOLT_PER_SECOND, 0.5 V/µs",
    "120, VOLT_PER_SECOND, 120 V/s",
    "-0.00183, VOLT_PER_KELVIN, −1.83 mV/K",
    "1.116389378e-9, VOLT_PER_ROOT_HERTZ, 1.116 nV/√Hz",
    "200, KELVIN_PER_WATT, 200 K/W",
    "Infinity, OHM, ∞",
    "-Infinity, OHM, −∞"
  })
  void writesAsTheTradeDoes(double value, Unit unit, String expected) {
    assertThat(EngineeringFormat.format(value, unit)).isEqualTo(expected);
  }

  @Test
  void writesFewerOrAllDigits() {
    assertThat(EngineeringFormat.format(4683.2, Unit.OHM, 2)).isEqualTo("4.7 kΩ");
    assertThat(EngineeringFormat.full(4683.125, Unit.OHM)).isEqualTo("4.683125 kΩ");
    assertThat(EngineeringFormat.full(0.1 + 0.2, Unit.ONE)).isEqualTo("0.30000000000000004");
  }

  @Test
  void writesFractionsInPerCent() {
    assertThat(EngineeringFormat.percent(0.002)).isEqualTo("0.2 %");
    assertThat(EngineeringFormat.percent(-0.05)).isEqualTo("−5 %");
    assertThat(EngineeringFormat.percent(0.0313)).isEqualTo("3.13 %");
  }

  @Test
  void refusesToWriteWhatIsNoNumber() {
    assertThatThrownBy(() -> EngineeringFormat.format(Double.NaN, Unit.VOLT))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @ParameterizedTest
  @CsvSource({
    "4700, OHM, 4.7k",
    "-0.0061, VOLT, -6.1m",
    "22e-12, FARAD, 22p",
    "2.2e-6, FARAD, 2.2u",
    "12, VOLT, 12",
    "25.5, CELSIUS, 25.5",
    "Infinity, OHM, infinite"
  })
  void spellsValuesAsTheyAreTyped(double value, Unit unit, String expected) {
    assertThat(EngineeringFormat.spelling(value, unit)).isEqualTo(expected);
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void everySpellingReadsBackToTheSameValue(Unit unit) {
    Random random = new Random(60062);
    for (int i = 0; i < 500; i++) {
      double value = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(34) - 20);
      assertThat(Quantity.parse(EngineeringFormat.spelling(value, unit), unit).value())
          .isEqualTo(value);
      assertThat(Quantity.parse(EngineeringFormat.full(value, unit), unit).value())
          .isEqualTo(value);
    }
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void fourDigitsReadBackToFourDigits(Unit unit) {
    Random random = new Random(60063);
    for (int i = 0; i < 500; i++) {
      double value = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(34) - 20);
      // Half a unit of the fourth digit is at most 5 parts in 10 000 of the value.
      assertThat(Quantity.parse(EngineeringFormat.format(value, unit), unit).value())
          .isCloseTo(value, Offset.offset(Math.abs(value) * 5.001e-4));
    }
  }
}
