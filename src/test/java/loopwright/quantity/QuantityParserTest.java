package loopwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityParserTest {
  /** Letter code of IEC 60062; the forms with k, p and u as they are commonly typed. */
  @ParameterizedTest
  @CsvSource({
    "R47, 0.47",
    "4R7, 4.7",
    "470R, 470",
    "4K7, 4700",
    "4k7, 4700",
    "47K3, 47300",
    "470K, 470e3",
    "4M7, 4.7e6",
    "2M2, 2.2e6",
    "-4k7, -4700"
  })
  void readsTheLetterCodeOfResistors(String text, double ohms) {
    assertThat(Quantity.parse(text, Unit.OHM).value()).isEqualTo(ohms);
  }

  /** Letter code of IEC 60062. */
  @ParameterizedTest
  @CsvSource({
    "4n7, 4.7e-9",
    "p47, 0.47e-12",
    "4p7, 4.7e-12",
    "47n, 47e-9",
    "2\u00B52, 2.2e-6",
    "2\u03BC2, 2.2e-6",
    "2u2, 2.2e-6",
    "1F5, 1.5",
    "1f5, 1.5e-15",
    "4n7F, 4.7e-9"
  })
  void readsTheLetterCodeOfCapacitors(String text, double farads) {
    assertThat(Quantity.parse(text, Unit.FARAD).value()).isEqualTo(farads);
  }

  @ParameterizedTest
  @CsvSource({
    "4700, OHM, 4700",
    "4.7k, OHM, 4700",
    "4.7 k, OHM, 4700",
    "4.7 kΩ, OHM, 4700",
    "4.7k\u2126, OHM, 4700",
    "4.7 kohm, OHM, 4700",
    "4.7 kOhm, OHM, 4700",
    "4k7 ohm, OHM, 4700",
    "47 R, OHM, 47",
    "10 mΩ, OHM, 0.01",
    "10 MΩ, OHM, 10e6",
    "1G, OHM, 1e9",
    "10mV, VOLT, 0.01",
    "-6.1 mV, VOLT, -0.0061",
    "\u22126.1 mV, VOLT, -0.0061",
    "+12, VOLT, 12",
    ".5, VOLT, 0.5",
    "22p, FARAD, 22e-12",
    "22 pF, FARAD, 22e-12",
    "5 F, FARAD, 5",
    "5 f, FARAD, 5e-15",
    "5 mF, FARAD, 5e-3",
    "1e-12, FARAD, 1e-12",
    "1E3, HERTZ, 1000",
    "1.5e3 kHz, HERTZ, 1.5e6",
    "300 MHz, HERTZ, 300e6",
    "1.52 mA, AMPERE, 1.52e-3",
    "400 ps, SECOND, 400e-12",
    "625 mW, WATT, 0.625",
    "20 µS, SIEMENS, 20e-6",
    "10 uH, HENRY, 10e-6",
    "200 K/W, KELVIN_PER_WATT, 200",
    "200, KELVIN_PER_WATT, 200",
    "25 °C, CELSIUS, 25",
    "-10 C, CELSIUS, -10",
    "0.5 V/µs, VOLT_PER_SECOND, 500e3",
    "0.5 V/us, VOLT_PER_SECOND, 500e3",
    "2 MV/s, VOLT_PER_SECOND, 2e6",
    "-2 mV/K, VOLT_PER_KELVIN, -0.002",
    "4 nV/√Hz, VOLT_PER_ROOT_HERTZ, 4e-9",
    "1e6 1/s, PER_SECOND, 1e6",
    "60°, DEGREE, 60",
    "6 dB, DECIBEL, 6",
    "1%, ONE, 0.01",
    "0.5 %, ONE, 0.005",
    "100k, ONE, 100e3",
    "200, ONE, 200"
  })
  void readsNumbersPrefixesAndUnits(String text, Unit unit, double value) {
    assertThat(Quantity.parse(text, unit).value()).isEqualTo(value);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "-6,1 mV | -0.0061",
        "12,5 | 12.5",
        "0,234 | 0.234",
        "1234,567 | 1234.567",
        ",5 | 0.5"
      })
  void readsADecimalCommaWhereItCanBeNothingElse(String text, double volts) {
    assertThat(Quantity.parse(text, Unit.VOLT).value()).isEqualTo(volts);
  }

  @Test
  void refusesACommaThatMayGroupThousandsAndSaysBothReadings() {
    assertThatThrownBy(() -> Quantity.parse("1,234", Unit.OHM))
        .isInstanceOf(QuantityException.class)
        .hasMessage(
            "found \"1,234\", which may mean 1.234 or 1234, expected a resistance in Ω, such as"
                + " 4.7k or 4k7");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        " ",
        "NaN",
        "nan",
        "1.2.3",
        "1,234,567",
        "1.234,5",
        "1,234.5",
        "4k7k",
        "4K7K",
        "4k7.1",
        "k",
        "R",
        "4x7",
        "0x10",
        "1d",
        "1e",
        "1e-",
        "--5",
        "5-",
        "+-5",
        "4 700",
        "1,",
        "ten",
        "4.7 kHz",
        "4.7 F",
        "1%",
        "4k7F",
        "4R7k",
        "470 kR",
        "1e999",
        "1e-999",
        "4.7 kk",
        "5 Ohm m",
        "٤٧"
      })
  void refusesWhatIsNoResistance(String text) {
    assertThatThrownBy(() -> Quantity.parse(text, Unit.OHM))
        .isInstanceOf(QuantityException.class)
        .hasMessageStartingWith("found \"" + text + "\"")
        .hasMessageEndingWith("expected a resistance in Ω, such as 4.7k or 4k7");
  }

  @ParameterizedTest
  @CsvSource({
    "4R7, FARAD",
    "47 R, VOLT",
    "200 K, KELVIN_PER_WATT",
    "25 k, CELSIUS",
    "25 mC, CELSIUS",
    "3k, DECIBEL",
    "1%, VOLT",
    "5 S, SECOND",
    "5 s, SIEMENS",
    "5 hz, HERTZ"
  })
  void refusesWhatBelongsToAnotherUnit(String text, Unit unit) {
    assertThatThrownBy(() -> Quantity.parse(text, unit))
        .isInstanceOf(QuantityException.class)
        .hasMessage("found \"" + text + "\", expected " + unit.expectation());
  }

  @ParameterizedTest
  @ValueSource(strings = {"infinite", "Infinite", "infinity", "∞"})
  void readsInfinityInWords(String text) {
    assertThat(Quantity.parse(text, Unit.OHM, Range.POSITIVE_OR_INFINITE).value())
        .isEqualTo(Double.POSITIVE_INFINITY);
    assertThatThrownBy(() -> Quantity.parse(text, Unit.OHM, Range.POSITIVE))
        .hasMessage("found \"" + text + "\", expected a resistance in Ω that is more than zero");
  }

  @Test
  void checksTheRange() {
    assertThatThrownBy(() -> Quantity.parse("-4k7", Unit.OHM, Range.NOT_NEGATIVE))
        .hasMessage("found \"-4k7\", expected a resistance in Ω that is zero or more");
    assertThatThrownBy(() -> Quantity.literal("7").requireWithin(Range.FRACTION, Unit.ONE))
        .hasMessage("found 7, expected a plain number that is a fraction from 0 to 1, or per cent");
    assertThat(Quantity.parse("0", Unit.OHM, Range.NOT_NEGATIVE).value()).isZero();
  }

  @Test
  void keepsTheSpelling() {
    assertThat(Quantity.parse("4k7", Unit.OHM)).isEqualTo(new Quantity(4700, "4k7", false));
    assertThat(Quantity.spelled(4700, Unit.OHM)).isEqualTo(new Quantity(4700, "4.7k", false));
    assertThatThrownBy(() -> Quantity.literal("1e999")).isInstanceOf(QuantityException.class);
  }

  @Test
  void readsTheUnitThatWasWrittenWhereNoneIsExpected() {
    assertThat(Quantity.parseAny("-6.1 mV").unit()).contains(Unit.VOLT);
    assertThat(Quantity.parseAny("-6.1 mV").quantity().value()).isEqualTo(-0.0061);
    assertThat(Quantity.parseAny("4R7").unit()).contains(Unit.OHM);
    assertThat(Quantity.parseAny("4k7").unit()).isEmpty();
    assertThat(Quantity.parseAny("4k7").quantity().value()).isEqualTo(4700);
    assertThat(Quantity.parseAny("13 MHz").unit()).contains(Unit.HERTZ);
    assertThat(Quantity.parseAny("1 %").unit()).contains(Unit.ONE);
    assertThat(Quantity.parseAny("9.77").unit()).isEmpty();
    assertThatThrownBy(() -> Quantity.parseAny("about ten"))
        .hasMessage("found \"about ten\", expected a value, such as 4.7k or -6.1 mV");
  }

  @Test
  void knowsUnitsByTheirSymbols() {
    for (Unit unit : Unit.values()) {
      assertThat(Unit.fromSymbol(unit.symbol())).contains(unit);
    }
    assertThat(Unit.fromSymbol("\u2126")).contains(Unit.OHM);
    assertThat(Unit.fromSymbol("furlong")).isEmpty();
  }
}
