package loopwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import loopwright.bench.NodeSuspects;
import loopwright.design.Design;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Unit;
import loopwright.spread.Band;
import loopwright.spread.HookupSpread;
import loopwright.task.Progress;

/** The nodes to measure, in the order that tells most, with their bands and suspects. */
final class NodeTable {
  private static final int MOST_PARTS = 3;

  /** Words of the fault catalogue, and what they are where every letter costs room. */
  private static final String[][] SHORTER = {
    {"rails.resistance@", "supply lead of "},
    {"rails.decoupling.resistance@", "decoupling of "},
    {"rails.", "rail "},
    {": ", " "},
    {"collector and emitter exchanged", "C and E exchanged"},
    {"base and emitter shorted", "B\u2013E shorted"},
    {"base and collector shorted", "B\u2013C shorted"},
    {"collector and emitter shorted", "C\u2013E shorted"},
    {"of the wrong polarity", "wrong polarity"},
    {"base open", "B open"},
    {"collector open", "C open"},
    {"emitter open", "E open"},
    {"a decade wrong, ", "is "},
  };

  private final Design design;
  private final Designators designators;

  NodeTable(Design design, Designators designators) {
    this.design = design;
    this.designators = designators;
  }

  /** The rows of a hookup; none where it finds no rest. */
  List<SheetNode> of(
      HookupPrediction prediction, Optional<HookupSpread> spread, Progress progress) {
    if (prediction.rest().isEmpty()) {
      return List.of();
    }
    Wiring wiring = Wiring.of(design, prediction.hookup());
    Map<String, Band> bands = spread.map(HookupSpread::nodes).orElse(Map.of());
    NodeSuspects suspects =
        NodeSuspects.of(design, prediction.hookup().name(), wiring.measurable(), bands, progress);
    List<SheetNode> rows = new ArrayList<>();
    for (NodeSuspects.Node node : suspects.nodes()) {
      double volts = prediction.rest().get().nodes().get(node.name());
      rows.add(
          new SheetNode(
              node.name(),
              at(wiring, node.name()),
              Expected.of(
                  FigureValue.of(volts), Optional.ofNullable(bands.get(node.name())), Unit.VOLT),
              says(wiring, node.ifHigh()),
              says(wiring, node.ifLow())));
    }
    return rows;
  }

  private List<String> at(Wiring wiring, String node) {
    List<String> devices = wiring.at(node, role -> String.join(" ", designators.of(role)));
    return devices.isEmpty()
        ? wiring.partsAt(node).stream()
            .map(designators::element)
            .filter(name -> !name.isEmpty())
            .limit(MOST_PARTS)
            .toList()
        : devices;
  }

  private String says(Wiring wiring, List<NodeSuspects.Suspect> suspects) {
    return suspects.isEmpty()
        ? "\u2014"
        : suspects.stream()
            .map(suspect -> named(wiring, suspect))
            .collect(Collectors.joining("; "));
  }

  /** The fault with every part by its designator, as it stands on the sheet. */
  private String named(Wiring wiring, NodeSuspects.Suspect suspect) {
    String says = suspect.says();
    List<String> names = new ArrayList<>(wiring.names());
    names.sort(Comparator.comparingInt(String::length).reversed());
    for (String name : names) {
      String designator = designators.element(name);
      if (!designator.isEmpty()) {
        says =
            says.replaceAll(
                "(?<![\\w.@])" + Pattern.quote(name) + "(?![\\w@])",
                Matcher.quoteReplacement(designator));
      }
    }
    for (String[] shorter : SHORTER) {
      says = says.replace(shorter[0], shorter[1]);
    }
    return says;
  }
}
