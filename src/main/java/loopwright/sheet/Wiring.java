package loopwright.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.assembly.Nodes;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.Capacitor;
import loopwright.circuit.Circuit;
import loopwright.circuit.DeviceTerminals;
import loopwright.circuit.DeviceTerminals.DiodeTerminals;
import loopwright.circuit.DeviceTerminals.TransistorTerminals;
import loopwright.circuit.Element;
import loopwright.circuit.Lead;
import loopwright.circuit.Resistor;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.design.NodeNames;

/** What is connected where in the circuit of a hookup. */
final class Wiring {
  private static final String GROUND = "ground";

  /**
   * A resistor or capacitor between two nodes.
   *
   * @param name its path, with what tells it from its twin behind an {@code @}
   * @param from name of a node
   * @param to name of a node
   */
  record Link(String name, String from, String to) {}

  private final Circuit circuit;

  /** A measured lead joins two indices to one node of the bench. */
  private final Map<Integer, Integer> joined = new LinkedHashMap<>();

  private Wiring(Circuit circuit) {
    this.circuit = circuit;
    for (Element element : circuit.elements()) {
      if (element instanceof Lead lead) {
        joined.put(Math.max(lead.from(), lead.to()), Math.min(lead.from(), lead.to()));
      }
    }
  }

  /** That of a hookup. */
  static Wiring of(Design design, Hookup hookup) {
    AssembledHookup assembled = Assembler.assemble(design, hookup);
    return new Wiring(assembled.circuit());
  }

  /** Names of all parts and devices. */
  List<String> names() {
    return circuit.elements().stream().map(Element::name).toList();
  }

  /**
   * One name of every node that a meter can be put on and that is not given: without ground, the
   * generator, and what is inside the supplies.
   */
  List<String> measurable() {
    Map<Integer, String> names = new LinkedHashMap<>();
    for (String name : circuit.nodeNames()) {
      int node = node(circuit.node(name));
      if (node >= 0 && !Nodes.isInternal(name) && !isGiven(name)) {
        names.computeIfAbsent(node, index -> name(index));
      }
    }
    return names.values().stream().filter(name -> !isGiven(name)).toList();
  }

  private static boolean isGiven(String name) {
    return name.startsWith("ideal.")
        || name.startsWith("decoupling.")
        || name.equals(Nodes.GENERATOR)
        || name.equals("compensationMiddle");
  }

  /** Every resistor and capacitor whose path begins so. */
  List<Link> links(String prefix) {
    List<Link> links = new ArrayList<>();
    for (Element element : circuit.elements()) {
      if (element.name().startsWith(prefix)) {
        link(element).ifPresent(links::add);
      }
    }
    return links;
  }

  private Optional<Link> link(Element element) {
    if (element instanceof Resistor resistor) {
      return Optional.of(link(element, resistor.from(), resistor.to()));
    }
    if (element instanceof Capacitor capacitor) {
      return Optional.of(link(element, capacitor.from(), capacitor.to()));
    }
    return element instanceof BlockingCapacitor blocking
        ? Optional.of(link(element, blocking.from(), blocking.to()))
        : Optional.empty();
  }

  private Link link(Element element, int from, int to) {
    return new Link(element.name(), name(from), name(to));
  }

  String name(int index) {
    int node = node(index);
    if (node < 0) {
      return GROUND;
    }
    return Stream.of(List.of(Nodes.OUT), NodeNames.ALL, circuit.nodeNames())
        .flatMap(List::stream)
        .filter(name -> circuit.hasNode(name) && !Nodes.isInternal(name))
        .filter(name -> node(circuit.node(name)) == node)
        .findFirst()
        .orElseGet(() -> circuit.nodeName(index));
  }

  private int node(int index) {
    return joined.getOrDefault(index, index);
  }

  /**
   * The terminals of devices at a node, by the letters that pinouts have.
   *
   * @param designator of a role
   */
  List<String> at(String name, Function<String, String> designator) {
    List<String> at = new ArrayList<>();
    if (!circuit.hasNode(name)) {
      return at;
    }
    int node = node(circuit.node(name));
    for (DeviceTerminals device : circuit.devices()) {
      String who = designator.apply(device.role());
      terminals(device)
          .forEach(
              (terminal, index) -> {
                if (node(index) == node) {
                  at.add(who + " " + terminal);
                }
              });
    }
    return at;
  }

  /** Resistors and capacitors at a node. */
  List<String> partsAt(String name) {
    return links("").stream()
        .filter(link -> link.from().equals(name) || link.to().equals(name))
        .map(Link::name)
        .toList();
  }

  private static Map<String, Integer> terminals(DeviceTerminals device) {
    Map<String, Integer> terminals = new LinkedHashMap<>();
    if (device instanceof TransistorTerminals transistor) {
      terminals.put("C", transistor.collector());
      terminals.put("B", transistor.base());
      terminals.put("E", transistor.emitter());
    } else if (device instanceof DiodeTerminals diode) {
      terminals.put("A", diode.anode());
      terminals.put("K", diode.cathode());
    }
    return terminals;
  }
}
