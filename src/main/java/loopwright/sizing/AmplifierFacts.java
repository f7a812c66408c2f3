package loopwright.sizing;

import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.FiguresAmplifier;
import loopwright.design.StagesAmplifier;
import loopwright.part.TransistorParameters;
import loopwright.predict.Catalogue;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupGains;

/**
 * What a divider needs to know of the amplifier that it stands around, for hand estimates. Taken
 * from the amplifier with a divider for the wanted gain around it.
 *
 * @param loop what decides the gain
 * @param biasAtMinus current into the inverting input, A
 * @param biasAtPlus current into the other input times the resistance that it flows through, V
 * @param blocked whether no direct current flows through the lower resistor
 * @param available current that the divider may be measured by, A, see {@link OutputCurrent}
 * @param noise input noise density of the amplifier and the source alone, V/√Hz
 * @param inputCapacitance at the inverting input, F
 * @param gainBandwidth unity frequency of the loop times the noise gain, Hz; 0 where not known
 * @param margin phase margin that a divider without a pole would leave, degrees; infinite where the
 *     loop gain never passes 1
 * @param peak of the output, V
 */
record AmplifierFacts(
    LoopFacts loop,
    double biasAtMinus,
    double biasAtPlus,
    boolean blocked,
    double available,
    double noise,
    double inputCapacitance,
    double gainBandwidth,
    double margin,
    double peak) {
  /** Half the depletion capacitance of the pair's junctions counts: two are in series. */
  private static final double IN_SERIES = 0.5;

  /**
   * An amplifier known by its figures is taken to be as quiet as this resistance, Ω: 4 nV/√Hz.
   * Common practice, no source.
   */
  private static final double QUIET = 1e3;

  /**
   * The facts of an amplifier.
   *
   * @param figures of the hookup with a divider for the wanted gain
   * @param wanted gain, generator to output
   */
  static AmplifierFacts of(HookupFigures figures, double wanted) {
    HookupGains gains = figures.gains();
    double amplitude = figures.hookup().source().amplitude().value();
    double peak = amplitude > 0 ? Math.abs(wanted) * amplitude : 1;
    double gainBandwidth = solved(figures, "unityFrequency", 0) * gains.noiseGain().orElse(1);
    double capacitance = capacitance(figures);
    double parallel = gains.upper() / gains.noiseGain().orElse(1);
    double margin =
        solved(figures, "phaseMargin", Double.POSITIVE_INFINITY)
            + phase(gainBandwidth / gains.noiseGain().orElse(1), parallel, capacitance);
    double plus = gains.restResistanceAtPlus();
    return new AmplifierFacts(
        LoopFacts.of(figures),
        bias(figures, "pair.q2"),
        Double.isInfinite(plus) ? 0 : bias(figures, "pair.q1") * plus,
        blocked(figures),
        OutputCurrent.of(figures, peak),
        noise(figures),
        capacitance,
        gainBandwidth,
        margin,
        peak);
  }

  /**
   * Phase that the pole of a resistance and a capacitance takes at a frequency in Hz, degrees:
   * arctan of the frequency over the pole's.
   */
  static double phase(double frequency, double resistance, double capacitance) {
    return Math.toDegrees(Math.atan(2 * Math.PI * frequency * resistance * capacitance));
  }

  private static boolean blocked(HookupFigures figures) {
    Feedback feedback = figures.hookup().feedback();
    return feedback instanceof Feedback.NonInverting divider
        ? divider.lowerCapacitance().isPresent()
        : figures.hookup().source().couplingCapacitance().isPresent();
  }

  private static double solved(HookupFigures figures, String key, double otherwise) {
    return figures.solved(Catalogue.find(key).orElseThrow()).number().orElse(otherwise);
  }

  private static double bias(HookupFigures figures, String half) {
    if (figures.design().amplifier() instanceof FiguresAmplifier stated) {
      return Math.abs(stated.inputBiasCurrent().value());
    }
    return figures.devices().get(half) instanceof TransistorState state
        ? Math.abs(state.baseCurrent())
        : 0;
  }

  /** √(2·4kT(r_B + R_E + 1/(2g_m)) + 4kT R_source), without what the divider adds. */
  private static double noise(HookupFigures figures) {
    double kelvin = kelvin(figures.design());
    double thermal = 4 * Physics.BOLTZMANN * kelvin;
    double source = figures.gains().sourceResistance();
    double half = QUIET / 2;
    if (figures.design().amplifier() instanceof StagesAmplifier stages
        && figures.devices().get("pair.q1") instanceof TransistorState q1
        && q1.collectorCurrent() > 0) {
      half =
          figures.transistor("pair.q1").baseResistance()
              + stages.inputPair().emitterResistance().effective()
              + stages.inputPair().baseResistance().effective()
              + Physics.thermalVoltage(kelvin) / (2 * q1.collectorCurrent());
    }
    return Math.sqrt(thermal * (2 * half + (Double.isInfinite(source) ? 0 : source)));
  }

  private static double capacitance(HookupFigures figures) {
    double stray = figures.design().surroundings().strayCapacitance().value();
    if (figures.design().amplifier() instanceof FiguresAmplifier stated) {
      return stray + stated.inputCapacitance().value();
    }
    if (!(figures.devices().get("pair.q2") instanceof TransistorState q2)) {
      return stray;
    }
    TransistorParameters pair = figures.transistor("pair.q2");
    double diffusion =
        pair.transitTime()
            * Math.max(0, q2.collectorCurrent())
            / Physics.thermalVoltage(kelvin(figures.design()));
    return stray
        + pair.baseCollectorCapacitance()
        + IN_SERIES * (pair.baseEmitterCapacitance() + diffusion);
  }

  private static double kelvin(Design design) {
    return Physics.ZERO_CELSIUS + design.surroundings().ambient().value();
  }
}
