package loopwright.circuit;

import java.util.List;

/**
 * One source of noise at an operating point: a current from one node to another, or, where the
 * second is a branch, a voltage in series with it.
 *
 * @param element name of the element that makes it
 * @param cause why it does
 * @param from row that loses what {@code to} gains; −1 for none
 * @param to row that is excited; −1 for ground
 * @param level density, A²/Hz (in a branch V²/Hz); for flicker at 1 Hz
 */
public record NoiseSource(String element, Cause cause, int from, int to, double level) {
  /** Why there is noise. */
  public enum Cause {
    /** 4kT/R of a resistance (Johnson and Nyquist 1928). */
    THERMAL,
    /** 2q I_C (Schottky 1918). */
    COLLECTOR_SHOT,
    /** 2q I_B. */
    BASE_SHOT,
    /** 2q I of a diode. */
    DIODE_SHOT,
    /** 2q I_B times corner over frequency. */
    FLICKER
  }

  /**
   * Density at a frequency, A²/Hz; in a branch V²/Hz.
   *
   * @param frequency Hz, above zero
   */
  public double density(double frequency) {
    return cause == Cause.FLICKER ? level / frequency : level;
  }

  /**
   * Adds 4kT times a conductance in S (a current), or times a resistance in Ω (a voltage in a
   * branch); nothing at 0 K.
   */
  static void addThermal(
      String element, int from, int to, double value, double kelvin, List<NoiseSource> sources) {
    add(element, Cause.THERMAL, from, to, 4 * Physics.BOLTZMANN * kelvin * value, sources);
  }

  /** Adds 2q|I| for a current in A. */
  static void addShot(
      String element, Cause cause, int from, int to, double current, List<NoiseSource> sources) {
    add(element, cause, from, to, shot(current), sources);
  }

  /** Adds 2q|I_B| f_corner/f for a current in A and a corner in Hz; nothing without a corner. */
  static void addFlicker(
      String element, int from, int to, double current, double corner, List<NoiseSource> sources) {
    add(element, Cause.FLICKER, from, to, shot(current) * corner, sources);
  }

  private static double shot(double current) {
    return 2 * Physics.ELEMENTARY_CHARGE * Math.abs(current);
  }

  private static void add(
      String element, Cause cause, int from, int to, double level, List<NoiseSource> sources) {
    if (level > 0) {
      sources.add(new NoiseSource(element, cause, from, to, level));
    }
  }
}
