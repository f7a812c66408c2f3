package loopwright.design;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;

/** Every device: a known part, of the kind and polarity that its place asks for. */
final class DeviceCheck {
  private final Design design;
  private final Problems problems;
  private final List<DeviceRole> roles;

  private DeviceCheck(Design design, Problems problems) {
    this.design = design;
    this.problems = problems;
    this.roles = DeviceRoles.of(design);
  }

  static void check(Design design, Problems problems) {
    DeviceCheck check = new DeviceCheck(design, problems);
    check.unknownParts();
    // The stage's own part must fit as well, even where every device of it is another.
    DeviceRoles.of(DesignPath.set(design, "devices", Map.of())).forEach(check::fits);
    check.roles.forEach(check::fits);
    check.choices();
  }

  private void unknownParts() {
    UsedParts.of(design)
        .forEach(
            (part, paths) -> {
              if (!design.parts().containsKey(part)) {
                paths.forEach(
                    path ->
                        problems.add(
                            path,
                            "\"" + part + "\", which is no known part",
                            "the name of a part record in this file or on the shelf"));
              }
            });
  }

  private void fits(DeviceRole device) {
    PartRecord part = design.parts().get(device.part());
    if (part == null) {
      return;
    }
    String found = "\"" + device.part() + "\", " + kind(part);
    if (device.diode()) {
      if (!(part instanceof DiodeRecord)) {
        problems.add(device.partPath(), found, "a diode for " + device.role());
      }
    } else if (!(part instanceof TransistorRecord)) {
      problems.add(device.partPath(), found, "a transistor for " + device.role());
    } else if (device.polarity().isPresent()) {
      Polarity polarity = ((TransistorRecord) part).kind();
      if (polarity != device.polarity().get()) {
        problems.add(
            device.partPath(),
            found,
            article(device.polarity().get()) + " transistor for " + device.role() + beside(device));
      }
    }
  }

  private String beside(DeviceRole device) {
    String stage = device.role().substring(0, device.role().indexOf('.'));
    boolean always = List.of("bias", "driver", "out").contains(stage);
    return always
        ? ""
        : DeviceRoles.pairPolarity(design)
            .map(pair -> " beside " + article(pair) + " pair")
            .orElse("");
  }

  private void choices() {
    design
        .devices()
        .forEach(
            (role, choice) -> {
              String path = "devices." + role;
              Optional<DeviceRole> device =
                  roles.stream().filter(known -> known.role().equals(role)).findFirst();
              if (device.isEmpty()) {
                problems.add(path, "a device that the amplifier does not have", expectedRoles());
              } else if (device.get().diode() && choice.measured().isPresent()) {
                problems.add(
                    path + ".measured", "a transistor's readings for a diode", "a part only");
              }
              if (choice.part().isEmpty() && choice.measured().isEmpty()) {
                problems.add(path, "neither part nor measured", "at least one of the two");
              }
            });
  }

  private String expectedRoles() {
    return roles.isEmpty()
        ? "none, for its devices are not known"
        : "one of " + String.join(", ", roles.stream().map(DeviceRole::role).toList());
  }

  private static String kind(PartRecord part) {
    return part instanceof TransistorRecord transistor
        ? article(transistor.kind()) + " transistor"
        : "a diode";
  }

  private static String article(Polarity polarity) {
    return polarity == Polarity.NPN ? "an npn" : "a pnp";
  }
}
