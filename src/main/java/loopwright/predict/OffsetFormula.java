package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import loopwright.design.FiguresAmplifier;
import loopwright.design.GainStage;
import loopwright.design.InputPair;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;

/**
 * The input offset by hand, cause by cause, from currents at rest and part values: V_T
 * ln(I_C1/I_C2), the Early effect, the mismatch, base and emitter resistances (from memory: any
 * text on differential pairs).
 */
final class OffsetFormula {
  private OffsetFormula() {}

  /** A cause and its share of the input offset, V. */
  record Cause(String name, double volts) {}

  /** Input offset, V: the sum of its causes. */
  static FigureValue inputOffset(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier figures) {
      return FigureValue.of(figures.inputOffset().value(), "as stated");
    }
    double sum = causes(solution).stream().mapToDouble(Cause::volts).sum();
    return FigureValue.of(sum);
  }

  /** The causes; for pnp all are negated. */
  static List<Cause> causes(HookupSolution solution) {
    StagesAmplifier amplifier = StageEstimate.stages(solution);
    InputPair pair = amplifier.inputPair();
    HandTransistor q1 = HandTransistor.of(solution, "pair.q1");
    HandTransistor q2 = HandTransistor.of(solution, "pair.q2");
    double[] collectors = collectorCurrents(solution, amplifier, q1, q2);
    double ic1 = collectors[0];
    double ic2 = collectors[1];
    if (!(ic1 > 0) || !(ic2 > 0)) {
      throw new UnsolvedException("the next stage needs more than the whole tail current");
    }
    double thermal = q1.thermalVoltage();
    double ib1 = ic1 / q1.beta();
    double ib2 = ic2 / q2.beta();
    double early1 = 1 - q1.baseCollectorVoltage() / q1.parameters().earlyVoltage();
    double early2 = 1 - q2.baseCollectorVoltage() / q2.parameters().earlyVoltage();
    double base1 = q1.parameters().baseResistance() + pair.baseResistance().effective();
    double base2 = q2.parameters().baseResistance() + pair.baseResistance().effective();
    double emitter1 = q1.parameters().emitterResistance() + pair.emitterResistance().effective();
    double emitter2 = q2.parameters().emitterResistance() + pair.emitterResistance().effective();
    int sign = polarity(solution).sign();
    List<Cause> causes = new ArrayList<>();
    causes.add(new Cause("unequal collector currents", sign * thermal * Math.log(ic1 / ic2)));
    causes.add(new Cause("Early effect in the pair", -sign * thermal * Math.log(early1 / early2)));
    causes.add(
        new Cause(
            "base-emitter mismatch",
            sign * thermal * Math.log(q2.saturationCurrent() / q1.saturationCurrent())));
    causes.add(new Cause("base currents in base resistances", sign * (ib1 * base1 - ib2 * base2)));
    causes.add(
        new Cause(
            "emitter currents in emitter resistances",
            sign * ((ic1 + ib1) * emitter1 - (ic2 + ib2) * emitter2)));
    return causes;
  }

  /** Polarity of the pair. */
  static Polarity polarity(HookupSolution solution) {
    return ((TransistorRecord) solution.assembled().models().record("pair.q1")).kind();
  }

  /** I_C1 as the next stage and the load demand it, and what the tail leaves for I_C2, A. */
  private static double[] collectorCurrents(
      HookupSolution solution, StagesAmplifier amplifier, HandTransistor q1, HandTransistor q2) {
    double tail = q1.emitterCurrent() + q2.emitterCurrent();
    double nextBase = nextBaseCurrent(solution, amplifier.gainStage());
    if (amplifier.inputPair().load() instanceof PairLoad.Resistors resistors) {
      double drop = nextStageVoltage(solution, amplifier.gainStage());
      double ic1 = drop / resistors.output().effective() + nextBase;
      double ie2 = tail - ic1 * (1 + 1 / q1.beta());
      return new double[] {ic1, ie2 * q2.beta() / (q2.beta() + 1)};
    }
    PairLoad.Mirror mirror = (PairLoad.Mirror) amplifier.inputPair().load();
    HandTransistor q3 = HandTransistor.of(solution, "pair.q3");
    HandTransistor q4 = HandTransistor.of(solution, "pair.q4");
    double early =
        (1 - q4.baseCollectorVoltage() / q4.parameters().earlyVoltage())
            / (1 - q3.baseCollectorVoltage() / q3.parameters().earlyVoltage());
    double degenerated = 1 + q4.transconductance() * mirror.emitterResistance().effective();
    double ratio = 1 + (early - 1) / degenerated;
    double collectors = tail / (1 + 1 / q1.beta());
    double reference = (collectors - nextBase) / (ratio + 1 + 1 / q3.beta() + 1 / q4.beta());
    return new double[] {
      reference * ratio + nextBase, reference * (1 + 1 / q3.beta() + 1 / q4.beta())
    };
  }

  private static double nextBaseCurrent(HookupSolution solution, GainStage stage) {
    String role = stage.buffer().isPresent() ? "gain.buffer" : "gain.q1";
    return HandTransistor.of(solution, role).baseCurrent();
  }

  /** Voltage that the next stage holds across the output load resistor, V. */
  private static double nextStageVoltage(HookupSolution solution, GainStage stage) {
    HandTransistor gain = HandTransistor.of(solution, "gain.q1");
    double volts =
        junctionVoltage(gain) + gain.emitterCurrent() * stage.emitterResistance().effective();
    if (stage.buffer().isPresent()) {
      volts += junctionVoltage(HandTransistor.of(solution, "gain.buffer"));
    }
    return volts;
  }

  private static double junctionVoltage(HandTransistor transistor) {
    return transistor.baseEmitterVoltage(transistor.collectorCurrent())
        + transistor.baseCurrent() * transistor.parameters().baseResistance()
        + transistor.emitterCurrent() * transistor.parameters().emitterResistance();
  }
}
