package loopwright.assembly;

import loopwright.design.CurrentSource;
import loopwright.part.Polarity;

/** Any current source: pulls from a node toward the tail's rail. */
final class CurrentSourceAssembly {
  private CurrentSourceAssembly() {}

  /**
   * Adds a current source.
   *
   * @param path of the source in the file
   * @param prefix of its device roles and own nodes: {@code tail} or {@code gainLoad}
   * @param node that it pulls from
   */
  static void add(Workpiece work, CurrentSource source, String path, String prefix, String node) {
    if (source instanceof CurrentSource.Resistor resistor) {
      work.resistor(path + ".resistance", node, work.tailRail(), resistor.resistance());
    } else if (source instanceof CurrentSource.Ideal ideal) {
      ideal(work, ideal, path, node);
    } else if (source instanceof CurrentSource.Mirror mirror) {
      MirrorSourceAssembly.add(work, mirror, path, prefix, node);
    } else if (source instanceof CurrentSource.DiodeBiased diodeBiased) {
      DiodeBiasedSourceAssembly.add(work, diodeBiased, path, prefix, node);
    } else if (source instanceof CurrentSource.TwoTransistor twoTransistor) {
      TwoTransistorSourceAssembly.add(work, twoTransistor, path, prefix, node);
    }
  }

  private static void ideal(Workpiece work, CurrentSource.Ideal ideal, String path, String node) {
    double current = ideal.current().value();
    if (work.pairPolarity() == Polarity.NPN) {
      work.circuit().currentSource(path + ".current", node, work.tailRail(), current);
    } else {
      work.circuit().currentSource(path + ".current", work.tailRail(), node, current);
    }
  }
}
