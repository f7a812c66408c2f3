package loopwright.bench;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.design.Design;
import loopwright.design.Reading;

/**
 * Readings that were taken in one circuit.
 *
 * @param circuit the design as those readings found it, instruments included
 * @param hookup name of the hookup
 * @param readings their indices on the bench
 */
record ReadingGroup(Design circuit, String hookup, List<Integer> readings) {
  /** Keeps its own copy. */
  ReadingGroup {
    readings = List.copyOf(readings);
  }

  /** The readings of a design by circuit; loose parts are in none. */
  static List<ReadingGroup> of(Design design) {
    Map<List<Object>, List<Integer>> groups = new LinkedHashMap<>();
    List<Reading> readings = design.bench().readings();
    for (int i = 0; i < readings.size(); i++) {
      Reading reading = readings.get(i);
      if (reading.hookup().isPresent()) {
        Design circuit = new Expectation(reading).circuit(design);
        groups
            .computeIfAbsent(List.of(circuit, reading.hookup().get()), key -> new ArrayList<>())
            .add(i);
      }
    }
    return groups.entrySet().stream()
        .map(
            group ->
                new ReadingGroup(
                    (Design) group.getKey().get(0),
                    (String) group.getKey().get(1),
                    group.getValue()))
        .toList();
  }
}
