package loopwright.assembly;

import loopwright.design.InputPair;
import loopwright.design.PairLoad;

/** The long-tailed pair with its load and tail. */
final class InputPairAssembly {
  private static final String PATH = "amplifier.inputPair";

  private InputPairAssembly() {}

  static void add(Workpiece work, InputPair pair) {
    half(work, pair, "1", Nodes.IN_PLUS, Nodes.PAIR_OUT);
    half(work, pair, "2", HookupNodes.IN_MINUS_AMPLIFIER, Nodes.PAIR_OTHER);
    CurrentSourceAssembly.add(work, pair.tail(), PATH + ".tail", "tail", Nodes.TAIL);
    if (pair.load() instanceof PairLoad.Resistors resistors) {
      work.resistor(
          PATH + ".load.output", work.collectorRail(), Nodes.PAIR_OUT, resistors.output());
      work.resistor(
          PATH + ".load.other", work.collectorRail(), Nodes.PAIR_OTHER, resistors.other());
    } else if (pair.load() instanceof PairLoad.Mirror mirror) {
      mirrorHalf(work, mirror, "3", Nodes.PAIR_OTHER);
      mirrorHalf(work, mirror, "4", Nodes.PAIR_OUT);
    }
  }

  private static void half(
      Workpiece work, InputPair pair, String number, String input, String collector) {
    String role = "pair.q" + number;
    String base = "base" + number;
    String emitter = "emitter" + number;
    work.resistor(PATH + ".baseResistance@" + role, input, base, pair.baseResistance());
    work.resistor(
        PATH + ".emitterResistance@" + role, Nodes.TAIL, emitter, pair.emitterResistance());
    work.transistor(role, pair.transistor(), collector, base, emitter);
  }

  private static void mirrorHalf(
      Workpiece work, PairLoad.Mirror mirror, String number, String collector) {
    String role = "pair.q" + number;
    String emitter = "mirrorEmitter" + number;
    work.resistor(
        PATH + ".load.emitterResistance@" + role,
        work.collectorRail(),
        emitter,
        mirror.emitterResistance());
    work.transistor(role, mirror.transistor(), collector, Nodes.PAIR_OTHER, emitter);
  }
}
