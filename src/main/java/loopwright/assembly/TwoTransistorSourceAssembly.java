package loopwright.assembly;

import loopwright.design.CurrentSource;

/** Two transistors: q2 holds its base-emitter voltage across the sense resistor of q1. */
final class TwoTransistorSourceAssembly {
  private TwoTransistorSourceAssembly() {}

  static void add(
      Workpiece work, CurrentSource.TwoTransistor source, String path, String prefix, String node) {
    String base = prefix + ".base";
    String sense = prefix + ".sense";
    work.transistor(prefix + ".q1", source.transistor(), node, base, sense);
    work.resistor(path + ".senseResistance", sense, work.tailRail(), source.senseResistance());
    work.transistor(prefix + ".q2", source.transistor(), base, sense, work.tailRail());
    work.resistor(
        path + ".feedResistance", work.feedNode(source.feedFrom()), base, source.feedResistance());
  }
}
