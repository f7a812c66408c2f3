package loopwright.characterise;

import java.util.Optional;
import loopwright.circuit.Physics;
import loopwright.part.TransistorParameters;

/**
 * Which figure decides which parameter of a transistor. Each parameter depends a little on the
 * others, so the rules are gone through in turn until none of them moves anything.
 *
 * @param saturationCurrent the base-emitter voltage that decides I_S
 * @param beta the current gains that decide β_F, I_rec and I_K
 * @param earlyVoltage the output conductance that decides V_A
 * @param transitTime the transition frequency that decides the forward transit time
 */
record TransistorRules(
    Optional<PrintedFigure<TransistorParameters>> saturationCurrent,
    Optional<BetaFit> beta,
    Optional<PrintedFigure<TransistorParameters>> earlyVoltage,
    Optional<PrintedFigure<TransistorParameters>> transitTime) {
  private static final double SETTLED = 1e-10;
  private static final int ROUNDS = 200;

  /** Saturation currents of silicon transistors lie well inside these, A. */
  private static final double LEAST_SATURATION_CURRENT = 1e-30;

  private static final double MOST_SATURATION_CURRENT = 1e-3;

  /** Any transit time will do to find the slope of an affine function. */
  private static final double TRIAL_TIME = 1e-9;

  /**
   * Solves all rules together.
   *
   * @param from complete but for what the rules decide
   * @throws FitException when no parameters give the figures
   */
  TransistorParameters settle(TransistorParameters from) {
    TransistorParameters at = guess(from);
    for (int round = 0; round < ROUNDS; round++) {
      TransistorParameters next = goThrough(at);
      if (change(at, next) < SETTLED) {
        return next;
      }
      at = next;
    }
    throw new FitException(
        "The figures of this record do not settle on one set of parameters: two of them are at"
            + " odds.");
  }

  private TransistorParameters guess(TransistorParameters from) {
    TransistorParameters at = from;
    if (Double.isNaN(at.saturationCurrent())) {
      PrintedFigure<TransistorParameters> voltage = saturationCurrent.orElseThrow();
      double thermal = Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);
      at = at.withSaturationCurrent(voltage.at() * Math.exp(-voltage.wanted() / thermal));
      requirePlausible(voltage, at.saturationCurrent());
    }
    if (earlyVoltage.isPresent() && Double.isInfinite(at.earlyVoltage())) {
      at = at.withEarlyVoltage(earlyVoltage.get().at() / earlyVoltage.get().wanted());
    }
    if (Double.isNaN(at.forwardBeta())) {
      BetaFit fit = beta.orElseThrow();
      at = fit.fit(at.withForwardBeta(fit.highestGain()), true);
    }
    return at;
  }

  private TransistorParameters goThrough(TransistorParameters from) {
    TransistorParameters at = from;
    if (saturationCurrent.isPresent()) {
      at = forBaseEmitterVoltage(at, saturationCurrent.get());
    }
    if (earlyVoltage.isPresent()) {
      at = forOutputConductance(at, earlyVoltage.get());
    }
    if (beta.isPresent()) {
      at = beta.get().fit(at, false);
    }
    if (transitTime.isPresent()) {
      at = forTransitionFrequency(at, transitTime.get());
    }
    return at;
  }

  /** At a given current V_BE falls by V_T for every e-fold of I_S, whatever q_b is. */
  private static TransistorParameters forBaseEmitterVoltage(
      TransistorParameters at, PrintedFigure<TransistorParameters> voltage) {
    double thermal = Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);
    double excess = voltage.returned(at) - voltage.wanted();
    double found = at.saturationCurrent() * Math.exp(excess / thermal);
    requirePlausible(voltage, found);
    return at.withSaturationCurrent(found);
  }

  /** 1/h_oe is V_A + V_CE − V_BE over I_C, so V_A follows its error times I_C. */
  private static TransistorParameters forOutputConductance(
      TransistorParameters at, PrintedFigure<TransistorParameters> conductance) {
    double found =
        at.earlyVoltage()
            + conductance.at() * (1 / conductance.wanted() - 1 / conductance.returned(at));
    if (!(found > 0)) {
      throw new FitException(
          "The "
              + conductance.saysValue()
              + ", is more than any Early voltage above zero gives at that voltage.");
    }
    return at.withEarlyVoltage(found);
  }

  /** 1/(2π f_T) is an affine function of the transit time; never below zero. */
  private static TransistorParameters forTransitionFrequency(
      TransistorParameters at, PrintedFigure<TransistorParameters> frequency) {
    double without = delay(frequency.returned(at.withTransitTime(0)));
    double slope = (delay(frequency.returned(at.withTransitTime(TRIAL_TIME))) - without);
    double found = TRIAL_TIME * (delay(frequency.wanted()) - without) / slope;
    return at.withTransitTime(Math.max(0, found));
  }

  private static double delay(double frequency) {
    return 1 / (2 * Math.PI * frequency);
  }

  private static void requirePlausible(
      PrintedFigure<TransistorParameters> voltage, double saturationCurrent) {
    if (!(saturationCurrent >= LEAST_SATURATION_CURRENT
        && saturationCurrent <= MOST_SATURATION_CURRENT)) {
      throw new FitException(
          "The "
              + voltage.saysValue()
              + ", is not what a silicon junction shows: it asks for a saturation current of "
              + saturationCurrent
              + " A.");
    }
  }

  /** The largest relative change of a parameter that some rule decides. */
  private static double change(TransistorParameters from, TransistorParameters to) {
    double most = relative(from.saturationCurrent(), to.saturationCurrent());
    most = Math.max(most, relative(from.forwardBeta(), to.forwardBeta()));
    most = Math.max(most, relative(from.recombinationCurrent(), to.recombinationCurrent()));
    most = Math.max(most, relative(from.kneeCurrent(), to.kneeCurrent()));
    most = Math.max(most, relative(from.earlyVoltage(), to.earlyVoltage()));
    return Math.max(most, relative(from.transitTime(), to.transitTime()));
  }

  private static double relative(double from, double to) {
    return from == to ? 0 : Math.abs(to - from) / Math.max(Math.abs(from), Math.abs(to));
  }
}
