package loopwright.bench;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;

/**
 * Readings that are predicted in one circuit.
 *
 * @param circuit the design as those readings found it
 * @param hookup name of the hookup
 * @param readings their indices on the bench
 * @param loading by reading, what an instrument that the circuit leaves out adds to it
 */
record ReadingGroup(
    Design circuit, String hookup, List<Integer> readings, Map<Integer, Double> loading) {
  /**
   * An instrument whose load moves a reading by less than this share of what the reading is
   * believed may be left out of builds that differ little: what is left of its effect is less than
   * a tenth of the uncertainty where the circuit's resistances change by a third.
   */
  private static final double LIGHT = 0.3;

  /** Keeps its own copies. */
  ReadingGroup {
    readings = List.copyOf(readings);
    loading = Map.copyOf(loading);
  }

  /** The readings of a design by circuit, instruments included; loose parts are in none. */
  static List<ReadingGroup> of(Design design) {
    Groups groups = new Groups();
    List<Reading> readings = design.bench().readings();
    for (int i = 0; i < readings.size(); i++) {
      Reading reading = readings.get(i);
      if (reading.hookup().isPresent()) {
        groups.add(new Expectation(reading).circuit(design), reading.hookup().get(), i, 0);
      }
    }
    return groups.list();
  }

  /**
   * The same readings in fewer circuits: instruments that load lightly are left out, and what they
   * do to the design's own circuit is added to what is predicted without them.
   *
   * @param kin whose fits of part records are taken over
   * @param standard standard uncertainty of a reading
   * @param nominal what the design's own circuit shows, instruments included; NaN where unknown
   */
  static List<ReadingGroup> light(
      Design design, HookupFigures kin, IntToDoubleFunction standard, IntToDoubleFunction nominal) {
    Groups groups = new Groups();
    Map<List<Object>, HookupFigures> unloaded = new HashMap<>();
    List<Reading> readings = design.bench().readings();
    for (ReadingGroup exact : of(design)) {
      for (int i : exact.readings()) {
        Expectation expectation = new Expectation(readings.get(i));
        Design without = expectation.unloaded(design);
        double free =
            expectation
                .of(
                    unloaded.computeIfAbsent(
                        List.of(without, exact.hookup()),
                        key -> kin.apart(without, exact.hookup())))
                .number()
                .orElse(Double.NaN);
        double load = nominal.applyAsDouble(i) - free;
        if (Math.abs(load) <= LIGHT * standard.applyAsDouble(i)) {
          groups.add(without, exact.hookup(), i, load);
        } else {
          groups.add(exact.circuit(), exact.hookup(), i, 0);
        }
      }
    }
    return groups.list();
  }

  /**
   * Figures of each group's circuit at nominal values, in the same order. Those of a hookup are
   * solved from the first of it: they differ by an instrument's load only.
   *
   * @param kin whose fits of part records are taken over
   */
  static List<HookupFigures> nominal(List<ReadingGroup> groups, HookupFigures kin) {
    Map<String, HookupFigures> first = new HashMap<>();
    List<HookupFigures> figures = new ArrayList<>();
    for (ReadingGroup group : groups) {
      HookupFigures start = first.get(group.hookup());
      HookupFigures own =
          start == null
              ? kin.apart(group.circuit(), group.hookup())
              : start.of(Build.nominal(group.circuit()));
      if (own.failure().isEmpty()) {
        first.putIfAbsent(group.hookup(), own);
      }
      figures.add(own);
    }
    return figures;
  }

  /** What a reading of this group shows, given the figures of its circuit; NaN where nothing. */
  double shown(List<Reading> all, int reading, HookupFigures figures) {
    return new Expectation(all.get(reading)).of(figures).number().orElse(Double.NaN)
        + loading.getOrDefault(reading, 0.0);
  }

  /** Groups in the making, in the order of their first readings. */
  private static final class Groups {
    private final Map<List<Object>, List<Integer>> readings = new LinkedHashMap<>();
    private final Map<List<Object>, Map<Integer, Double>> loading = new HashMap<>();

    void add(Design circuit, String hookup, int reading, double load) {
      List<Object> key = List.of(circuit, hookup);
      readings.computeIfAbsent(key, none -> new ArrayList<>()).add(reading);
      loading.computeIfAbsent(key, none -> new HashMap<>()).put(reading, load);
    }

    List<ReadingGroup> list() {
      return readings.entrySet().stream()
          .map(
              group ->
                  new ReadingGroup(
                      (Design) group.getKey().get(0),
                      (String) group.getKey().get(1),
                      group.getValue(),
                      loading.get(group.getKey())))
          .toList();
    }
  }
}
