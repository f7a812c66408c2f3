package loopwright.assembly;

import loopwright.design.CurrentSource;

/** A mirror whose input current is set by a resistor: q1 diode-connected, q2 carries the output. */
final class MirrorSourceAssembly {
  private MirrorSourceAssembly() {}

  static void add(
      Workpiece work, CurrentSource.Mirror mirror, String path, String prefix, String node) {
    String reference = prefix + ".reference";
    work.resistor(
        path + ".setResistance",
        work.feedNode(mirror.feedFrom()),
        reference,
        mirror.setResistance());
    for (int number = 1; number <= 2; number++) {
      String role = prefix + ".q" + number;
      String emitter = prefix + ".emitter" + number;
      work.resistor(
          path + ".emitterResistance@" + role,
          work.tailRail(),
          emitter,
          mirror.emitterResistance());
      work.transistor(
          role, mirror.transistor(), number == 1 ? reference : node, reference, emitter);
    }
  }
}
