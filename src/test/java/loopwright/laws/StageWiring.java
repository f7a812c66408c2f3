package loopwright.laws;

import java.util.Optional;
import loopwright.design.Bias;
import loopwright.design.CurrentSource;
import loopwright.design.Design;
import loopwright.design.FeedFrom;
import loopwright.design.GainStage;
import loopwright.design.InputPair;
import loopwright.design.OutputStage;
import loopwright.design.PairLoad;
import loopwright.design.StagesAmplifier;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;

/** The stages as the format's page describes them, each sentence of it a line here. */
final class StageWiring {
  private final Design design;
  private final Wiring wiring;
  private final boolean npn;

  /** P: the rail of the pair's collectors. */
  private final String p;

  /** M: the rail of tail and load. */
  private final String m;

  StageWiring(Design design, Wiring wiring) {
    this.design = design;
    this.wiring = wiring;
    StagesAmplifier stages = (StagesAmplifier) design.amplifier();
    TransistorRecord pair = (TransistorRecord) design.parts().get(stages.inputPair().transistor());
    this.npn = pair.kind() == Polarity.NPN;
    this.p = npn ? "positive" : "negative";
    this.m = npn ? "negative" : "positive";
  }

  void add() {
    StagesAmplifier stages = (StagesAmplifier) design.amplifier();
    pair(stages.inputPair());
    String farDrive = output(stages.outputStage());
    gain(stages.gainStage(), farDrive);
  }

  private void pair(InputPair pair) {
    wiring.resistor("in+", "base1", pair.baseResistance().effective());
    wiring.resistor("in-", "base2", pair.baseResistance().effective());
    wiring.resistor("tail", "emitter1", pair.emitterResistance().effective());
    wiring.resistor("tail", "emitter2", pair.emitterResistance().effective());
    wiring.transistor("pair.q1", "pairOut", "base1", "emitter1");
    wiring.transistor("pair.q2", "pairOther", "base2", "emitter2");
    source(pair.tail(), "tail", "tail");
    if (pair.load() instanceof PairLoad.Resistors load) {
      wiring.resistor(p, "pairOut", load.output().effective());
      wiring.resistor(p, "pairOther", load.other().effective());
    } else if (pair.load() instanceof PairLoad.Mirror mirror) {
      wiring.transistor("pair.q3", "pairOther", "pairOther", "mirrorEmitter3");
      wiring.transistor("pair.q4", "pairOut", "pairOther", "mirrorEmitter4");
      wiring.resistor("mirrorEmitter3", p, mirror.emitterResistance().effective());
      wiring.resistor("mirrorEmitter4", p, mirror.emitterResistance().effective());
    }
  }

  private void gain(GainStage gain, String farDrive) {
    String base = gain.buffer().isPresent() ? "gainBase" : "pairOut";
    gain.buffer()
        .ifPresent(
            buffer -> {
              wiring.transistor("gain.buffer", m, "pairOut", "gainBase");
              wiring.resistor("gainBase", p, buffer.emitterResistance().effective());
            });
    wiring.resistor("gainEmitter", p, gain.emitterResistance().effective());
    gain.emitterBypass().ifPresent(bypass -> wiring.blocking("gainEmitter", p, bypass.effective()));
    gain.compensation()
        .ifPresent(
            compensation -> {
              String middle = "compensationMiddle";
              wiring.capacitor("gainOut", middle, compensation.capacitance().effective());
              wiring.resistor(middle, "pairOut", compensation.resistance().effective());
            });
    wiring.transistor("gain.q1", "gainOut", base, "gainEmitter");
    source(gain.load(), "gainLoad", farDrive);
  }

