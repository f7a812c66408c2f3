package loopwright.design;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The bench: instruments that say enough, readings and curves that refer to what exists. */
final class BenchCheck {
  private static final double MATCHED_LOAD = 50;

  /** Quantities that are read of a part out of circuit. */
  private static final Set<String> LOOSE = Set.of("resistance", "capacitance", "beta");

  private static final Set<String> OF_A_DEVICE = Set.of("collectorCurrent", "baseEmitterVoltage");

  private final Design design;
  private final Problems problems;

  private BenchCheck(Design design, Problems problems) {
    this.design = design;
    this.problems = problems;
  }

  static void check(Design design, Problems problems) {
    BenchCheck check = new BenchCheck(design, problems);
    Bench bench = design.bench();
    for (Map.Entry<String, Instrument> entry : bench.instruments().entrySet()) {
      check.instrument("bench.instruments." + entry.getKey(), entry.getValue());
    }
    for (int i = 0; i < bench.readings().size(); i++) {
      check.reading("bench.readings." + i, bench.readings().get(i));
    }
    problems.checkNames("bench.curves", bench.curves().stream().map(Curve::name).toList());
    for (Curve curve : bench.curves()) {
      check.curve("bench.curves." + curve.name(), curve);
    }
  }

  /** A hookup that something refers to by its name. */
  static void hookup(Design design, Problems problems, String path, String name) {
    if (design.hookup(name).isEmpty()) {
      List<String> names = design.hookups().stream().map(Hookup::name).toList();
      problems.add(
          path,
          "\"" + name + "\", which is no hookup of this design",
          names.isEmpty() ? "the name of one" : "one of " + String.join(", ", names));
    }
  }

  private void instrument(String path, Instrument instrument) {
    boolean fullScale =
        instrument.range().isPresent()
            || (instrument.divisions().isPresent() && instrument.voltsPerDivision().isPresent());
    if (instrument.percentOfRange().isPresent() && !fullScale) {
      problems.add(
          path + ".percentOfRange",
          "a share of the range without a range",
          "range, or divisions and voltsPerDivision");
    }
    if (instrument.digits().isPresent() && instrument.resolution().isEmpty()) {
      problems.add(path + ".digits", "digits without the value of one", "resolution beside it");
    }
    instrument
        .displayLoad()
        .filter(load -> load.value() != MATCHED_LOAD && Double.isFinite(load.value()))
        .ifPresent(load -> problems.add(path + ".displayLoad", load.spelling(), "50 or infinite"));
  }

  private void reading(String path, Reading reading) {
    String quantity = reading.quantity();
    boolean loose = LOOSE.contains(quantity);
    if (reading.hookup().isPresent()) {
      hookup(design, problems, path + ".hookup", reading.hookup().get());
    } else if (!loose) {
      problems.add(
          path + ".hookup",
          "none for a reading of " + quantity,
          "the hookup that was built; only a loose part has none");
    }
    need(path, "node", quantity.equals("nodeVoltage"), reading.node(), quantity);
    need(path, "device", OF_A_DEVICE.contains(quantity), reading.device(), quantity);
    need(path, "rail", quantity.equals("supplyCurrent"), reading.rail(), quantity);
    need(path, "part", loose, reading.part(), quantity);
    reading.device().ifPresent(role -> device(path + ".device", role));
    reading.part().ifPresent(part -> part(path + ".part", part));
    reading.instrument().ifPresent(name -> instrumentName(path + ".instrument", name));
    reading
        .uncertainty()
        .filter(uncertainty -> uncertainty.value() <= 0)
        .ifPresent(
            uncertainty ->
                problems.add(
                    path + ".uncertainty", uncertainty.spelling(), "an uncertainty above zero"));
  }

  private void need(
      String path, String field, boolean applies, Optional<?> given, String quantity) {
    if (applies && given.isEmpty()) {
      problems.add(path + "." + field, "none", "the " + field + " for a reading of " + quantity);
    }
  }

  private void device(String path, String role) {
    if (DeviceRoles.find(design, role).isEmpty()) {
      problems.add(
          path, "\"" + role + "\", which is no device of the amplifier", "a role such as pair.q1");
    }
  }

  /** A resistor or capacitor by its path, a device by its role, or a part by its name. */
  private void part(String path, String part) {
    boolean known =
        design.parts().containsKey(part)
            || DeviceRoles.find(design, part).isPresent()
            || DesignPath.parts(design).stream().anyMatch(named -> named.path().equals(part));
    if (!known) {
      problems.add(
          path,
          "\"" + part + "\", which is no part of this design",
          "the path of a resistor or capacitor, a device role, or the name of a part");
    }
  }

  private void instrumentName(String path, String name) {
    Set<String> names = design.bench().instruments().keySet();
    if (!names.contains(name)) {
      problems.add(
          path,
          "\"" + name + "\", which is no instrument of this bench",
          names.isEmpty() ? "the name of one" : "one of " + String.join(", ", names));
    }
  }

  private void curve(String path, Curve curve) {
    curve.hookup().ifPresent(name -> hookup(design, problems, path + ".hookup", name));
    List<Integer> lengths =
        curve.columns().stream().map(column -> column.values().size()).distinct().toList();
    if (lengths.size() > 1) {
      problems.add(
          path + ".columns", "columns of different length", "as many values in every column");
    }
  }
}
