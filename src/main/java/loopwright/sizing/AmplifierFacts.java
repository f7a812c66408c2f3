package loopwright.sizing;

import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.FiguresAmplifier;
import loopwright.design.OutputStage;
import loopwright.design.Source;
import loopwright.design.StagesAmplifier;
import loopwright.part.TransistorParameters;
import loopwright.predict.Catalogue;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.HookupFigures;
import loopwright.predict.HookupGains;

/**
 * What a divider needs to know of the amplifier that it stands around, for hand estimates.
 *
 * @param gain open-loop gain A; infinite where it is not known
 * @param biasCurrent into the inverting input, A, without its sign
 * @param available current that the divider may be measured by, A: what gain stage and follower can
 *     give, but not more than ten times what the load takes, nor 10 mA without one
 * @param noise input noise density of the amplifier and the source alone, V/√Hz
 * @param inputCapacitance at the inverting input, F
 * @param gainBandwidth unity frequency of the loop times the noise gain, Hz; 0 where not known
 * @param ratio driven-input ratio κ
 * @param sourceResistance that the driven terminal sees, Ω
 * @param amplitude of the generator, V peak; 0 for none
 * @param inverting whether the source drives the inverting input
 */
record AmplifierFacts(
    double gain,
    double biasCurrent,
    double available,
    double noise,
    double inputCapacitance,
    double gainBandwidth,
    double ratio,
    double sourceResistance,
    double amplitude,
    boolean inverting) {
  /** Half the depletion capacitance of the pair's junctions counts: two are in series. */
  private static final double IN_SERIES = 0.5;

  private static final double TIMES_LOAD = 10;
  private static final double WITHOUT_LOAD = 10e-3;

  static AmplifierFacts of(HookupFigures figures) {
    HookupGains gains = figures.gains();
    Design design = figures.design();
    Source source = figures.hookup().source();
    double noiseGain = gains.noiseGain().orElse(1);
    return new AmplifierFacts(
        solved(figures, "openLoopGain", Double.POSITIVE_INFINITY),
        bias(figures),
        Math.min(available(figures), besideLoad(figures)),
        noise(figures),
        capacitance(figures),
        solved(figures, "unityFrequency", 0) * noiseGain,
        gains.inputRatio(),
        gains.sourceResistance(),
        source.amplitude().value(),
        design.hookup(figures.hookup().name()).orElseThrow().feedback()
            instanceof Feedback.Inverting);
  }

  private static double solved(HookupFigures figures, String key, double otherwise) {
    return figures.solved(Catalogue.find(key).orElseThrow()).number().orElse(otherwise);
  }

  private static double bias(HookupFigures figures) {
    if (figures.design().amplifier() instanceof FiguresAmplifier stated) {
      return Math.abs(stated.inputBiasCurrent().value());
    }
    return figures.devices().get("pair.q2") instanceof TransistorState q2
        ? Math.abs(q2.baseCurrent())
        : 0;
  }

  /**
   * A divider that takes more than the load does is out of proportion; common practice, no source.
   */
  private static double besideLoad(HookupFigures figures) {
    double peak =
        Math.max(
            1,
            figures.gains().idealGain().orElse(1) * figures.hookup().source().amplitude().value());
    return figures
        .hookup()
        .load()
        .resistance()
        .map(load -> TIMES_LOAD * Math.abs(peak) / load.effective())
        .orElse(WITHOUT_LOAD);
  }

  /** The gain stage's current, times the follower's current gain where there is one. */
  private static double available(HookupFigures figures) {
    if (figures.design().amplifier() instanceof FiguresAmplifier stated) {
      double resistance = stated.outputResistance().value();
      double high =
          stated
              .outputHigh()
              .map(q -> q.value())
              .orElse(figures.design().rails().positive().value());
      return resistance > 0 ? high / resistance : Double.POSITIVE_INFINITY;
    }
    double current =
        figures.devices().get("gain.q1") instanceof TransistorState gain
            ? Math.abs(gain.collectorCurrent())
            : 0;
    StagesAmplifier stages = (StagesAmplifier) figures.design().amplifier();
    if (stages.outputStage() instanceof OutputStage.PushPull pushPull) {
      double beta =
          Math.min(
              figures.transistor("out.upper").forwardBeta(),
              figures.transistor("out.lower").forwardBeta());
      current *= beta;
      if (pushPull.drivers().isPresent()) {
        current *=
            Math.min(
                figures.transistor("driver.upper").forwardBeta(),
                figures.transistor("driver.lower").forwardBeta());
      }
    }
    return current;
  }

  /** √(2·4kT(r_B + R_E + 1/(2g_m)) + 4kT R_source); 0, not known, for one known by its figures. */
  private static double noise(HookupFigures figures) {
    double kelvin = Physics.ZERO_CELSIUS + figures.design().surroundings().ambient().value();
    double thermal = 4 * Physics.BOLTZMANN * kelvin;
    double source = thermal * figures.gains().sourceResistance();
    if (figures.design().amplifier() instanceof StagesAmplifier stages
        && figures.devices().get("pair.q1") instanceof TransistorState q1
        && q1.collectorCurrent() > 0) {
      double half =
          figures.transistor("pair.q1").baseResistance()
              + stages.inputPair().emitterResistance().effective()
              + stages.inputPair().baseResistance().effective()
              + Physics.thermalVoltage(kelvin) / (2 * q1.collectorCurrent());
      return Math.sqrt(2 * thermal * half + source);
    }
    return 0;
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
    double kelvin = Physics.ZERO_CELSIUS + figures.design().surroundings().ambient().value();
    double diffusion =
        pair.transitTime() * Math.max(0, q2.collectorCurrent()) / Physics.thermalVoltage(kelvin);
    return stray
        + pair.baseCollectorCapacitance()
        + IN_SERIES * (pair.baseEmitterCapacitance() + diffusion);
  }
}
