package loopwright.characterise;

import loopwright.circuit.DiodeEquations;
import loopwright.circuit.Physics;
import loopwright.numeric.RootSearch;
import loopwright.part.DiodeParameters;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Figures of a diode from its parameters at 25 °C, in the words of a datasheet. */
public final class DiodeFigures {
  /** Recovery time over transit time where forward and reverse current are alike. */
  private static final double RECOVERY = Math.log(2);

  /** Beyond this no junction conducts forward, V. */
  private static final double HIGHEST_JUNCTION = 20;

  private static final double STRIDE = 0.1;
  private static final double TOLERANCE = 1e-15;

  private final DiodeParameters parameters;
  private final DiodeEquations equations;

  /**
   * @param parameters at 25 °C
   */
  public DiodeFigures(DiodeParameters parameters) {
    this.parameters = parameters;
    this.equations = new DiodeEquations(parameters, Physics.NOMINAL_TEMPERATURE);
  }

  /**
   * Forward voltage between the terminals, V.
   *
   * @param current forward, A
   * @throws FitException when no junction voltage gives that current
   */
  public double forwardVoltage(double current) {
    double low;
    double high = 0;
    do {
      low = high;
      high += STRIDE;
      if (high > HIGHEST_JUNCTION) {
        throw new FitException(
            "A forward current of "
                + EngineeringFormat.format(current, Unit.AMPERE)
                + " is out of this diode's reach.");
      }
    } while (!(excess(high, current) >= 0));
    double junction = RootSearch.find(voltage -> excess(voltage, current), low, high, TOLERANCE);
    return junction + current * parameters.seriesResistance();
  }

  /** Capacitance of the depletion layer without bias, F. */
  public double capacitance() {
    DiodeParameters withoutDiffusion =
        new DiodeParameters(
            parameters.saturationCurrent(),
            parameters.ideality(),
            parameters.seriesResistance(),
            parameters.capacitance(),
            0);
    DiodeEquations depletion = new DiodeEquations(withoutDiffusion, Physics.NOMINAL_TEMPERATURE);
    depletion.evaluate(0);
    return depletion.chargeByVoltage();
  }

  /**
   * Recovery time, s: what the stored charge takes to leave when forward and reverse current are
   * alike, transitTime · ln 2.
   */
  public double recoveryTime() {
    return parameters.transitTime() * RECOVERY;
  }

  /** The transit time of that recovery time, both in s. */
  static double transitTime(double recoveryTime) {
    return recoveryTime / RECOVERY;
  }

  private double excess(double voltage, double current) {
    equations.evaluate(voltage);
    return equations.current() - current;
  }
}
