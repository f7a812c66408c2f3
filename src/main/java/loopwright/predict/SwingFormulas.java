package loopwright.predict;

import loopwright.circuit.Physics;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.FiguresAmplifier;
import loopwright.design.GainStage;
import loopwright.design.OutputStage;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.part.Polarity;

/** Hand formulas of clipping, slewing and noise. */
final class SwingFormulas {
  /** Collector-emitter voltage at which a transistor counts as run out, V; common practice. */
  private static final double SATURATION = 0.2;

  private SwingFormulas() {}

  /**
   * Highest (direction 1) or lowest (−1) output: rail less drops, or what the load's current
   * allows.
   */
  static FigureValue clip(HookupSolution solution, int direction) {
    double load = OutputLoad.resistance(solution);
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      double limit =
          direction > 0
              ? figures.outputHigh().orElse(solution.design().rails().positive()).value()
              : figures.outputLow().orElse(solution.design().rails().negative()).value();
      return FigureValue.of(limit / (1 + figures.outputResistance().value() / load));
    }
    StagesAmplifier amplifier = StageEstimate.stages(solution);
    boolean activeSide = (OffsetFormula.polarity(solution) == Polarity.NPN) == (direction > 0);
    double rail =
        direction
            * (direction > 0
                ? solution.design().rails().positive().value()
                : solution.design().rails().negative().value());
    double beta = StageEstimate.of(solution).followerBeta();
    double follower = followerDrop(solution, amplifier.outputStage(), direction);
    double loadingOfDrive = Double.isInfinite(beta) ? load : beta * load;
    double volts =
        activeSide
            ? rail - gainStageDrop(solution, amplifier.gainStage())
            : passiveSide(solution, amplifier.gainStage().load(), rail, loadingOfDrive);
    return FigureValue.of(direction * (volts - follower));
  }

  private static double gainStageDrop(HookupSolution solution, GainStage stage) {
    HandTransistor gain = HandTransistor.of(solution, "gain.q1");
    return SATURATION + gain.emitterCurrent() * stage.emitterResistance().effective();
  }

  /** Furthest voltage of the drive node toward the load's rail, counted outward from ground, V. */
  private static double passiveSide(
      HookupSolution solution, CurrentSource source, double rail, double load) {
    if (source instanceof CurrentSource.Resistor resistor) {
      return rail / (1 + resistor.resistance().effective() / load);
    }
    if (source instanceof CurrentSource.Ideal ideal) {
      return Math.min(rail, ideal.current().value() * load);
    }
    String carrier = source instanceof CurrentSource.Mirror ? "gainLoad.q2" : "gainLoad.q1";
    HandTransistor transistor = HandTransistor.of(solution, carrier);
    double emitter = 0;
    if (source instanceof CurrentSource.Mirror mirror) {
      emitter = mirror.emitterResistance().effective();
    } else if (source instanceof CurrentSource.DiodeBiased biased) {
      emitter = biased.emitterResistance().effective();
    } else if (source instanceof CurrentSource.TwoTransistor two) {
      emitter = two.senseResistance().effective();
    }
    double compliance = rail - SATURATION - transistor.emitterCurrent() * emitter;
    return Math.min(compliance, transistor.collectorCurrent() * load);
  }

  private static double followerDrop(HookupSolution solution, OutputStage stage, int direction) {
    if (!(stage instanceof OutputStage.PushPull pushPull)) {
      return 0;
    }
    double load = OutputLoad.resistance(solution);
    double current = Math.max(solution.levels().peak() / 2 / load, 1e-6);
    String side = direction > 0 ? "upper" : "lower";
    HandTransistor output = HandTransistor.of(solution, "out." + side);
    double drop =
        output.baseEmitterVoltage(current) + current * pushPull.emitterResistance().effective();
    if (pushPull.drivers().isPresent()) {
      drop +=
          HandTransistor.of(solution, "driver." + side).baseEmitterVoltage(current / output.beta());
    }
    boolean biasHelps = pushPull.bias() instanceof Bias.Joined;
    return biasHelps || drop > 0 ? drop : 0;
  }

  /**
   * Slew rate: the current that the pair can give each way over the compensation (Solomon 1974).
   */
  static FigureValue slew(HookupSolution solution, int direction) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      return FigureValue.of(figures.slewRate().value(), "as stated");
    }
    double tail =
        HandTransistor.of(solution, "pair.q1").emitterCurrent()
            + HandTransistor.of(solution, "pair.q2").emitterCurrent();
    double current = tail;
    if (StageEstimate.stages(solution).inputPair().load() instanceof PairLoad.Resistors) {
      double held = HandTransistor.of(solution, "pair.q1").collectorCurrent();
      boolean bySink = (OffsetFormula.polarity(solution) == Polarity.NPN) == (direction > 0);
      current = bySink ? tail - held : held;
    }
    return FigureValue.of(current / LoopFormulas.compensation(solution));
  }

  /** Noise density referred to the generator: pair, source and divider, white terms only. */
  static FigureValue inputNoise(HookupSolution solution) {
    solution.needLoop();
    StagesAmplifier amplifier = StageEstimate.stages(solution);
    HandTransistor q1 = HandTransistor.of(solution, "pair.q1");
    HandTransistor q2 = HandTransistor.of(solution, "pair.q2");
    HookupGains gains = solution.gains();
    double thermal = 4 * Physics.BOLTZMANN * q1.kelvin();
    double shot = Physics.ELEMENTARY_CHARGE * (q1.baseCurrent() + q2.baseCurrent());
    double perHalf =
        q1.parameters().baseResistance()
            + amplifier.inputPair().baseResistance().effective()
            + amplifier.inputPair().emitterResistance().effective()
            + 1 / (q1.transconductance() + q2.transconductance());
    double plus =
        solution.assembled().isInverting()
            ? gains.restResistanceAtPlus()
            : gains.sourceResistance();
    double minus = Resistances.parallel(gains.upper(), gains.lower());
    double square =
        2 * thermal * perHalf + thermal * (plus + minus) + shot * (plus * plus + minus * minus);
    double referred = gains.noiseGain().orElseThrow() / Math.abs(gains.idealGain().orElseThrow());
    return FigureValue.of(Math.sqrt(square) * referred, "flicker is left out");
  }
}
