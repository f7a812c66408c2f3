package loopwright.laws;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loopwright.design.Design;

/**
 * What is connected to what: a plain list of parts between named nodes, kept apart from the
 * program's own circuit. Capacitors do not appear, since none carries a current at rest.
 */
final class Wiring {
  /** A resistor. */
  record Resistance(String from, String to, double ohms) {}

  /** A capacitor; a blocking one counts as a short at signal frequency. */
  record Capacitance(String from, String to, double farads, boolean blocking) {}

  /** A transistor by its role. */
  record TransistorAt(String role, String collector, String base, String emitter) {}

  /** A diode by its role. */
  record DiodeAt(String role, String anode, String cathode) {}

  /** An ideal current that leaves one node and enters another. */
  record Current(String from, String to, double amperes) {}

  private final List<Resistance> resistances = new ArrayList<>();
  private final List<Capacitance> capacitances = new ArrayList<>();
  private final List<TransistorAt> transistors = new ArrayList<>();
  private final List<DiodeAt> diodes = new ArrayList<>();
  private final List<Current> currents = new ArrayList<>();
  private final Map<String, String> sameAs = new HashMap<>();

  /** What the parts of a design and its first hookup are connected to. */
  static Wiring of(Design design) {
    Wiring wiring = new Wiring();
    new HookupWiring(design, design.hookups().get(0), wiring).add();
    new StageWiring(design, wiring).add();
    return wiring;
  }

  /** Nodes that a source feeds. */
  Set<String> fed() {
    return Stream.of("ground", "generator", "ideal.positive", "ideal.negative")
        .map(this::node)
        .collect(Collectors.toCollection(HashSet::new));
  }

  List<Resistance> resistances() {
    return resistances;
  }

  List<Capacitance> capacitances() {
    return capacitances;
  }

  List<TransistorAt> transistors() {
    return transistors;
  }

  List<DiodeAt> diodes() {
    return diodes;
  }

  List<Current> currents() {
    return currents;
  }

  /** A resistor; without resistance its nodes are one. */
  void resistor(String from, String to, double ohms) {
    if (ohms == 0) {
      join(from, to);
    } else {
      resistances.add(new Resistance(from, to, ohms));
    }
  }

  void capacitor(String from, String to, double farads) {
    capacitances.add(new Capacitance(from, to, farads, false));
  }

  void blocking(String from, String to, double farads) {
    capacitances.add(new Capacitance(from, to, farads, true));
  }

  void transistor(String role, String collector, String base, String emitter) {
    transistors.add(new TransistorAt(role, collector, base, emitter));
  }

  void diode(String role, String anode, String cathode) {
    diodes.add(new DiodeAt(role, anode, cathode));
  }

  void current(String from, String to, double amperes) {
    currents.add(new Current(from, to, amperes));
  }

  void join(String one, String other) {
    String first = node(one);
    String second = node(other);
    if (!first.equals(second)) {
      sameAs.put(second, first);
    }
  }

  /** The one name that all names of a node share. */
  String node(String name) {
    String at = name;
    while (sameAs.containsKey(at)) {
      at = sameAs.get(at);
    }
    return at;
  }
}
