package loopwright.assembly;

import loopwright.design.CurrentSource;
import loopwright.part.Polarity;

/** A transistor whose base stands a chain of diodes away from the rail. */
final class DiodeBiasedSourceAssembly {
  private DiodeBiasedSourceAssembly() {}

  static void add(
      Workpiece work, CurrentSource.DiodeBiased source, String path, String prefix, String node) {
    String base = prefix + ".base";
    String emitter = prefix + ".emitter";
    boolean downward = work.pairPolarity() == Polarity.NPN;
    work.diodeChain(
        prefix + ".d",
        prefix + ".chain",
        source.diode(),
        source.count(),
        downward ? base : work.tailRail(),
        downward ? work.tailRail() : base);
    work.resistor(
        path + ".feedResistance", work.feedNode(source.feedFrom()), base, source.feedResistance());
    work.resistor(
        path + ".emitterResistance", emitter, work.tailRail(), source.emitterResistance());
    work.transistor(prefix + ".q1", source.transistor(), node, base, emitter);
  }
}
