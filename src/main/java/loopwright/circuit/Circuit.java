package loopwright.circuit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import loopwright.numeric.SparsityPattern;
import loopwright.numeric.SystemFamily;

/**
 * A circuit of fixed topology and values, but for the temperatures of its junctions. Its matrix
 * pattern is analysed once; every evaluation only refills values. Devices keep scratch values, so a
 * circuit serves one thread at a time; so do all circuits together that were built like one
 * another.
 */
public final class Circuit {
  /**
   * How unknowns and memories are laid out.
   *
   * @param indices index of every node name; −1 is ground
   * @param names node names in the order in which they were first spoken of
   * @param nodes number of node voltages
   * @param unknowns number of node voltages and branch currents
   * @param memory number of values that devices remember
   * @param blocking number of blocking capacitors
   */
  record Layout(
      Map<String, Integer> indices,
      List<String> names,
      int nodes,
      int unknowns,
      int memory,
      int blocking) {}

  private final Layout layout;
  private final List<Element> elements;
  private final Map<String, Element> byName = new LinkedHashMap<>();
  private final List<DeviceTerminals> devices;
  private final SystemFamily systems;
  private final int[] diagonal;
  private final double kelvin;
  private final double restGenerator;

  Circuit(
      Layout layout,
      List<Element> elements,
      List<DeviceTerminals> devices,
      SystemFamily systems,
      int[] diagonal,
      double kelvin,
      double restGenerator) {
    this.layout = layout;
    this.elements = elements;
    this.devices = devices;
    this.systems = systems;
    this.diagonal = diagonal;
    this.kelvin = kelvin;
    this.restGenerator = restGenerator;
    elements.forEach(element -> byName.put(element.name(), element));
  }

  /**
   * Whether another circuit has the same unknowns, so that a state of it can be a start for this.
   */
  public boolean isLike(Circuit other) {
    return layout.unknowns() == other.layout.unknowns()
        && layout.memory() == other.layout.memory()
        && layout.blocking() == other.layout.blocking()
        && layout.indices().equals(other.layout.indices());
  }

  /** Number of node voltages, which come first among the unknowns. */
  public int nodes() {
    return layout.nodes();
  }

  /** Number of unknowns: node voltages, then branch currents. */
  public int unknowns() {
    return layout.unknowns();
  }

  /** Every node name in the order in which they were first spoken of; joined names all appear. */
  public List<String> nodeNames() {
    return layout.names();
  }

  /** Whether there is a node of this name. */
  public boolean hasNode(String name) {
    return layout.indices().containsKey(name);
  }

  /**
   * Index of a node; −1 for ground.
   *
   * @throws NoSuchElementException when there is none of this name
   */
  public int node(String name) {
    Integer index = layout.indices().get(name);
    if (index == null) {
      throw new NoSuchElementException("the circuit has no node " + name);
    }
    return index;
  }

  /** A name of the node of this index, for messages. */
  public String nodeName(int index) {
    return layout.names().stream()
        .filter(name -> layout.indices().get(name) == index)
        .findFirst()
        .orElse("unknown " + index);
  }

  /** All elements. */
  public List<Element> elements() {
    return elements;
  }

  /**
   * The element of a name and type.
   *
   * @throws NoSuchElementException when there is none
   */
  public <E extends Element> E element(String name, Class<E> type) {
    Element element = byName.get(name);
    if (!type.isInstance(element)) {
      throw new NoSuchElementException("the circuit has no " + type.getSimpleName() + " " + name);
    }
    return type.cast(element);
  }

  /**
   * Brings the junction of a device to another temperature. States that were solved before are no
   * solutions any more.
   *
   * @param role of the device
   * @param kelvin K
   * @throws NoSuchElementException when there is no such device
   */
  public void heat(String role, double kelvin) {
    Element element = byName.get(role);
    if (element instanceof Transistor transistor) {
      transistor.heat(kelvin);
    } else if (element instanceof JunctionDiode diode) {
      diode.heat(kelvin);
    } else {
      throw new NoSuchElementException("the circuit has no device " + role);
    }
  }

  /** Where every device meets the circuit, in the order of the signal path. */
  public List<DeviceTerminals> devices() {
    return devices;
  }

  /** The places of G and C that may differ from zero. */
  public SparsityPattern pattern() {
    return systems.pattern();
  }

  /**
   * Linear systems of that pattern; what one learns of a good elimination order serves the next.
   */
  public SystemFamily systems() {
    return systems;
  }

  /** Ambient temperature, K. */
  public double kelvin() {
    return kelvin;
  }

  /** Generator voltage at rest, V. */
  public double restGenerator() {
    return restGenerator;
  }

  /** A state with every voltage at zero. */
  public CircuitState newState() {
    return new CircuitState(this, layout.memory(), layout.blocking());
  }

  void stampTethers(CircuitState state) {
    for (int node = 0; node < layout.nodes(); node++) {
      double current = state.tether() * (state.voltage(node) - state.anchored(node));
      state.stamps().current(node, current, 0);
      state.stamps().conductance(diagonal[node], state.tether());
    }
  }
}
