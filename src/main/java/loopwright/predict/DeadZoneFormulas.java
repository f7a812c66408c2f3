package loopwright.predict;

import loopwright.design.Bias;
import loopwright.design.FiguresAmplifier;
import loopwright.design.OutputStage;
import loopwright.quantity.Unit;

/** Hand formulas of the crossover. */
final class DeadZoneFormulas {
  private DeadZoneFormulas() {}

  /** V_BE at the load's peak current for joined bases, twice with drivers; about 0 when biased. */
  static FigureValue deadZone(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      return FigureValue.of(figures.deadZone().value(), "as stated");
    }
    OutputStage stage = StageEstimate.stages(solution).outputStage();
    if (!(stage instanceof OutputStage.PushPull pushPull)) {
      return FigureValue.of(0, "there is no follower");
    }
    if (!(pushPull.bias() instanceof Bias.Joined)) {
      return FigureValue.of(0, "about nothing for a biased stage");
    }
    double current = solution.levels().peak() / OutputLoad.resistance(solution);
    if (!(current > 0)) {
      throw new UnsolvedException("the output drives no load");
    }
    double volts =
        (baseEmitter(solution, "out.upper", current) + baseEmitter(solution, "out.lower", current))
            / 2;
    if (pushPull.drivers().isPresent()) {
      double upper = current / HandTransistor.of(solution, "out.upper").beta();
      double lower = current / HandTransistor.of(solution, "out.lower").beta();
      volts +=
          (baseEmitter(solution, "driver.upper", upper)
                  + baseEmitter(solution, "driver.lower", lower))
              / 2;
    }
    return FigureValue.of(
        volts + current * pushPull.emitterResistance().effective(),
        "at a peak load current of " + Text.of(current, Unit.AMPERE));
  }

  private static double baseEmitter(HookupSolution solution, String role, double current) {
    HandTransistor transistor = HandTransistor.of(solution, role);
    return transistor.baseEmitterVoltage(current)
        + current * transistor.parameters().emitterResistance();
  }

  /** deadZone/A. */
  static FigureValue atInput(HookupSolution solution) {
    KnownFigure zone = KnownFigure.of(solution, "deadZone");
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    return FigureValue.of(
        zone.value() / gain.value(), "with " + zone.says() + " and " + gain.says());
  }

  /** deadZone/(1 + A/NG). */
  static FigureValue crossoverError(HookupSolution solution) {
    solution.needLoop();
    KnownFigure zone = KnownFigure.of(solution, "deadZone");
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    double noiseGain = solution.gains().noiseGain().orElseThrow();
    return FigureValue.of(
        zone.value() / (1 + gain.value() / noiseGain),
        "with " + zone.says() + " and " + gain.says());
  }

  /** Harmonics 2 to 50 of a dead zone within the loop, over the fundamental. */
  static FigureValue distortion(HookupSolution solution) {
    solution.needLoop();
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    double zone = relativeZone(solution, gain.value());
    return FigureValue.of(distortion(zone), "of the crossover alone, with " + gain.says());
  }

  /**
   * δ = deadZone NG/(A P): the dead zone over the peak, both at the input; 0 without a dead zone.
   */
  static double relativeZone(HookupSolution solution, double gain) {
    Outcome<KnownFigure> zone = Outcome.of(() -> KnownFigure.of(solution, "deadZone"));
    if (!zone.isPresent()) {
      return 0;
    }
    double peak = Levels.nominalPeak(solution.assembled(), solution.gains());
    return zone.value().value() * solution.gains().noiseGain().orElseThrow() / (gain * peak);
  }

  /**
   * Describing function of a dead zone, 1 − (2/π)(asin δ + δ√(1 − δ²)) (Gelb and Vander Velde,
   * Multiple-Input Describing Functions, 1968).
   */
  static double describingFunction(double zone) {
    if (zone >= 1) {
      return 0;
    }
    return 1 - 2 / Math.PI * (Math.asin(zone) + zone * Math.sqrt(1 - zone * zone));
  }

  /**
   * Harmonics 2 to 50 over the fundamental for a sine through a dead zone: b_n = −(2/(πn)) (sin((n
   * − 1)a)/(n − 1) + sin((n + 1)a)/(n + 1)), a = asin δ, n odd (derived from the Fourier integral).
   */
  static double distortion(double zone) {
    if (zone >= 1) {
      throw new UnsolvedException("the signal stays within the dead zone");
    }
    double angle = Math.asin(zone);
    double sum = 0;
    for (int n = 3; n < StaticWaveform.HARMONICS; n += 2) {
      double term =
          2
              / (Math.PI * n)
              * (Math.sin((n - 1) * angle) / (n - 1) + Math.sin((n + 1) * angle) / (n + 1));
      sum += term * term;
    }
    return Math.sqrt(sum) / describingFunction(zone);
  }
}
