package loopwright.quantity;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * The units that a design or a figure may carry. Values are always in the plain unit, never in a
 * multiple.
 */
public enum Unit {
  /** A ratio: no unit. */
  ONE("", "a plain number", "200 or 1%", true),
  VOLT("V", "a voltage", "12 or 10mV", true, "volt", "volts"),
  AMPERE("A", "a current", "2m or 1.5 mA", true, "amp", "ampere"),
  OHM("Ω", "a resistance", "4.7k or 4k7", true, "ohm", "Ohm", "ohms", "Ohms"),
  SIEMENS("S", "a conductance", "40m or 20 µS", true),
  FARAD("F", "a capacitance", "22p or 4n7", true, "farad"),
  HENRY("H", "an inductance", "10u or 1 mH", true, "henry"),
  HERTZ("Hz", "a frequency", "1k or 300 MHz", true, "hertz"),
  SECOND("s", "a time", "4n or 0.5 ms", true, "sec"),
  WATT("W", "a power", "0.5 or 625 mW", true, "watt"),
  /** Temperatures of a design are in degrees Celsius, the format's only value that is not SI. */
  CELSIUS("°C", "a temperature", "25 or 25 °C", false, "C", "\u2103", "degC"),
  KELVIN_PER_WATT("K/W", "a thermal resistance", "200 or 200 K/W", false, "°C/W", "C/W"),
  VOLT_PER_SECOND("V/s", "a slew rate", "500k or 0.5 V/µs", true),
  VOLT_PER_KELVIN("V/K", "a drift", "-2m or 10 µV/K", true, "V/°C"),
  VOLT_PER_ROOT_HERTZ("V/√Hz", "a noise density", "4n or 4 nV/√Hz", true, "V/rtHz"),
  PER_SECOND("1/s", "a rate", "1e6 or 1e6 1/s", false, "/s", "rad/s"),
  DEGREE("°", "an angle", "60 or 60°", false, "deg"),
  DECIBEL("dB", "a level", "6 or 6 dB", false);

  private final String symbol;
  private final String says;
  private final String examples;
  private final boolean prefixed;
  private final List<String> spellings;

  Unit(String symbol, String says, String examples, boolean prefixed, String... otherSpellings) {
    this.symbol = symbol;
    this.says = says;
    this.examples = examples;
    this.prefixed = prefixed;
    this.spellings = List.of(otherSpellings);
  }

  /** The printed symbol; empty for a ratio. */
  public String symbol() {
    return symbol;
  }

  /** What a value of this unit is, with its article: {@code a resistance}. */
  public String says() {
    return says;
  }

  /** Whether multiples such as kilo and milli are usual with this unit. */
  public boolean isPrefixed() {
    return prefixed;
  }

  /** What is expected where a value of this unit stands, with examples, for messages. */
  public String expectation() {
    return says + (symbol.isEmpty() ? "" : " in " + symbol) + ", such as " + examples;
  }

  /** The symbol and the other spellings that people use for it; none is empty. */
  List<String> spellings() {
    if (symbol.isEmpty()) {
      return spellings;
    }
    return Stream.concat(Stream.of(symbol), spellings.stream()).toList();
  }

  /**
   * The unit that a symbol, or another usual spelling of it, stands for.
   *
   * @param symbol without prefix; an empty text is a ratio
   */
  public static Optional<Unit> fromSymbol(String symbol) {
    String normal = Spelling.normal(symbol);
    if (normal.isEmpty()) {
      return Optional.of(ONE);
    }
    return Arrays.stream(values()).filter(unit -> unit.spellings().contains(normal)).findFirst();
  }
}
