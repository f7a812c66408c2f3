package loopwright.assembly;

import java.util.Optional;
import loopwright.circuit.CircuitBuilder;
import loopwright.design.Design;
import loopwright.design.FeedFrom;
import loopwright.design.PartValue;
import loopwright.design.ReturnNode;
import loopwright.part.Polarity;

/**
 * The circuit in the making and what every stage needs to add itself to it: the design, the device
 * models, and which rail is which for the pair's polarity.
 */
final class Workpiece {
  /** Resistance of a broken lead, Ω. */
  private static final double OPEN = 1e10;

  /** Resistance of what should not conduct and does, Ω. */
  private static final double SHORT = 1e-2;

  private final Design design;
  private final DeviceModels models;
  private final Temperatures temperatures;
  private final CircuitBuilder circuit;
  private final Polarity pairPolarity;

  Workpiece(
      Design design,
      DeviceModels models,
      Temperatures temperatures,
      CircuitBuilder circuit,
      Polarity pairPolarity) {
    this.design = design;
    this.models = models;
    this.temperatures = temperatures;
    this.circuit = circuit;
    this.pairPolarity = pairPolarity;
  }

  Design design() {
    return design;
  }

  CircuitBuilder circuit() {
    return circuit;
  }

  Polarity pairPolarity() {
    return pairPolarity;
  }

  /** The rail that the pair's collectors hang on: P. */
  String collectorRail() {
    return pairPolarity == Polarity.NPN ? Nodes.POSITIVE : Nodes.NEGATIVE;
  }

  /** The rail that tail and load pull toward: M. */
  String tailRail() {
    return pairPolarity == Polarity.NPN ? Nodes.NEGATIVE : Nodes.POSITIVE;
  }

  /** Adds a transistor of a stage. */
  void transistor(String role, String part, String collector, String base, String emitter) {
    DeviceFault fault = models.deviations().faults().get(role);
    Polarity polarity = models.polarity(role, part);
    boolean reversed = fault == DeviceFault.REVERSED;
    circuit.transistor(
        role,
        fault == DeviceFault.WRONG_POLARITY ? polarity.opposite() : polarity,
        broken(role, fault == DeviceFault.COLLECTOR_OPEN, reversed ? emitter : collector),
        broken(role, fault == DeviceFault.BASE_OPEN, base),
        broken(role, fault == DeviceFault.EMITTER_OPEN, reversed ? collector : emitter),
        models.transistor(role, part),
        temperatures.kelvin(role));
    if (fault == DeviceFault.BASE_EMITTER_SHORT) {
      conduct(role, base, emitter);
    } else if (fault == DeviceFault.BASE_COLLECTOR_SHORT) {
      conduct(role, base, collector);
    } else if (fault == DeviceFault.COLLECTOR_EMITTER_SHORT) {
      conduct(role, collector, emitter);
    }
  }

  /** The terminal's node, or one behind a broken lead. */
  private String broken(String role, boolean isBroken, String node) {
    if (!isBroken) {
      return node;
    }
    String behind = role + ".inner.broken";
    circuit.resistor(role + ".broken", node, behind, OPEN);
    return behind;
  }

  private void conduct(String name, String from, String to) {
    circuit.resistor(name + ".shorted", from, to, SHORT);
  }

  /** Adds a diode of a stage. */
  void diode(String role, String part, String anode, String cathode) {
    circuit.diode(role, anode, cathode, models.diode(role, part), temperatures.kelvin(role));
  }

  /**
   * Adds a chain of diodes that conducts downward from one node to the other.
   *
   * @param rolePrefix roles are this and 1, 2, …
   * @param nodePrefix the nodes between are this and 1, 2, …
   */
  void diodeChain(
      String rolePrefix, String nodePrefix, String part, int count, String high, String low) {
    String anode = high;
    for (int i = 1; i <= count; i++) {
      String cathode = i == count ? low : nodePrefix + i;
      diode(rolePrefix + i, part, anode, cathode);
      anode = cathode;
    }
  }

  void resistor(String path, String from, String to, PartValue value) {
    circuit.resistor(path, from, to, value(path, value));
  }

  void capacitor(String path, String from, String to, PartValue value) {
    circuit.capacitor(path, from, to, value(path, value));
    conductIfShorted(path, from, to);
  }

  void blockingCapacitor(String path, String from, String to, PartValue value) {
    circuit.blockingCapacitor(path, from, to, value(path, value));
    conductIfShorted(path, from, to);
  }

  private void conductIfShorted(String path, String from, String to) {
    if (models.deviations().shorted().contains(path)) {
      conduct(path, from, to);
    }
  }

  /** The value of an element in this build. */
  double value(String element, PartValue value) {
    return value.effective() * models.deviations().ratio(element);
  }

  /** The node that the bias of a current source is fed from. */
  String feedNode(Optional<FeedFrom> feedFrom) {
    FeedFrom standard = tailRailIsZero() ? FeedFrom.OPPOSITE_RAIL : FeedFrom.GROUND;
    return switch (feedFrom.orElse(standard)) {
      case GROUND -> CircuitBuilder.GROUND;
      case MID_RAIL -> Nodes.MID_RAIL;
      case OPPOSITE_RAIL -> collectorRail();
    };
  }

  /** The node of a return. */
  static String returnNode(ReturnNode node) {
    return node == ReturnNode.GROUND ? CircuitBuilder.GROUND : Nodes.MID_RAIL;
  }

  private boolean tailRailIsZero() {
    double volts =
        pairPolarity == Polarity.NPN
            ? design.rails().negative().value()
            : design.rails().positive().value();
    return volts == 0;
  }
}
