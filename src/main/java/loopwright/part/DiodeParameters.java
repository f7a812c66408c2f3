package loopwright.part;

/**
 * A complete set of parameters of the diode equations at 298.15 K, in SI units.
 *
 * @param saturationCurrent I_S, A
 * @param ideality n
 * @param seriesResistance Ω
 * @param capacitance zero-bias depletion capacitance, F
 * @param transitTime s
 */
public record DiodeParameters(
    double saturationCurrent,
    double ideality,
    double seriesResistance,
    double capacitance,
    double transitTime) {
  /** What holds where a record says nothing; the saturation current has no default. */
  public static final DiodeParameters DEFAULTS = new DiodeParameters(Double.NaN, 1, 0, 0, 0);
}
