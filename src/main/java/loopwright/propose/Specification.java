package loopwright.propose;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import loopwright.design.DesignException;
import loopwright.design.Drawer;
import loopwright.design.Problem;

/**
 * What a first design is to do.
 *
 * @param positive rail, V, above zero
 * @param negative rail, V, not above zero; 0 for a single supply with a mid-rail
 * @param gain magnitude from generator to output, 0.1 to 1000; at least 1 where it does not invert
 * @param inverting whether it inverts
 * @param loadResistance Ω; empty for none
 * @param loadCapacitance F
 * @param swing peak of the output, V
 * @param bandwidth −3 dB, closed loop, Hz
 * @param sourceResistance Ω
 * @param signalFrequency Hz
 * @param transistors names of the parts at hand, diodes too; empty for the whole shelf
 * @param resistors values to choose from
 * @param capacitors values to choose from
 * @param margin phase margin wanted at every level of the swing, degrees
 * @param gainTolerance how far the predicted gain may be off, a fraction
 * @param preferences where the demands leave room
 */
public record Specification(
    double positive,
    double negative,
    double gain,
    boolean inverting,
    OptionalDouble loadResistance,
    double loadCapacitance,
    double swing,
    double bandwidth,
    double sourceResistance,
    double signalFrequency,
    List<String> transistors,
    Drawer.Stock resistors,
    Drawer.Stock capacitors,
    double margin,
    double gainTolerance,
    Set<Preference> preferences) {
  /** Phase margin where nothing else is wanted, degrees. */
  public static final double USUAL_MARGIN = 60;

  /** Tolerance of the gain where nothing else is wanted. */
  public static final double USUAL_GAIN_TOLERANCE = 0.02;

  /**
   * Keeps its own copies.
   *
   * @throws DesignException with every value that cannot be, and what was expected
   */
  public Specification {
    transistors = List.copyOf(transistors);
    preferences = Set.copyOf(preferences);
    List<Problem> problems = new ArrayList<>();
    within(problems, "rails", positive, 3, 60, "a positive rail from 3 V to 60 V");
    within(problems, "rails", negative, -60, 0, "a negative rail from −60 V to 0");
    within(problems, "gain", gain, inverting ? 0.1 : 1, 1000, gainExpected(inverting));
    within(problems, "load", loadResistance.orElse(1), 1, 1e9, "at least 1 Ω");
    within(problems, "load capacitance", loadCapacitance, 0, 1e-6, "from 0 to 1 µF");
    within(problems, "swing", swing, 1e-3, 60, "a peak from 1 mV to 60 V");
    within(problems, "bandwidth", bandwidth, 10, 1e8, "from 10 Hz to 100 MHz");
    within(problems, "source resistance", sourceResistance, 0, 1e6, "from 0 to 1 MΩ");
    within(problems, "signal frequency", signalFrequency, 1, 1e7, "from 1 Hz to 10 MHz");
    within(problems, "margin", margin, 1, 85, "from 1 to 85 degrees");
    within(problems, "gain tolerance", gainTolerance, 1e-4, 0.5, "from 0.01 % to 50 %");
    if (problems.isEmpty() && signalFrequency > bandwidth) {
      problems.add(
          new Problem(
              "signal frequency",
              "found a signal above the bandwidth, expected a bandwidth that passes it"));
    }
    if (!problems.isEmpty()) {
      throw new DesignException(problems);
    }
  }

  private static String gainExpected(boolean inverting) {
    return inverting
        ? "a magnitude from 0.1 to 1000"
        : "from 1 to 1000: below 1 only an inverting amplifier can go";
  }

  private static void within(
      List<Problem> problems, String what, double value, double low, double high, String expected) {
    if (!(value >= low && value <= high)) {
      problems.add(new Problem(what, "found " + value + ", expected " + expected));
    }
  }

  /** Whether there is one supply only. */
  boolean single() {
    return negative == 0;
  }

  /** What the output swings around by design, V. */
  double middle() {
    return single() ? positive / 2 : 0;
  }

  /** Room from the middle to the nearer rail, V. */
  double room() {
    return Math.min(positive - middle(), middle() - negative);
  }

  /** From rail to rail, V. */
  double span() {
    return positive - negative;
  }

  /** Whether something is preferred. */
  boolean prefers(Preference preference) {
    return preferences.contains(preference);
  }

  /** Noise gain that an exact divider makes, the source network left out. */
  double noiseGain() {
    return inverting ? 1 + gain : gain;
  }
}
