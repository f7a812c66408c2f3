package loopwright.assembly;

import loopwright.design.Extra;
import loopwright.design.Hookup;

/** Resistors and capacitors beyond the stage library. */
final class ExtrasAssembly {
  private ExtrasAssembly() {}

  static void add(Workpiece work, Hookup hookup) {
    for (Extra extra : work.design().extras()) {
      String path = "extras." + extra.name();
      check(work, hookup, path + ".from", extra.from());
      check(work, hookup, path + ".to", extra.to());
      if (extra instanceof Extra.ExtraResistor) {
        work.resistor(path + ".value", extra.from(), extra.to(), extra.value());
      } else {
        work.capacitor(path + ".value", extra.from(), extra.to(), extra.value());
      }
    }
  }

  private static void check(Workpiece work, Hookup hookup, String path, String node) {
    if (!work.circuit().has(node)) {
      throw new AssemblyException(
          path
              + ": found \""
              + node
              + "\", expected a node that the circuit of hookup \""
              + hookup.name()
              + "\" has");
    }
  }
}
