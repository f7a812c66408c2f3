package loopwright.sheet;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loopwright.assembly.Assembler;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.Capacitor;
import loopwright.circuit.Element;
import loopwright.circuit.Resistor;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.Hookup;
import loopwright.design.NamedPart;

/**
 * Reference designators (IEEE 315: R, C, Q, D and a number). Every place of the stage library has a
 * number of its own, by decades along the signal path and by hundreds for hookups, so that a part
 * keeps its designator whatever comes and goes elsewhere.
 */
public final class Designators {
  private final Map<String, List<String>> byPath = new LinkedHashMap<>();
  private final Map<String, String> byElement = new LinkedHashMap<>();
  private final Set<String> given = new LinkedHashSet<>();

  private Designators() {}

  /**
   * Those of a design.
   *
   * @throws loopwright.assembly.AssemblyException when the design stands for no circuit
   */
  public static Designators of(Design design) {
    Designators designators = new Designators();
    for (DeviceRole role : DeviceRoles.of(design)) {
      String letter = role.diode() ? "D" : "Q";
      designators.give(role.role(), role.role(), letter, DesignatorPlaces.device(role.role()));
    }
    Map<String, NamedPart> parts = new LinkedHashMap<>();
    DesignPath.parts(design).forEach(part -> parts.put(part.path(), part));
    for (int i = 0; i < design.hookups().size(); i++) {
      designators.hookup(design, design.hookups().get(i), i, parts);
    }
    return designators;
  }

  private void hookup(Design design, Hookup hookup, int index, Map<String, NamedPart> parts) {
    for (Element element : Assembler.assemble(design, hookup).circuit().elements()) {
      String path = element.name().split("@")[0];
      if (parts.containsKey(path)
          && !byElement.containsKey(element.name())
          && DesignatorPlaces.isPart(path)) {
        if (element instanceof Resistor) {
          give(element.name(), path, "R", DesignatorPlaces.part(design, element.name(), index));
        } else if (element instanceof Capacitor || element instanceof BlockingCapacitor) {
          give(element.name(), path, "C", DesignatorPlaces.part(design, element.name(), index));
        }
      }
    }
  }

  private void give(String element, String path, String letter, int wanted) {
    int number = wanted;
    while (!given.add(letter + number)) {
      number++;
    }
    byElement.put(element, letter + number);
    byPath.computeIfAbsent(path, absent -> new ArrayList<>()).add(letter + number);
  }

  /**
   * The designators of what a path or role stands for: none for what is no part to fit, two for the
   * path of twins.
   */
  public List<String> of(String pathOrRole) {
    return Collections.unmodifiableList(byPath.getOrDefault(pathOrRole, List.of()));
  }

  /**
   * The designator of one part: that of its twins whose name the circuit gives it, behind an
   * {@code @}; empty where it is no part to fit.
   */
  public String element(String name) {
    return byElement.getOrDefault(name, "");
  }
}
