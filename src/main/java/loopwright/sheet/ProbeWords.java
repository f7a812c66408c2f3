package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.design.Hookup;
import loopwright.design.Probe;
import loopwright.quantity.Unit;

/** Which probe goes where. */
final class ProbeWords {
  private ProbeWords() {}

  /** What holds for every hookup; capacitance: common practice, no source. */
  static final String USUAL =
      "Probe: \u00D710, its ground clip on circuit ground; where a hookup names no probe the figures"
          + " are those without it (it adds 10 to 15 pF where it touches).";

  /** The probes that a hookup names. */
  static String of(Hookup hookup) {
    if (hookup.probes().isEmpty()) {
      return "";
    }
    return "Probe: "
        + hookup.probes().stream().map(ProbeWords::says).collect(Collectors.joining("; "))
        + "; the figures are those with it.";
  }

  private static String says(Probe probe) {
    List<String> parts = new ArrayList<>();
    probe.resistance().ifPresent(value -> parts.add(PartSays.value(value, Unit.OHM)));
    probe.capacitance().ifPresent(value -> parts.add(PartSays.value(value, Unit.FARAD)));
    return "at "
        + PartSays.node(probe.node())
        + (parts.isEmpty() ? "" : " with " + String.join(" and ", parts));
  }
}
