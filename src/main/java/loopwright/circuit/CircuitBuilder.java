package loopwright.circuit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import loopwright.numeric.SparsityPattern;
import loopwright.numeric.SystemFamily;
import loopwright.part.DiodeParameters;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;

/**
 * Collects a circuit by node names. Names may be joined to one node at any time; indices are given
 * when all is known.
 */
public final class CircuitBuilder {
  /**
   * Leakage to ground of a part of the circuit that only capacitors tie to the rest, S: without it
   * the voltage there would be undefined.
   */
  public static final double LEAKAGE = 1e-12;

  /** How the names of such leakages begin; the node's name follows. */
  public static final String LEAKAGE_PREFIX = "leakage.";

  /** Name of the ground node. */
  public static final String GROUND = "ground";

  private final Map<String, String> joined = new LinkedHashMap<>();
  private final Set<String> withoutStray = new HashSet<>();
  private final List<Supplier<Element>> plans = new ArrayList<>();
  private final List<DeviceTerminals.Named> devices = new ArrayList<>();
  private final List<String[]> conducting = new ArrayList<>();
  private final SparsityPattern.Builder pattern = new SparsityPattern.Builder();
  private final Map<String, Integer> indices = new LinkedHashMap<>();
  private final double kelvin;
  private int nodes;
  private int branches;
  private int memory;
  private int blocking;
  private double restGenerator;

  /**
   * An empty circuit.
   *
   * @param kelvin ambient temperature, K
   */
  public CircuitBuilder(double kelvin) {
    this.kelvin = kelvin;
    withoutStray(GROUND);
  }

  /** Makes sure that a node of this name exists. */
  public String node(String name) {
    joined.putIfAbsent(name, name);
    return name;
  }

  /** Whether a node of this name exists. */
  public boolean has(String name) {
    return joined.containsKey(name);
  }

  /** Makes two names mean one node. */
  public void join(String first, String second) {
    String a = root(node(first));
    String b = root(node(second));
    if (!a.equals(b)) {
      joined.put(b, a);
    }
  }

  /** Says that a node, and whatever it is joined with, gets no stray capacitor. */
  public void withoutStray(String name) {
    withoutStray.add(node(name));
  }

  /** A resistor at ambient temperature; 0 Ω joins its nodes. */
  public void resistor(String name, String from, String to, double resistance) {
    resistor(name, from, to, resistance, kelvin);
  }

  /**
   * A resistance that stands for no part: it makes no noise.
   *
   * @param resistance Ω; 0 joins its nodes
   */
  public void noiselessResistor(String name, String from, String to, double resistance) {
    resistor(name, from, to, resistance, 0);
  }

  private void resistor(
      String name, String from, String to, double resistance, double temperature) {
    if (resistance == 0) {
      join(from, to);
      return;
    }
    node(from);
    node(to);
    conducts(from, to);
    plans.add(() -> new Resistor(name, index(from), index(to), resistance, temperature, this));
  }

  /** A capacitor that is open in every static state; 0 F is none. */
  public void capacitor(String name, String from, String to, double capacitance) {
    node(from);
    node(to);
    if (capacitance != 0) {
      plans.add(() -> new Capacitor(name, index(from), index(to), capacitance, this));
    }
  }

  /** A capacitor that counts as a short at the signal's frequency; 0 F is none. */
  public void blockingCapacitor(String name, String from, String to, double capacitance) {
    node(from);
    node(to);
    if (capacitance == 0) {
      return;
    }
    int branch = branch();
    int at = blocking++;
    plans.add(
        () ->
            new BlockingCapacitor(
                name, at, index(from), index(to), branchIndex(branch), capacitance, this));
  }

  /** An independent current from one node to another through the source. */
  public void currentSource(String name, String from, String to, double current) {
    node(from);
    node(to);
    plans.add(() -> new CurrentSourceElement(name, index(from), index(to), current));
  }

  /** An ideal supply from ground to a node. */
  public void supply(String name, String node, double voltage) {
    node(node);
    conducts(node, GROUND);
    int branch = branch();
    plans.add(
        () -> new VoltageSource(name, index(node), branchIndex(branch), voltage, false, this));
  }

