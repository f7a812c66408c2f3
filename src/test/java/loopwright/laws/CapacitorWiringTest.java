package loopwright.laws;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Inductor;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.RandomDesigns;
import loopwright.numeric.SparsityPattern;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;
import org.junit.jupiter.api.Test;

/**
 * Every capacitor of a design, with its strays, stands where the format's page puts it: between
 * devices without capacitances the matrix C is what the plain list of capacitors adds up to.
 */
class CapacitorWiringTest {
  private static final int DESIGNS = 200;
  private static final Optional<Quantity> NONE = Optional.of(Quantity.of(0));

  @Test
  void capacitorsStandWhereTheFormatPutsThem() {
    int blocking = 0;
    int inductors = 0;
    for (Design design : RandomDesigns.of(DESIGNS).map(CapacitorWiringTest::bare).toList()) {
      AssembledHookup hookup = Solved.assembled(design);
      Wiring wiring = new Wiring();
      new HookupWiring(design, design.hookups().get(0), wiring).add();
      new StageWiring(design, wiring).add();
      Map<Integer, String> names = names(design, hookup.circuit(), wiring);
      assertSame(design, actual(hookup.circuit(), names), expected(design, wiring, names));
      blocking += checkBlocking(design, hookup.circuit(), wiring, names);
      inductors += checkInductors(design, hookup.circuit());
    }
    assertThat(blocking).isGreaterThan(DESIGNS / 2);
    assertThat(inductors).isGreaterThan(DESIGNS / 10);
  }

  /** The wiring's name of every node of the circuit; both ends of a lead are one node. */
  private static Map<Integer, String> names(Design design, Circuit circuit, Wiring wiring) {
    Map<Integer, String> names = new HashMap<>();
    for (String name : circuit.nodeNames()) {
      String known =
          name.equals("behindLead.in-") ? "in-" : name.equals("behindLead.source") ? null : name;
      if (known != null && !name.contains(".inner.")) {
        String before = names.put(circuit.node(name), wiring.node(known));
        assertThat(before == null || before.equals(wiring.node(known)))
            .as("%s: %s and %s", design.name(), before, name)
            .isTrue();
      }
    }
    return names;
  }

