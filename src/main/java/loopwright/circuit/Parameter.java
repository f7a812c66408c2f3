package loopwright.circuit;

/** What of an element may differ from build to build, and how its change is measured. */
public enum Parameter {
  /** Resistance, by its natural logarithm. */
  RESISTANCE,
  /** Capacitance, by its natural logarithm. */
  CAPACITANCE,
  /** Voltage of a supply, by its natural logarithm. */
  SUPPLY,
  /** Junction voltage at equal current at 25 °C, V: V_BE of a transistor, V_F of a diode. */
  JUNCTION_VOLTAGE,
  /** Forward current gain at every current, by its natural logarithm. */
  CURRENT_GAIN
}
