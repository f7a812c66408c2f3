package loopwright.circuit;

/**
 * The point at which a circuit is evaluated, with the stamps it gives there. It belongs to one run
 * and one thread.
 */
public final class CircuitState {
  /** How capacitors count in the static equations. */
  public enum Blocking {
    /** Every capacitor is open. */
    OPEN,
    /** Blocking capacitors hold the voltage that they had at rest; all others are open. */
    HELD
  }

  private static final int NONE = -1;

  private final Circuit circuit;
  private final double[] unknowns;
  private final double[] memory;
  private final Stamps stamps;
  private final double[] held;
  private final double[] anchor;
  private Blocking blocking = Blocking.OPEN;
  private int openDespite = NONE;
  private double sourceScale = 1;
  private double generator;
  private double tether;
  private boolean limited;
  private boolean moving;

  CircuitState(Circuit circuit, int memorySize, int blockingCapacitors) {
    this.circuit = circuit;
    this.unknowns = new double[circuit.unknowns()];
    this.memory = new double[memorySize];
    this.stamps = new Stamps(circuit.unknowns(), circuit.pattern().slots());
    this.held = new double[blockingCapacitors];
    this.anchor = new double[circuit.nodes()];
    this.generator = circuit.restGenerator();
  }

  /** The circuit. */
  public Circuit circuit() {
    return circuit;
  }

  /** Node voltages, V, then branch currents, A; to be changed by solvers only. */
  public double[] unknowns() {
    return unknowns;
  }

  /** What the last evaluation gave. */
  public Stamps stamps() {
    return stamps;
  }

  /** Voltage of a node by index, V; ground has index −1. */
  public double voltage(int node) {
    return node < 0 ? 0 : unknowns[node];
  }

  /** Voltage of a node by name, V. */
  public double voltage(String node) {
    return voltage(circuit.node(node));
  }

  /** How blocking capacitors count. */
  public Blocking blocking() {
    return blocking;
  }

  /** Opens the blocking capacitors. */
  public void openBlockingCapacitors() {
    blocking = Blocking.OPEN;
  }

  /** Holds every blocking capacitor at the voltage it has in this state. */
  public void holdBlockingCapacitors() {
    for (Element element : circuit.elements()) {
      if (element instanceof BlockingCapacitor capacitor) {
        held[capacitor.index()] = capacitor.voltage(this);
      }
    }
    blocking = Blocking.HELD;
    openDespite = NONE;
  }

  /** Holds every blocking capacitor at the voltage that its like is held at in another circuit. */
  public void holdBlockingCapacitorsAs(CircuitState other) {
    System.arraycopy(other.held, 0, held, 0, held.length);
    blocking = Blocking.HELD;
    openDespite = NONE;
  }

  /** Opens one blocking capacitor while the others go on holding their voltage. */
  public void openOnly(BlockingCapacitor capacitor) {
    openDespite = capacitor.index();
  }

  double held(int index) {
    return held[index];
  }

  boolean holds(int index) {
    return blocking == Blocking.HELD && index != openDespite;
  }

  /** Factor on every independent source: 1, or less while the supply is stepped up. */
  public double sourceScale() {
    return sourceScale;
  }

  /** Sets the factor on every independent source. */
  public void setSourceScale(double scale) {
    sourceScale = scale;
  }

  /** Generator voltage before the source scale, V. */
  public double generator() {
    return generator;
  }

  /** Sets the generator voltage, V. */
  public void setGenerator(double volts) {
    generator = volts;
  }

  /** Conductance that ties every node to where it was anchored, S; 0 in the circuit itself. */
  public double tether() {
    return tether;
  }

  /** Sets the conductance that ties every node to where it was anchored, S. */
  public void setTether(double siemens) {
    tether = siemens;
  }

  /** Anchors every node at its present voltage. */
  public void anchor() {
    System.arraycopy(unknowns, 0, anchor, 0, anchor.length);
  }

  /** Voltage at which a node is anchored, V. */
  double anchored(int node) {
    return anchor[node];
  }

  /** Whether the circuit moves in time, so that what limits a rate of change acts. */
  public boolean moving() {
    return moving;
  }

  /** Makes the circuit move in time, or rest. */
  public void setMoving(boolean inTime) {
    moving = inTime;
  }

  /** Whether the last evaluation linearised some junction elsewhere than at its voltage. */
  public boolean limited() {
    return limited;
  }

  void setLimited() {
    limited = true;
  }

  double memory(int index) {
    return memory[index];
  }

  void setMemory(int index, double value) {
    memory[index] = value;
  }

  /** Evaluates every element at the present unknowns, limiting junction steps. */
  public void evaluate() {
    stamps.clear();
    limited = false;
    for (Element element : circuit.elements()) {
      element.stamp(this);
    }
    if (tether > 0) {
      circuit.stampTethers(this);
    }
  }

  /** Takes over point and conditions of another state of the same circuit. */
  public void copyFrom(CircuitState other) {
    if (other.circuit != circuit) {
      throw new IllegalArgumentException("a state belongs to one circuit");
    }
    System.arraycopy(other.unknowns, 0, unknowns, 0, unknowns.length);
    System.arraycopy(other.memory, 0, memory, 0, memory.length);
    System.arraycopy(other.held, 0, held, 0, held.length);
    blocking = other.blocking;
    openDespite = other.openDespite;
    sourceScale = other.sourceScale;
    generator = other.generator;
    tether = other.tether;
    moving = other.moving;
    System.arraycopy(other.anchor, 0, anchor, 0, anchor.length);
  }

  /**
   * Takes over the point of a state of a circuit of the same topology but other values or
   * temperatures, as a start for solving.
   */
  public void startFrom(CircuitState other) {
    if (other.unknowns.length != unknowns.length || other.memory.length != memory.length) {
      throw new IllegalArgumentException("the circuits differ in topology");
    }
    System.arraycopy(other.unknowns, 0, unknowns, 0, unknowns.length);
    System.arraycopy(other.memory, 0, memory, 0, memory.length);
  }

  /** A copy that moves on its own. */
  public CircuitState copy() {
    CircuitState copy = circuit.newState();
    copy.copyFrom(this);
    return copy;
  }
}
