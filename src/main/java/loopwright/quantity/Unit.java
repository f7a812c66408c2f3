package loopwright.quantity;

/**
 * The units that a design or a figure may carry. Values are always in the plain unit, never in a
 * multiple.
 */
public enum Unit {
  /** A ratio: no unit. */
  ONE(""),
  VOLT("V"),
  AMPERE("A"),
  OHM("Ω"),
  SIEMENS("S"),
  FARAD("F"),
  HENRY("H"),
  HERTZ("Hz"),
  SECOND("s"),
  WATT("W"),
  /** Temperatures of a design are in degrees Celsius, the format's only value that is not SI. */
  CELSIUS("°C"),
  KELVIN_PER_WATT("K/W"),
  VOLT_PER_SECOND("V/s"),
  VOLT_PER_KELVIN("V/K"),
  VOLT_PER_ROOT_HERTZ("V/√Hz"),
  PER_SECOND("1/s"),
  DEGREE("°"),
  DECIBEL("dB");

  private final String symbol;

  Unit(String symbol) {
    this.symbol = symbol;
  }

  /** The printed symbol; empty for a ratio. */
  public String symbol() {
    return symbol;
  }
}
