package loopwright.predict;

import loopwright.design.CurrentSource;
import loopwright.design.GainStage;
import loopwright.design.OutputStage;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;

/**
 * Gains and resistances of the stages by hand, from currents at rest and part values alone.
 *
 * @param pairTransconductance G_m1 from the differential input to the pair's output collector, S
 * @param pairOutResistance what that current flows into, the next stage included, Ω
 * @param bufferGain from there to the gain transistor's base
 * @param gainTransconductance G_m2, S
 * @param gainOutResistance what that current flows into, the follower included, Ω
 * @param ownGainOutResistance the same without the follower, Ω
 * @param followerGain from the gain stage's collector to the output
 * @param followerResistance r_e and emitter resistance of the follower, Ω
 * @param followerBeta current gain of the follower, drivers included; infinite for none
 */
record StageEstimate(
    double pairTransconductance,
    double pairOutResistance,
    double bufferGain,
    double gainTransconductance,
    double gainOutResistance,
    double ownGainOutResistance,
    double followerGain,
    double followerResistance,
    double followerBeta) {
  /** Open-loop gain: the product of the stages. */
  double gain() {
    return pairTransconductance
        * pairOutResistance
        * bufferGain
        * gainTransconductance
        * gainOutResistance
        * followerGain;
  }

  /** Works the stages out. */
  static StageEstimate of(HookupSolution solution) {
    StagesAmplifier amplifier = stages(solution);
    GainStage stage = amplifier.gainStage();
    HandTransistor q1 = HandTransistor.of(solution, "pair.q1");
    HandTransistor q2 = HandTransistor.of(solution, "pair.q2");
    HandTransistor gain = HandTransistor.of(solution, "gain.q1");

    double degeneration = amplifier.inputPair().emitterResistance().effective();
    double stopper = amplifier.inputPair().baseResistance().effective();
    double half1 = halfResistance(q1, degeneration, stopper);
    double half2 = halfResistance(q2, degeneration, stopper);
    double alpha = q1.beta() / (q1.beta() + 1);
    boolean mirror = amplifier.inputPair().load() instanceof PairLoad.Mirror;
    double pairTransconductance = alpha * (mirror ? 2 : 1) / (half1 + half2);

    double emitter =
        gain.parameters().emitterResistance()
            + (stage.emitterBypass().isPresent() ? 0 : stage.emitterResistance().effective());
    double gainInput = gain.inputResistance() + (gain.beta() + 1) * emitter;
    double pairOwn =
        Resistances.parallel(
            pairLoadResistance(solution, amplifier), q1.collectorResistance(stopper, half2));
    double bufferGain = 1;
    double pairOut = Resistances.parallel(pairOwn, gainInput);
    double gainSource = pairOwn;
    if (stage.buffer().isPresent()) {
      HandTransistor buffer = HandTransistor.of(solution, "gain.buffer");
      double behind =
          Resistances.parallel(stage.buffer().get().emitterResistance().effective(), gainInput);
      bufferGain = behind / (behind + buffer.emitterResistance());
      pairOut =
          Resistances.parallel(pairOwn, buffer.inputResistance() + (buffer.beta() + 1) * behind);
      gainSource = buffer.emitterResistance() + pairOwn / (buffer.beta() + 1);
    }
    double gainTransconductance =
        gain.beta() / (gain.beta() + 1) / (gain.emitterResistance() + emitter);
    double ownGainOut =
        Resistances.parallel(
            sourceResistance(solution, stage.load(), "gainLoad"),
            gain.collectorResistance(gainSource, emitter));
    FollowerEstimate follower = FollowerEstimate.of(solution, amplifier.outputStage());
    return new StageEstimate(
        pairTransconductance,
        pairOut,
        bufferGain,
        gainTransconductance,
        Resistances.parallel(ownGainOut, follower.inputResistance()),
        ownGainOut,
        follower.gain(),
        follower.resistance(),
        follower.beta());
  }

  /**
   * The amplifier's stages.
   *
   * @throws UnsolvedException when it is known by figures only
   */
  static StagesAmplifier stages(HookupSolution solution) {
    if (solution.design().amplifier() instanceof StagesAmplifier stages) {
      return stages;
    }
    throw new UnsolvedException("the amplifier is known by its figures only");
  }

  /** r_e of one half of the pair with its degeneration and its share of the base resistance, Ω. */
  static double halfResistance(HandTransistor half, double degeneration, double stopper) {
    return half.emitterResistance()
        + half.parameters().emitterResistance()
        + degeneration
        + (half.parameters().baseResistance() + stopper) / (half.beta() + 1);
  }

  private static double pairLoadResistance(HookupSolution solution, StagesAmplifier amplifier) {
    if (amplifier.inputPair().load() instanceof PairLoad.Resistors resistors) {
      return resistors.output().effective();
    }
    PairLoad.Mirror mirror = (PairLoad.Mirror) amplifier.inputPair().load();
    HandTransistor q4 = HandTransistor.of(solution, "pair.q4");
    return q4.collectorResistance(0, mirror.emitterResistance().effective());
  }

  /** Resistance of a current source at its node, Ω. */
  static double sourceResistance(HookupSolution solution, CurrentSource source, String prefix) {
    if (source instanceof CurrentSource.Resistor resistor) {
      return resistor.resistance().effective();
    }
    if (source instanceof CurrentSource.Mirror mirror) {
      return HandTransistor.of(solution, prefix + ".q2")
          .collectorResistance(0, mirror.emitterResistance().effective());
    }
    if (source instanceof CurrentSource.DiodeBiased biased) {
      return HandTransistor.of(solution, prefix + ".q1")
          .collectorResistance(0, biased.emitterResistance().effective());
    }
    if (source instanceof CurrentSource.TwoTransistor two) {
      HandTransistor q1 = HandTransistor.of(solution, prefix + ".q1");
      HandTransistor q2 = HandTransistor.of(solution, prefix + ".q2");
      double loop = q2.transconductance() * two.feedResistance().effective();
      return q1.collectorResistance(0, two.senseResistance().effective() * (1 + loop));
    }
    return Double.POSITIVE_INFINITY;
  }

  /** The push-pull follower by hand. */
  private record FollowerEstimate(
      double inputResistance, double gain, double resistance, double beta) {
    static FollowerEstimate of(HookupSolution solution, OutputStage stage) {
      double load = OutputLoad.resistance(solution);
      if (!(stage instanceof OutputStage.PushPull pushPull)) {
        return new FollowerEstimate(load, 1, 0, Double.POSITIVE_INFINITY);
      }
      HandTransistor upper = HandTransistor.of(solution, "out.upper");
      HandTransistor lower = HandTransistor.of(solution, "out.lower");
      double swing = solution.levels().peak() / 2 / load;
      double idle = upper.emitterCurrent() + lower.emitterCurrent();
      boolean both = idle / 2 > swing;
      double current = Math.max(idle, swing);
      double emitter = pushPull.emitterResistance().effective() / (both ? 2 : 1);
      double resistance = upper.thermalVoltage() / current + emitter;
      double beta = (upper.beta() + lower.beta()) / 2 + 1;
      if (pushPull.drivers().isPresent()) {
        beta *=
            (HandTransistor.of(solution, "driver.upper").beta()
                        + HandTransistor.of(solution, "driver.lower").beta())
                    / 2
                + 1;
      }
      double gain = Double.isInfinite(load) ? 1 : load / (load + resistance);
      return new FollowerEstimate(beta * (load + resistance), gain, resistance, beta);
    }
  }
}