  /** An inductor (H) with its series resistance (Ω); without inductance it is a resistor. */
  public void inductor(String name, String from, String to, double resistance, double inductance) {
    if (inductance == 0) {
      resistor(name, from, to, resistance);
      return;
    }
    node(from);
    node(to);
    conducts(from, to);
    int branch = branch();
    plans.add(
        () ->
            new Inductor(
                name,
                index(from),
                index(to),
                branchIndex(branch),
                resistance,
                inductance,
                kelvin,
                this));
  }

  /** The generator, from ground to a node, at its rest voltage. */
  public void generator(String name, String node, double rest) {
    node(node);
    restGenerator = rest;
    conducts(node, GROUND);
    int branch = branch();
    plans.add(() -> new VoltageSource(name, index(node), branchIndex(branch), rest, true, this));
  }

  /** A wire whose current is an unknown, from the network's to the amplifier's side. */
  public void lead(String name, String from, String to) {
    lead(name, from, to, false);
  }

  /**
   * A lead in which the loop gain is measured at many frequencies: its unknowns are eliminated
   * last, so that a solution for them alone is short.
   */
  public void measuredLead(String name, String from, String to) {
    lead(name, from, to, true);
  }

  private void lead(String name, String from, String to, boolean measured) {
    node(from);
    node(to);
    conducts(from, to);
    int branch = branch();
    plans.add(
        () -> {
          Lead lead = new Lead(name, index(from), index(to), branchIndex(branch), this);
          if (measured) {
            pattern.eliminateLast(lead.from());
            pattern.eliminateLast(lead.to());
            pattern.eliminateLast(lead.branch());
          }
          return lead;
        });
  }

  /**
   * A transistor between its terminals.
   *
   * @param kelvin junction temperature, K
   */
  public void transistor(
      String role,
      Polarity polarity,
      String collector,
      String base,
      String emitter,
      TransistorParameters parameters,
      double kelvin) {
    String c = behind(role, "collector", collector, parameters.collectorResistance(), kelvin);
    String b = behind(role, "base", base, parameters.baseResistance(), kelvin);
    String e = behind(role, "emitter", emitter, parameters.emitterResistance(), kelvin);
    conducts(c, b);
    conducts(b, e);
    int at = memory;
    memory += 2;
    TransistorEquations equations = new TransistorEquations(parameters, kelvin);
    plans.add(
        () ->
            new Transistor(
                role,
                polarity,
                index(c),
                index(b),
                index(e),
                equations,
                at,
                parameters.flickerCorner(),
                this));
    devices.add(DeviceTerminals.Named.transistor(role, polarity, collector, base, emitter));
  }

  /**
   * A diode between its terminals.
   *
   * @param kelvin junction temperature, K
   */
  public void diode(
      String role, String anode, String cathode, DiodeParameters parameters, double kelvin) {
    String a = behind(role, "anode", anode, parameters.seriesResistance(), kelvin);
    node(cathode);
    conducts(a, cathode);
    int at = memory++;
    DiodeEquations equations = new DiodeEquations(parameters, kelvin);
    plans.add(() -> new JunctionDiode(role, index(a), index(cathode), equations, at, this));
    devices.add(DeviceTerminals.Named.diode(role, anode, cathode));
  }

  /** An amplifier known by its figures. */
  public void figureAmplifier(
      FigureAmplifier.Figures figures, String inPlus, String inMinus, String gainOut, String out) {
    for (String name : List.of(inPlus, inMinus, gainOut, out)) {
      node(name);
    }
    conducts(gainOut, GROUND);
    conducts(out, GROUND);
    int first = branches;
    branches += FigureAmplifier.branches(figures);
    int at = memory++;
    plans.add(
        () ->
            new FigureAmplifier(
                figures,
                new FigureAmplifier.Nodes(
                    index(inPlus), index(inMinus), index(gainOut), index(out)),
                branchIndex(first),
                at,
                this));
  }

  /**
   * The finished circuit.
   *
   * @param strayCapacitance from every node to ground, F, but for those that were excluded
   */
  public Circuit build(double strayCapacitance) {
    return build(strayCapacitance, Optional.empty());
  }

