package loopwright.design;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.part.PartRecord;
import loopwright.part.Shelf;

/** The part records that a design names, and where they come from. */
public final class UsedParts {
  private UsedParts() {}

  /**
   * The paths at which each part is named, by part, in the order of the file: in the stages, for
   * single devices, and among the transistors in the drawer.
   */
  public static Map<String, List<String>> of(Design design) {
    Map<String, List<String>> uses = new LinkedHashMap<>();
    Design withoutChoices = DesignPath.set(design, "devices", Map.of());
    for (Design asked : List.of(withoutChoices, design)) {
      DeviceRoles.of(asked).forEach(device -> add(uses, device.part(), device.partPath()));
    }
    // A device that the amplifier lacks names a part all the same.
    design
        .devices()
        .forEach(
            (role, choice) ->
                choice.part().ifPresent(part -> add(uses, part, "devices." + role + ".part")));
    List<String> drawer = design.drawer().transistors();
    for (int i = 0; i < drawer.size(); i++) {
      add(uses, drawer.get(i), "drawer.transistors." + i);
    }
    return uses;
  }

  /**
   * A copy of the design that brings along every record it names, so that it is whole by itself.
   * Records of the design win over those of the shelf; names that neither has stay missing.
   */
  public static Design withPartsFrom(Design design, Shelf shelf) {
    Map<String, PartRecord> parts = new LinkedHashMap<>(design.parts());
    for (String name : of(design).keySet()) {
      if (!parts.containsKey(name)) {
        shelf.find(name).ifPresent(found -> parts.put(name, found));
      }
    }
    return parts.size() == design.parts().size() ? design : DesignPath.set(design, "parts", parts);
  }

  private static void add(Map<String, List<String>> uses, String part, String path) {
    List<String> paths = uses.computeIfAbsent(part, name -> new ArrayList<>());
    if (!paths.contains(path)) {
      paths.add(path);
    }
  }
}
