package loopwright.bench;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.assembly.DeviceFault;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.NamedPart;
import loopwright.predict.HookupFigures;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * The single faults that a person makes or meets (after the fault dictionary of Hochwald and
 * Bastian, IEEE Transactions on Circuits and Systems 26, 1979, 523–529): every resistor and
 * capacitor open, shorted, a decade wrong or exchanged with its neighbour in the parts list; every
 * transistor reversed, of the wrong polarity, with a lead open or two shorted; a rail missing or
 * reversed; the generator's display, the probe's factor.
 */
final class FaultCatalogue {
  private static final double OPEN = 1e10;
  private static final double SHORT = 1e-2;
  private static final double OPEN_CAPACITOR = 1e-6;

  private final Design design;
  private final List<Candidate> candidates = new ArrayList<>();

  private FaultCatalogue(Design design) {
    this.design = design;
  }

  /** All candidates of a hookup, in the order of the design. */
  static List<Candidate> of(HookupFigures nominal) {
    FaultCatalogue catalogue = new FaultCatalogue(nominal.design());
    Map<String, NamedPart> elements = new LinkedHashMap<>();
    for (NamedPart part : DesignPath.parts(nominal.design())) {
      if (!part.path().startsWith("bench.")) {
        nominal.elements(part.path()).forEach(element -> elements.put(element, part));
      }
    }
    elements.forEach((element, part) -> catalogue.part(element, part));
    catalogue.exchanges(elements);
    DeviceRoles.of(nominal.design()).stream()
        .filter(role -> !role.diode())
        .map(DeviceRole::role)
        .forEach(catalogue::device);
    catalogue.rails();
    catalogue.bench();
    return catalogue.candidates;
  }

  private void part(String element, NamedPart part) {
    double value = part.value().effective();
    boolean resistor = part.unit() == Unit.OHM;
    if (resistor) {
      add(Candidate.ofPart(element, element + ": open", OPEN / value));
      add(Candidate.ofPart(element, element + ": shorted", SHORT / value));
    } else {
      add(Candidate.ofPart(element, element + ": open", OPEN_CAPACITOR));
      add(Candidate.shorted(element, element + ": shorted"));
    }
    decade(element, part, 10);
    decade(element, part, 0.1);
  }

  private void decade(String element, NamedPart part, double ratio) {
    String wrong = EngineeringFormat.format(part.value().effective() * ratio, part.unit(), 3);
    add(Candidate.ofPart(element, element + ": a decade wrong, " + wrong, ratio));
  }

  /** Two parts next to one another in the parts list are easily taken for each other. */
  private void exchanges(Map<String, NamedPart> elements) {
    List<Map.Entry<String, NamedPart>> list = List.copyOf(elements.entrySet());
    for (int i = 1; i < list.size(); i++) {
      Map.Entry<String, NamedPart> one = list.get(i - 1);
      Map.Entry<String, NamedPart> other = list.get(i);
      double ofOne = one.getValue().value().effective();
      double ofOther = other.getValue().value().effective();
      if (one.getValue().unit() == other.getValue().unit() && ofOne != ofOther) {
        add(
            Candidate.exchanged(
                one.getKey(),
                ofOne,
                other.getKey(),
                ofOther,
                one.getKey() + ": exchanged with " + other.getKey()));
      }
    }
  }

  private void device(String role) {
    for (DeviceFault fault : DeviceFault.values()) {
      boolean decidesThePair = role.equals("pair.q1") && fault == DeviceFault.WRONG_POLARITY;
      if (!decidesThePair) {
        add(Candidate.ofDevice(role, fault));
      }
    }
  }

  private void rails() {
    rail("rails.positive", design.rails().positive());
    if (design.rails().negative().value() != 0) {
      rail("rails.negative", design.rails().negative());
    }
  }

  private void rail(String path, Quantity volts) {
    add(
        Candidate.ofSupply(
            path, path + ": missing", circuit -> DesignPath.set(circuit, path, Quantity.of(0))));
    add(
        Candidate.ofSupply(
            path,
            path + ": reversed",
            circuit -> DesignPath.set(circuit, path, Quantity.of(-volts.value()))));
  }

  private void bench() {
    Map<String, Double> twice =
        Map.of("gain", 2.0, "closedLoopGain", 2.0, "closedLoopGainAtRest", 2.0);
    add(
        Candidate.ofBench(
            "generator",
            "generator: display set for 50 Ω, so that a high impedance receives twice as much",
            twice));
    add(
        Candidate.ofBench(
            "probe",
            "probe: its factor of ten is not applied",
            Map.of("gain", 0.1, "closedLoopGain", 0.1, "closedLoopGainAtRest", 0.1)));
  }

  private void add(Candidate candidate) {
    candidates.add(candidate);
  }
}