  /**
   * The finished circuit; where its matrix has the same places as another's, what was learnt of
   * that one's elimination order serves it too.
   *
   * @param strayCapacitance from every node to ground, F, but for those that were excluded
   * @param like a circuit that may differ in values only; of the same thread
   */
  public Circuit build(double strayCapacitance, Optional<Circuit> like) {
    addLeakage();
    if (strayCapacitance > 0) {
      addStrays(strayCapacitance);
    }
    numberNodes();
    int[] diagonal = new int[nodes];
    for (int i = 0; i < nodes; i++) {
      diagonal[i] = slot(i, i);
    }
    List<Element> elements = plans.stream().map(Supplier::get).toList();
    return new Circuit(
        new Circuit.Layout(
            Map.copyOf(indices),
            List.copyOf(indices.keySet()),
            nodes,
            nodes + branches,
            memory,
            blocking),
        elements,
        devices.stream().map(device -> device.at(this::index)).toList(),
        systems(pattern.build(nodes + branches), like),
        diagonal,
        kelvin,
        restGenerator);
  }

  private static SystemFamily systems(SparsityPattern pattern, Optional<Circuit> like) {
    return like.filter(circuit -> circuit.pattern().isSameAs(pattern))
        .map(Circuit::systems)
        .orElseGet(() -> new SystemFamily(pattern));
  }

  /** The slot of a place of the matrix, for the elements of this package. */
  int slot(int row, int column) {
    return pattern.slot(row, column);
  }

  private String behind(
      String role, String terminal, String outer, double resistance, double junction) {
    node(outer);
    if (resistance == 0) {
      return outer;
    }
    String inner = role + ".inner." + terminal;
    withoutStray(inner);
    resistor(role + "." + terminal + "Resistance", outer, inner, resistance, junction);
    return inner;
  }

  private int branch() {
    return branches++;
  }

  private int branchIndex(int branch) {
    return nodes + branch;
  }

  private int index(String name) {
    return indices.get(name);
  }

  private String root(String name) {
    String at = name;
    while (!joined.get(at).equals(at)) {
      at = joined.get(at);
    }
    return at;
  }

  private void addStrays(double capacitance) {
    Set<String> excluded = new HashSet<>();
    withoutStray.forEach(name -> excluded.add(root(name)));
    for (String name : List.copyOf(joined.keySet())) {
      String root = root(name);
      if (excluded.add(root)) {
        capacitor("stray." + root, root, GROUND, capacitance);
      }
    }
  }

  private void conducts(String one, String other) {
    conducting.add(new String[] {one, other});
  }

  /** Ties every part of the circuit that no conductance reaches to ground. */
  private void addLeakage() {
    Map<String, String> island = new LinkedHashMap<>();
    joined.keySet().forEach(name -> island.put(root(name), root(name)));
    for (String[] pair : conducting) {
      island.put(shore(island, root(pair[0])), shore(island, root(pair[1])));
    }
    for (String name : List.copyOf(island.keySet())) {
      String shore = shore(island, name);
      String ground = shore(island, root(GROUND));
      if (!shore.equals(ground)) {
        noiselessResistor(LEAKAGE_PREFIX + name, name, GROUND, 1 / LEAKAGE);
        island.put(shore, ground);
      }
    }
  }

  /** The name that stands for an island; on the way each name is moved nearer to it. */
  private static String shore(Map<String, String> island, String name) {
    String at = name;
    String next = island.get(at);
    while (!next.equals(at)) {
      String beyond = island.get(next);
      island.put(at, beyond);
      at = beyond;
      next = island.get(at);
    }
    return at;
  }

  private void numberNodes() {
    Map<String, Integer> byRoot = new LinkedHashMap<>();
    byRoot.put(root(GROUND), -1);
    for (String name : joined.keySet()) {
      String root = root(name);
      int next = byRoot.size() - 1;
      byRoot.putIfAbsent(root, next);
      indices.put(name, byRoot.get(root));
    }
    nodes = byRoot.size() - 1;
  }
}