  /** The output stage; returns the far drive node. */
  private String output(OutputStage output) {
    if (!(output instanceof OutputStage.PushPull stage)) {
      wiring.join("out", "gainOut");
      return "gainOut";
    }
    wiring.join("gainOut", npn ? "driveHigh" : "driveLow");
    bias(stage.bias());
    String upperBase = "driveHigh";
    String lowerBase = "driveLow";
    if (stage.drivers().isPresent()) {
      wiring.transistor("driver.upper", "positive", "driveHigh", "powerHigh");
      wiring.transistor("driver.lower", "negative", "driveLow", "powerLow");
      wiring.resistor("powerHigh", "powerLow", stage.drivers().get().resistance().effective());
      upperBase = "powerHigh";
      lowerBase = "powerLow";
    }
    wiring.transistor("out.upper", "positive", upperBase, "outHigh");
    wiring.transistor("out.lower", "negative", lowerBase, "outLow");
    wiring.resistor("outHigh", "out", stage.emitterResistance().effective());
    wiring.resistor("outLow", "out", stage.emitterResistance().effective());
    return npn ? "driveLow" : "driveHigh";
  }

  private void bias(Bias bias) {
    if (bias instanceof Bias.Joined) {
      wiring.join("driveHigh", "driveLow");
    } else if (bias instanceof Bias.Diodes diodes) {
      chain("bias.d", "biasChain", diodes.count(), "driveHigh", "driveLow");
    } else if (bias instanceof Bias.VbeMultiplier multiplier) {
      wiring.transistor("bias.q1", "driveHigh", "biasTap", "driveLow");
      wiring.resistor("driveHigh", "biasTap", multiplier.upper().effective());
      wiring.resistor("biasTap", "driveLow", multiplier.lower().effective());
    }
  }

  private void chain(String role, String between, int count, String anode, String cathode) {
    for (int i = 1; i <= count; i++) {
      wiring.diode(
          role + i, i == 1 ? anode : between + (i - 1), i == count ? cathode : between + i);
    }
  }

  private void source(CurrentSource source, String name, String node) {
    if (source instanceof CurrentSource.Resistor resistor) {
      wiring.resistor(node, m, resistor.resistance().effective());
    } else if (source instanceof CurrentSource.Ideal ideal) {
      double current = ideal.current().value();
      wiring.current(node, m, npn ? current : -current);
    } else if (source instanceof CurrentSource.Mirror mirror) {
      wiring.resistor(
          feed(mirror.feedFrom()), name + ".reference", mirror.setResistance().effective());
      wiring.transistor(name + ".q1", name + ".reference", name + ".reference", name + ".emitter1");
      wiring.transistor(name + ".q2", node, name + ".reference", name + ".emitter2");
      wiring.resistor(name + ".emitter1", m, mirror.emitterResistance().effective());
      wiring.resistor(name + ".emitter2", m, mirror.emitterResistance().effective());
    } else if (source instanceof CurrentSource.DiodeBiased biased) {
      String base = name + ".base";
      chain(name + ".d", name + ".chain", biased.count(), npn ? base : m, npn ? m : base);
      wiring.resistor(feed(biased.feedFrom()), base, biased.feedResistance().effective());
      wiring.transistor(name + ".q1", node, base, name + ".emitter");
      wiring.resistor(name + ".emitter", m, biased.emitterResistance().effective());
    } else if (source instanceof CurrentSource.TwoTransistor two) {
      String base = name + ".base";
      String sense = name + ".sense";
      wiring.transistor(name + ".q1", node, base, sense);
      wiring.resistor(sense, m, two.senseResistance().effective());
      wiring.transistor(name + ".q2", base, sense, m);
      wiring.resistor(feed(two.feedFrom()), base, two.feedResistance().effective());
    }
  }

  private String feed(Optional<FeedFrom> feed) {
    double volts = npn ? design.rails().negative().value() : design.rails().positive().value();
    FeedFrom standard = volts == 0 ? FeedFrom.OPPOSITE_RAIL : FeedFrom.GROUND;
    return switch (feed.orElse(standard)) {
      case GROUND -> "ground";
      case MID_RAIL -> "midRail";
      case OPPOSITE_RAIL -> p;
    };
  }
}
