package loopwright.circuit;

/** Physical constants and the temperature laws of junctions. */
public final class Physics {
  /** Boltzmann constant, J/K; exact (SI 2019). */
  public static final double BOLTZMANN = 1.380649e-23;

  /** Elementary charge, C; exact (SI 2019). */
  public static final double ELEMENTARY_CHARGE = 1.602176634e-19;

  /** 0 °C in K. */
  public static final double ZERO_CELSIUS = 273.15;

  /** Temperature at which device parameters are given, K. */
  public static final double NOMINAL_TEMPERATURE = 298.15;

  /** Band gap that the saturation-current law uses, V. */
  public static final double BAND_GAP = 1.12;

  private Physics() {}

  /** Thermal voltage kT/q in V, for a temperature in K. */
  public static double thermalVoltage(double kelvin) {
    return BOLTZMANN * kelvin / ELEMENTARY_CHARGE;
  }

  /**
   * Factor by which a saturation current grows from 298.15 K: (T/T₀)³ exp((1.12 eV/k)(1/T₀ − 1/T)).
   *
   * @param kelvin temperature, K
   */
  public static double saturationCurrentFactor(double kelvin) {
    double ratio = kelvin / NOMINAL_TEMPERATURE;
    double activation = BAND_GAP * ELEMENTARY_CHARGE / BOLTZMANN;
    return ratio * ratio * ratio * Math.exp(activation * (1 / NOMINAL_TEMPERATURE - 1 / kelvin));
  }

  /** Factor by which current gain grows from 298.15 K: (T/T₀)^1.5, for a temperature in K. */
  public static double betaFactor(double kelvin) {
    return Math.pow(kelvin / NOMINAL_TEMPERATURE, 1.5);
  }
}