  private static Map<List<String>, Double> actual(Circuit circuit, Map<Integer, String> names) {
    CircuitState state = circuit.newState();
    state.evaluate();
    Map<List<String>, Double> sums = new HashMap<>();
    SparsityPattern pattern = circuit.pattern();
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = pattern.row(slot);
      int column = pattern.column(slot);
      double value = state.stamps().c[slot];
      if (value != 0 && row < circuit.nodes() && column < circuit.nodes()) {
        sums.merge(List.of(names.get(row), names.get(column)), value, Double::sum);
      }
    }
    return sums;
  }

  private static Map<List<String>, Double> expected(
      Design design, Wiring wiring, Map<Integer, String> names) {
    Map<List<String>, Double> sums = new HashMap<>();
    for (Wiring.Capacitance capacitor : wiring.capacitances()) {
      if (!capacitor.blocking()) {
        add(wiring, sums, capacitor.from(), capacitor.to(), capacitor.farads());
      }
    }
    double stray = design.surroundings().strayCapacitance().value();
    Set<String> without = new HashSet<>();
    for (String name :
        new String[] {
          "ground",
          "generator",
          "positive",
          "negative",
          "ideal.positive",
          "ideal.negative",
          "decoupling.positive",
          "decoupling.negative"
        }) {
      without.add(wiring.node(name));
    }
    for (String name : new HashSet<>(names.values())) {
      if (stray > 0 && !without.contains(name)) {
        add(wiring, sums, name, "ground", stray);
      }
    }
    return sums;
  }

  private static void add(
      Wiring wiring, Map<List<String>, Double> sums, String from, String to, double farads) {
    String one = wiring.node(from);
    String other = wiring.node(to);
    String ground = wiring.node("ground");
    if (one.equals(other)) {
      return;
    }
    if (!one.equals(ground)) {
      sums.merge(List.of(one, one), farads, Double::sum);
    }
    if (!other.equals(ground)) {
      sums.merge(List.of(other, other), farads, Double::sum);
    }
    if (!one.equals(ground) && !other.equals(ground)) {
      sums.merge(List.of(one, other), -farads, Double::sum);
      sums.merge(List.of(other, one), -farads, Double::sum);
    }
  }

  private static void assertSame(
      Design design, Map<List<String>, Double> actual, Map<List<String>, Double> expected) {
    assertThat(actual.keySet()).as(design.name()).isEqualTo(expected.keySet());
    expected.forEach(
        (place, farads) ->
            assertThat(actual.get(place))
                .as("%s: %s", design.name(), place)
                .isCloseTo(farads, within(1e-9 * Math.abs(farads))));
  }

  private static int checkBlocking(
      Design design, Circuit circuit, Wiring wiring, Map<Integer, String> names) {
    String ground = wiring.node("ground");
    List<String> actual =
        circuit.elements().stream()
            .filter(BlockingCapacitor.class::isInstance)
            .map(BlockingCapacitor.class::cast)
            .map(
                c ->
                    Set.of(
                                names.getOrDefault(c.from(), ground),
                                names.getOrDefault(c.to(), driven(design, wiring)))
                            .stream()
                            .sorted()
                            .toList()
                        + " "
                        + c.capacitance())
            .sorted()
            .toList();
    List<String> expected =
        wiring.capacitances().stream()
            .filter(Wiring.Capacitance::blocking)
            .map(
                c ->
                    Stream.of(wiring.node(c.from()), wiring.node(c.to())).sorted().toList()
                        + " "
                        + c.farads())
            .sorted()
            .toList();
    assertThat(actual).as(design.name()).isEqualTo(expected);
    return expected.size();
  }

  /** The node behind the source's lead, which the names above leave out. */
  private static String driven(Design design, Wiring wiring) {
    boolean inverting = design.hookups().get(0).feedback() instanceof Feedback.Inverting;
    return wiring.node(inverting ? "inputEnd" : "in+");
  }

  /** One inductor of the stated size in either rail. */
  private static int checkInductors(Design design, Circuit circuit) {
    double inductance = design.rails().inductance().value();
    CircuitState state = circuit.newState();
    state.evaluate();
    SparsityPattern pattern = circuit.pattern();
    int found = 0;
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = pattern.row(slot);
      if (row >= circuit.nodes() && row == pattern.column(slot) && state.stamps().c[slot] != 0) {
        assertThat(state.stamps().c[slot]).isEqualTo(-inductance);
        found++;
      }
    }
    assertThat(found).as(design.name()).isEqualTo(inductance > 0 ? 2 : 0);
    assertThat(circuit.elements().stream().filter(Inductor.class::isInstance).count())
        .isEqualTo(found);
    return found;
  }

  /** The design with devices that store no charge. */
  private static Design bare(Design design) {
    Map<String, PartRecord> parts = new LinkedHashMap<>();
    design.parts().forEach((name, record) -> parts.put(name, bare(record)));
    return new Design(
        design.loopwright(),
        design.name(),
        design.notes(),
        design.rails(),
        design.surroundings(),
        parts,
        design.amplifier(),
        design.devices(),
        design.extras(),
        design.hookups(),
        design.tolerances(),
        design.limits(),
        design.drawer(),
        design.bench());
  }

  private static PartRecord bare(PartRecord record) {
    if (record instanceof TransistorRecord transistor) {
      TransistorModel model = transistor.model().orElseThrow();
      return new TransistorRecord(
          transistor.kind(),
          Optional.of(
              new TransistorModel(
                  model.saturationCurrent(),
                  model.forwardBeta(),
                  model.reverseBeta(),
                  model.earlyVoltage(),
                  model.kneeCurrent(),
                  model.recombinationCurrent(),
                  model.recombinationIdeality(),
                  model.baseResistance(),
                  model.emitterResistance(),
                  model.collectorResistance(),
                  NONE,
                  NONE,
                  NONE,
                  NONE,
                  model.flickerCorner())),
          transistor.datasheet(),
          transistor.measured(),
          transistor.limits(),
          transistor.source(),
          transistor.pins());
    }
    DiodeRecord diode = (DiodeRecord) record;
    DiodeModel model = diode.model().orElseThrow();
    return new DiodeRecord(
        Optional.of(
            new DiodeModel(
                model.saturationCurrent(), model.ideality(), model.seriesResistance(), NONE, NONE)),
        diode.datasheet(),
        diode.limits(),
        diode.source(),
        diode.pins());
  }
}
