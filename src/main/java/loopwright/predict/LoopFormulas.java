package loopwright.predict;

import loopwright.circuit.DepletionCapacitance;
import loopwright.design.CurrentSource;
import loopwright.design.Feedback;
import loopwright.design.FiguresAmplifier;
import loopwright.design.GainStage;
import loopwright.design.InputPair;
import loopwright.design.PairLoad;
import loopwright.design.PartValue;
import loopwright.quantity.Quantity;

/** Hand formulas of gains and of the loop. */
final class LoopFormulas {
  private LoopFormulas() {}

  /** Product of stage gains. */
  static FigureValue openLoopGain(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      double load = OutputLoad.resistance(solution);
      double share = 1 / (1 + figures.outputResistance().value() / load);
      return FigureValue.of(figures.gain().value() * share, "as stated, with the load's share");
    }
    return FigureValue.of(StageEstimate.of(solution).gain());
  }

  /** 2 G_m1 R_tail, for a resistor tail and a resistor load. */
  static FigureValue commonModeRejection(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      return FigureValue.of(Math.abs(figures.commonModeRejection().value()), "as stated");
    }
    InputPair pair = StageEstimate.stages(solution).inputPair();
    if (pair.tail() instanceof CurrentSource.Resistor tail
        && pair.load() instanceof PairLoad.Resistors) {
      return FigureValue.of(
          2 * StageEstimate.of(solution).pairTransconductance() * tail.resistance().effective());
    }
    throw new UnsolvedException("no hand formula but for a resistor tail and a resistor load");
  }

  /** Black's formula with common mode, source loading and the dead zone's describing function. */
  static FigureValue closedLoopGain(HookupSolution solution) {
    solution.needLoop();
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    HookupGains gains = solution.gains();
    double noiseGain = gains.noiseGain().orElseThrow();
    double a = gain.value();
    double result;
    if (solution.assembled().isInverting()) {
      result = gains.idealGain().orElseThrow() / (1 + noiseGain / a);
    } else {
      Outcome<Double> share = Outcome.of(() -> GainFigures.commonModeShare(solution));
      double c = share.isPresent() ? share.value() : 0;
      result = gains.inputRatio() * a * (1 + c / 2) / (1 + a * (1 - c / 2) / noiseGain);
      Outcome<KnownFigure> input = Outcome.of(() -> KnownFigure.of(solution, "inputResistance"));
      if (input.isPresent()) {
        result *= input.value().value() / (input.value().value() + gains.sourceResistance());
      }
    }
    double zone = DeadZoneFormulas.relativeZone(solution, a);
    return FigureValue.of(
        result * DeadZoneFormulas.describingFunction(zone), "with " + gain.says());
  }

  /** A/NG. */
  static FigureValue loopGain(HookupSolution solution) {
    solution.needLoop();
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    return FigureValue.of(
        gain.value() / solution.gains().noiseGain().orElseThrow(), "with " + gain.says());
  }

  /** G_m1/(2π (C_c + C_cb + strays) NG); for an amplifier by figures gain × first pole/NG. */
  static FigureValue unityFrequency(HookupSolution solution) {
    solution.needLoop();
    double noiseGain = solution.gains().noiseGain().orElseThrow();
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      double pole =
          figures.poles().stream()
              .mapToDouble(Quantity::value)
              .min()
              .orElseThrow(() -> new UnsolvedException("no pole is stated"));
      return FigureValue.of(figures.gain().value() * pole / noiseGain);
    }
    double transconductance = StageEstimate.of(solution).pairTransconductance();
    return FigureValue.of(transconductance / (2 * Math.PI * compensation(solution) * noiseGain));
  }

  /** The capacitance from the gain stage's collector back to the pair: C_c + C_cb + strays, F. */
  static double compensation(HookupSolution solution) {
    GainStage stage = StageEstimate.stages(solution).gainStage();
    HandTransistor gain = HandTransistor.of(solution, "gain.q1");
    double sum =
        stage.compensation().map(c -> c.capacitance().effective()).orElse(0.0)
            + gain.parameters().baseCollectorCapacitance()
                * DepletionCapacitance.factor(gain.baseCollectorVoltage())
            + solution.design().surroundings().strayCapacitance().value();
    if (sum == 0) {
      throw new UnsolvedException("no capacitance is stated that would set it");
    }
    return sum;
  }

  /** The loop's unity-gain frequency. */
  static FigureValue bandwidth(HookupSolution solution) {
    solution.needLoop();
    KnownFigure unity = KnownFigure.of(solution, "unityFrequency");
    return FigureValue.of(unity.value(), unity.says());
  }

  /** Blackman's impedance at the driven terminal. */
  static FigureValue inputResistance(HookupSolution solution) {
    solution.needLoop();
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    if (solution.hookup().feedback() instanceof Feedback.Inverting inverting) {
      return FigureValue.of(
          inverting.inputResistor().effective()
              + inverting.upper().effective() / (1 + gain.value()),
          "with " + gain.says());
    }
    double loop = gain.value() / solution.gains().noiseGain().orElseThrow();
    double differential =
        solution.design().amplifier() instanceof FiguresAmplifier figures
            ? figures.inputResistance().value()
            : differentialResistance(solution);
    return FigureValue.of(differential * (1 + loop), "with " + gain.says());
  }

  private static double differentialResistance(HookupSolution solution) {
    InputPair pair = StageEstimate.stages(solution).inputPair();
    HandTransistor q1 = HandTransistor.of(solution, "pair.q1");
    HandTransistor q2 = HandTransistor.of(solution, "pair.q2");
    double degeneration = pair.emitterResistance().effective();
    double stopper = pair.baseResistance().effective();
    return (q1.beta() + 1)
        * (StageEstimate.halfResistance(q1, degeneration, stopper)
            + StageEstimate.halfResistance(q2, degeneration, stopper));
  }

  /** Output resistance without feedback over 1 + loop gain, isolation outside the loop added. */
  static FigureValue outputResistance(HookupSolution solution) {
    solution.needLoop();
    KnownFigure gain = KnownFigure.of(solution, "openLoopGain");
    double loop = gain.value() / solution.gains().noiseGain().orElseThrow();
    double own;
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      own = figures.outputResistance().value();
    } else {
      StageEstimate stages = StageEstimate.of(solution);
      own =
          Double.isInfinite(stages.followerBeta())
              ? stages.ownGainOutResistance()
              : stages.followerResistance() + stages.ownGainOutResistance() / stages.followerBeta();
    }
    PartValue isolation = solution.hookup().load().isolation();
    return FigureValue.of(own / (1 + loop) + isolation.effective(), "with " + gain.says());
  }
}
