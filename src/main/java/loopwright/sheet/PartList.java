package loopwright.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.NamedPart;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Pin;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** The parts of a design by value, and the pins of the types among them. */
final class PartList {
  private final Design design;
  private final Designators designators;

  PartList(Design design, Designators designators) {
    this.design = design;
    this.designators = designators;
  }

  /** Resistors by rising value, then capacitors, then semiconductors by type. */
  List<SheetPart> lines() {
    List<SheetPart> lines = new ArrayList<>();
    lines.addAll(passive(Unit.OHM, "resistor", design.tolerances().resistor()));
    lines.addAll(passive(Unit.FARAD, "capacitor", design.tolerances().capacitor()));
    roles()
        .forEach(
            (part, roles) ->
                lines.add(new SheetPart(part, kind(design.parts().get(part)), named(roles))));
    return lines;
  }

  /** The pins of every type that is used. */
  List<SheetPinout> pinouts() {
    List<SheetPinout> pinouts = new ArrayList<>();
    roles()
        .forEach(
            (part, roles) -> {
              PartRecord record = design.parts().get(part);
              pinouts.add(
                  new SheetPinout(part, record instanceof DiodeRecord, pins(record), named(roles)));
            });
    return pinouts;
  }

  private record Line(double value, String says, String what) {}

  private List<SheetPart> passive(Unit unit, String kind, Optional<Quantity> general) {
    Map<Line, List<String>> byLine = new LinkedHashMap<>();
    for (NamedPart part : DesignPath.parts(design)) {
      List<String> named = designators.of(part.path());
      if (part.unit() == unit && !named.isEmpty()) {
        byLine.computeIfAbsent(line(part, kind, general), line -> new ArrayList<>()).addAll(named);
      }
    }
    return byLine.entrySet().stream()
        .sorted((a, b) -> Double.compare(a.getKey().value(), b.getKey().value()))
        .map(entry -> new SheetPart(entry.getKey().says(), entry.getKey().what(), entry.getValue()))
        .toList();
  }

  private static Line line(NamedPart part, String kind, Optional<Quantity> general) {
    String tolerance =
        part.value()
            .tolerance()
            .or(() -> general)
            .map(fraction -> " \u00B1" + EngineeringFormat.percent(fraction.value()))
            .orElse("");
    String measured =
        part.value()
            .measured()
            .map(value -> ", measured " + EngineeringFormat.format(value.value(), part.unit()))
            .orElse("");
    return new Line(
        part.value().value().value(),
        PartSays.value(part.value(), part.unit()),
        kind + tolerance + measured);
  }

  private Map<String, List<String>> roles() {
    Map<String, List<String>> roles = new LinkedHashMap<>();
    for (DeviceRole role : DeviceRoles.of(design)) {
      roles.computeIfAbsent(role.part(), part -> new ArrayList<>()).add(role.role());
    }
    return roles;
  }

  private List<String> named(List<String> roles) {
    return roles.stream().flatMap(role -> designators.of(role).stream()).toList();
  }

  private static String kind(PartRecord record) {
    if (record instanceof TransistorRecord transistor) {
      return transistor.kind() == Polarity.NPN ? "npn transistor" : "pnp transistor";
    }
    return "diode";
  }

  private static List<Pin> pins(PartRecord record) {
    if (record instanceof TransistorRecord transistor) {
      return transistor.pins();
    }
    return record instanceof DiodeRecord diode ? diode.pins() : List.of();
  }
}
